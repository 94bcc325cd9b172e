using MeshSection.Dxf.Curves;
using MeshSection.Dxf.Placing;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>
/// Joins pieces into closed loops, in this order: slivers become points; ends in the same place are joined; pieces
/// there twice are dropped; ends still free are joined with what lies within the gap; pieces that are now there twice
/// are dropped. Then every node must have exactly two ends: more is a branch, one is an open boundary.
/// </summary>
internal sealed class LoopFinder
{
    // Ends closer than this part of the diagonal differ by rounding only; joining them is not worth a note.
    private const double RoundingOverDiagonal = 1e-9;

    private readonly List<Piece> _pieces;
    private readonly LocalFrame _frame;
    private readonly JoinGap _gap;
    private readonly EndNodes _nodes;
    private readonly bool[] _dropped;
    private readonly List<DrawingNote> _notes;

    private LoopFinder(List<Piece> pieces, LocalFrame frame, JoinGap gap, List<DrawingNote> notes)
    {
        _pieces = pieces;
        _frame = frame;
        _gap = gap;
        _notes = notes;
        _nodes = new EndNodes(pieces);
        _dropped = new bool[pieces.Count];
    }

    /// <summary>Finds the loops that the pieces make, sorted by their leftmost corners.</summary>
    /// <param name="pieces">Lines and arcs in any order and direction.</param>
    /// <param name="frame">Where they lie.</param>
    /// <param name="gap">How far ends may be apart.</param>
    /// <param name="unread">What to say about entities that were not read, if something is missing.</param>
    /// <param name="notes">What was mended is added here.</param>
    /// <param name="joins">The number of nodes at which ends of different entities meet.</param>
    /// <exception cref="DrawingException">Ends meet in more than one way, or a boundary is open.</exception>
    public static List<Loop> Find(
        List<Piece> pieces, LocalFrame frame, JoinGap gap, string unread, List<DrawingNote> notes, out int joins)
    {
        var finder = new LoopFinder(pieces, frame, gap, notes);
        finder.MergeSlivers();
        var duplicates = new Dictionary<(PlacedEntity, PlacedEntity), int>();
        Duplicates.Drop(pieces, finder._dropped, finder._nodes, 0, duplicates);
        finder.BridgeGaps();
        Duplicates.Drop(pieces, finder._dropped, finder._nodes, gap.Length, duplicates);
        finder.NoteDuplicates(duplicates);

        var ends = new NodeEnds(pieces, finder._dropped, finder._nodes);
        var places = finder.Places();
        EndCheck.Run(pieces, ends, places, finder._nodes, frame, gap, unread);
        joins = finder.NoteJoins(ends, places);
        return finder.Walk(ends, places);
    }

    private void MergeSlivers()
    {
        for (var i = 0; i < _pieces.Count; i++)
        {
            if (_pieces[i].Edge.Chord.Length > _gap.Sliver)
            {
                continue;
            }

            _nodes.Merge(_nodes.Start(i), _nodes.End(i));
            _dropped[i] = true;
            var source = _pieces[i].Entity.Source;
            var at = _frame.ToDrawing(_pieces[i].Edge.Start);
            var length = _pieces[i].Edge.Chord.Length / _frame.Scale;
            _notes.Add(new DrawingNote(
                NoteCode.Sliver,
                $"An edge of {source} at {Wording.At(at)} is only {Wording.Distance(length)} long; it was taken as a point.",
                [source], at, length));
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

    /// <summary>Where each node lies.</summary>
    private Point[] Places()
    {
        var places = _nodes.Points.ToArray();
        foreach (var (node, members) in _nodes.Merged())
        {
            places[node] = _nodes.Place(members);
        }

        return places;
    }

    private void NoteDuplicates(Dictionary<(PlacedEntity Dropped, PlacedEntity Kept), int> duplicates)
    {
        foreach (var ((dropped, kept), count) in duplicates)
        {
            var what = count == 1 ? "An edge" : $"{count} edges";
            _notes.Add(DrawingNote.About(
                NoteCode.DuplicateDropped,
                $"{what} of {dropped.Source} lay on {(count == 1 ? "one" : "those")} of {kept.Source} and " +
                $"{(count == 1 ? "was" : "were")} left out.",
                dropped.Source,
                kept.Source));
        }
    }

    private int NoteJoins(NodeEnds ends, Point[] places)
    {
        var joins = 0;
        var rounding = RoundingOverDiagonal * _frame.Diagonal + 4 * _frame.Scale * _frame.Spacing;
        var gaps = new List<DrawingNote>();
        var merged = _nodes.Merged();
        for (var node = 0; node < _nodes.Count; node++)
        {
            if (ends.Degree(node) == 0)
            {
                continue;
            }

            var (a, b) = (_pieces[ends.Piece(node, 0)].Entity, _pieces[ends.Piece(node, 1)].Entity);
            joins += ReferenceEquals(a, b) ? 0 : 1;
            if (!merged.TryGetValue(node, out var members))
            {
                continue;
            }

            var spread = members.Aggregate(Box.Empty, (box, m) => box.With(_nodes.Points[m])).Diagonal;
            if (spread > rounding)
            {
                var at = _frame.ToDrawing(places[node]);
                var distance = spread / _frame.Scale;
                gaps.Add(new DrawingNote(
                    NoteCode.GapBridged,
                    $"A gap of {Wording.Distance(distance)} at {Wording.At(at)} was closed: {Wording.Names([a.Source, b.Source])}.",
                    ReferenceEquals(a, b) ? [a.Source] : [a.Source, b.Source], at, distance));
            }
        }

        _notes.AddRange(gaps.OrderBy(g => g.Point!.Value.X).ThenBy(g => g.Point!.Value.Y));
        return joins;
    }

    private List<Loop> Walk(NodeEnds ends, Point[] places)
    {
        var loops = new List<Loop>();
        var taken = (bool[])_dropped.Clone();
        for (var first = 0; first < _pieces.Count; first++)
        {
            if (taken[first])
            {
                continue;
            }

            var edges = new List<Edge>();
            var entities = new List<PlacedEntity>();
            var piece = first;
            var from = _nodes.Start(first);
            while (!taken[piece])
            {
                taken[piece] = true;
                var isForward = _nodes.Start(piece) == from;
                var to = isForward ? _nodes.End(piece) : _nodes.Start(piece);
                edges.Add((isForward ? _pieces[piece].Edge : _pieces[piece].Edge.Reversed()).Between(places[from], places[to]));
                entities.Add(_pieces[piece].Entity);
                piece = ends.Piece(to, 0) == piece ? ends.Piece(to, 1) : ends.Piece(to, 0);
                from = to;
            }

            loops.Add(new Loop(edges, entities).FromLeftmostCorner());
            NoteClosing(entities);
        }

        loops.Sort((a, b) => Loop.Compare(a.Edges[0], b.Edges[0]));
        return loops;
    }

    private void NoteClosing(List<PlacedEntity> entities)
    {
        var polyline = entities[0];
        if (polyline.IsOpenPolyline && entities.TrueForAll(e => ReferenceEquals(e, polyline)))
        {
            _notes.Add(DrawingNote.About(
                NoteCode.PolylineClosed,
                $"{polyline.Source} is not marked as closed, but its ends meet; it was taken as closed.",
                polyline.Source));
        }
    }
}
