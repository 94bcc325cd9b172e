namespace MeshSection.Geometry;

/// <summary>
/// Finds every place at which two edges cross: both are cut until they are as good as straight, and pieces farther apart
/// than their sag are left.
/// </summary>
internal static class EdgeCrossings
{
    // Off the middle, where curves often cross: a crossing at the end of a piece could be lost, or found twice.
    private const double Split = 0.4871;

    // Two curves that cross take some hundred pairs of pieces; those that run along each other take them without end.
    private const int MostPairs = 20_000;

    /// <summary>
    /// The parameters on both edges of their crossings; those at ends are left out. Null if they run along each other for a
    /// part of their length.
    /// </summary>
    /// <param name="a">An edge.</param>
    /// <param name="b">Another.</param>
    /// <param name="tolerance">How near to an end a crossing is one at the end, and how exact curves are followed, mm.</param>
    public static List<(double A, double B)>? Find(Edge a, Edge b, double tolerance)
    {
        var found = new List<(double A, double B)>();
        var pairs = 0;
        Search(a, 0, 1, b, 0, 1);
        return pairs <= MostPairs ? found : null;

        void Search(Edge p, double fromA, double toA, Edge q, double fromB, double toB)
        {
            if (++pairs > MostPairs)
            {
                return;
            }

            var (sagP, sagQ) = (p.Sag, q.Sag);
            if (EdgeContact.ChordDistance(p.Start, p.End, q.Start, q.End) > sagP + sagQ)
            {
                return;
            }

            if (sagP <= 0.25 * tolerance && sagQ <= 0.25 * tolerance)
            {
                if (OfChords(p, q) is var (s, t))
                {
                    var at = p.Start + s * p.Chord;
                    Add(Parameter(a, at, fromA + s * (toA - fromA)), Parameter(b, at, fromB + t * (toB - fromB)));
                }

                return;
            }

            if (sagP >= sagQ)
            {
                var middle = fromA + Split * (toA - fromA);
                Search(a.Part(fromA, middle), fromA, middle, q, fromB, toB);
                Search(a.Part(middle, toA), middle, toA, q, fromB, toB);
            }
            else
            {
                var middle = fromB + Split * (toB - fromB);
                Search(p, fromA, toA, b.Part(fromB, middle), fromB, middle);
                Search(p, fromA, toA, b.Part(middle, toB), middle, toB);
            }
        }

        void Add(double s, double t)
        {
            (s, t) = Polished(a, s, b, t);
            var point = a.PointAt(s);
            var isAtEnd = IsNear(point, a.Start) || IsNear(point, a.End) || IsNear(point, b.Start) || IsNear(point, b.End);
            if (!isAtEnd && !found.Exists(f => IsNear(a.PointAt(f.A), point)))
            {
                found.Add((s, t));
            }
        }

        bool IsNear(Point p, Point q) => p.DistanceTo(q) <= tolerance;
    }

    /// <summary>Along a Bézier curve the parameter does not run with the length, so that the chord does not tell it.</summary>
    private static double Parameter(Edge edge, Point at, double byChord) =>
        edge is BezierEdge ? NearestOnEdge.Parameter(edge, at) : byChord;

    /// <summary>Newton's steps from where chords cross, as long as they bring the two points nearer to each other.</summary>
    private static (double S, double T) Polished(Edge a, double s, Edge b, double t)
    {
        var apart = a.PointAt(s).DistanceTo(b.PointAt(t));
        for (var step = 0; step < 5 && apart > 0; step++)
        {
            var (way, u, v) = (b.PointAt(t) - a.PointAt(s), a.VelocityAt(s), b.VelocityAt(t));
            var (nextS, nextT) = (s + way.Cross(v) / u.Cross(v), t + way.Cross(u) / u.Cross(v));
            if (!(nextS >= 0 && nextS <= 1 && nextT >= 0 && nextT <= 1))
            {
                break;
            }

            var nearer = a.PointAt(nextS).DistanceTo(b.PointAt(nextT));
            if (!(nearer < apart))
            {
                break;
            }

            (s, t, apart) = (nextS, nextT, nearer);
        }

        return (s, t);
    }

    private static (double S, double T)? OfChords(Edge p, Edge q)
    {
        var (u, v) = (p.Chord, q.Chord);
        var (p0, p1) = (v.Cross(p.Start - q.Start), v.Cross(p.End - q.Start));
        var (q0, q1) = (u.Cross(q.Start - p.Start), u.Cross(q.End - p.Start));
        return p0 * p1 <= 0 && q0 * q1 <= 0 && p0 != p1 && q0 != q1 ? (p0 / (p0 - p1), q0 / (q0 - q1)) : null;
    }
}
