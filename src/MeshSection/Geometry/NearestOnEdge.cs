namespace MeshSection.Geometry;

/// <summary>Finds the place on an edge that is nearest to a point.</summary>
internal static class NearestOnEdge
{
    // An arc turns by half a circle at most: in quarters of it the distance has one least value each.
    private const int Parts = 4;

    /// <summary>The parameter of the nearest place.</summary>
    public static double Parameter(Edge edge, Point point) => edge switch
    {
        LineEdge => Math.Clamp((point - edge.Start).Dot(edge.Chord) / edge.Chord.Dot(edge.Chord), 0, 1),
        BezierEdge curve => Nearest(edge, point, curve.Perpendiculars(point)),
        _ => Nearest(edge, point, Enumerable.Range(0, Parts).Select(i => InPart(edge, point, (double)i / Parts, (i + 1.0) / Parts))),
    };

    private static double Nearest(Edge edge, Point point, IEnumerable<double> candidates)
    {
        var (best, least) = (0.0, edge.Start.DistanceTo(point));
        foreach (var t in candidates.Append(1))
        {
            var distance = edge.PointAt(t).DistanceTo(point);
            (best, least) = distance < least ? (t, distance) : (best, least);
        }

        return best;
    }

    private static double InPart(Edge edge, Point point, double low, double high)
    {
        for (var i = 0; i < 60 && high - low > 1e-16; i++)
        {
            var middle = 0.5 * (low + high);
            (low, high) = (point - edge.PointAt(middle)).Dot(edge.TangentAt(middle)) > 0 ? (middle, high) : (low, middle);
        }

        return 0.5 * (low + high);
    }
}
