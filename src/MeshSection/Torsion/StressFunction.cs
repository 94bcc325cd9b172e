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
    /// <param name="sums">Its matrices and loads.</param>
    /// <param name="outer">The outer boundary; all others are holes.</param>
    /// <param name="enclosed">The area inside each boundary, mm², negative for holes.</param>
    public static double LowerBound(
        CentredMesh mesh, QuadraticNodes nodes, ElementSums sums, int outer, ReadOnlySpan<double> enclosed)
    {
        var boundaries = BoundaryNodes(mesh, nodes);
        var (unknowns, interior) = Unknowns(nodes, boundaries, outer);
        var load = new double[interior + enclosed.Length - 1];
        if (load.Length == 0)
        {
            // Every node lies on the boundary, as in a single triangle: only ψ = 0 is left.
            return 0;
        }

        for (var node = 0; node < unknowns.Length; node++)
        {
            if (unknowns[node] >= 0)
            {
                load[unknowns[node]] += 2 * sums.Area[node];
            }
        }

        for (var b = 0; b < enclosed.Length; b++)
        {
            if (b != outer)
            {
                load[interior + Hole(b, outer)] -= 2 * enclosed[b];
            }
        }

        var matrix = sums.Assemble(unknowns, load.Length);
        var psi = load.AsSpan().ToArray();
        SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern), matrix).Solve(psi);
        var work = Dot(load, psi);
        return work * work / Dot(psi, matrix.Times(psi));
    }

    /// <summary>
    /// The unknown of each node: those inside by their rank, then one for each hole; -1 on the outer boundary.
    /// </summary>
    private static (int[] Unknowns, int Interior) Unknowns(QuadraticNodes nodes, int[] boundaries, int outer)
    {
        var byRank = new int[nodes.Count];
        for (var node = 0; node < nodes.Count; node++)
        {
            byRank[nodes.Ranks[node]] = node;
        }

        var unknowns = new int[nodes.Count];
        var interior = 0;
        foreach (var node in byRank)
        {
            unknowns[node] = boundaries[node] < 0 ? interior++ : -1;
        }

        for (var node = 0; node < nodes.Count; node++)
        {
            if (boundaries[node] >= 0 && boundaries[node] != outer)
            {
                unknowns[node] = interior + Hole(boundaries[node], outer);
            }
        }

        return (unknowns, interior);
    }

    private static int Hole(int boundary, int outer) => boundary < outer ? boundary : boundary - 1;

    /// <summary>The boundary on which each node lies, or -1.</summary>
    private static int[] BoundaryNodes(CentredMesh mesh, QuadraticNodes nodes)
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
