namespace MeshSection.LinearAlgebra;

/// <summary>Where the lower triangle of a symmetric matrix may hold values: compressed columns, diagonal included.</summary>
/// <param name="Size">n, the number of unknowns.</param>
/// <param name="Starts">Where each column begins in <paramref name="Rows"/>; length n + 1.</param>
/// <param name="Rows">The rows of each column in rising order, the diagonal first.</param>
internal sealed record SymmetricPattern(int Size, int[] Starts, int[] Rows)
{
    /// <summary>The pattern of a sum of element matrices.</summary>
    /// <param name="elements">The unknowns of each element, -1 for none; length a multiple of <paramref name="width"/>.</param>
    /// <param name="width">Unknowns per element.</param>
    /// <param name="size">n, the number of unknowns.</param>
    public static SymmetricPattern OfElements(ReadOnlySpan<int> elements, int width, int size)
    {
        var (places, slots) = Incidence(elements, size);
        var starts = new int[size + 1];
        var rows = new int[size + 3 * elements.Length];
        var lastSeen = new int[size];
        var count = 0;
        for (var column = 0; column < size; column++)
        {
            rows[count++] = column;
            lastSeen[column] = column + 1;
            for (var s = places[column]; s < places[column + 1]; s++)
            {
                foreach (var row in elements.Slice(slots[s] / width * width, width))
                {
                    if (row <= column || lastSeen[row] == column + 1)
                    {
                        continue;
                    }

                    lastSeen[row] = column + 1;
                    if (count == rows.Length)
                    {
                        Array.Resize(ref rows, 2 * count);
                    }

                    rows[count++] = row;
                }
            }

            rows.AsSpan(starts[column], count - starts[column]).Sort();
            starts[column + 1] = count;
        }

        Array.Resize(ref rows, count);
        return new SymmetricPattern(size, starts, rows);
    }

    /// <summary>For each unknown the places in <paramref name="elements"/> where it stands.</summary>
    private static (int[] Starts, int[] Slots) Incidence(ReadOnlySpan<int> elements, int size)
    {
        var starts = new int[size + 1];
        foreach (var unknown in elements)
        {
            if (unknown >= 0)
            {
                starts[unknown + 1]++;
            }
        }

        for (var i = 0; i < size; i++)
        {
            starts[i + 1] += starts[i];
        }

        var slots = new int[starts[size]];
        var next = starts.AsSpan(0, size).ToArray();
        for (var s = 0; s < elements.Length; s++)
        {
            if (elements[s] >= 0)
            {
                slots[next[elements[s]]++] = s;
            }
        }

        return (starts, slots);
    }
}
