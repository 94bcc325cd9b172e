using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Space;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>
/// The cubic with continuous curvature through given points, with the chord lengths as parameter [PieglTiller1997,
/// chapter 9]: closed with continuous curvature everywhere, or open with the stated end tangents, or none bending at the ends.
/// </summary>
internal static class FitPointCurves
{
    public static IEnumerable<PlaneCurve> Of(Spline spline, Func<SpacePoint, Point> project)
    {
        var points = Distinct(spline.FitPoints.Select(project));
        if (points.Count < 2)
        {
            return [];
        }

        if (spline.IsClosed && points[0] != points[^1])
        {
            points.Add(points[0]);
        }

        var isPeriodic = spline.IsClosed && points.Count > 3;
        var lengths = points.Zip(points.Skip(1), (a, b) => a.DistanceTo(b)).ToArray();
        var slopes = isPeriodic ? Periodic(points, lengths) : Open(points, lengths, Tangent(spline.StartTangent), Tangent(spline.EndTangent));
        return lengths.Select((h, i) => new FreeCurve(
            [points[i], points[i] + h / 3 * slopes[i], points[i + 1] - h / 3 * slopes[i + 1], points[i + 1]], [1, 1, 1, 1]));

        Point? Tangent(SpacePoint? stated)
        {
            if (stated is not { } vector)
            {
                return null;
            }

            var flat = project(vector) - project(default);
            return flat.Length > 0 ? flat / flat.Length : null;
        }
    }

    private static List<Point> Distinct(IEnumerable<Point> points)
    {
        var distinct = new List<Point>();
        foreach (var point in points)
        {
            if (distinct.Count == 0 || distinct[^1] != point)
            {
                distinct.Add(point);
            }
        }

        return distinct;
    }

    /// <summary>Slopes at the points: m₀ and mₙ stated, or the curvature zero there.</summary>
    private static Point[] Open(List<Point> points, double[] h, Point? start, Point? end)
    {
        var n = h.Length;
        var (lower, diagonal, upper, right) = (new double[n + 1], new double[n + 1], new double[n + 1], new Point[n + 1]);
        (diagonal[0], upper[0], right[0]) = start is { } first ? (1, 0, first) : (2, 1, 3 / h[0] * (points[1] - points[0]));
        (diagonal[n], lower[n], right[n]) = end is { } last ? (1, 0, last) : (2, 1, 3 / h[n - 1] * (points[n] - points[n - 1]));
        for (var i = 1; i < n; i++)
        {
            (lower[i], diagonal[i], upper[i], right[i]) = Row(points[i - 1], points[i], points[i + 1], h[i - 1], h[i]);
        }

        return Solved(lower, diagonal, upper, right);
    }

    /// <summary>Slopes of a closed curve: a cyclic system, as two tridiagonal ones (Sherman and Morrison).</summary>
    private static Point[] Periodic(List<Point> points, double[] h)
    {
        var n = h.Length;
        var (lower, diagonal, upper, right) = (new double[n], new double[n], new double[n], new Point[n]);
        for (var i = 0; i < n; i++)
        {
            var before = (i + n - 1) % n;
            (lower[i], diagonal[i], upper[i], right[i]) = Row(points[before], points[i], points[i + 1], h[before], h[i]);
        }

        var (corner, opposite, gamma) = (lower[0], upper[n - 1], -diagonal[0]);
        diagonal[0] -= gamma;
        diagonal[n - 1] -= corner * opposite / gamma;
        var unit = new Point[n];
        unit[0] = new Point(gamma, 0);
        unit[n - 1] = new Point(opposite, 0);
        var (y, z) = (Solved(lower, (double[])diagonal.Clone(), upper, right), Solved(lower, (double[])diagonal.Clone(), upper, unit));
        var factor = (y[0] + corner / gamma * y[n - 1]) / (1 + z[0].X + corner / gamma * z[n - 1].X);
        Point[] slopes = [.. y.Select((value, i) => value - z[i].X * factor)];
        return [.. slopes, slopes[0]];
    }

    private static (double Lower, double Diagonal, double Upper, Point Right) Row(Point before, Point here, Point next, double h, double k) =>
        (k, 2 * (h + k), h, 3 * (k / h * (here - before) + h / k * (next - here)));

    private static Point[] Solved(double[] lower, double[] diagonal, double[] upper, Point[] right)
    {
        var (d, x) = ((double[])diagonal.Clone(), (Point[])right.Clone());
        for (var i = 1; i < x.Length; i++)
        {
            var factor = lower[i] / d[i - 1];
            d[i] -= factor * upper[i - 1];
            x[i] -= factor * x[i - 1];
        }

        x[^1] /= d[^1];
        for (var i = x.Length - 2; i >= 0; i--)
        {
            x[i] = (x[i] - upper[i] * x[i + 1]) / d[i];
        }

        return x;
    }
}
