namespace MeshSection.Geometry;

/// <summary>Where two edges meet.</summary>
/// <param name="Point">The place.</param>
/// <param name="Crosses">True if each passes to the other side of the other; false if they only touch.</param>
internal readonly record struct Contact(Point Point, bool Crosses);

/// <summary>
/// Finds where two edges come nearer than a tolerance. An edge lies within its sag of its chord, so two edges whose
/// chords are farther apart than that are clear; otherwise the one with the greater sag is halved, until both are
/// as good as straight. Works for every kind of edge.
/// </summary>
internal static class EdgeContact
{
    // Near the middle but not in it: curves often cross others in their middle, and a crossing at the end of a piece
    // looks like a touch.
    private const double Split = 0.4871;

    /// <summary>The first place found where the edges cross or come nearer than the tolerance, or null.</summary>
    public static Contact? Find(Edge a, Edge b, double tolerance)
    {
        var (sagA, sagB) = (a.Sag, b.Sag);
        var flat = 0.25 * tolerance;
        if (sagA <= flat && sagB <= flat)
        {
            return OfChords(a, b, tolerance);
        }

        if (ChordDistance(a.Start, a.End, b.Start, b.End) > sagA + sagB + tolerance)
        {
            return null;
        }

        return sagA >= sagB
            ? Find(a.Part(0, Split), b, tolerance) ?? Find(a.Part(Split, 1), b, tolerance)
            : Find(a, b.Part(0, Split), tolerance) ?? Find(a, b.Part(Split, 1), tolerance);
    }

    private static Contact? OfChords(Edge a, Edge b, double tolerance)
    {
        // Signed distances of each edge's ends from the other's line.
        var (alongA, alongB) = (a.TangentAt(0.5), b.TangentAt(0.5));
        var (b0, b1) = (alongA.Cross(b.Start - a.Start), alongA.Cross(b.End - a.Start));
        var (a0, a1) = (alongB.Cross(a.Start - b.Start), alongB.Cross(a.End - b.Start));
        if (Opposite(a0, a1, tolerance) && Opposite(b0, b1, tolerance))
        {
            return new Contact(a.Start + a0 / (a0 - a1) * a.Chord, true);
        }

        if (a0 * a1 < 0 && b0 * b1 < 0)
        {
            return new Contact(a.Start + a0 / (a0 - a1) * a.Chord, false);
        }

        foreach (var (point, start, end) in new[]
        {
            (a.Start, b.Start, b.End), (a.End, b.Start, b.End), (b.Start, a.Start, a.End), (b.End, a.Start, a.End),
        })
        {
            if (PointDistance(point, start, end) <= tolerance)
            {
                return new Contact(point, false);
            }
        }

        return null;
    }

    private static bool Opposite(double from, double to, double tolerance) =>
        (from > tolerance && to < -tolerance) || (from < -tolerance && to > tolerance);

    /// <summary>The shortest distance between the straight pieces ab and cd; 0 if they cross.</summary>
    public static double ChordDistance(Point a, Point b, Point c, Point d)
    {
        var (ab, cd) = (b - a, d - c);
        if (ab.Cross(c - a) > 0 != ab.Cross(d - a) > 0 && cd.Cross(a - c) > 0 != cd.Cross(b - c) > 0)
        {
            return 0;
        }

        return Math.Min(
            Math.Min(PointDistance(a, c, d), PointDistance(b, c, d)),
            Math.Min(PointDistance(c, a, b), PointDistance(d, a, b)));
    }

    private static double PointDistance(Point p, Point start, Point end)
    {
        var along = end - start;
        var t = (p - start).Dot(along) / along.Dot(along);
        return p.DistanceTo(t <= 0 ? start : t >= 1 ? end : start + t * along);
    }
}
