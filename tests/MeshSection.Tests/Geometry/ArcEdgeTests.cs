using CsCheck;
using MeshSection.Geometry;

namespace MeshSection.Tests.Geometry;

public class ArcEdgeTests
{
    private static readonly Gen<ArcEdge> AnyArc =
        from x in Gen.Double[-100, 100]
        from y in Gen.Double[-100, 100]
        from length in Gen.Double[0.1, 100]
        from angle in Gen.Double[-Math.PI, Math.PI]
        from bulge in Gen.Double[1e-6, 8]
        from left in Gen.Bool
        select new ArcEdge(
            new Point(x, y), new Point(x, y) + length * Point.Direction(angle), left ? bulge : -bulge);

    [Fact]
    public void Every_point_lies_at_the_radius_from_the_centre() => Gen.Select(AnyArc, Gen.Double[0, 1]).Sample((arc, t) =>
    {
        // A flat arc has its centre far away: the centre's own rounding, not the point's, sets the tolerance.
        var tolerance = 1e-12 * (100 + arc.Radius);
        Assert.Equal(arc.Radius, arc.PointAt(t).DistanceTo(arc.Centre), tolerance);
        Assert.Equal(arc.Radius, arc.Start.DistanceTo(arc.Centre), tolerance);
    });

    [Fact]
    public void Fractions_are_fractions_of_the_length() => Gen.Select(AnyArc, Gen.Double[0.01, 0.99]).Sample((arc, t) =>
    {
        var (head, tail) = (arc.Part(0, t), arc.Part(t, 1));
        Assert.Equal(t * arc.Length, head.Length, 1e-11 * arc.Length);
        Assert.Equal(arc.Length, head.Length + tail.Length, 1e-11 * arc.Length);
        Assert.Equal(arc.Start, head.Start);
        Assert.Equal(head.End, tail.Start);
        Assert.Equal(arc.End, tail.End);
    });

    [Fact]
    public void Tangent_is_the_derivative_of_the_point() => Gen.Select(AnyArc, Gen.Double[0.05, 0.95]).Sample((arc, t) =>
    {
        const double Step = 1e-5;
        var slope = (arc.PointAt(t + Step) - arc.PointAt(t - Step)) / (2 * Step * arc.Length);
        Assert.Equal(0, slope.DistanceTo(arc.TangentAt(t)), 1e-8);
    });

    [Fact]
    public void Start_angle_points_from_centre_to_start() => AnyArc.Where(a => Math.Abs(a.Bulge) > 0.01).Sample(arc =>
    {
        var start = arc.Centre + arc.Radius * Point.Direction(arc.StartAngle);
        Assert.Equal(0, start.DistanceTo(arc.Start), 1e-9 * (1 + arc.Radius));
    });

    [Fact]
    public void Bounds_hold_the_arc_and_are_reached_on_every_side() => AnyArc.Sample(arc =>
    {
        var box = arc.Bounds;
        var reach = Box.Empty;
        for (var i = 0; i <= 4000; i++)
        {
            reach = reach.With(arc.PointAt(i / 4000.0));
        }

        // 4000 samples miss an extreme by at most r (θ / 8000)² / 2.
        var missed = arc.Radius * Math.Pow(arc.Sweep / 8000, 2) / 2 + 1e-12 * (100 + arc.Radius);
        Assert.Equal(box.MinX, reach.MinX, missed);
        Assert.Equal(box.MaxX, reach.MaxX, missed);
        Assert.Equal(box.MinY, reach.MinY, missed);
        Assert.Equal(box.MaxY, reach.MaxY, missed);
    });

    [Fact]
    public void Crossings_lie_on_the_line_and_none_is_missed() =>
        Gen.Select(AnyArc, Gen.Double[-Math.PI, Math.PI], Gen.Double[0.1, 0.9]).Sample((arc, angle, t) =>
        {
            var normal = Point.Direction(angle);
            var offset = normal.Dot(arc.PointAt(t));
            var roots = arc.Crossings(normal, offset);
            Assert.Contains(roots, root => Math.Abs(normal.Dot(arc.PointAt(root)) - offset) < 1e-11 * (100 + arc.Length));
            var turning = arc.Turnings(normal).Select(u => Math.Abs(u - t)).DefaultIfEmpty(1).Min();
            if (turning > 1e-4)
            {
                Assert.Contains(roots, root => Math.Abs(root - t) < 1e-8);
            }
        });

    [Fact]
    public void Mirroring_reverses_the_bulge_and_keeps_the_curve()
    {
        var arc = new ArcEdge(new Point(1, 2), new Point(4, 3), 0.4);
        var placed = (ArcEdge)arc.Placed(new Placement(new Point(10, 0), Math.PI / 2, 2, true));
        Assert.Equal(new Point(10 - 2 * 2, 2 * -1), placed.Start);
        Assert.Equal(-0.4, placed.Bulge);
        Assert.Equal(2 * arc.Length, placed.Length, 12);
    }
}
