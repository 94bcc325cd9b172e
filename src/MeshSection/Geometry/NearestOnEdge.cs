namespace MeshSection.Geometry;

/// <summary>Finds the place on an edge that is nearest to a point which lies about on it.</summary>
internal static class NearestOnEdge
{
    // An edge turns by half a circle at most: in so many parts it is so straight that, near it, each has one nearest place.
    private const int Parts = 16;

    /// <summary>The parameter of the nearest place, for a point nearer to the edge than to its centre of curvature.</summary>
    public static double Parameter(Edge edge, Point point)
    {
        if (edge is LineEdge)
        {
            return Math.Clamp((point - edge.Start).Dot(edge.Chord) / edge.Chord.Dot(edge.Chord), 0, 1);
        }

        var (best, least) = (0.0, double.PositiveInfinity);
        for (var part = 0; part < Parts; part++)
        {
            var t = InPart(edge, point, (double)part / Parts, (part + 1.0) / Parts);
            var distance = edge.PointAt(t).DistanceTo(point);
            (best, least) = distance < least ? (t, distance) : (best, least);
        }

        return best;
    }

    private static double InPart(Edge edge, Point point, double low, double high)
    {
        var (from, to) = (low, high);
        for (var i = 0; i < 60 && high - low > 1e-16; i++)
        {
            var middle = 0.5 * (low + high);
            (low, high) = (point - edge.PointAt(middle)).Dot(edge.TangentAt(middle)) > 0 ? (middle, high) : (low, middle);
        }

        return low == from ? from : high == to ? to : 0.5 * (low + high);
    }
}
