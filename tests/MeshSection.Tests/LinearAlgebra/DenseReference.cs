using MeshSection.LinearAlgebra;

namespace MeshSection.Tests.LinearAlgebra;

/// <summary>The same linear algebra in the plainest dense form, to compare with.</summary>
internal static class DenseReference
{
    public static double[,] Of(SparseSymmetric matrix)
    {
        var n = matrix.Pattern.Size;
        var dense = new double[n, n];
        for (var j = 0; j < n; j++)
        {
            for (var p = matrix.Pattern.Starts[j]; p < matrix.Pattern.Starts[j + 1]; p++)
            {
                dense[matrix.Pattern.Rows[p], j] = dense[j, matrix.Pattern.Rows[p]] = matrix.Values[p];
            }
        }

        return dense;
    }

    /// <summary>Gaussian elimination with partial pivoting.</summary>
    public static double[] Solve(double[,] matrix, double[] side)
    {
        var (a, x, n) = ((double[,])matrix.Clone(), (double[])side.Clone(), side.Length);
        for (var k = 0; k < n; k++)
        {
            var best = Enumerable.Range(k, n - k).MaxBy(i => Math.Abs(a[i, k]));
            for (var j = 0; j < n; j++)
            {
                (a[k, j], a[best, j]) = (a[best, j], a[k, j]);
            }

            (x[k], x[best]) = (x[best], x[k]);
            for (var i = k + 1; i < n; i++)
            {
                var factor = a[i, k] / a[k, k];
                for (var j = k; j < n; j++)
                {
                    a[i, j] -= factor * a[k, j];
                }

                x[i] -= factor * x[k];
            }
        }

        for (var k = n - 1; k >= 0; k--)
        {
            for (var j = k + 1; j < n; j++)
            {
                x[k] -= a[k, j] * x[j];
            }

            x[k] /= a[k, k];
        }

        return x;
    }

    /// <summary>Which entries of the Cholesky factor may be other than zero, by eliminating the graph.</summary>
    public static bool[,] FactorPattern(SymmetricPattern pattern, int[] order)
    {
        var n = pattern.Size;
        var rank = new int[n];
        for (var k = 0; k < n; k++)
        {
            rank[order[k]] = k;
        }

        var filled = new bool[n, n];
        for (var j = 0; j < n; j++)
        {
            for (var p = pattern.Starts[j]; p < pattern.Starts[j + 1]; p++)
            {
                var (a, b) = (rank[j], rank[pattern.Rows[p]]);
                filled[Math.Max(a, b), Math.Min(a, b)] = true;
            }
        }

        for (var k = 0; k < n; k++)
        {
            for (var i = k + 1; i < n; i++)
            {
                for (var j = k + 1; j <= i; j++)
                {
                    filled[i, j] |= filled[i, k] && filled[j, k];
                }
            }
        }

        return filled;
    }
}
