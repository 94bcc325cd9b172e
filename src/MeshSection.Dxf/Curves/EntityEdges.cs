using MeshSection.Dxf.Entities;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>Turns entities into edges. No edge turns by more than half a circle.</summary>
internal static class EntityEdges
{
    // An arc that departs from its chord by less than this part of the drawing's size is the chord.
    private const double LeastSag = 1e-12;

    /// <summary>Appends the edges of an entity in local axes.</summary>
    /// <returns>How many edges were dropped since they have no length.</returns>
    public static int Append(Entity entity, LocalFrame frame, List<Edge> edges) => entity switch
    {
        LineEntity line => Line(frame.ToLocal(line.Start), frame.ToLocal(line.End), edges),
        ArcEntity arc => Arc(arc, frame, edges),
        CircleEntity circle => Circle(frame.ToLocal(circle.Centre), frame.Scale * circle.Radius, edges),
        PolylineEntity polyline => Polyline(polyline, frame, edges),
        _ => 0,
    };

    private static int Line(Point start, Point end, List<Edge> edges)
    {
        if (start == end)
        {
            return 1;
        }

        edges.Add(new LineEdge(start, end));
        return 0;
    }

    private static int Arc(ArcEntity arc, LocalFrame frame, List<Edge> edges)
    {
        var centre = frame.ToLocal(arc.Centre);
        var radius = frame.Scale * arc.Radius;
        var sweep = Degrees.Sweep(arc.StartAngle, arc.EndAngle);
        if (sweep == 0)
        {
            return arc.StartAngle == arc.EndAngle ? 1 : Circle(centre, radius, edges);
        }

        var parts = sweep > 180 ? 2 : 1;
        var bulge = sweep == 180 ? 1 : Math.Tan(sweep / parts * (Math.PI / 720));
        var start = centre + radius * Degrees.Direction(arc.StartAngle);
        var end = centre + radius * Degrees.Direction(arc.EndAngle);
        var dropped = 0;
        if (parts == 2)
        {
            var middle = centre + radius * Degrees.Direction(arc.StartAngle + 0.5 * sweep);
            dropped += Bulged(start, middle, bulge, frame, edges);
            start = middle;
        }

        return dropped + Bulged(start, end, bulge, frame, edges);
    }

    private static int Circle(Point centre, double radius, List<Edge> edges)
    {
        var right = centre + new Point(radius, 0);
        var left = centre - new Point(radius, 0);
        if (right == left)
        {
            return 1;
        }

        edges.Add(new ArcEdge(right, left, 1));
        edges.Add(new ArcEdge(left, right, 1));
        return 0;
    }

    private static int Polyline(PolylineEntity polyline, LocalFrame frame, List<Edge> edges)
    {
        var vertices = polyline.Vertices;
        var count = polyline.IsClosed && vertices.Length > 1 ? vertices.Length : vertices.Length - 1;
        if (count < 1)
        {
            return 1;
        }

        var dropped = 0;
        var first = frame.ToLocal(vertices[0].Point);
        var start = first;
        for (var i = 0; i < count; i++)
        {
            var end = i + 1 < vertices.Length ? frame.ToLocal(vertices[i + 1].Point) : first;
            dropped += Bulged(start, end, vertices[i].Bulge, frame, edges);
            start = end;
        }

        return dropped;
    }

    private static int Bulged(Point start, Point end, double bulge, LocalFrame frame, List<Edge> edges)
    {
        var chord = end - start;
        if (0.5 * chord.Length * Math.Abs(bulge) <= LeastSag * frame.Diagonal)
        {
            return Line(start, end, edges);
        }

        if (Math.Abs(bulge) <= 1)
        {
            edges.Add(new ArcEdge(start, end, bulge));
            return 0;
        }

        // Halved, since the short chord of a long arc says little about its radius. tan(θ/8) from b = tan(θ/4).
        var apex = 0.5 * (start + end) - 0.5 * bulge * chord.Left();
        var half = bulge / (1 + double.Hypot(1, bulge));
        edges.Add(new ArcEdge(start, apex, half));
        edges.Add(new ArcEdge(apex, end, half));
        return 0;
    }
}
