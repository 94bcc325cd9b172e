namespace MeshSection.LinearAlgebra;

/// <summary>
/// The elimination tree of a symmetric matrix ([Davis2006], chapter 4): the parent of column j is the row of the first
/// entry below the diagonal in column j of its Cholesky factor.
/// </summary>
internal static class EliminationTree
{
    /// <summary>The parent of each column, or -1 for a root.</summary>
    /// <param name="starts">Where the entries above the diagonal of each column begin; length n + 1.</param>
    /// <param name="rows">Their rows.</param>
    public static int[] Parents(int[] starts, int[] rows)
    {
        var n = starts.Length - 1;
        var parents = new int[n];
        var ancestors = new int[n];
        for (var j = 0; j < n; j++)
        {
            parents[j] = -1;
            ancestors[j] = -1;
            for (var p = starts[j]; p < starts[j + 1]; p++)
            {
                // From the row up to the root that it has so far, which then hangs from j; the path is shortened.
                for (var i = rows[p]; i >= 0 && i < j;)
                {
                    var above = ancestors[i];
                    ancestors[i] = j;
                    if (above < 0)
                    {
                        parents[i] = j;
                    }

                    i = above;
                }
            }
        }

        return parents;
    }

    /// <summary>The columns in postorder: every column after all its descendants, which stand together before it.</summary>
    public static int[] Postorder(int[] parents)
    {
        var n = parents.Length;
        var firstChild = new int[n];
        var nextSibling = new int[n];
        Array.Fill(firstChild, -1);
        for (var j = n - 1; j >= 0; j--)
        {
            if (parents[j] >= 0)
            {
                nextSibling[j] = firstChild[parents[j]];
                firstChild[parents[j]] = j;
            }
        }

        var order = new int[n];
        var stack = new int[n];
        var count = 0;
        for (var root = 0; root < n; root++)
        {
            if (parents[root] >= 0)
            {
                continue;
            }

            var depth = 0;
            stack[0] = root;
            while (depth >= 0)
            {
                var j = stack[depth];
                var child = firstChild[j];
                if (child >= 0)
                {
                    firstChild[j] = nextSibling[child];
                    stack[++depth] = child;
                }
                else
                {
                    order[count++] = j;
                    depth--;
                }
            }
        }

        return order;
    }

    /// <summary>
    /// How many entries each column of the factor has, diagonal included, from the leaves of the row subtrees
    /// [GilbertNgPeyton1994].
    /// </summary>
    /// <param name="parents">The tree; its columns are in postorder.</param>
    /// <param name="starts">Where each column of the lower triangle begins; length n + 1.</param>
    /// <param name="rows">Their rows, diagonal first.</param>
    public static int[] ColumnCounts(int[] parents, int[] starts, int[] rows)
    {
        var n = parents.Length;
        var first = new int[n];
        var counts = new int[n];
        var lastFirst = new int[n];
        var lastLeaf = new int[n];
        var ancestors = new int[n];
        for (var j = 0; j < n; j++)
        {
            first[j] = j;
            lastFirst[j] = -1;
            lastLeaf[j] = -1;
            ancestors[j] = j;
        }

        for (var j = 0; j < n; j++)
        {
            counts[j] += first[j] == j ? 1 : 0;
            if (parents[j] >= 0)
            {
                first[parents[j]] = Math.Min(first[parents[j]], first[j]);
            }
        }

        for (var j = 0; j < n; j++)
        {
            for (var p = starts[j] + 1; p < starts[j + 1]; p++)
            {
                var i = rows[p];
                if (first[j] <= lastFirst[i])
                {
                    continue;
                }

                // Column j is a new leaf of row i's subtree; where its path meets that of the leaf before, one is too many.
                lastFirst[i] = first[j];
                counts[j]++;
                if (lastLeaf[i] >= 0)
                {
                    counts[Root(ancestors, lastLeaf[i])]--;
                }

                lastLeaf[i] = j;
            }

            if (parents[j] >= 0)
            {
                counts[parents[j]]--;
                ancestors[j] = parents[j];
            }
        }

        for (var j = 0; j < n; j++)
        {
            if (parents[j] >= 0)
            {
                counts[parents[j]] += counts[j];
            }
        }

        return counts;
    }

    private static int Root(int[] ancestors, int j)
    {
        var root = j;
        while (ancestors[root] != root)
        {
            root = ancestors[root];
        }

        while (ancestors[j] != root)
        {
            (ancestors[j], j) = (root, ancestors[j]);
        }

        return root;
    }
}
