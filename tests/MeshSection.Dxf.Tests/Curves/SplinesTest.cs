using System.Collections.Immutable;
using CsCheck;
using MeshSection.Dxf.Curves;
using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Space;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Tests.Curves;

/// <summary>Splines cut into Bézier pieces, against the definition of a B-spline.</summary>
public class SplinesTest
{
    private static readonly Gen<Spline> AnySpline =
        from degree in Gen.Int[1, 5]
        from count in Gen.Int[degree + 1, degree + 8]
        from controls in Gen.Select(Gen.Double[-50, 50], Gen.Double[-50, 50], (x, y) => new SpacePoint(x, y, 0)).Array[count]
        from weights in Gen.Double[0.3, 3].Array[count]
        from steps in Gen.OneOf(Gen.Const(0.0), Gen.Double[0.1, 2]).Array[count + degree + 1]
        let knots = steps.Aggregate(new List<double> { 0 }, (sum, step) => [.. sum, sum[^1] + step])[1..]
        where knots[count] - knots[degree] > 0.1 && AllWithin(knots, degree)
        select new Spline(degree, [.. knots], [.. controls], [.. weights], [], null, null, false);

    [Fact]
    public void Pieces_are_the_spline_by_its_definition() => AnySpline.Sample(spline =>
    {
        var pieces = SplineCurves.Of(spline, p => new Point(p.X, p.Y)).Cast<FreeCurve>().ToArray();
        var spans = Enumerable.Range(spline.Degree, spline.Controls.Length - spline.Degree)
            .Where(i => spline.Knots[i + 1] > spline.Knots[i]).ToArray();
        Assert.Equal(spans.Length, pieces.Length);
        for (var k = 0; k < spans.Length; k++)
        {
            for (var j = 0; j <= 4; j++)
            {
                var t = 0.02 + 0.24 * j;
                var u = spline.Knots[spans[k]] + t * (spline.Knots[spans[k] + 1] - spline.Knots[spans[k]]);
                Assert.Equal(0, ByDefinition(spline, u).DistanceTo(Value(pieces[k], t)), 1e-9);
            }
        }
    });

    [Fact]
    public void A_fitted_curve_runs_through_its_points_with_continuous_slope_and_curvature() =>
        Gen.Select(Gen.Double[1, 10].Array[4, 9], Gen.Bool, Gen.Bool).Sample((radii, isClosed, hasTangents) =>
        {
            var points = radii.Select((r, i) => new SpacePoint(r * Math.Cos(6.0 * i / radii.Length), r * Math.Sin(6.0 * i / radii.Length), 0)).ToImmutableArray();
            var tangent = hasTangents && !isClosed ? new SpacePoint(0, 2, 0) : (SpacePoint?)null;
            var spline = new Spline(3, [], [], [], points, tangent, tangent, isClosed);
            var curves = SplineCurves.Of(spline, p => new Point(p.X, p.Y)).Cast<FreeCurve>().ToArray();
            Assert.Equal(isClosed ? points.Length : points.Length - 1, curves.Length);
            for (var i = 0; i < curves.Length; i++)
            {
                Assert.Equal(new Point(points[i].X, points[i].Y), curves[i].Controls[0]);
                if (i + 1 < curves.Length || isClosed)
                {
                    var (c, d) = (curves[i].Controls, curves[(i + 1) % curves.Length].Controls);
                    var (h, k) = (c[0].DistanceTo(c[3]), d[0].DistanceTo(d[3]));
                    Assert.Equal(0, ((c[3] - c[2]) / h).DistanceTo((d[1] - d[0]) / k), 1e-10);
                    Assert.Equal(0, ((c[3] - 2 * c[2] + c[1]) / (h * h)).DistanceTo((d[2] - 2 * d[1] + d[0]) / (k * k)), 1e-9);
                }
            }

            if (tangent is not null)
            {
                Assert.Equal(0, (curves[0].Controls[1] - curves[0].Controls[0]).Cross(new Point(0, 1)), 1e-12);
            }
            else if (!isClosed)
            {
                var first = curves[0].Controls;
                Assert.Equal(0, (first[0] - 2 * first[1] + first[2]).Length, 1e-10);
            }
        });

    private static bool AllWithin(List<double> knots, int degree) =>
        Enumerable.Range(0, knots.Count - degree - 1).All(i => knots[i + degree + 1] > knots[i]);

    /// <summary>Σ wᵢ Nᵢ Pᵢ / Σ wᵢ Nᵢ with Cox and de Boor's recursion for N.</summary>
    private static Point ByDefinition(Spline spline, double u)
    {
        var (sum, weight) = (Point.Origin, 0.0);
        for (var i = 0; i < spline.Controls.Length; i++)
        {
            var part = spline.Weights[i] * Basis(spline.Knots, i, spline.Degree, u);
            sum += part * new Point(spline.Controls[i].X, spline.Controls[i].Y);
            weight += part;
        }

        return sum / weight;
    }

    private static double Basis(ImmutableArray<double> knots, int i, int p, double u)
    {
        if (p == 0)
        {
            return u >= knots[i] && u < knots[i + 1] ? 1 : 0;
        }

        var (left, right) = (knots[i + p] - knots[i], knots[i + p + 1] - knots[i + 1]);
        return (left > 0 ? (u - knots[i]) / left * Basis(knots, i, p - 1, u) : 0) +
            (right > 0 ? (knots[i + p + 1] - u) / right * Basis(knots, i + 1, p - 1, u) : 0);
    }

    private static Point Value(FreeCurve curve, double t)
    {
        var w = Bernstein.Value([.. curve.Weights], t);
        return new Point(
            Bernstein.Value([.. curve.Controls.Zip(curve.Weights, (c, k) => k * c.X)], t) / w,
            Bernstein.Value([.. curve.Controls.Zip(curve.Weights, (c, k) => k * c.Y)], t) / w);
    }
}
