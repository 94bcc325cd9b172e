using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>Turns curves of the drawing into edges. No arc turns by more than half a circle.</summary>
internal static class CurveEdges
{
    // An arc that departs from its chord by less than this part of the drawing's size is the chord.
    private const double LeastSag = 1e-12;

    /// <summary>Appends the edges of a curve in local axes.</summary>
    /// <returns>How many edges were dropped since they have no length.</returns>
    public static int Append(PlaneCurve curve, LocalFrame frame, List<Edge> edges) => curve switch
    {
        StraightCurve straight => Straight(straight.Points, frame, edges),
        BulgedCurve bulged => Bulged(frame.ToLocal(bulged.Start), frame.ToLocal(bulged.End), bulged.Bulge, frame, edges),
        EllipticCurve { IsCircular: true } circular => Circular(circular, frame, edges),
        EllipticCurve elliptic => Elliptic(elliptic, frame, edges),
        FreeCurve free => Free([.. free.Controls.Select(frame.ToLocal)], free.Weights, frame, edges),
        _ => 0,
    };

    private static int Straight(ImmutableArray<Point> points, LocalFrame frame, List<Edge> edges)
    {
        var dropped = points.Length < 2 ? 1 : 0;
        for (var i = 0; i + 1 < points.Length; i++)
        {
            dropped += Line(frame.ToLocal(points[i]), frame.ToLocal(points[i + 1]), edges);
        }

        return dropped;
    }

    private static int Line(Point start, Point end, List<Edge> edges)
    {
        if (start == end)
        {
            return 1;
        }

        edges.Add(new LineEdge(start, end));
        return 0;
    }

    private static int Circular(EllipticCurve curve, LocalFrame frame, List<Edge> edges)
    {
        var (u, v) = (frame.Scale * curve.U, frame.Scale * curve.V);
        var centre = frame.ToLocal(curve.Centre);
        var isWhole = curve.Sweep == 360;
        var parts = curve.Sweep > 180 ? 2 : 1;
        var bulge = isWhole || curve.Sweep == 180 ? 1 : Math.Tan(curve.Sweep / parts * (Math.PI / 720));
        bulge = u.Cross(v) < 0 ? -bulge : bulge;
        var first = At(curve.Start);
        var start = first;
        var dropped = 0;
        for (var part = 1; part <= parts; part++)
        {
            var end = isWhole && part == parts ? first : At(curve.Start + part * curve.Sweep / parts);
            dropped += Bulged(start, end, bulge, frame, edges);
            start = end;
        }

        return isWhole && dropped > 0 ? 1 : dropped;

        Point At(double angle)
        {
            var direction = Degrees.Direction(angle);
            return centre + (direction.X * u + direction.Y * v);
        }
    }

    /// <summary>In parts of a quarter at most, each exactly a rational curve of degree 2 [PieglTiller1997, chapter 7].</summary>
    private static int Elliptic(EllipticCurve curve, LocalFrame frame, List<Edge> edges)
    {
        if (curve.Sweep == 0)
        {
            return 1;
        }

        var (u, v) = (frame.Scale * curve.U, frame.Scale * curve.V);
        var centre = frame.ToLocal(curve.Centre);
        var parts = (int)Math.Max(1, Math.Ceiling(curve.Sweep / 90 - 1e-9));
        var step = curve.Sweep / parts;
        var weight = Math.Cos(0.5 * step * (Math.PI / 180));
        var first = At(curve.Start, 1);
        var start = first;
        var dropped = 0;
        for (var part = 1; part <= parts; part++)
        {
            var end = curve.Sweep == 360 && part == parts ? first : At(curve.Start + part * step, 1);
            dropped += Free([start, At(curve.Start + (part - 0.5) * step, 1 / weight), end], [1, weight, 1], frame, edges);
            start = end;
        }

        return dropped;

        Point At(double angle, double factor)
        {
            var direction = Degrees.Direction(angle);
            return centre + factor * (direction.X * u + direction.Y * v);
        }
    }

    private static int Free(ImmutableArray<Point> controls, ImmutableArray<double> weights, LocalFrame frame, List<Edge> edges)
    {
        var pieces = BezierPieces.Of(controls, weights, LeastSag * frame.Diagonal);
        edges.AddRange(pieces);
        return pieces.Count == 0 ? 1 : 0;
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
