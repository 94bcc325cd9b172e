using System.Runtime.CompilerServices;

namespace MeshSection.LinearAlgebra;

/// <summary>
/// The Cholesky factor L of a sparse symmetric positive definite matrix, P A Pᵀ = L Lᵀ, by the multifrontal method
/// [DuffReid1983]: each supernode gathers what its children in the elimination tree left over, eliminates its own
/// columns in a dense panel, and leaves the rest to its parent.
/// </summary>
internal sealed class SparseCholesky
{
    // Columns of a panel that are eliminated one by one before the rest of the panel is brought up to date.
    private const int BlockWidth = 16;

    // A pivot that is no more than this part of its diagonal entry is lost in rounding: the matrix is singular.
    private const double LeastPivot = 1e-13;

    private readonly SymbolicCholesky _symbolic;
    private readonly double[] _panels;

    private SparseCholesky(SymbolicCholesky symbolic)
    {
        _symbolic = symbolic;
        _panels = new double[symbolic.Supernodes.PanelStarts[^1]];
    }

    /// <summary>How many numbers the factor holds.</summary>
    public int EntryCount => _panels.Length;

    /// <summary>Factorises a matrix.</summary>
    /// <param name="symbolic">The analysis of its pattern.</param>
    /// <param name="matrix">The matrix, symmetric positive definite.</param>
    /// <exception cref="NotPositiveDefiniteException">The matrix is singular or indefinite.</exception>
    public static SparseCholesky Factor(SymbolicCholesky symbolic, SparseSymmetric matrix)
    {
        var factor = new SparseCholesky(symbolic);
        factor.Run(matrix.Values);
        return factor;
    }

    /// <summary>Solves A X = B for several right-hand sides.</summary>
    /// <param name="sides">The columns of B, each overwritten by that of X.</param>
    public void Solve(params ReadOnlySpan<double[]> sides)
    {
        foreach (var side in sides)
        {
            var x = new double[side.Length];
            for (var k = 0; k < x.Length; k++)
            {
                x[k] = side[_symbolic.Order[k]];
            }

            Forward(x);
            Backward(x);
            for (var k = 0; k < x.Length; k++)
            {
                side[_symbolic.Order[k]] = x[k];
            }
        }
    }

    private void Run(double[] values)
    {
        var nodes = _symbolic.Supernodes;
        var places = new int[_symbolic.Order.Length];
        var rest = new RestStack();
        for (var s = 0; s < nodes.Count; s++)
        {
            var rows = nodes.RowsOf(s);
            for (var i = 0; i < rows.Length; i++)
            {
                places[rows[i]] = i;
            }

            var (width, below) = (nodes.Width(s), rows.Length - nodes.Width(s));
            var panel = _panels.AsSpan(nodes.PanelStarts[s], rows.Length * width);
            TakeColumns(s, panel, rows.Length, places, values);
            var own = rest.Clear(below * below);
            for (var child = 0; child < nodes.ChildCounts[s]; child++)
            {
                var (owner, left) = rest.Pop();
                AddRest(nodes.RowsOf(owner)[nodes.Width(owner)..], left.Span, panel, own, rows.Length, width, places);
            }

            Eliminate(panel, rows.Length, width, nodes.FirstColumns[s], values);
            if (below > 0)
            {
                DenseKernels.SubtractProduct(own, below, panel[width..], rows.Length, below, below, width);
                rest.Push(s, own);
            }
        }
    }

    private void TakeColumns(int s, Span<double> panel, int height, int[] places, double[] values)
    {
        var first = _symbolic.Supernodes.FirstColumns[s];
        for (var k = 0; k < _symbolic.Supernodes.Width(s); k++)
        {
            for (var p = _symbolic.Starts[first + k]; p < _symbolic.Starts[first + k + 1]; p++)
            {
                panel[k * height + places[_symbolic.Rows[p]]] = values[_symbolic.Sources[p]];
            }
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void AddRest(
        ReadOnlySpan<int> rows, ReadOnlySpan<double> left, Span<double> panel, Span<double> own, int height, int width, int[] places)
    {
        var below = height - width;
        for (var a = 0; a < rows.Length; a++)
        {
            var column = places[rows[a]];
            var target = column < width ? panel.Slice(column * height, height) : own.Slice((column - width) * below, below);
            var shift = column < width ? 0 : width;
            for (var b = a; b < rows.Length; b++)
            {
                target[places[rows[b]] - shift] += left[a * rows.Length + b];
            }
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private void Eliminate(Span<double> panel, int height, int width, int firstColumn, double[] values)
    {
        for (var block = 0; block < width; block += BlockWidth)
        {
            var end = Math.Min(block + BlockWidth, width);
            DenseKernels.SubtractProduct(
                panel[(block * height + block)..], height, panel[block..], height, height - block, end - block, block);
            for (var j = block; j < end; j++)
            {
                var column = panel.Slice(j * height + j, height - j);
                var pivot = column[0];
                var diagonal = values[_symbolic.Sources[_symbolic.Starts[firstColumn + j]]];
                if (!(pivot > LeastPivot * diagonal))
                {
                    throw new NotPositiveDefiniteException(_symbolic.Order[firstColumn + j], pivot, diagonal);
                }

                var root = Math.Sqrt(pivot);
                column[0] = root;
                for (var i = 1; i < column.Length; i++)
                {
                    column[i] /= root;
                }

                for (var k = j + 1; k < end; k++)
                {
                    DenseKernels.Subtract(panel.Slice(k * height + k, height - k), column[(k - j)..], column[k - j]);
                }
            }
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private void Forward(double[] x)
    {
        var nodes = _symbolic.Supernodes;
        for (var s = 0; s < nodes.Count; s++)
        {
            var rows = nodes.RowsOf(s);
            for (var k = 0; k < nodes.Width(s); k++)
            {
                var column = _panels.AsSpan(nodes.PanelStarts[s] + k * rows.Length, rows.Length);
                var value = x[rows[k]] /= column[k];
                for (var i = k + 1; i < rows.Length; i++)
                {
                    x[rows[i]] -= column[i] * value;
                }
            }
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private void Backward(double[] x)
    {
        var nodes = _symbolic.Supernodes;
        for (var s = nodes.Count - 1; s >= 0; s--)
        {
            var rows = nodes.RowsOf(s);
            for (var k = nodes.Width(s) - 1; k >= 0; k--)
            {
                var column = _panels.AsSpan(nodes.PanelStarts[s] + k * rows.Length, rows.Length);
                var sum = x[rows[k]];
                for (var i = k + 1; i < rows.Length; i++)
                {
                    sum -= column[i] * x[rows[i]];
                }

                x[rows[k]] = sum / column[k];
            }
        }
    }
}
