using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Meshing;

namespace MeshSection.Tests.Meshing;

public class MeshCheckTests
{
    private static readonly PlanarGraph Graph = HostileGraphs.All["inclusion"];

    private static readonly Mesh Sound = DelaunayMesherTests.Sound(Graph, new MeshSettings { MaxArea = 40 });

    [Fact]
    public void A_sound_mesh_has_no_faults() => Assert.Empty(MeshCheck.Faults(Sound, Graph));

    [Fact]
    public void A_missing_entry_is_found() =>
        AssertFault(MeshFaultKind.Structure, With(neighbours: Sound.Neighbours.RemoveAt(0)));

    [Fact]
    public void A_corner_that_is_no_node_is_found() =>
        AssertFault(MeshFaultKind.Structure, With(corners: Sound.Corners.SetItem(5, Sound.Nodes.Length)));

    [Fact]
    public void A_moved_point_is_found() =>
        AssertFault(MeshFaultKind.MovedPoint, With(nodes: Sound.Nodes.SetItem(2, Sound.Nodes[2] + new Point(1e-9, 0))));

    [Fact]
    public void A_triangle_turned_over_is_found()
    {
        ImmutableArray<int> corners = Sound.Corners.SetItem(0, Sound.Corners[1]).SetItem(1, Sound.Corners[0]);
        AssertFault(MeshFaultKind.Orientation, With(corners: corners));
    }

    [Fact]
    public void A_neighbour_that_does_not_know_its_neighbour_is_found()
    {
        int e = Enumerable.Range(0, Sound.Neighbours.Length).First(e => Sound.Neighbours[e] >= 0);
        AssertFault(MeshFaultKind.Neighbour, With(neighbours: Sound.Neighbours.SetItem(e, -1)));
        AssertFault(MeshFaultKind.Neighbour, With(neighbours: Sound.Neighbours.SetItem(e, e / 3)));
    }

    [Fact]
    public void A_triangle_of_the_wrong_region_is_found()
    {
        int atSegment = Enumerable.Range(0, Sound.Segments.Length).First(e => Sound.Segments[e] >= 0) / 3;
        AssertFault(MeshFaultKind.Region, With(regions: Sound.Regions.SetItem(atSegment, 1 - Sound.Regions[atSegment])));
        AssertFault(MeshFaultKind.Region, With(regions: Sound.Regions.SetItem(3, -1)));
    }

    [Fact]
    public void An_edge_without_its_segment_is_found()
    {
        int e = Enumerable.Range(0, Sound.Segments.Length).First(e => Sound.Segments[e] >= 0 && Sound.Neighbours[e] < 0);
        AssertFault(MeshFaultKind.OpenEdge, With(segments: Sound.Segments.SetItem(e, -1)));
    }

    [Fact]
    public void A_node_off_its_segment_is_found()
    {
        int e = Enumerable.Range(0, Sound.Segments.Length).First(e => Sound.Segments[e] == 0 && Sound.Corners[After(e)] >= Graph.Points.Length);
        int node = Sound.Corners[After(e)];
        Point moved = Sound.Nodes[node] + new Point(0, 1e-9);
        AssertFault(MeshFaultKind.BrokenSegment, With(nodes: Sound.Nodes.SetItem(node, moved)));
    }

    [Fact]
    public void A_missing_triangle_is_found()
    {
        PlanarGraph graph = Graphs.Of(Graphs.Rectangle(0, 0, 10, 10), Graphs.Rectangle(20, 0, 10, 10));
        PlanarGraph half = graph with { Segments = graph.Segments[..4] };
        Mesh mesh = DelaunayMesherTests.Sound(half, new MeshSettings());
        ImmutableArray<MeshFault> faults = MeshCheck.Faults(mesh, graph);
        Assert.Contains(faults, fault => fault.Kind == MeshFaultKind.Area);
        Assert.Contains(faults, fault => fault.Kind == MeshFaultKind.EulerCount);
        Assert.Contains(faults, fault => fault is { Kind: MeshFaultKind.BrokenSegment, Index: 5 });
    }

    [Fact]
    public void An_edge_that_should_be_flipped_is_found()
    {
        PlanarGraph graph = Graphs.Of(Graphs.Polygon(0, 0, 10, -3, 20, 0, 10, 3));
        var mesh = new Mesh(graph.Points, [0, 1, 2, 0, 2, 3], [-1, 1, -1, -1, -1, 0], [0, 0], [1, -1, 0, 2, 3, -1], []);
        AssertFault(MeshFaultKind.NotDelaunay, mesh, graph);
    }

    [Fact]
    public void Quality_is_measured()
    {
        PlanarGraph graph = Graphs.Of(Graphs.Polygon(0, 0, 4, 0, 0, 3));
        MeshQuality quality = MeshQuality.Of(DelaunayMesherTests.Sound(graph, new MeshSettings()));
        Assert.Equal((3, 1), (quality.Nodes, quality.Triangles));
        Assert.Equal(Math.Atan2(3, 4) * 180 / Math.PI, quality.SmallestAngle, 12);
        Assert.Equal(new Point(4, 0), quality.SmallestAnglePlace);
        Assert.Equal(0, quality.SmallestAngleTriangle);
        Assert.Equal(90, quality.LargestAngle, 12);
        Assert.Equal(6, quality.LargestArea, 12);
        Assert.Equal([0, 0, 0, 1, 0, 1, 0, 0, 0, 1, 0, 0, 0, 0, 0, 0, 0, 0], quality.AngleHistogram);
    }

    private static void AssertFault(MeshFaultKind kind, Mesh mesh, PlanarGraph? graph = null) =>
        Assert.Contains(MeshCheck.Faults(mesh, graph ?? Graph), fault => fault.Kind == kind);

    private static int After(int e) => e - e % 3 + (e + 1) % 3;

    private static Mesh With(
        ImmutableArray<Point>? nodes = null,
        ImmutableArray<int>? corners = null,
        ImmutableArray<int>? neighbours = null,
        ImmutableArray<int>? regions = null,
        ImmutableArray<int>? segments = null) => new(
            nodes ?? Sound.Nodes,
            corners ?? Sound.Corners,
            neighbours ?? Sound.Neighbours,
            regions ?? Sound.Regions,
            segments ?? Sound.Segments,
            Sound.Unrefined);
}
