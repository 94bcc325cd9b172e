using CsCheck;
using MeshSection.LinearAlgebra;

namespace MeshSection.Tests.LinearAlgebra;

/// <summary>Matrices to factorise.</summary>
internal static class Matrices
{
    /// <summary>Random sums of small positive definite element matrices over random unknowns.</summary>
    public static Gen<SparseSymmetric> PositiveDefinite { get; } =
        from size in Gen.Int[1, 60]
        from elements in Gen.Int[0, size - 1].Array[3 * (size / 2 + 1)]
        from weights in Gen.Double[0.1, 10].Array[elements.Length / 3]
        select FromElements(size, elements, weights);

    /// <summary>Poisson's equation on a grid of n × n unknowns: 4 on the diagonal, -1 to the four neighbours.</summary>
    public static SparseSymmetric Grid(int n)
    {
        var pairs = new List<int>();
        for (var i = 0; i < n * n; i++)
        {
            if (i % n < n - 1)
            {
                pairs.AddRange([i, i + 1]);
            }

            if (i + n < n * n)
            {
                pairs.AddRange([i, i + n]);
            }
        }

        var slots = pairs.ToArray();
        var matrix = new SparseSymmetric(SymmetricPattern.OfElements(slots, 2, n * n));
        for (var s = 0; s < slots.Length; s += 2)
        {
            matrix.Add(slots.AsSpan(s, 2), [0, -1, -1, 0]);
        }

        for (var i = 0; i < n * n; i++)
        {
            matrix.Add([i], [4]);
        }

        return matrix;
    }

    private static SparseSymmetric FromElements(int size, int[] elements, double[] weights)
    {
        var matrix = new SparseSymmetric(SymmetricPattern.OfElements(elements, 3, size));
        for (var e = 0; e < weights.Length; e++)
        {
            // w v vᵀ with v = (1, -2, 0.5): positive semidefinite, even where an unknown stands twice.
            double[] v = [1, -2, 0.5];
            var element = new double[9];
            for (var i = 0; i < 9; i++)
            {
                element[i] = weights[e] * v[i / 3] * v[i % 3];
            }

            matrix.Add(elements.AsSpan(3 * e, 3), element);
        }

        for (var i = 0; i < size; i++)
        {
            matrix.Add([i], [0.01]);
        }

        return matrix;
    }
}
