using MeshSection.Geometry;
using MeshSection.Meshing;
using static MeshSection.Tests.Meshing.Graphs;

namespace MeshSection.Tests.Meshing;

public class DelaunayMesherTests
{
    private const double Slack = 1e-5;

    public static TheoryData<string> Names => [.. HostileGraphs.All.Keys];

    [Theory]
    [MemberData(nameof(Names))]
    public void A_hostile_outline_is_covered_soundly_and_finely(string name)
    {
        PlanarGraph graph = HostileGraphs.All[name];
        Mesh mesh = Sound(graph, new MeshSettings());
        AssertQuality(mesh, 28);
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void A_hostile_outline_is_covered_without_refinement(string name)
    {
        PlanarGraph graph = HostileGraphs.All[name];
        Mesh mesh = Sound(graph, new MeshSettings { MinAngle = 0 });
        Assert.Equal(graph.Points.Length, mesh.Nodes.Length);
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void A_hostile_outline_may_be_turned_and_ask_for_33_degrees(string name)
    {
        PlanarGraph graph = Moved(HostileGraphs.All[name], 1, 0.3, new Point(0.1, -7));
        AssertQuality(Sound(graph, new MeshSettings { MinAngle = 33 }), 33);
    }

    [Theory]
    [InlineData(1e-3, 0)]
    [InlineData(1e6, 0)]
    [InlineData(1, 1e6)]
    [InlineData(1e3, 1e7)]
    public void Scale_and_distance_from_the_origin_do_no_harm(double scale, double shift)
    {
        foreach (string name in new[] { "L", "plate with 40 holes", "fan of 20 segments", "ring", "inclusion" })
        {
            PlanarGraph graph = Moved(HostileGraphs.All[name], scale, 0.7, new Point(shift, -2 * shift));
            AssertQuality(Sound(graph, new MeshSettings()), 28);
        }
    }

    [Theory]
    [InlineData(0.01)]
    [InlineData(0.1)]
    [InlineData(1)]
    [InlineData(5)]
    [InlineData(15)]
    [InlineData(27)]
    [InlineData(28)]
    [InlineData(30)]
    [InlineData(45)]
    [InlineData(59.999)]
    [InlineData(60)]
    public void A_wedge_keeps_its_corner_and_no_new_angle_is_small(double degrees)
    {
        foreach (double second in new[] { 100.0, 63, 17 })
        {
            PlanarGraph graph = Graphs.Of(Wedge(degrees, 100, second));
            Mesh mesh = Sound(graph, new MeshSettings { MaxArea = 50 });
            Assert.All(mesh.Unrefined, left => Assert.Equal(UnrefinedCause.InputAngle, left.Cause));
            double input = TriangleShape.SmallestAngle(graph.Points[0], graph.Points[1], graph.Points[2]);
            double smallest = MeshQuality.Of(mesh).SmallestAngle;
            Assert.InRange(smallest, Math.Min(28, LeastAcross(input)) - Slack, 60);
        }
    }

    [Fact]
    public void A_corner_equal_to_the_bound_is_left_alone()
    {
        foreach (double turn in new[] { 0, 0.1, 0.2, 0.3, 1, 2, 3 })
        {
            PlanarGraph graph = Moved(Graphs.Of(Wedge(30, 100, 100)), 1, turn, new Point(3, 4));
            Mesh mesh = Sound(graph, new MeshSettings { MinAngle = 30 });
            Assert.Equal(1, mesh.TriangleCount);
            Assert.Empty(mesh.Unrefined);
        }
    }

    [Theory]
    [InlineData(100)]
    [InlineData(3)]
    [InlineData(0.5)]
    public void No_triangle_is_larger_than_asked_for(double maxArea)
    {
        foreach (string name in new[] { "L", "ring", "islands in holes", "four materials around one point" })
        {
            Mesh mesh = Sound(HostileGraphs.All[name], new MeshSettings { MaxArea = maxArea });
            Assert.InRange(MeshQuality.Of(mesh).LargestArea, 0, maxArea);
            Assert.Empty(mesh.Unrefined);
        }
    }

    /// <summary>
    /// Counts of vertices that a published mesher of the same kind (Ruppert's refinement with off-centres, in C) gave for
    /// the same outlines: ours stays near them.
    /// </summary>
    [Theory]
    [InlineData("L", 20, 17, 1.05)]
    [InlineData("L", 30, 27, 1.05)]
    [InlineData("L", 33, 28, 1.05)]
    [InlineData("plate 1000 to 1", 20, 740, 1.1)]
    [InlineData("plate 1000 to 1", 30, 1223, 1.3)]
    [InlineData("plate 1000 to 1", 33, 1408, 1.3)]
    [InlineData("two segments at 2 and 5 degrees in a corner", 20, 43, 1.3)]
    [InlineData("two segments at 2 and 5 degrees in a corner", 30, 85, 2)]
    public void No_more_nodes_are_made_than_the_quality_needs(string name, double minAngle, int published, double factor)
    {
        Mesh mesh = Sound(HostileGraphs.All[name], new MeshSettings { MinAngle = minAngle });
        Assert.InRange(mesh.Nodes.Length, published / 2, factor * published);
    }

    /// <summary>At 30 degrees off-centres need about 30 % fewer triangles than circumcentres [Ungor2009].</summary>
    [Fact]
    public void Off_centres_keep_the_mesh_small()
    {
        Mesh mesh = Sound(HostileGraphs.All["lines through a cloud of points"], new MeshSettings { MinAngle = 30 });
        // 18 363 with circumcentres alone.
        Assert.InRange(mesh.TriangleCount, 10_000, 14_000);
    }

    [Fact]
    public void Area_alone_can_be_asked_for()
    {
        Mesh mesh = Sound(HostileGraphs.All["plate 1000 to 1"], new MeshSettings { MinAngle = 0, MaxArea = 5 });
        Assert.InRange(MeshQuality.Of(mesh).LargestArea, 1, 5);
    }

    [Fact]
    public void The_limit_on_nodes_is_kept_and_reported()
    {
        Mesh mesh = Sound(HostileGraphs.All["ring"], new MeshSettings { MaxArea = 1, MaxNodes = 1000 });
        Assert.Equal(1000, mesh.Nodes.Length);
        Assert.NotEmpty(mesh.Unrefined);
        Assert.All(mesh.Unrefined, left => Assert.Equal(UnrefinedCause.NodeLimit, left.Cause));
    }

    [Fact]
    public void Digits_that_run_out_are_reported()
    {
        PlanarGraph graph = Moved(Graphs.Of(Rectangle(0, 0, 1e-3, 1e-3)), 1, 0, new Point(1e9, 1e9));
        Mesh mesh = Sound(graph, new MeshSettings { MaxArea = 1e-12 });
        Assert.Contains(mesh.Unrefined, left => left.Cause == UnrefinedCause.LeastEdge);
    }

    [Fact]
    public void Points_keep_their_numbers_and_the_mesh_is_the_same_bit_for_bit()
    {
        foreach (PlanarGraph graph in HostileGraphs.All.Values.Take(12))
        {
            var settings = new MeshSettings { MaxArea = 20 };
            Mesh first = Sound(graph, settings);
            Mesh second = Sound(graph, settings);
            Assert.Equal(graph.Points.AsSpan(), first.Nodes.AsSpan()[..graph.Points.Length]);
            Assert.Equal(first.Nodes.AsSpan(), second.Nodes.AsSpan());
            Assert.Equal(first.Corners.AsSpan(), second.Corners.AsSpan());
            Assert.Equal(first.Neighbours.AsSpan(), second.Neighbours.AsSpan());
            Assert.Equal(first.Segments.AsSpan(), second.Segments.AsSpan());
        }
    }

    [Fact]
    public void Neighbours_in_the_plane_are_near_in_memory()
    {
        Mesh mesh = Sound(HostileGraphs.All["L"], new MeshSettings { MaxArea = 0.5 });
        double apart = 0;
        for (int e = 0; e < mesh.Neighbours.Length; e++)
        {
            if (mesh.Neighbours[e] >= 0) apart += Math.Abs(mesh.Neighbours[e] - e / 3);
        }
        Assert.InRange(apart / mesh.Neighbours.Length, 0, 0.05 * mesh.TriangleCount);
    }

    [Fact]
    public void A_segment_split_between_two_regions_has_the_same_nodes_on_both_sides()
    {
        Mesh mesh = Sound(HostileGraphs.All["two parts and a shared wall"], new MeshSettings { MaxArea = 5 });
        const int Wall = 10;
        int[] left = EdgesOf(mesh, Wall, 0);
        int[] right = EdgesOf(mesh, Wall, 1);
        Assert.True(left.Length > 4);
        Assert.Equal(left.Length, right.Length);
        Assert.All(left, e => Assert.Contains(mesh.Neighbours[e], right.Select(f => f / 3)));
    }

    [Fact]
    public void Nothing_to_cover_gives_no_triangles()
    {
        Assert.Equal(0, Sound(new PlanarGraph([], []), new MeshSettings()).TriangleCount);
        Assert.Equal(0, Sound(new PlanarGraph([new(1, 2)], []), new MeshSettings()).TriangleCount);
        PlanarGraph line = new([new(0, 0), new(1, 1), new(2, 2), new(5, 5)], [new(0, 1, -1, -1)]);
        Assert.Equal(0, Sound(line, new MeshSettings()).TriangleCount);
        PlanarGraph loose = new([new(0, 0), new(1, 1), new(2, 0), new(5, 5)], []);
        Assert.Equal(0, Sound(loose, new MeshSettings()).TriangleCount);
    }

    [Fact]
    public void Work_can_be_cancelled()
    {
        using var source = new CancellationTokenSource();
        source.Cancel();
        Assert.Throws<OperationCanceledException>(() => new DelaunayMesher().Triangulate(
            HostileGraphs.All["ring"], new MeshSettings { MaxArea = 0.01 }, source.Token));
    }

    internal static Mesh Sound(PlanarGraph graph, MeshSettings settings)
    {
        Mesh mesh = new DelaunayMesher().Triangulate(graph, settings, TestContext.Current.CancellationToken);
        Assert.Empty(MeshCheck.Faults(mesh, graph));
        return mesh;
    }

    /// <summary>Every angle keeps the bound, except in triangles that are listed as beside a corner of the outline.</summary>
    internal static void AssertQuality(Mesh mesh, double bound)
    {
        Assert.All(mesh.Unrefined, left => Assert.Equal(UnrefinedCause.InputAngle, left.Cause));
        HashSet<int> listed = [.. mesh.Unrefined.Select(left => left.Triangle)];
        for (int t = 0; t < mesh.TriangleCount; t++)
        {
            if (listed.Contains(t)) continue;
            double angle = TriangleShape.SmallestAngle(
                mesh.Nodes[mesh.Corners[3 * t]], mesh.Nodes[mesh.Corners[3 * t + 1]], mesh.Nodes[mesh.Corners[3 * t + 2]]);
            Assert.True(angle >= bound - Slack, $"Triangle {t} has an angle of {angle}.");
        }
    }

    /// <summary>[MillerPavWalkington2003]: no angle is smaller than arctan(sin t / (2 - cos t)), t the smallest input angle.</summary>
    private static double LeastAcross(double degrees)
    {
        (double sin, double cos) = Math.SinCos(degrees * Math.PI / 180);
        return Math.Atan2(sin, 2 - cos) * 180 / Math.PI;
    }

    private static int[] EdgesOf(Mesh mesh, int segment, int region) =>
        [.. Enumerable.Range(0, mesh.Segments.Length).Where(e => mesh.Segments[e] == segment && mesh.Regions[e / 3] == region)];
}
