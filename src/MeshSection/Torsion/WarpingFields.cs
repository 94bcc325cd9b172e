using MeshSection.LinearAlgebra;

namespace MeshSection.Torsion;

/// <summary>
/// Three displacements along the member, at each node: the warping function ω of a unit twist, and the shear functions
/// φ₁, φ₂ that go with a bending stress growing along the member as ∂σ/∂z = x and y.
/// </summary>
/// <remarks>
/// They satisfy, for every v,
/// <code>
/// a(ω, v)  = ∫ (y ∂v/∂x - x ∂v/∂y) dA
/// a(φᵢ, v) = ∫ (2 (1 + ν) xᵢ v + ν gᵢ · ∇v) dA     g₁ = ((x² - y²)/2, x y)   g₂ = (x y, (y² - x²)/2)
/// </code>
/// so that the stresses are τ = ∇ω + (-y, x) for G times unit twist and τᵢ = (∇φᵢ - ν gᵢ) / (2 (1 + ν))
/// ([SchrammKitisKangPilkey1994]; gᵢ is how Poisson's ratio makes the section curve). Each is known but for a constant;
/// one node is held at 0. The origin is the centroid, without which φᵢ would not exist.
/// </remarks>
/// <param name="Warping">ω at each node, mm².</param>
/// <param name="Shear1">φ₁ at each node, mm³.</param>
/// <param name="Shear2">φ₂ at each node, mm³.</param>
internal sealed record WarpingFields(double[] Warping, double[] Shear1, double[] Shear2)
{
    private const int Nodes = QuadraticNodes.PerTriangle;

    /// <summary>Solves for the three fields.</summary>
    /// <param name="mesh">The fitted mesh, about its centroid.</param>
    /// <param name="nodes">Its nodes.</param>
    /// <param name="poissonRatio">ν.</param>
    public static WarpingFields Solve(CurvedMesh mesh, QuadraticNodes nodes, double poissonRatio)
    {
        // The node ranked last is the one that is held.
        var held = nodes.Count - 1;
        var unknowns = new int[nodes.Triangles.Length];
        for (var slot = 0; slot < unknowns.Length; slot++)
        {
            var rank = nodes.Ranks[nodes.Triangles[slot]];
            unknowns[slot] = rank == held ? -1 : rank;
        }

        var (warping, shear1, shear2) = (new double[held], new double[held], new double[held]);
        AddLoads(mesh, unknowns, poissonRatio, warping, shear1, shear2);
        var matrix = Stiffness.Assemble(mesh, unknowns, held);
        SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern), matrix).Solve(warping, shear1, shear2);
        return new WarpingFields(AtNodes(warping, nodes), AtNodes(shear1, nodes), AtNodes(shear2, nodes));
    }

    private static void AddLoads(
        CurvedMesh mesh, int[] unknowns, double nu, double[] warping, double[] shear1, double[] shear2)
    {
        var point = new ElementPoint(mesh);
        for (var t = 0; t < mesh.Mesh.TriangleCount; t++)
        {
            point.Enter(t);
            for (var q = 0; q < point.Count; q++)
            {
                point.Move(q);
                var (x, y, area) = (point.X, point.Y, point.Weight);
                var (growth, half, product) = (2 * (1 + nu), 0.5 * nu * (x * x - y * y), nu * x * y);
                for (var i = 0; i < Nodes; i++)
                {
                    var unknown = unknowns[Nodes * t + i];
                    if (unknown < 0)
                    {
                        continue;
                    }

                    var (v, vx, vy) = (point.Shape[i], point.ShapeX[i], point.ShapeY[i]);
                    warping[unknown] += area * (y * vx - x * vy);
                    shear1[unknown] += area * (growth * x * v + half * vx + product * vy);
                    shear2[unknown] += area * (growth * y * v + product * vx - half * vy);
                }
            }
        }
    }

    private static double[] AtNodes(double[] unknowns, QuadraticNodes nodes)
    {
        var values = new double[nodes.Count];
        for (var node = 0; node < values.Length; node++)
        {
            var rank = nodes.Ranks[node];
            values[node] = rank < unknowns.Length ? unknowns[rank] : 0;
        }

        return values;
    }
}
