using MeshSection.Geometry;
using MeshSection.Meshing;

namespace MeshSection.Tests.Meshing;

/// <summary>Planar graphs to mesh, built from closed loops and loose segments.</summary>
internal sealed class Graphs
{
    private readonly List<Point> points = [];
    private readonly List<Segment> segments = [];
    private readonly Dictionary<Point, int> numbers = [];

    public static PlanarGraph Of(params Point[][] loops)
    {
        var graph = new Graphs();
        foreach (Point[] loop in loops) graph.Loop(loop, 0, -1);
        return graph.Build();
    }

    public PlanarGraph Build() => new([.. points], [.. segments]);

    public Graphs Loop(Point[] loop, int left, int right)
    {
        for (int i = 0; i < loop.Length; i++) Line(loop[i], loop[(i + 1) % loop.Length], left, right);
        return this;
    }

    public Graphs Line(Point from, Point to, int left, int right)
    {
        segments.Add(new Segment(Number(from), Number(to), left, right));
        return this;
    }

    public Graphs Dot(Point point)
    {
        Number(point);
        return this;
    }

    private int Number(Point point)
    {
        if (!numbers.TryGetValue(point, out int number))
        {
            number = points.Count;
            numbers.Add(point, number);
            points.Add(point);
        }
        return number;
    }

    public static Point[] Polygon(params double[] xy) =>
        [.. Enumerable.Range(0, xy.Length / 2).Select(i => new Point(xy[2 * i], xy[2 * i + 1]))];

    public static Point[] Rectangle(double left, double bottom, double width, double height) => Polygon(
        left, bottom, left + width, bottom, left + width, bottom + height, left, bottom + height);

    public static Point[] Circle(double x, double y, double radius, int count) =>
        [.. Enumerable.Range(0, count).Select(i => new Point(x, y) + radius * Point.Direction(Math.Tau * i / count))];

    public static Point[] Hole(Point[] loop)
    {
        Point[] reversed = [.. loop];
        Array.Reverse(reversed);
        return reversed;
    }

    public static Point[] Wedge(double degrees, double first, double second) =>
        [Point.Origin, new(first, 0), second * Point.Direction(degrees * Math.PI / 180)];

    public static PlanarGraph Moved(PlanarGraph graph, double scale, double angle, Point shift)
    {
        Point x = Point.Direction(angle);
        return graph with
        {
            Points = [.. graph.Points.Select(p => shift + scale * (p.X * x + p.Y * x.Left()))],
        };
    }
}
