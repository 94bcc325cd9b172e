using MeshSection.LinearAlgebra;

namespace MeshSection.Torsion;

/// <summary>
/// Prandtl's stress function ψ for a unit twist and G = 1: -Δψ = 2 in the section, ψ = 0 on the outer boundary and a
/// constant on each hole, chosen so that the hole's edge closes without warping [TimoshenkoGoodier1970], articles 104
/// and 115.
/// </summary>
/// <remarks>
/// For any ψ that keeps these boundary values, L(ψ)² / a(ψ, ψ) ≤ J, with L(ψ) = 2 ∫ ψ dA + 2 Σ ψₖ Aₖ over the holes and
/// a(ψ, ψ) = ∫ |∇ψ|² dA; the greatest value on the triangles is that of the ψ solved for.
/// </remarks>
internal static class StressFunction
{
    private const int Nodes = QuadraticNodes.PerTriangle;

    /// <summary>The lower bound of the torsion constant J, mm⁴.</summary>
    /// <param name="mesh">The fitted mesh of one connected region.</param>
    /// <param name="nodes">Its nodes.</param>
    /// <param name="outer">The outer boundary; all others are holes.</param>
    public static double LowerBound(CurvedMesh mesh, QuadraticNodes nodes, int outer)
    {
        var (unknowns, interior, holes) = Unknowns(mesh, nodes, outer);
        var load = new double[interior + holes.Length];
        holes.CopyTo(load, interior);
        AddAreaLoads(mesh, unknowns, load);
        var matrix = Stiffness.Assemble(mesh, unknowns, load.Length);
        var psi = (double[])load.Clone();
        SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern), matrix).Solve(psi);

        var work = Dot(load, psi);
        return work * work / Dot(psi, matrix.Times(psi));
    }

    /// <summary>
    /// The unknown at each slot of the triangles: those inside by their rank, then one for each hole; -1 on the outer
    /// boundary. Also the load 2 Aₖ of each hole.
    /// </summary>
    private static (int[] Unknowns, int Interior, double[] Holes) Unknowns(CurvedMesh mesh, QuadraticNodes nodes, int outer)
    {
        var boundaries = BoundaryNodes(mesh, nodes);
        var areas = mesh.EnclosedAreas();
        var holeNumbers = new int[areas.Length];
        var holes = new double[areas.Length - 1];
        for (var b = 0; b < areas.Length; b++)
        {
            if (b != outer)
            {
                holeNumbers[b] = b < outer ? b : b - 1;
                holes[holeNumbers[b]] = 2 * Math.Abs(areas[b]);
            }
        }

        var byRank = new int[nodes.Count];
        for (var node = 0; node < nodes.Count; node++)
        {
            byRank[nodes.Ranks[node]] = node;
        }

        var unknownOf = new int[nodes.Count];
        var interior = 0;
        foreach (var node in byRank)
        {
            unknownOf[node] = boundaries[node] < 0 ? interior++ : -1;
        }

        for (var node = 0; node < nodes.Count; node++)
        {
            if (boundaries[node] >= 0 && boundaries[node] != outer)
            {
                unknownOf[node] = interior + holeNumbers[boundaries[node]];
            }
        }

        var unknowns = new int[nodes.Triangles.Length];
        for (var slot = 0; slot < unknowns.Length; slot++)
        {
            unknowns[slot] = unknownOf[nodes.Triangles[slot]];
        }

        return (unknowns, interior, holes);
    }

    /// <summary>The boundary on which each node lies, or -1.</summary>
    private static int[] BoundaryNodes(CurvedMesh mesh, QuadraticNodes nodes)
    {
        var boundaries = new int[nodes.Count];
        Array.Fill(boundaries, -1);
        for (var e = 0; e < mesh.Boundaries.Length; e++)
        {
            if (mesh.Boundaries[e] < 0)
            {
                continue;
            }

            var (first, k) = (e / 3 * Nodes, e % 3);
            boundaries[nodes.Triangles[first + (k + 1) % 3]] = mesh.Boundaries[e];
            boundaries[nodes.Triangles[first + (k + 2) % 3]] = mesh.Boundaries[e];
            boundaries[nodes.Triangles[first + 3 + k]] = mesh.Boundaries[e];
        }

        return boundaries;
    }

    private static void AddAreaLoads(CurvedMesh mesh, int[] unknowns, double[] load)
    {
        var point = new ElementPoint(mesh);
        for (var t = 0; t < mesh.Mesh.TriangleCount; t++)
        {
            point.Enter(t);
            for (var q = 0; q < point.Count; q++)
            {
                point.Move(q);
                for (var i = 0; i < Nodes; i++)
                {
                    var unknown = unknowns[Nodes * t + i];
                    if (unknown >= 0)
                    {
                        load[unknown] += 2 * point.Weight * point.Shape[i];
                    }
                }
            }
        }
    }

    private static double Dot(double[] a, double[] b)
    {
        var sum = 0.0;
        for (var i = 0; i < a.Length; i++)
        {
            sum += a[i] * b[i];
        }

        return sum;
    }
}
