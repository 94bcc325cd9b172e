using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>
/// Cuts strands where the ends of others lie on them, drops what is then there twice, and cuts where strands cross. Ends
/// were joined before, so only what did not close need be cut.
/// </summary>
/// <param name="tolerance">How far an end may be from a strand that it lies on, mm.</param>
/// <param name="crossingTolerance">How exact crossings of curves are, and how near to an end one is no crossing, mm.</param>
/// <param name="notes">What was mended is added here.</param>
internal sealed class Splitter(double tolerance, double crossingTolerance, JoinNotes notes)
{
    // Tangents that differ by less, radians, may belong to curves that lie on each other.
    private const double SameDirection = 1e-3;

    /// <summary>How many ends of others strands were cut at.</summary>
    public int Tees { get; private set; }

    /// <summary>How many crossings strands were cut at.</summary>
    public int Crossings { get; private set; }

    /// <summary>Cuts the strands that do not close, and those that do where ends of the former lie on them.</summary>
    public Linework SplitLoose(Linework linework)
    {
        var ends = linework.Ends();
        var isLoose = new bool[linework.Strands.Count];
        var open = new Stack<int>(Enumerable.Range(0, ends.Count).Where(n => ends[n].Length is not (0 or 2)));
        while (open.TryPop(out var node))
        {
            foreach (var s in ends[node])
            {
                if (!isLoose[s])
                {
                    isLoose[s] = true;
                    open.Push(linework.Strands[s].From);
                    open.Push(linework.Strands[s].To);
                }
            }
        }

        return Split(linework.With([.. linework.Strands.Select((s, i) => s with { IsLoose = isLoose[i] })]));
    }

    /// <summary>Cuts every strand.</summary>
    public Linework SplitAll(Linework linework) =>
        Split(linework.With([.. linework.Strands.Select(s => s with { IsLoose = true })]));

    private Linework Split(Linework linework)
    {
        var teed = WithoutDuplicates(AtTees(Merged(linework), out var tees));
        var crossed = WithoutDuplicates(AtCrossings(teed, out var crossings));
        (Tees, Crossings) = (Tees + tees, Crossings + crossings);
        return crossed;
    }

    /// <summary>
    /// Nodes that differ by rounding only become one: curves that lie on each other may state their corners in different ways.
    /// </summary>
    private Linework Merged(Linework linework)
    {
        var nodes = linework.Nodes;
        var same = Math.Min(notes.Rounding, tolerance);
        var tree = new BoxTree([.. nodes.Select(n => Box.Of(n, n))]);
        var names = new int[nodes.Count];
        var near = new List<int>();
        for (var node = 0; node < names.Length; node++)
        {
            near.Clear();
            tree.Query(Box.Of(nodes[node], nodes[node]).Grown(same), near);
            names[node] = near.Where(n => n <= node && nodes[n].DistanceTo(nodes[node]) <= same).Min(n => n == node ? node : names[n]);
        }

        var strands = new List<Strand>(linework.Strands.Count);
        foreach (var strand in linework.Strands)
        {
            var (from, to) = (names[strand.From], names[strand.To]);
            var isSame = nodes[from] == nodes[strand.From] && nodes[to] == nodes[strand.To];
            if (from != to)
            {
                strands.Add(isSame ? strand with { From = from, To = to } : strand with
                {
                    From = from,
                    To = to,
                    Edge = strand.Edge.Between(nodes[from], nodes[to]),
                });
            }
        }

        return linework.With(strands);
    }

    private Linework AtTees(Linework linework, out int tees)
    {
        var strands = linework.Strands;
        var places = linework.Nodes.ToList();
        var (isUsed, isLoose) = (new bool[places.Count], new bool[places.Count]);
        foreach (var strand in strands)
        {
            isUsed[strand.From] = isUsed[strand.To] = true;
            isLoose[strand.From] |= strand.IsLoose;
            isLoose[strand.To] |= strand.IsLoose;
        }

        var ends = linework.Ends();
        var tree = new BoxTree([.. strands.Select(s => s.Edge.Bounds.Grown(tolerance))]);
        var cuts = new StrandCuts();
        var near = new List<int>();
        for (var node = 0; node < places.Count; node++)
        {
            near.Clear();
            if (isUsed[node])
            {
                tree.Query(Box.Of(places[node], places[node]), near);
                near.Sort();
            }

            var drawn = places[node];
            foreach (var s in near)
            {
                var mayEnd = isLoose[node] || strands[s].IsLoose;
                if (mayEnd && Tee(strands[s], drawn, node) is { } at && (isLoose[node] || RunsAlong(strands[s], at, node, ends[node], strands)))
                {
                    cuts.Add(s, at, node);
                    places[node] = Onto(strands[s], at, drawn, places[node]);
                }
            }
        }

        tees = cuts.Count;
        return linework.With([.. strands.Select(s => Moved(s, places))]).Cut(places, cuts);
    }

    /// <summary>The parameter at which a node lies on a strand that does not end there; null if it does not.</summary>
    private double? Tee(Strand strand, Point place, int node)
    {
        if (node == strand.From || node == strand.To)
        {
            return null;
        }

        var at = NearestOnEdge.Parameter(strand.Edge, place);
        var nearest = strand.Edge.PointAt(at);
        var isOn = nearest.DistanceTo(place) <= tolerance;
        var isInside = nearest.DistanceTo(strand.Edge.Start) > tolerance && nearest.DistanceTo(strand.Edge.End) > tolerance;
        return isOn && isInside ? at : null;
    }

    /// <summary>
    /// True if a strand runs on along one that ends at the node, so that it may lie on it: where it only passes over a node of
    /// a closed loop, as a centre line does, nothing ends.
    /// </summary>
    private static bool RunsAlong(Strand strand, double at, int node, ReadOnlySpan<int> ends, IReadOnlyList<Strand> strands)
    {
        var along = strand.Edge.TangentAt(at);
        foreach (var e in ends)
        {
            if (Math.Abs(along.Cross(strands[e].Edge.TangentAt(strands[e].From == node ? 0 : 1))) < SameDirection)
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>A node off the strand goes onto it, so that the strand keeps its shape.</summary>
    private Point Onto(Strand strand, double at, Point drawn, Point place)
    {
        var nearest = strand.Edge.PointAt(at);
        var distance = nearest.DistanceTo(drawn);
        if (distance <= notes.Rounding)
        {
            return place;
        }

        notes.Gap(nearest, distance, [strand.Entity.Source]);
        return nearest;
    }

    private static Strand Moved(Strand strand, List<Point> places) =>
        strand.Edge.Start == places[strand.From] && strand.Edge.End == places[strand.To]
            ? strand
            : Strand.Of(strand.From, strand.To, strand.Edge.Between(places[strand.From], places[strand.To]), strand.Entity) with
            {
                IsLoose = strand.IsLoose,
            };

    private Linework WithoutDuplicates(Linework linework)
    {
        // Of two that lie on each other the one of a closed loop stays, then the part of the longer piece: which was drawn
        // first does not show.
        List<Strand> strands = [.. linework.Strands.OrderBy(s => s.IsLoose).ThenByDescending(s => s.Whole.Chord.Length).ThenBy(s => LeastEnd(s.Whole))];
        var isDropped = new bool[strands.Count];
        foreach (var (dropped, kept) in Duplicates.Find(strands.Select((s, i) => (s.From, s.To, s.Edge, i)), linework.Nodes, tolerance))
        {
            isDropped[dropped] = true;
            notes.Duplicate(strands[dropped].Entity, strands[kept].Entity);
        }

        return linework.With([.. strands.Where((_, s) => !isDropped[s])]);

        static (double X, double Y) LeastEnd(Edge edge)
        {
            var (start, end) = ((edge.Start.X, edge.Start.Y), (edge.End.X, edge.End.Y));
            return start.CompareTo(end) < 0 ? start : end;
        }
    }

    private Linework AtCrossings(Linework linework, out int crossings)
    {
        var strands = linework.Strands;
        int[] loose = [.. Enumerable.Range(0, strands.Count).Where(s => strands[s].IsLoose)];
        var boxes = loose.Select(s => strands[s].Edge.Bounds).ToArray();
        var tree = new BoxTree(boxes);
        var places = linework.Nodes.ToList();
        var cuts = new StrandCuts();
        var near = new List<int>();
        crossings = 0;
        for (var i = 0; i < loose.Length; i++)
        {
            near.Clear();
            tree.Query(boxes[i], near);
            near.Sort();
            foreach (var (s, other) in near.Where(j => j > i).Select(j => (loose[i], loose[j])))
            {
                var found = EdgeCrossings.Find(strands[s].Edge, strands[other].Edge, crossingTolerance)
                    ?? throw notes.RunTogether(strands[s], strands[other]);
                foreach (var (a, b) in found)
                {
                    var node = NodeAt(strands[s].Edge.PointAt(a), s, other);
                    cuts.Add(s, a, node);
                    cuts.Add(other, b, node);
                    crossings++;
                }
            }
        }

        return linework.Cut(places, cuts);

        // Three strands through one point make one node.
        int NodeAt(Point point, int s, int other)
        {
            foreach (var (_, node) in cuts.Of(s).Concat(cuts.Of(other)))
            {
                if (places[node].DistanceTo(point) <= crossingTolerance)
                {
                    return node;
                }
            }

            places.Add(point);
            return places.Count - 1;
        }
    }
}
