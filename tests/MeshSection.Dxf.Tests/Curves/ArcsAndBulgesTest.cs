using MeshSection.Geometry;
using MeshSection.Integration;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Curves;

public class ArcsAndBulgesTest
{
    [Theory]
    [InlineData(1)]
    [InlineData(-1)]
    [InlineData(0.3)]
    [InlineData(2.5)]
    [InlineData(40)]
    [InlineData(1e-9)]
    public void The_area_under_a_bulge_is_that_of_its_segment(double bulge)
    {
        // Chord 2 upon a square of side 2: r = c (1 + b²) / (4 b), segment r² (θ - sin θ) / 2 with θ = 4 atan b.
        var outline = Outline(Drawing([LwPolyline([(0, 0, bulge), (2, 0, 0), (2, 200, 0), (0, 200, 0)])])).Outline;
        var (r, θ) = (2 * (1 + bulge * bulge) / (4 * bulge), 4 * Math.Atan(bulge));
        var segment = Math.Abs(bulge) < 1e-6 ? 4 * bulge / 3 : Math.Sign(bulge) * r * r * (Math.Abs(θ) - Math.Sin(Math.Abs(θ))) / 2;
        Assert.Equal(400 + segment, new BoundaryIntegrator(outline).Moments(new Point(0, 0)).Area, 1e-13 * (400 + segment));
        Assert.All(outline.Boundaries[0].Boundary.Edges, e => Assert.True(e is not ArcEdge a || Math.Abs(a.Bulge) <= 1));
    }

    [Theory]
    [InlineData(1e-14, false)]
    [InlineData(1e-9, true)]
    public void Only_an_arc_that_no_one_could_see_is_a_line(double bulge, bool isArc)
    {
        var edges = Outline(Drawing([LwPolyline([(0, 0, bulge), (10, 0, 0), (10, 10, 0)])])).Outline.Boundaries[0].Boundary.Edges;
        Assert.Equal(isArc, edges.Any(e => e is ArcEdge));
    }

    public static TheoryData<string> Circles =>
    [
        Circle(3, 4, 2),
        Arc(3, 4, 2, 0, 360),
        Arc(3, 4, 2, -180, 180),
        Arc(3, 4, 2, 0, 180) + Arc(3, 4, 2, 180, 360),
        LwPolyline([(1, 4, 1), (5, 4, 1)]),
        LwPolyline([(5, 4, -1), (1, 4, -1)]),
        Polyline([(1, 4, 1), (5, 4, 1)]),
    ];

    [Theory]
    [MemberData(nameof(Circles))]
    public void A_circle_is_the_same_two_half_circles_however_it_is_drawn(string text)
    {
        var outline = Outline(Drawing([text])).Outline;
        var edges = Assert.Single(outline.Boundaries).Boundary.Placed(Placement.Moved(outline.Origin.X, outline.Origin.Y)).Edges;
        Assert.Equal([new ArcEdge(new(1, 4), new(5, 4), 1), new ArcEdge(new(5, 4), new(1, 4), 1)], edges);
    }

    [Theory]
    [InlineData(350, 10, 20)]
    [InlineData(10, 350, 340)]
    [InlineData(-10, 730, 20)]
    [InlineData(90, 91, 1)]
    [InlineData(0, 180, 180)]
    [InlineData(0, 359.999, 359.999)]
    public void An_arc_runs_counter_clockwise_from_its_start_to_its_end(double from, double to, double sweep)
    {
        var arc = Read(Drawing([Arc(1, 2, 5, from, to)])).Entities[0];
        var placed = new Dxf.Placing.PlacedEntity(arc, arc.Source, Dxf.Space.SpaceMap.Identity);
        var edges = new List<Edge>();
        var curve = Assert.Single(Dxf.Curves.EntityCurves.Of(placed, Dxf.Curves.DrawingPlane.Own));
        Dxf.Curves.CurveEdges.Append(curve, new Dxf.Curves.LocalFrame(default, default, 1), edges);
        Assert.Equal(sweep, edges.Sum(e => ((ArcEdge)e).Sweep) * 180 / Math.PI, 1e-9);
        Assert.Equal(sweep > 180 ? 2 : 1, edges.Count);
        Assert.All(edges, e => Assert.Equal(5, ((ArcEdge)e).Radius, 1e-12));
    }

    [Fact]
    public void Directions_at_quarter_turns_and_their_mirror_images_are_exact()
    {
        Assert.Equal(
            [new(1, 0), new(0, 1), new(-1, 0), new(0, -1), new(1, 0)],
            new double[] { 0, 90, 180, 270, 360 }.Select(Dxf.Curves.Degrees.Direction));
        for (var angle = -400; angle < 400; angle++)
        {
            var p = Dxf.Curves.Degrees.Direction(angle);
            Assert.Equal(new Point(-p.X, p.Y), Dxf.Curves.Degrees.Direction(180 - angle));
            Assert.Equal(Math.Cos(angle * Math.PI / 180), p.X, 1e-14);
            Assert.Equal(Math.Sin(angle * Math.PI / 180), p.Y, 1e-14);
        }
    }
}
