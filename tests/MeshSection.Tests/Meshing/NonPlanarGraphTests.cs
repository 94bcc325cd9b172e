using MeshSection.Geometry;
using MeshSection.Meshing;
using static MeshSection.Tests.Meshing.Graphs;

namespace MeshSection.Tests.Meshing;

public class NonPlanarGraphTests
{
    [Fact]
    public void Crossing_segments_are_named_with_the_place()
    {
        PlanarGraph graph = Graphs.Of(Polygon(0, 0, 10, 10, 10, 0, 0, 10));
        MeshingException thrown = Assert.Throws<MeshingException>(() => Mesh(graph));
        Assert.Equal((0, 2), (thrown.First, thrown.Second));
        Assert.Equal(5, thrown.Point.X, 12);
        Assert.Equal(5, thrown.Point.Y, 12);
    }

    [Fact]
    public void A_point_on_a_segment_is_named_with_it()
    {
        PlanarGraph graph = new Graphs().Loop(Rectangle(0, 0, 10, 10), 0, -1).Dot(new(4, 0)).Build();
        MeshingException thrown = Assert.Throws<MeshingException>(() => Mesh(graph));
        Assert.Equal((0, -1), (thrown.First, thrown.Second));
        Assert.Equal(new Point(4, 0), thrown.Point);
    }

    [Fact]
    public void A_segment_that_runs_on_through_a_corner_is_refused()
    {
        PlanarGraph graph = new Graphs().Loop(Rectangle(0, 0, 10, 10), 0, -1)
            .Line(new(0, 0), new(10, 10), 0, 0).Line(new(3, 3), new(8, 3), 0, 0).Build();
        MeshingException thrown = Assert.Throws<MeshingException>(() => Mesh(graph));
        Assert.Equal((4, -1), (thrown.First, thrown.Second));
        Assert.Equal(new Point(3, 3), thrown.Point);
    }

    [Fact]
    public void The_same_segment_twice_is_refused()
    {
        PlanarGraph graph = Graphs.Of(Rectangle(0, 0, 10, 10));
        graph = graph with { Segments = graph.Segments.Add(new Segment(1, 0, -1, 0)) };
        MeshingException thrown = Assert.Throws<MeshingException>(() => Mesh(graph));
        Assert.Equal((0, 4), (thrown.First, thrown.Second));
        Assert.Equal(new Point(5, 0), thrown.Point);
    }

    [Fact]
    public void A_crossing_by_the_last_digit_is_seen()
    {
        double tip = Math.BitIncrement(10.0);
        PlanarGraph graph = Graphs.Of(Polygon(0, 0, 20, 0, 20, 20, 0, 20), Hole(Polygon(0.5, 10, tip, 5, tip, 15)));
        Mesh(graph);
        graph = new Graphs().Loop(Rectangle(0, 0, 20, 20), 0, -1)
            .Line(new(10, 0), new(10, 20), 0, 0).Line(new(5, 5), new(tip, 6), 0, 0).Build();
        Assert.Throws<MeshingException>(() => Mesh(graph));
        graph = new Graphs().Loop(Rectangle(0, 0, 20, 20), 0, -1)
            .Line(new(5, 5), new(Math.BitDecrement(10.0), 6), 0, 0).Build();
        Mesh(graph);
    }

    [Fact]
    public void An_open_region_is_refused()
    {
        PlanarGraph closed = Graphs.Of(Rectangle(0, 0, 10, 10));
        PlanarGraph open = closed with { Segments = closed.Segments.RemoveAt(2) };
        Assert.Throws<ArgumentException>(() => Mesh(open));
    }

    [Fact]
    public void Segments_that_contradict_each_other_are_refused()
    {
        PlanarGraph graph = Graphs.Of(Rectangle(0, 0, 10, 10));
        graph = graph with { Segments = graph.Segments.SetItem(3, graph.Segments[3] with { Left = 7 }) };
        Assert.Throws<ArgumentException>(() => Mesh(graph));
    }

    [Fact]
    public void Malformed_graphs_are_refused()
    {
        PlanarGraph graph = Graphs.Of(Rectangle(0, 0, 10, 10));
        Assert.Throws<ArgumentException>(() => Mesh(graph with { Points = graph.Points.Add(new(10, 10)) }));
        Assert.Throws<ArgumentException>(() => Mesh(graph with { Points = graph.Points.Add(new(double.NaN, 10)) }));
        Assert.Throws<ArgumentException>(() => Mesh(graph with { Points = graph.Points.Add(new(5, 1e100)) }));
        Assert.Throws<ArgumentException>(() => Mesh(graph with { Segments = graph.Segments.Add(new(0, 4, 0, 0)) }));
        Assert.Throws<ArgumentException>(() => Mesh(graph with { Segments = graph.Segments.Add(new(-1, 2, 0, 0)) }));
        Assert.Throws<ArgumentException>(() => Mesh(graph with { Segments = graph.Segments.Add(new(2, 2, 0, 0)) }));
    }

    [Fact]
    public void Settings_out_of_range_are_refused()
    {
        PlanarGraph graph = Graphs.Of(Rectangle(0, 0, 10, 10));
        foreach (MeshSettings settings in new MeshSettings[]
        {
            new() { MinAngle = -1 }, new() { MinAngle = 34 }, new() { MinAngle = double.NaN },
            new() { MaxArea = 0 }, new() { MaxArea = double.NaN },
        })
        {
            Assert.Throws<ArgumentOutOfRangeException>(() => Mesh(graph, settings));
        }
    }

    private static Mesh Mesh(PlanarGraph graph, MeshSettings? settings = null) =>
        new DelaunayMesher().Triangulate(graph, settings ?? new MeshSettings(), TestContext.Current.CancellationToken);
}
