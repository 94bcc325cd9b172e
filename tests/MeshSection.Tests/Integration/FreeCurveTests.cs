using CsCheck;
using MeshSection.Geometry;
using MeshSection.Integration;

namespace MeshSection.Tests.Integration;

/// <summary>Sections bounded by ellipses and splines: closed forms, and the two integrators against each other.</summary>
public class FreeCurveTests
{
    private static readonly double Quarter = Math.Sqrt(0.5);

    /// <summary>An ellipse as four exact quarters, from the affine image of the unit circle.</summary>
    private static Boundary Ellipse(Point centre, Point major, Point minor)
    {
        Point[] square = [new(1, 0), new(1, 1), new(0, 1), new(-1, 1), new(-1, 0), new(-1, -1), new(0, -1), new(1, -1)];
        var image = square.Select(p => centre + p.X * major + p.Y * minor).ToArray();
        return Boundary.Create(Enumerable.Range(0, 4).SelectMany(q => BezierPieces.Of(
            [image[2 * q], image[2 * q + 1], image[(2 * q + 2) % 8]], [1, Quarter, 1], 0)));
    }

    [Fact]
    public void An_ellipse_has_its_closed_forms() =>
        Gen.Select(Gen.Double[1, 100], Gen.Double[0.01, 1], Gen.Double[-Math.PI, Math.PI], Gen.Double[-50, 50]).Sample((a, ratio, angle, x) =>
        {
            // Ix = π a b³ / 4 about its own axes [YoungBudynas2002], turned by the law of the tensor.
            var b = ratio * a;
            var outline = Outline.Create([Ellipse(new Point(x, 3), a * Point.Direction(angle), b * Point.Direction(angle).Left())]);
            var moments = new BoundaryIntegrator(outline).Moments(new Point(x, 3));
            var (sin, cos) = Math.SinCos(angle);
            var (along, across) = (Math.PI * a * a * a * b / 4, Math.PI * a * b * b * b / 4);
            Assert.Equal(1, moments.Area / (Math.PI * a * b), 1e-13);
            Assert.Equal(1, moments.XX / (along * cos * cos + across * sin * sin), 1e-12);
            Assert.Equal(1, moments.YY / (along * sin * sin + across * cos * cos), 1e-12);
            Assert.Equal((along - across) * sin * cos, moments.XY, 1e-12 * along);
        });

    [Fact]
    public void A_parabolic_segment_has_its_closed_forms()
    {
        // Under y = h (1 - x²/c²): A = 4/3 c h, centroid at 2/5 h, ∫ y² dA = 32/105 c h³, ∫ x² dA = 4/15 h c³.
        const double C = 30, H = 20;
        var outline = Outline.Create([Boundary.Create(
            [new LineEdge(new(-C, 0), new(C, 0)), .. BezierPieces.Of([new(C, 0), new(0, 2 * H), new(-C, 0)], [1, 1, 1], 0)])]);
        var (flat, mesh) = Pipeline.Mesh(outline);
        foreach (IIntegrator integrator in new IIntegrator[] { new FiberIntegrator(mesh, flat), new BoundaryIntegrator(outline) })
        {
            var moments = integrator.Moments(Point.Origin);
            Assert.Equal(1, moments.Area / (4.0 / 3 * C * H), 1e-13);
            Assert.Equal(0.4 * H, moments.Centroid.Y, 1e-12);
            Assert.Equal(1, moments.YY / (32.0 / 105 * C * H * H * H), 1e-13);
            Assert.Equal(1, moments.XX / (4.0 / 15 * H * C * C * C), 1e-13);
        }
    }

    [Fact]
    public void On_random_smooth_outlines_fibers_and_boundary_agree() =>
        Gen.Select(Gen.Double[20, 100].Array[5, 9], Gen.Double[0.3, 3].Array[9], Gen.Double[-Math.PI, Math.PI], Gen.Double[-0.4, 0.4]).Sample(
            (radii, weights, angle, reach) =>
            {
                // A star of points about the origin; between the middles of its sides, conics with the points as control points.
                var n = radii.Length;
                var star = radii.Select((r, i) => r * Point.Direction(Math.Tau * i / n)).ToArray();
                var edges = Enumerable.Range(0, n).SelectMany(i => BezierPieces.Of(
                    [0.5 * (star[(i + n - 1) % n] + star[i]), star[i], 0.5 * (star[i] + star[(i + 1) % n])], [1, weights[i], 1], 0));
                var outline = Outline.Create([Boundary.Create(edges)]);
                var (flat, mesh) = Pipeline.Mesh(outline);
                var (fiber, boundary) = (new FiberIntegrator(mesh, flat), new BoundaryIntegrator(outline));
                var (f, b) = (fiber.Moments(Point.Origin), boundary.Moments(Point.Origin));
                Assert.Equal(1, f.Area / b.Area, 1e-12);
                Assert.Equal(1, f.XX / b.XX, 1e-12);
                Assert.Equal(1, f.YY / b.YY, 1e-12);
                Assert.Equal(f.XY, b.XY, 1e-12 * Math.Sqrt(b.XX * b.YY));
                var normal = Point.Direction(angle);
                var (fBeyond, bBeyond) = (fiber.Beyond(normal, 100 * reach), boundary.Beyond(normal, 100 * reach));
                Assert.Equal(fBeyond.Area, bBeyond.Area, 1e-12 * b.Area);
                Assert.Equal(fBeyond.Moment, bBeyond.Moment, 1e-12 * b.Area * 100);
            },
            iter: 60);

    [Fact]
    public void Torsion_of_an_ellipse_is_the_closed_form()
    {
        // J = π a³ b³ / (a² + b²) [YoungBudynas2002, table 10.1].
        const double A = 60, B = 25;
        var outline = Outline.Create([Ellipse(Point.Origin, new(A, 0), new(0, B))]);
        var (flat, mesh) = Pipeline.Mesh(outline, 1000);
        var torsion = MeshSection.Torsion.TorsionAnalysis.Of(flat, mesh);
        var exact = Math.PI * A * A * A * B * B * B / (A * A + B * B);
        Assert.InRange(exact, torsion.TorsionConstant.Lower, torsion.TorsionConstant.Upper);
        Assert.Equal(1, torsion.TorsionConstant.Value / exact, 1e-7);
    }
}
