namespace MeshSection.LinearAlgebra;

/// <summary>A symmetric sparse matrix, its lower triangle in compressed columns.</summary>
/// <param name="pattern">Where values may stand; all are zero at first.</param>
internal sealed class SparseSymmetric(SymmetricPattern pattern)
{
    /// <summary>Where the values stand.</summary>
    public SymmetricPattern Pattern { get; } = pattern;

    /// <summary>The value at each place of the pattern.</summary>
    public double[] Values { get; } = new double[pattern.Rows.Length];

    /// <summary>Adds an element matrix.</summary>
    /// <param name="unknowns">The unknown of each row of the element, -1 for none; an unknown may stand twice.</param>
    /// <param name="element">The element matrix, symmetric, row by row; length the square of the number of its rows.</param>
    public void Add(ReadOnlySpan<int> unknowns, ReadOnlySpan<double> element)
    {
        var width = unknowns.Length;
        for (var a = 0; a < width; a++)
        {
            var column = unknowns[a];
            if (column < 0)
            {
                continue;
            }

            var rows = Pattern.Rows.AsSpan(Pattern.Starts[column], Pattern.Starts[column + 1] - Pattern.Starts[column]);
            for (var b = 0; b < width; b++)
            {
                if (unknowns[b] >= column)
                {
                    Values[Pattern.Starts[column] + Find(rows, unknowns[b])] += element[a * width + b];
                }
            }
        }
    }

    /// <summary>y = A x.</summary>
    public double[] Times(ReadOnlySpan<double> x)
    {
        var y = new double[Pattern.Size];
        for (var j = 0; j < Pattern.Size; j++)
        {
            for (var p = Pattern.Starts[j]; p < Pattern.Starts[j + 1]; p++)
            {
                var i = Pattern.Rows[p];
                y[i] += Values[p] * x[j];
                if (i != j)
                {
                    y[j] += Values[p] * x[i];
                }
            }
        }

        return y;
    }

    private static int Find(ReadOnlySpan<int> rows, int row)
    {
        var (low, high) = (0, rows.Length - 1);
        while (low < high)
        {
            var middle = (low + high) >> 1;
            if (rows[middle] < row)
            {
                low = middle + 1;
            }
            else
            {
                high = middle;
            }
        }

        return low;
    }
}
