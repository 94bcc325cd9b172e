using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Adds the points and lines that a mesh is to keep to a flattened outline. What lies on a boundary cuts it there; lines
/// are cut where they cross or where another point lies on them.
/// </summary>
internal sealed class ConstraintInsertion
{
    private readonly FlatOutline flat;
    private readonly double snap;
    private readonly List<Point> points;
    private readonly List<Segment> segments;

    private ConstraintInsertion(FlatOutline flat)
    {
        this.flat = flat;
        snap = ConstraintPlaces.Snap(flat.Outline);
        points = [.. flat.Graph.Points];
        segments = [.. flat.Graph.Segments];
    }

    /// <summary>The flattened outline with the points and lines in its graph; the chords stay its first segments.</summary>
    /// <param name="flat">The flattened outline.</param>
    /// <param name="cuts">How its edges were cut; see <see cref="ChordChain"/>.</param>
    /// <param name="constraints">What to add.</param>
    public static FlatOutline Run(FlatOutline flat, double[][][] cuts, MeshConstraints constraints)
    {
        var insertion = new ConstraintInsertion(Recut(flat, cuts, constraints));
        foreach (var point in constraints.Points)
        {
            insertion.NodeAt(point, null);
        }

        var lines = constraints.Lines.Select(line => insertion.Ends(line)).ToList();
        insertion.AddCrossings(lines);
        var pieces = new HashSet<(int, int)>();
        foreach (var line in lines)
        {
            insertion.AddPieces(line, pieces);
        }

        return insertion.flat with { Graph = new PlanarGraph([.. insertion.points], [.. insertion.segments]) };
    }

    /// <summary>Cuts the boundaries where points lie on them.</summary>
    private static FlatOutline Recut(FlatOutline flat, double[][][] cuts, MeshConstraints constraints)
    {
        var snap = ConstraintPlaces.Snap(flat.Outline);
        foreach (var point in ConstraintPlaces.Ends(constraints))
        {
            var (chord, fraction, distance) = ConstraintPlaces.Nearest(flat, point);
            var curve = flat.Chords[chord].Curve;
            if (distance > snap || point.DistanceTo(curve.Start) <= snap || point.DistanceTo(curve.End) <= snap)
            {
                continue;
            }

            var (b, e) = (flat.Chords[chord].Place.Boundary, flat.Chords[chord].Place.Edge);
            var first = chord;
            while (first > 0 && flat.Chords[first - 1].Place == flat.Chords[chord].Place)
            {
                first--;
            }

            var (from, to) = (cuts[b][e][chord - first], cuts[b][e][chord - first + 1]);
            cuts[b][e] = [.. cuts[b][e].Append(from + fraction * (to - from)).Order()];
            flat = ChordChain.Of(flat.Outline, cuts);
        }

        return flat;
    }

    private Ends Ends(ConstraintLine line)
    {
        var ends = new Ends(line, NodeAt(line.From, line), NodeAt(line.To, line));
        return ends.From != ends.To ? ends : throw new ConstraintException(ConstraintFault.NoLength, line.From, line);
    }

    /// <summary>The node at a place, an old one if there is one.</summary>
    private int NodeAt(Point place, ConstraintLine? line)
    {
        for (var i = 0; i < points.Count; i++)
        {
            if (points[i].DistanceTo(place) <= snap)
            {
                return i;
            }
        }

        if (!ConstraintPlaces.IsInside(flat.Outline, place))
        {
            throw new ConstraintException(ConstraintFault.Outside, place, line);
        }

        points.Add(place);
        return points.Count - 1;
    }

    private void AddCrossings(List<Ends> lines)
    {
        for (var i = 0; i < lines.Count; i++)
        {
            for (var j = 0; j < i; j++)
            {
                if (Crossing(points[lines[i].From], points[lines[i].To], points[lines[j].From], points[lines[j].To]) is { } place)
                {
                    NodeAt(place, lines[i].Line);
                }
            }
        }
    }

    /// <summary>Adds the pieces of a line between the nodes that lie on it.</summary>
    private void AddPieces(Ends line, HashSet<(int, int)> pieces)
    {
        var (from, along) = (points[line.From], points[line.To] - points[line.From]);
        var (length, direction) = (along.Length, along / along.Length);
        var nodes = Enumerable.Range(0, points.Count)
            .Select(i => (Node: i, At: direction.Dot(points[i] - from), Off: Math.Abs(direction.Cross(points[i] - from))))
            .Where(n => n.Node == line.From || n.Node == line.To || (n.Off <= snap && n.At > 0 && n.At < length))
            .OrderBy(n => n.At)
            .Select(n => n.Node)
            .ToArray();
        for (var i = 1; i < nodes.Length; i++)
        {
            var (a, b) = (nodes[i - 1], nodes[i]);
            RefuseBoundary(line.Line, a, b);
            if (pieces.Add((Math.Min(a, b), Math.Max(a, b))))
            {
                var region = RegionAt(0.5 * (points[a] + points[b]));
                segments.Add(new Segment(a, b, region, region));
            }
        }
    }

    /// <summary>Makes sure that the piece of a line from node a to b lies within the section.</summary>
    private void RefuseBoundary(ConstraintLine line, int a, int b)
    {
        var (from, to) = (points[a], points[b]);
        Point? met = null;
        for (var i = 0; i < flat.Chords.Length; i++)
        {
            var s = segments[i];
            if ((s.From == a && s.To == b) || (s.From == b && s.To == a))
            {
                throw new ConstraintException(ConstraintFault.MeetsBoundary, 0.5 * (from + to), line);
            }

            var isApart = s.From != a && s.From != b && s.To != a && s.To != b;
            if (isApart && Crossing(from, to, points[s.From], points[s.To]) is { } place
                && (met is null || place.DistanceTo(from) < met.Value.DistanceTo(from)))
            {
                met = place;
            }
        }

        if (met is not null || !ConstraintPlaces.IsInside(flat.Outline, 0.5 * (from + to)))
        {
            throw new ConstraintException(ConstraintFault.MeetsBoundary, met ?? from, line);
        }
    }

    private int RegionAt(Point place) => flat.Outline.Boundaries
        .Where(b => b.Role != BoundaryRole.Hole && WindingNumber.Of(b.Boundary, place) > 0)
        .MinBy(b => b.Boundary.SignedArea)!
        .Region;

    /// <summary>Where two straight lines cross between their ends; null if they do not.</summary>
    private static Point? Crossing(Point a, Point b, Point c, Point d)
    {
        var turn = (b - a).Cross(d - c);
        if (turn == 0)
        {
            return null;
        }

        var (t, u) = ((c - a).Cross(d - c) / turn, (c - a).Cross(b - a) / turn);
        return t is > 0 and < 1 && u is > 0 and < 1 ? a + t * (b - a) : null;
    }
}

/// <summary>A line with the nodes at its ends.</summary>
internal readonly record struct Ends(ConstraintLine Line, int From, int To);
