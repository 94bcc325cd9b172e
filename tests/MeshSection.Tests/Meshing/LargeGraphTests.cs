using MeshSection.Geometry;
using MeshSection.Meshing;
using static MeshSection.Tests.Meshing.Graphs;

namespace MeshSection.Tests.Meshing;

/// <summary>Sizes at which a method that takes the square of them would not come back.</summary>
public class LargeGraphTests
{
    [Fact]
    public void A_polygon_of_100_000_corners() => Fine(Graphs.Of(Circle(0, 0, 100, 100_000)));

    [Fact]
    public void A_comb_of_10_000_teeth()
    {
        Point[] top = [.. Enumerable.Range(0, 20_001).Select(i => new Point(20_000 - i, i % 2 == 0 ? 1 : 1.8))];
        Fine(Graphs.Of([new(0, 0), new(20_000, 0), .. top]));
    }

    [Theory]
    [InlineData("ray")]
    [InlineData("parallel")]
    [InlineData("parabola")]
    [InlineData("geometric")]
    [InlineData("random")]
    public void A_line_along_rows_of_50_000_points(string kind)
    {
        const int Count = 50_000;
        var random = new Random(1);
        var graph = new Graphs().Loop(Rectangle(-100, -100, 1200, 200), 0, -1).Line(Point.Origin, new(1000, 0), 0, 0);
        for (int i = 1; i <= Count; i++)
        {
            double t = (double)i / (Count + 1);
            (double x, double y) = kind switch
            {
                "ray" => (1000 * t, t),
                "parallel" => (1000 * t, 0.05),
                "parabola" => (1000 * t, 0.2 * t * (1 - t)),
                "geometric" => (999 * Math.Pow(0.9999, Count - i), 0.01 * t),
                _ => (1000 * t, 1e-3 + 0.2 * random.NextDouble()),
            };
            graph.Dot(new(x, y)).Dot(new(x + 0.01, -y));
        }
        DelaunayMesherTests.Sound(graph.Build(), new MeshSettings { MinAngle = 0 });
    }

    [Fact]
    public void Ten_thousand_holes()
    {
        var graph = new Graphs().Loop(Rectangle(0, 0, 1000, 1000), 0, -1);
        for (int i = 0; i < 10_000; i++) graph.Loop(Hole(Circle(10 * (i % 100) + 5, 10 * (i / 100) + 5, 3, 6)), 0, -1);
        Fine(graph.Build());
    }

    private static void Fine(PlanarGraph graph) =>
        DelaunayMesherTests.AssertQuality(DelaunayMesherTests.Sound(graph, new MeshSettings()), 28);
}
