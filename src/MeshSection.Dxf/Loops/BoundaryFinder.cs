using MeshSection.Dxf.Curves;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>
/// Finds the closed loops that pieces make. Ends are joined; if that does not close everything, what is open is cut where
/// it ends on others and where it crosses, and what then leads nowhere is left out.
/// </summary>
/// <param name="frame">Where the pieces lie.</param>
/// <param name="gap">How far ends may be apart.</param>
/// <param name="unread">What to say about entities that were not read, if something is missing.</param>
/// <param name="notes">What was mended is added here.</param>
internal sealed class BoundaryFinder(LocalFrame frame, JoinGap gap, string unread, JoinNotes notes)
{
    // Nodes at which strands cross are this exact, as a part of the diagonal.
    private const double CrossingOverDiagonal = 1e-10;

    /// <summary>What the pieces come to: strands without free ends.</summary>
    /// <exception cref="DrawingException">A boundary is open.</exception>
    public Linework Closed(List<Piece> pieces)
    {
        var joined = EndJoiner.Join(pieces, frame, gap, notes);
        if (joined.IsClosed)
        {
            return joined;
        }

        var splitter = Splitter();
        var rest = WithoutDangles(splitter.SplitLoose(joined));
        NoteCuts(splitter, rest);
        return rest;
    }

    /// <summary>The plane as strands divide it, cut where any of them meet; and those strands.</summary>
    public (PlanarMap Map, IReadOnlyList<Strand> Strands) Map(Linework linework)
    {
        var splitter = Splitter();
        var split = splitter.SplitAll(linework);
        NoteCuts(splitter, split);
        while (true)
        {
            var map = PlanarMap.Of([.. split.Strands.Select(s => s.Edge)]);
            List<Strand> kept = [.. split.Strands.Where((_, i) => map.FacesBeside(i) is var (left, right) && left != right)];
            if (kept.Count == split.Strands.Count)
            {
                return (map, kept);
            }

            foreach (var bridge in split.Strands.Where((_, i) => map.FacesBeside(i) is var (left, right) && left == right))
            {
                notes.Bridge(bridge);
            }

            split = split.With(kept);
        }
    }

    private Linework WithoutDangles(Linework split)
    {
        var dangles = new Dangles(split, frame.Diagonal);
        var rest = dangles.Prune(out var chains);
        List<FreeEnd> free = [.. chains.SelectMany(c => c.FreeEnds())];
        if (dangles.Unclosed(chains) is var (a, b))
        {
            throw OutlineFaults.Open([a, b, .. free.Where(f => f != a && f != b)], frame, gap, unread);
        }

        if (free.Count == 0 && rest.Strands.Count == 0)
        {
            throw OutlineFaults.NothingLeft(gap, frame);
        }

        if (rest.Strands.Count == 0)
        {
            var (first, second) = NearestPair.Of([.. Enumerable.Range(0, free.Count)], [.. free.Select(f => f.Place)]);
            throw OutlineFaults.Open(
                [free[first], free[second], .. free.Where((_, i) => i != first && i != second)], frame, gap, unread);
        }

        notes.Dangling(chains, rest);
        return rest;
    }

    private Splitter Splitter() => new(gap.Length, CrossingOverDiagonal * frame.Diagonal, notes);

    /// <summary>Cuts of what was left out afterwards are not worth a word.</summary>
    private void NoteCuts(Splitter splitter, Linework rest)
    {
        if (rest.Strands.Any(s => s.Begin != 0 || s.Stop != 1))
        {
            notes.Split(splitter.Crossings, splitter.Tees);
        }
    }
}
