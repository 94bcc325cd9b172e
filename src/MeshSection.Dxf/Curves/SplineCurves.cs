using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Space;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>
/// Cuts splines at their knots into rational Bézier curves, exactly: the control points of a piece are the values of the
/// spline's polar form at the knots on its two sides [PieglTiller1997, chapter 5].
/// </summary>
internal static class SplineCurves
{
    // Knots nearer than this part of their range are one.
    private const double KnotRounding = 1e-12;

    // Ends of neighbouring pieces nearer than this part of the spline's size are one point.
    private const double EndRounding = 1e-12;

    public static IEnumerable<PlaneCurve> Of(Spline spline, Func<SpacePoint, Point> project)
    {
        if (spline.Controls.IsEmpty)
        {
            return FitPointCurves.Of(spline, project);
        }

        Point[] controls = [.. spline.Controls.Select(project)];
        var (p, knots) = (spline.Degree, spline.Knots);
        var curves = new List<PlaneCurve>();
        var rounding = KnotRounding * (knots[controls.Length] - knots[p]);
        var size = controls.Aggregate(Box.Empty, (box, c) => box.With(c)).Diagonal;
        Point? end = null;
        for (var span = p; span < controls.Length; span++)
        {
            if (!(knots[span + 1] - knots[span] > rounding))
            {
                continue;
            }

            var (points, weights) = Piece(spline, controls, span);
            if (end is { } before && points[0].DistanceTo(before) <= EndRounding * size)
            {
                points[0] = before;
            }

            end = points[^1];
            curves.Add(new FreeCurve([.. points], [.. weights]));
        }

        Close(curves, EndRounding * size);
        return curves;
    }

    /// <summary>A spline that comes back to its start but for rounding ends in the same bits.</summary>
    private static void Close(List<PlaneCurve> curves, double rounding)
    {
        if (curves.Count > 0 && curves[0] is FreeCurve first && curves[^1] is FreeCurve last &&
            last.Controls.Length > 2 && first.Controls[0].DistanceTo(last.Controls[^1]) <= rounding)
        {
            curves[^1] = last with { Controls = last.Controls.SetItem(last.Controls.Length - 1, first.Controls[0]) };
        }
    }

    private static (Point[] Points, double[] Weights) Piece(Spline spline, Point[] controls, int span)
    {
        var p = spline.Degree;
        var (points, weights) = (new Point[p + 1], new double[p + 1]);
        var (left, right) = (spline.Knots[span], spline.Knots[span + 1]);
        Span<double> at = stackalloc double[p];
        for (var j = 0; j <= p; j++)
        {
            // p - j times the left knot, j times the right one.
            at[..(p - j)].Fill(left);
            at[(p - j)..].Fill(right);
            (points[j], weights[j]) = PolarForm(spline, controls, span, at);
        }

        return (points, weights);
    }

    /// <summary>De Boor's steps with another parameter in each.</summary>
    private static (Point Point, double Weight) PolarForm(Spline spline, Point[] controls, int span, ReadOnlySpan<double> at)
    {
        var (p, knots) = (spline.Degree, spline.Knots);
        Span<(Point Point, double Weight)> steps = stackalloc (Point, double)[p + 1];
        for (var i = 0; i <= p; i++)
        {
            var weight = spline.Weights[span - p + i];
            steps[i] = (weight * controls[span - p + i], weight);
        }

        for (var r = 1; r <= p; r++)
        {
            for (var i = p; i >= r; i--)
            {
                var (low, high) = (knots[span - p + i], knots[span + 1 + i - r]);
                var t = (at[r - 1] - low) / (high - low);
                steps[i] = (
                    (1 - t) * steps[i - 1].Point + t * steps[i].Point,
                    (1 - t) * steps[i - 1].Weight + t * steps[i].Weight);
            }
        }

        return (steps[p].Point / steps[p].Weight, steps[p].Weight);
    }
}
