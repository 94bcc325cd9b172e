using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>
/// Cuts a rational Bézier curve of any shape into edges that each turn one way, by no more than a quarter of a turn: where
/// it runs along an axis, where it bends the other way, and at cusps, which are both.
/// </summary>
public static class BezierPieces
{
    // Cuts nearer to each other than this part of the parameter are one.
    private const double LeastPart = 1e-9;

    /// <summary>The edges of a curve, in running order, each beginning in the bits in which the one before it ends.</summary>
    /// <param name="controls">The control points, at least two.</param>
    /// <param name="weights">Their weights, positive.</param>
    /// <param name="straight">A piece nearer to its chord than this is a straight edge, mm.</param>
    /// <returns>Curves, and straight edges; empty if all control points are one.</returns>
    public static IReadOnlyList<Edge> Of(ImmutableArray<Point> controls, ImmutableArray<double> weights, double straight)
    {
        if (controls.All(p => p == controls[0]))
        {
            return [];
        }

        if (controls.Length == 2)
        {
            return [new LineEdge(controls[0], controls[1])];
        }

        var whole = new BezierEdge(controls, weights);
        var cuts = whole.Turnings(Point.AlongX).Concat(whole.Turnings(Point.AlongY)).Concat(Bends(controls, weights)).Order();
        var edges = new List<Edge>();
        var from = 0.0;
        foreach (var to in cuts.Append(1))
        {
            if (to - from < LeastPart || (to < 1 && 1 - to < LeastPart))
            {
                continue;
            }

            var piece = from == 0 && to == 1 ? whole : whole.Part(from, to);
            if (piece.Start != piece.End)
            {
                edges.Add(piece.Sag <= straight ? new LineEdge(piece.Start, piece.End) : piece);
            }

            from = to;
        }

        return edges;
    }

    /// <summary>Where the curvature changes its sign: that of det(H, H', H''), with H = (w x, w y, w) [PieglTiller1997].</summary>
    private static List<double> Bends(ImmutableArray<Point> controls, ImmutableArray<double> weights)
    {
        // About the first control point, to lose no digits.
        var x = Coefficients(p => p.X - controls[0].X);
        var y = Coefficients(p => p.Y - controls[0].Y);
        var w = Coefficients(_ => 1);
        var (dx, dy, dw) = (Bernstein.Derivative(x), Bernstein.Derivative(y), Bernstein.Derivative(w));
        var (ddx, ddy, ddw) = (Bernstein.Derivative(dx), Bernstein.Derivative(dy), Bernstein.Derivative(dw));
        var sum = Bernstein.Product(w, Minus(Bernstein.Product(dx, ddy), Bernstein.Product(ddx, dy)));
        if (weights.AsSpan().IndexOfAnyExcept(weights[0]) >= 0)
        {
            var (rotated, other) = (
                Bernstein.Product(x, Minus(Bernstein.Product(dy, ddw), Bernstein.Product(ddy, dw))),
                Bernstein.Product(y, Minus(Bernstein.Product(dx, ddw), Bernstein.Product(ddx, dw))));
            sum = Minus(sum, Minus(other, rotated));
        }

        return Bernstein.SignChanges(Cleaned(sum));

        double[] Coefficients(Func<Point, double> of) => [.. controls.Select((p, i) => weights[i] * of(p))];
    }

    /// <summary>Coefficients that are nothing but rounding would make up bends; they are zero.</summary>
    private static double[] Cleaned(double[] c)
    {
        var rounding = 1e-14 * c.Max(Math.Abs);
        return [.. c.Select(value => Math.Abs(value) <= rounding ? 0 : value)];
    }

    private static double[] Minus(double[] a, double[] b) => [.. a.Zip(b, (p, q) => p - q)];
}
