namespace MeshSection.LinearAlgebra;

/// <summary>
/// What a Cholesky factorisation can know of a matrix by its pattern alone, for any values: the order of elimination in
/// postorder, and the supernodes with their rows.
/// </summary>
internal sealed class SymbolicCholesky
{
    private SymbolicCholesky(int[] order, int[] starts, int[] rows, int[] sources, Supernodes supernodes)
    {
        Order = order;
        Starts = starts;
        Rows = rows;
        Sources = sources;
        Supernodes = supernodes;
    }

    /// <summary>The unknown that is eliminated k-th.</summary>
    public int[] Order { get; }

    /// <summary>Where each column of the reordered lower triangle begins.</summary>
    public int[] Starts { get; }

    /// <summary>The rows of the reordered lower triangle, diagonal first.</summary>
    public int[] Rows { get; }

    /// <summary>For each entry of the reordered lower triangle its place in the given pattern.</summary>
    public int[] Sources { get; }

    /// <summary>The supernodes of the factor.</summary>
    public Supernodes Supernodes { get; }

    /// <summary>Analyses a pattern.</summary>
    /// <param name="pattern">The pattern of the matrix.</param>
    /// <param name="order">
    /// The unknowns in an order that keeps the fill low; null if they are numbered in such an order already.
    /// </param>
    public static SymbolicCholesky Of(SymmetricPattern pattern, int[]? order = null)
    {
        var rank = Inverse(order, pattern.Size);
        var upper = Reordered(pattern, rank, isUpper: true);
        var parents = EliminationTree.Parents(upper.Starts, upper.Rows);
        var post = EliminationTree.Postorder(parents);
        var postRank = Inverse(post, pattern.Size);
        var tree = new int[pattern.Size];
        var final = new int[pattern.Size];
        for (var k = 0; k < post.Length; k++)
        {
            var parent = parents[post[k]];
            tree[k] = parent < 0 ? -1 : postRank[parent];
            final[k] = order is null ? post[k] : order[post[k]];
        }

        var lower = Reordered(pattern, Inverse(final, pattern.Size), isUpper: false);
        var counts = EliminationTree.ColumnCounts(tree, lower.Starts, lower.Rows);
        var supernodes = Supernodes.Of(tree, counts, lower.Starts, lower.Rows);
        return new SymbolicCholesky(final, lower.Starts, lower.Rows, lower.Sources, supernodes);
    }

    private static int[] Inverse(int[]? order, int size)
    {
        var rank = new int[size];
        for (var k = 0; k < size; k++)
        {
            rank[order is null ? k : order[k]] = k;
        }

        return rank;
    }

    /// <summary>One triangle of the reordered matrix by columns; of the lower one, the diagonal comes first.</summary>
    private static (int[] Starts, int[] Rows, int[] Sources) Reordered(SymmetricPattern pattern, int[] rank, bool isUpper)
    {
        var n = pattern.Size;
        var starts = new int[n + 1];
        for (var j = 0; j < n; j++)
        {
            for (var p = pattern.Starts[j]; p < pattern.Starts[j + 1]; p++)
            {
                starts[Column(rank[j], rank[pattern.Rows[p]]) + 1]++;
            }
        }

        for (var j = 0; j < n; j++)
        {
            starts[j + 1] += starts[j];
        }

        var rows = new int[starts[n]];
        var sources = new int[starts[n]];
        var next = starts.AsSpan(0, n).ToArray();
        for (var j = 0; j < n; j++)
        {
            var k = next[rank[j]]++;
            (rows[k], sources[k]) = (rank[j], pattern.Starts[j]);
        }

        for (var j = 0; j < n; j++)
        {
            for (var p = pattern.Starts[j] + 1; p < pattern.Starts[j + 1]; p++)
            {
                var (a, b) = (rank[j], rank[pattern.Rows[p]]);
                var column = Column(a, b);
                var k = next[column]++;
                (rows[k], sources[k]) = (a + b - column, p);
            }
        }

        return (starts, rows, sources);

        int Column(int a, int b) => isUpper ? Math.Max(a, b) : Math.Min(a, b);
    }
}
