using MeshSection.Geometry;
using MeshSection.Meshing;

namespace MeshSection.Tests.Meshing;

public class MeshSizingTests
{
    private static readonly DelaunayMesher Mesher = new();

    private static CancellationToken Token => TestContext.Current.CancellationToken;

    [Theory]
    [InlineData(1000)]
    [InlineData(4000)]
    [InlineData(50_000)]
    public void As_many_elements_are_made_as_wanted(int count)
    {
        foreach ((string name, double area) in new[] { ("L", 1900.0), ("rectangle", 20_000.0), ("inclusion", 2400.0) })
        {
            Mesh mesh = MeshSizing.ForCount(Mesher, HostileGraphs.All[name], new MeshSettings(), area, count, Token);
            Assert.InRange(mesh.TriangleCount, (1 - MeshSizing.CountTolerance) * count, (1 + MeshSizing.CountTolerance) * count);
            DelaunayMesherTests.AssertQuality(mesh, 28);
        }
    }

    [Fact]
    public void An_outline_that_needs_more_gets_no_more_than_it_needs()
    {
        PlanarGraph graph = HostileGraphs.All["plate 1000 to 1"];
        int needed = Mesher.Triangulate(graph, new MeshSettings(), Token).TriangleCount;
        Assert.Equal(needed, MeshSizing.ForCount(Mesher, graph, new MeshSettings(), 1000, 10, Token).TriangleCount);
    }

    [Fact]
    public void No_side_is_longer_than_asked_for()
    {
        foreach (string name in new[] { "L", "ring", "inclusion", "plate 1000 to 1", "fan of 20 segments" })
        {
            PlanarGraph graph = HostileGraphs.All[name];
            Mesh mesh = DelaunayMesherTests.Sound(graph, new MeshSettings { MaxSide = 3 });
            Assert.True(LongestSides(mesh).Max() <= 3);
            DelaunayMesherTests.AssertQuality(mesh, 28);
        }
    }

    [Fact]
    public void Each_region_has_a_size_of_its_own()
    {
        PlanarGraph graph = HostileGraphs.All["inclusion"];
        Mesh mesh = DelaunayMesherTests.Sound(graph, new MeshSettings { RegionMaxSides = [double.PositiveInfinity, 0.5] });
        double[] sides = LongestSides(mesh);
        Assert.True(sides.Where((_, t) => mesh.Regions[t] == 1).Max() <= 0.5);
        Assert.True(sides.Where((_, t) => mesh.Regions[t] == 0).Max() > 5);
    }

    [Fact]
    public void Triangles_follow_a_field_of_sizes()
    {
        PlanarGraph graph = HostileGraphs.All["rectangle"];
        var field = new Cone(new Point(70, 40), 0.05, 0.25);
        Mesh mesh = DelaunayMesherTests.Sound(graph, new MeshSettings { SizeField = field });
        double[] sides = LongestSides(mesh);
        for (int t = 0; t < sides.Length; t++)
        {
            double wanted = field.At(Centre(mesh, t));
            Assert.InRange(sides[t] / wanted, 0.1, 1);
        }
        DelaunayMesherTests.AssertQuality(mesh, 28);
        Assert.InRange(mesh.TriangleCount, 500, 5000);
    }

    [Fact]
    public void A_field_below_the_digits_of_the_coordinates_ends_with_them()
    {
        var field = new Cone(new Point(70, 40), 1e-300, 0.25);
        Mesh mesh = DelaunayMesherTests.Sound(HostileGraphs.All["rectangle"], new MeshSettings { SizeField = field });
        Assert.InRange(mesh.TriangleCount, 1000, 20_000);
        Assert.NotEmpty(mesh.Unrefined);
        Assert.All(mesh.Unrefined, left => Assert.Equal(UnrefinedCause.LeastEdge, left.Cause));
        Assert.All(mesh.Unrefined, left => Assert.InRange(left.Place.DistanceTo(field.Tip), 0, 1e-10));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    public void A_size_must_be_positive(double side)
    {
        PlanarGraph graph = HostileGraphs.All["L"];
        Assert.Throws<ArgumentOutOfRangeException>(() => Mesher.Triangulate(graph, new MeshSettings { MaxSide = side }, Token));
        Assert.Throws<ArgumentOutOfRangeException>(() => Mesher.Triangulate(graph, new MeshSettings { RegionMaxSides = [side] }, Token));
        Mesh mesh = Mesher.Triangulate(graph, new MeshSettings(), Token);
        Assert.Throws<ArgumentOutOfRangeException>(
            () => Mesher.Refine(mesh, graph, [.. Enumerable.Repeat(side, mesh.TriangleCount)], new MeshSettings(), Token));
        Assert.Throws<ArgumentException>(() => Mesher.Refine(mesh, graph, [1], new MeshSettings(), Token));
        Assert.Throws<ArgumentException>(() => Mesher.Refine(
            mesh, HostileGraphs.All["ring"], [.. Enumerable.Repeat(1.0, mesh.TriangleCount)], new MeshSettings(), Token));
    }

    private static double[] LongestSides(Mesh mesh) => [.. Enumerable.Range(0, mesh.TriangleCount).Select(t => TriangleShape.LongestSide(
        mesh.Nodes[mesh.Corners[3 * t]], mesh.Nodes[mesh.Corners[3 * t + 1]], mesh.Nodes[mesh.Corners[3 * t + 2]]))];

    private static Point Centre(Mesh mesh, int t) =>
        (mesh.Nodes[mesh.Corners[3 * t]] + mesh.Nodes[mesh.Corners[3 * t + 1]] + mesh.Nodes[mesh.Corners[3 * t + 2]]) / 3;

    private sealed record Cone(Point Tip, double Least, double Growth) : ISizeField
    {
        public double At(Point place) => Least + Growth * Tip.DistanceTo(place);
    }
}
