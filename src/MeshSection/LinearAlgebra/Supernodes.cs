namespace MeshSection.LinearAlgebra;

/// <summary>
/// Runs of columns of a Cholesky factor that share their rows below, each held as one dense panel; small ones are joined
/// to their parents where that adds few zeros ([AshcraftGrimes1989]).
/// </summary>
internal sealed class Supernodes
{
    private Supernodes(int[] firstColumns, int[] rowStarts, int[] rows, int[] childCounts)
    {
        FirstColumns = firstColumns;
        RowStarts = rowStarts;
        Rows = rows;
        ChildCounts = childCounts;
        PanelStarts = new int[Count + 1];
        for (var s = 0; s < Count; s++)
        {
            PanelStarts[s + 1] = checked(PanelStarts[s] + Height(s) * Width(s));
        }
    }

    /// <summary>How many supernodes there are.</summary>
    public int Count => FirstColumns.Length - 1;

    /// <summary>The first column of each; length Count + 1.</summary>
    public int[] FirstColumns { get; }

    /// <summary>Where the rows of each begin in <see cref="Rows"/>; length Count + 1.</summary>
    public int[] RowStarts { get; }

    /// <summary>The rows of each in rising order: its own columns first, then those below.</summary>
    public int[] Rows { get; }

    /// <summary>How many supernodes have this one as their parent; they stand before it in postorder.</summary>
    public int[] ChildCounts { get; }

    /// <summary>Where the panel of each begins, column by column; length Count + 1.</summary>
    public int[] PanelStarts { get; }

    /// <summary>How many columns supernode s has.</summary>
    public int Width(int s) => FirstColumns[s + 1] - FirstColumns[s];

    /// <summary>How many rows supernode s has, its own columns included.</summary>
    public int Height(int s) => RowStarts[s + 1] - RowStarts[s];

    /// <summary>The rows of supernode s.</summary>
    public ReadOnlySpan<int> RowsOf(int s) => Rows.AsSpan(RowStarts[s], Height(s));

    /// <summary>Finds the supernodes.</summary>
    /// <param name="tree">The elimination tree in postorder.</param>
    /// <param name="counts">Entries of each column of the factor.</param>
    /// <param name="starts">Where each column of the matrix's lower triangle begins.</param>
    /// <param name="rows">Its rows.</param>
    public static Supernodes Of(int[] tree, int[] counts, int[] starts, int[] rows)
    {
        var (firstColumns, heights) = Partition(tree, counts);
        var count = heights.Length;
        var rowStarts = new int[count + 1];
        for (var s = 0; s < count; s++)
        {
            rowStarts[s + 1] = rowStarts[s] + heights[s];
        }

        var all = new int[rowStarts[count]];
        var childCounts = new int[count];
        var lastSeen = new int[tree.Length];
        var pending = new List<int>();
        for (var s = 0; s < count; s++)
        {
            var next = rowStarts[s];
            for (var j = firstColumns[s]; j < firstColumns[s + 1]; j++)
            {
                lastSeen[j] = s + 1;
                all[next++] = j;
            }

            for (var j = firstColumns[s]; j < firstColumns[s + 1]; j++)
            {
                Take(rows.AsSpan(starts[j], starts[j + 1] - starts[j]));
            }

            // Supernodes still waiting whose first row below lies in this one are its children.
            while (pending.Count > 0 && all[FirstBelow(pending[^1])] < firstColumns[s + 1])
            {
                var child = pending[^1];
                pending.RemoveAt(pending.Count - 1);
                childCounts[s]++;
                Take(all.AsSpan(FirstBelow(child), rowStarts[child + 1] - FirstBelow(child)));
            }

            all.AsSpan(rowStarts[s], next - rowStarts[s]).Sort();
            if (FirstBelow(s) < rowStarts[s + 1])
            {
                pending.Add(s);
            }

            void Take(ReadOnlySpan<int> candidates)
            {
                foreach (var i in candidates)
                {
                    if (i >= firstColumns[s] && lastSeen[i] != s + 1)
                    {
                        lastSeen[i] = s + 1;
                        all[next++] = i;
                    }
                }
            }
        }

        return new Supernodes(firstColumns, rowStarts, all, childCounts);

        int FirstBelow(int s) => rowStarts[s] + firstColumns[s + 1] - firstColumns[s];
    }

    private static (int[] FirstColumns, int[] Heights) Partition(int[] tree, int[] counts)
    {
        var parts = new List<Part>();
        for (var j = 0; j < tree.Length; j++)
        {
            if (j > 0 && tree[j - 1] == j && counts[j - 1] == counts[j] + 1)
            {
                parts[^1] = parts[^1] with { Width = parts[^1].Width + 1 };
                continue;
            }

            JoinLast(parts, tree);
            parts.Add(new Part(j, 1, counts[j], 0));
        }

        JoinLast(parts, tree);
        var firstColumns = new int[parts.Count + 1];
        var heights = new int[parts.Count];
        for (var s = 0; s < parts.Count; s++)
        {
            (firstColumns[s], heights[s]) = (parts[s].First, parts[s].Height);
        }

        firstColumns[^1] = tree.Length;
        return (firstColumns, heights);
    }

    /// <summary>Joins the last part to the one before it, as often as that one is its child and few zeros are added.</summary>
    private static void JoinLast(List<Part> parts, int[] tree)
    {
        while (parts.Count > 1)
        {
            var (child, parent) = (parts[^2], parts[^1]);
            if (tree[parent.First - 1] != parent.First)
            {
                return;
            }

            var (width, height) = (child.Width + parent.Width, child.Width + parent.Height);
            var joined = new Part(child.First, width, height, 0);
            joined = joined with { Zeros = joined.Entries - child.Entries - parent.Entries + child.Zeros + parent.Zeros };
            var allowed = width <= 4 ? 0.8 : width <= 16 ? 0.3 : width <= 48 ? 0.1 : 0.05;
            if (joined.Zeros > allowed * joined.Entries)
            {
                return;
            }

            parts.RemoveAt(parts.Count - 1);
            parts[^1] = joined;
        }
    }

    private readonly record struct Part(int First, int Width, int Height, long Zeros)
    {
        public long Entries => (long)Width * Height - (long)Width * (Width - 1) / 2;
    }
}
