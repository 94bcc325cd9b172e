using MeshSection.Dxf.Curves;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>
/// Joins the ends of pieces, in this order: slivers become points; ends in the same place are joined; pieces there twice
/// are dropped; ends still free are joined with what lies within the gap; pieces that are now there twice are dropped.
/// </summary>
internal sealed class EndJoiner
{
    private readonly List<Piece> _pieces;
    private readonly LocalFrame _frame;
    private readonly JoinGap _gap;
    private readonly EndNodes _nodes;
    private readonly bool[] _dropped;
    private readonly JoinNotes _notes;

    private EndJoiner(List<Piece> pieces, LocalFrame frame, JoinGap gap, JoinNotes notes)
    {
        _pieces = pieces;
        _frame = frame;
        _gap = gap;
        _notes = notes;
        _nodes = new EndNodes(pieces);
        _dropped = new bool[pieces.Count];
    }

    /// <summary>Joins pieces.</summary>
    /// <param name="pieces">Lines and curves in any order and direction.</param>
    /// <param name="frame">Where they lie.</param>
    /// <param name="gap">How far ends may be apart.</param>
    /// <param name="notes">What was mended is added here.</param>
    /// <exception cref="DrawingException">
    /// A gap can be closed in more than one way, or so many ends lie about one point that the tolerance makes no sense.
    /// </exception>
    public static Linework Join(List<Piece> pieces, LocalFrame frame, JoinGap gap, JoinNotes notes)
    {
        var joiner = new EndJoiner(pieces, frame, gap, notes);
        joiner.MergeSlivers();
        joiner.DropDuplicates(0);
        joiner.BridgeGaps();
        joiner.DropDuplicates(gap.Length);
        return joiner.Result();
    }

    private void MergeSlivers()
    {
        for (var i = 0; i < _pieces.Count; i++)
        {
            var edge = _pieces[i].Edge;
            if (edge.Chord.Length > _gap.Sliver)
            {
                continue;
            }

            _nodes.Merge(_nodes.Start(i), _nodes.End(i));
            _dropped[i] = true;
            _notes.Sliver(_pieces[i].Entity.Source, edge.Start, edge.Chord.Length);
        }
    }

    private void DropDuplicates(double tolerance)
    {
        var curves = Enumerable.Range(0, _pieces.Count).Where(i => !_dropped[i])
            .Select(i => (_nodes.Start(i), _nodes.End(i), _pieces[i].Edge, i));
        foreach (var (dropped, kept) in Duplicates.Find(curves, _nodes.Points, tolerance))
        {
            _dropped[dropped] = true;
            _notes.Duplicate(_pieces[dropped].Entity, _pieces[kept].Entity);
        }
    }

    private void BridgeGaps()
    {
        if (_gap.Length <= 1e-15 * _frame.Diagonal)
        {
            return;
        }

        var degrees = new int[_nodes.Count];
        for (var i = 0; i < _pieces.Count; i++)
        {
            if (!_dropped[i])
            {
                degrees[_nodes.Start(i)]++;
                degrees[_nodes.End(i)]++;
            }
        }

        // Degrees are those of exact joints; merging changes node numbers, so the free points are listed first.
        var free = Enumerable.Range(0, _nodes.Count).Where(p => degrees[_nodes.Find(p)] == 1).ToList();
        if (free.Count == 0)
        {
            return;
        }

        var near = new NearEnds(_nodes.Points, _gap.Length);
        var found = new List<int>();
        foreach (var point in free)
        {
            if (!near.TryFind(point, found))
            {
                throw OutlineFaults.Crowded(_nodes.Points[point], _frame, _gap);
            }

            foreach (var other in found)
            {
                _nodes.Merge(point, other);
            }
        }
    }

    private Linework Result()
    {
        var merged = _nodes.Merged();
        var places = _nodes.Points.ToList();
        foreach (var (node, members) in merged)
        {
            places[node] = _nodes.Place(members);
        }

        var strands = new List<Strand>(_pieces.Count);
        for (var i = 0; i < _pieces.Count; i++)
        {
            var (from, to) = (_nodes.Start(i), _nodes.End(i));
            if (!_dropped[i] && from == to)
            {
                _notes.Sliver(_pieces[i].Entity.Source, _pieces[i].Edge.Start, _pieces[i].Edge.Chord.Length);
            }
            else if (!_dropped[i])
            {
                strands.Add(Strand.Of(from, to, Moved(_pieces[i].Edge, places[from], places[to]), _pieces[i].Entity));
            }
        }

        NoteGaps(merged, places, strands);
        return new Linework(places, strands);
    }

    /// <summary>The edge with its ends at the nodes; which way it was drawn does not show in the bits.</summary>
    private static Edge Moved(Edge edge, Point start, Point end) =>
        edge.Start == start && edge.End == end ? edge
        : (start.X, start.Y).CompareTo((end.X, end.Y)) < 0 ? edge.Between(start, end)
        : edge.Reversed().Between(end, start).Reversed();

    private void NoteGaps(Dictionary<int, List<int>> merged, List<Point> places, List<Strand> strands)
    {
        if (merged.Count == 0)
        {
            return;
        }

        var ends = new Linework(places, strands).Ends();
        foreach (var (node, members) in merged.OrderBy(m => places[m.Key].X).ThenBy(m => places[m.Key].Y))
        {
            var spread = members.Aggregate(Box.Empty, (box, m) => box.With(_nodes.Points[m])).Diagonal;
            var met = ends[node].ToArray().Select(s => strands[s].Entity.Source).ToList();
            if (met.Count > 2 && spread > _notes.Rounding)
            {
                throw OutlineFaults.AmbiguousGap(met, places[node], spread, _frame, _gap);
            }

            if (met.Count > 0)
            {
                _notes.Gap(places[node], spread, met);
            }
        }
    }
}
