using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>Draws a polygon whose corners are rounded by arcs tangent to both sides.</summary>
internal static class RoundedPolygon
{
    /// <summary>Room left on a side, relative to its length, below which its two arcs are taken to meet.</summary>
    private const double LeastRoom = 1e-12;

    /// <exception cref="ShapeException">A radius is negative, not finite, or does not fit its sides.</exception>
    public static Boundary Draw(params ReadOnlySpan<Corner> corners)
    {
        var n = corners.Length;
        var roundings = new Rounding[n];
        for (var i = 0; i < n; i++)
        {
            ShapeCheck.AtLeast(corners[i].Radius, 0, corners[i].RadiusName);
            roundings[i] = new Rounding(corners[i], corners[(i + n - 1) % n].Place, corners[(i + 1) % n].Place);
        }

        CheckRoom(roundings);
        return Boundary.Create(Edges(roundings));
    }

    private static List<Edge> Edges(Rounding[] roundings)
    {
        var edges = new List<Edge>(2 * roundings.Length);
        for (var i = 0; i < roundings.Length; i++)
        {
            var before = roundings[(i + roundings.Length - 1) % roundings.Length];
            var here = roundings[i];
            var after = roundings[(i + 1) % roundings.Length];
            var start = Fills(before, here) ? before.End : here.Start;
            if (start != here.End)
            {
                edges.Add(new ArcEdge(start, here.End, Math.Tan(0.25 * here.Turn)));
            }

            if (!Fills(here, after))
            {
                edges.Add(new LineEdge(here.End, after.Start));
            }
        }

        return edges;
    }

    private static void CheckRoom(Rounding[] roundings)
    {
        // Of all radii that do not fit, name the one that is too large by the greatest factor.
        ShapeException? worst = null;
        for (var i = 0; i < roundings.Length; i++)
        {
            var a = roundings[i];
            var b = roundings[(i + 1) % roundings.Length];
            if (Room(a, b) >= -LeastRoom * a.Side)
            {
                continue;
            }

            var fault = TooLarge(a, b);
            if (worst is null || fault.Limit * worst.Value < worst.Limit * fault.Value)
            {
                worst = fault;
            }
        }

        if (worst is not null)
        {
            throw worst;
        }
    }

    private static ShapeException TooLarge(Rounding a, Rounding b)
    {
        var (blamed, other) = a.Tangent >= b.Tangent ? (a, b) : (b, a);
        var bothAlike = other.Tangent > 0 && a.Corner.RadiusName == b.Corner.RadiusName;
        var room = a.Side > other.Tangent ? a.Side - other.Tangent : a.Side;
        var limit = bothAlike ? a.Side / (a.Reach + b.Reach) : room / blamed.Reach;
        return new ShapeException(blamed.Corner.RadiusName, blamed.Corner.Radius, ShapeBound.AtMost, limit);
    }

    /// <summary>What the two arcs at the ends of a side leave of it.</summary>
    private static double Room(Rounding a, Rounding b) => a.Side - a.Tangent - b.Tangent;

    private static bool Fills(Rounding a, Rounding b) => Room(a, b) <= LeastRoom * a.Side;

    /// <summary>A corner with the sides that meet in it.</summary>
    private readonly struct Rounding
    {
        public Rounding(Corner corner, Point before, Point after)
        {
            Corner = corner;
            Side = corner.Place.DistanceTo(after);
            var arriving = (corner.Place - before) / corner.Place.DistanceTo(before);
            var leaving = (after - corner.Place) / Side;
            Turn = Math.Atan2(arriving.Cross(leaving), arriving.Dot(leaving));
            Reach = Math.Tan(0.5 * Math.Abs(Turn));
            Start = corner.Place - Tangent * arriving;
            End = corner.Place + Tangent * leaving;
        }

        public Corner Corner { get; }

        /// <summary>Length of the side that leaves the corner.</summary>
        public double Side { get; }

        /// <summary>Angle between the two sides, counter-clockwise positive.</summary>
        public double Turn { get; }

        /// <summary>Distance from the corner to either end of its arc, for a radius of 1.</summary>
        public double Reach { get; }

        /// <summary>Distance from the corner to either end of its arc.</summary>
        public double Tangent => Corner.Radius * Reach;

        public Point Start { get; }

        public Point End { get; }
    }
}
