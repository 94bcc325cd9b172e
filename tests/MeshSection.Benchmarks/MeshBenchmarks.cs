using BenchmarkDotNet.Attributes;
using MeshSection.Geometry;
using MeshSection.Meshing;

namespace MeshSection.Benchmarks;

/// <summary>
/// Meshing at 30 degrees with an area bound, against sorting as many random numbers as there are triangles: the ratio
/// tells how far the mesher stays n log n, on any machine.
/// </summary>
[MemoryDiagnoser]
[Config(typeof(PerTriangle))]
public class MeshBenchmarks
{
    /// <summary>Triangles that the area would hold at the largest size, for one triangle of the mesh.</summary>
    private const double FitsPerTriangle = 0.625;

    private PlanarGraph graph = null!;
    private MeshSettings settings = null!;
    private double[] unsorted = [];

    [Params("angle", "plate with 40 holes", "ring", "thin plate", "inclusions")]
    public string Outline { get; set; } = "";

    [Params(1_000, 10_000, 100_000, 300_000, 1_000_000)]
    public int Triangles { get; set; }

    [GlobalSetup]
    public void Prepare()
    {
        Ask();
        int count = Mesh();
        var random = new Random(1);
        unsorted = new double[count];
        for (int i = 0; i < count; i++) unsorted[i] = random.NextDouble();
    }

    /// <summary>How many triangles are made; about what is asked for, or more where the outline needs them.</summary>
    public static int Count(string outline, int triangles)
    {
        var benchmark = new MeshBenchmarks { Outline = outline, Triangles = triangles };
        benchmark.Ask();
        return benchmark.Mesh();
    }

    [Benchmark(Baseline = true)]
    public double Sort()
    {
        double[] sorted = [.. unsorted];
        Array.Sort(sorted);
        return sorted[0];
    }

    [Benchmark]
    public int Mesh() => new DelaunayMesher().Triangulate(graph, settings).TriangleCount;

    private void Ask()
    {
        (graph, double area) = Outlines.Named(Outline);
        settings = new MeshSettings { MinAngle = 30, MaxArea = area / (FitsPerTriangle * Triangles) };
    }

    private static class Outlines
    {
        public static (PlanarGraph Graph, double Area) Named(string name) => name switch
        {
            "angle" => Build(5900, new Loop([new(0, 0), new(100, 0), new(100, 50), new(50, 50), new(50, 68), new(0, 68)], 0, -1)),
            "plate with 40 holes" => Build(
                800 * 500 - 40 * Math.PI * 36 * 36,
                [new Loop(Rectangle(800, 500), 0, -1), .. Holes(36, -1)]),
            "ring" => Build(
                Math.PI * (100 * 100 - 80 * 80),
                new Loop(Circle(Point.Origin, 100, 120), 0, -1),
                new Loop(Circle(Point.Origin, 80, 96), -1, 0)),
            "thin plate" => Build(1000 * 2, new Loop(Rectangle(1000, 2), 0, -1)),
            "inclusions" => Build(800 * 500, [new Loop(Rectangle(800, 500), 0, -1), .. Holes(12, 1)]),
            _ => throw new ArgumentOutOfRangeException(nameof(name), name, "No such outline."),
        };

        private static IEnumerable<Loop> Holes(double radius, int inside) => Enumerable.Range(0, 40).Select(
            i => new Loop(Circle(new Point(50 + 100 * (i % 8), 50 + 100 * (i / 8)), radius, 48), inside, 0));

        private static Point[] Rectangle(double width, double height) =>
            [new(0, 0), new(width, 0), new(width, height), new(0, height)];

        private static Point[] Circle(Point centre, double radius, int count) =>
            [.. Enumerable.Range(0, count).Select(i => centre + radius * Point.Direction(Math.Tau * i / count))];

        private static (PlanarGraph Graph, double Area) Build(double area, params Loop[] loops)
        {
            var points = new List<Point>();
            var segments = new List<Segment>();
            foreach (Loop loop in loops)
            {
                int first = points.Count;
                int count = loop.Points.Length;
                points.AddRange(loop.Points);
                for (int i = 0; i < count; i++)
                {
                    segments.Add(new Segment(first + i, first + (i + 1) % count, loop.Left, loop.Right));
                }
            }
            return (new PlanarGraph([.. points], [.. segments]), area);
        }

        private sealed record Loop(Point[] Points, int Left, int Right);
    }
}
