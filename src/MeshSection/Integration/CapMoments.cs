using MeshSection.Geometry;

namespace MeshSection.Integration;

/// <summary>
/// The moments of the region between an edge and its chord, positive to the right of the chord, for the boundary
/// integrator: in closed form for arcs, and for Bézier curves by Green's theorem with quadrature along the curve, halved
/// until it changes nothing but rounding.
/// </summary>
internal static class CapMoments
{
    // Halving 12 times reaches rounding even where control points coincide.
    private const int MostHalvings = 12;

    /// <summary>The moments about a point; zero for a straight edge.</summary>
    public static AreaMoments Of(Edge edge, Point about) => edge switch
    {
        ArcEdge arc => OfArc(arc, about),
        BezierEdge curve => OfCurve(curve, 0, 1, Rule(curve, 0, 1), MostHalvings).Moved(curve.Start - about),
        _ => default,
    };

    private static AreaMoments OfArc(ArcEdge arc, Point about)
    {
        var cap = Cap.Of(arc);
        var middle = 0.5 * (arc.Start + arc.End) - about;
        var u = arc.Chord / arc.Chord.Length;
        var v = -Math.Sign(arc.Bulge) * u.Left();
        var first = cap.First;
        return new AreaMoments(
            cap.Area,
            cap.Area * middle.X + first * v.X,
            cap.Area * middle.Y + first * v.Y,
            cap.Area * middle.X * middle.X + 2 * first * middle.X * v.X + cap.Along * u.X * u.X + cap.Across * v.X * v.X,
            cap.Area * middle.Y * middle.Y + 2 * first * middle.Y * v.Y + cap.Along * u.Y * u.Y + cap.Across * v.Y * v.Y,
            cap.Area * middle.X * middle.Y + first * (middle.X * v.Y + middle.Y * v.X)
                + cap.Along * u.X * u.Y + cap.Across * v.X * v.Y);
    }

    /// <summary>About the curve's start, from which the chord encloses nothing.</summary>
    private static AreaMoments OfCurve(BezierEdge curve, double from, double to, AreaMoments whole, int halvings)
    {
        var middle = 0.5 * (from + to);
        var (left, right) = (Rule(curve, from, middle), Rule(curve, middle, to));
        var sum = left + right;
        var square = curve.Chord.Dot(curve.Chord);
        var isSettled = Math.Abs(sum.Area - whole.Area) <= 1e-15 * square &&
            Math.Abs(sum.XX - whole.XX) + Math.Abs(sum.YY - whole.YY) <= 1e-15 * square * square;
        return halvings == 0 || isSettled
            ? sum
            : OfCurve(curve, from, middle, left, halvings - 1) + OfCurve(curve, middle, to, right, halvings - 1);
    }

    /// <summary>∫ f dA over what the way from the start sweeps: ∫ f(p) p × p' dt / (k + 2) for f homogeneous of degree k.</summary>
    private static AreaMoments Rule(BezierEdge curve, double from, double to)
    {
        var sum = default(AreaMoments);
        foreach (var (at, weight) in GaussLegendre.Points)
        {
            var t = from + at * (to - from);
            var p = curve.OffsetAt(t);
            var w = (to - from) * weight * p.Cross(curve.VelocityAt(t));
            sum += new AreaMoments(w / 2, w * p.X / 3, w * p.Y / 3, w * p.X * p.X / 4, w * p.Y * p.Y / 4, w * p.X * p.Y / 4);
        }

        return sum;
    }
}
