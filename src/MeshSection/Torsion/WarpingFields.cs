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
    /// <summary>Solves for the three fields.</summary>
    /// <param name="nodes">The nodes of the fitted mesh.</param>
    /// <param name="sums">Its matrices and loads.</param>
    public static WarpingFields Solve(QuadraticNodes nodes, ElementSums sums)
    {
        // The node ranked last is the one that is held.
        var count = nodes.Count - 1;
        var unknowns = new int[nodes.Count];
        for (var node = 0; node < unknowns.Length; node++)
        {
            unknowns[node] = nodes.Ranks[node] == count ? -1 : nodes.Ranks[node];
        }

        var matrix = sums.Assemble(unknowns, count);
        var (warping, shear1, shear2) = (Load(sums.Warping), Load(sums.Shear1), Load(sums.Shear2));
        SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern), matrix).Solve(warping, shear1, shear2);
        return new WarpingFields(AtNodes(warping), AtNodes(shear1), AtNodes(shear2));

        double[] Load(double[] atNodes)
        {
            var load = new double[count];
            for (var node = 0; node < unknowns.Length; node++)
            {
                if (unknowns[node] >= 0)
                {
                    load[unknowns[node]] = atNodes[node];
                }
            }

            return load;
        }

        double[] AtNodes(double[] solution)
        {
            var values = new double[unknowns.Length];
            for (var node = 0; node < values.Length; node++)
            {
                values[node] = unknowns[node] < 0 ? 0 : solution[unknowns[node]];
            }

            return values;
        }
    }
}
