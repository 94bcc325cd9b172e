using MeshSection.Geometry;
using MeshSection.Meshing;
using static MeshSection.Tests.Meshing.Graphs;

namespace MeshSection.Tests.Meshing;

/// <summary>Outlines that meshers stumble over, by name.</summary>
internal static class HostileGraphs
{
    public static readonly Dictionary<string, PlanarGraph> All = new()
    {
        ["rectangle"] = Graphs.Of(Rectangle(0, 0, 200, 100)),
        ["L"] = Graphs.Of(Polygon(0, 0, 100, 0, 100, 10, 10, 10, 10, 100, 0, 100)),
        ["ring"] = Graphs.Of(Circle(0, 0, 100, 96), Hole(Circle(0, 0, 80, 72))),
        ["plate with 40 holes"] = Plate(),
        ["islands in holes"] = Graphs.Of(
            Rectangle(0, 0, 100, 100),
            Hole(Rectangle(10, 10, 80, 80)),
            Rectangle(20, 20, 60, 60),
            Hole(Rectangle(40, 40, 20, 20)),
            Circle(50, 50, 5, 12)),
        ["four materials around one point"] = FourMaterials(),
        ["inclusion"] = new Graphs().Loop(Rectangle(0, 0, 60, 40), 0, -1).Loop(Circle(30, 20, 8, 24), 1, 0).Build(),
        ["two parts and a shared wall"] = new Graphs()
            .Loop(Rectangle(200, 0, 10, 10), 2, -1)
            .Line(new(0, 0), new(50, 0), 0, -1).Line(new(50, 0), new(100, 0), 1, -1)
            .Line(new(100, 0), new(100, 30), 1, -1).Line(new(100, 30), new(50, 30), 1, -1)
            .Line(new(50, 30), new(0, 30), 0, -1).Line(new(0, 30), new(0, 0), 0, -1)
            .Line(new(50, 0), new(50, 30), 0, 1).Build(),
        ["points and lines forced into a region"] = new Graphs()
            .Loop(Rectangle(0, 0, 100, 100), 0, -1)
            .Line(new(20, 20), new(80, 20.001), 0, 0).Line(new(80, 20.001), new(60, 70), 0, 0)
            .Dot(new(50, 50)).Dot(new(50, 50.001)).Dot(new(99.999, 50)).Build(),
        ["lines through a cloud of points"] = Cloud(),
        ["points outside"] = new Graphs().Loop(Rectangle(0, 0, 10, 10), 0, -1).Dot(new(500, 3)).Dot(new(-1, 5)).Build(),
        ["collinear points along each side"] = Graphs.Of(Comb(0, 1)),
        ["cocircular grid"] = Grid(12),
        ["holes that touch at a point"] = Graphs.Of(
            Rectangle(0, 0, 40, 20), Polygon(10, 5, 10, 15, 20, 10), Polygon(20, 10, 30, 15, 30, 5)),
        ["squares that touch at a corner"] = Graphs.Of(Rectangle(0, 0, 10, 10), Rectangle(10, 10, 10, 10)),
        ["fan of 20 segments"] = Fan(),
        ["slit of 1e-9"] = Graphs.Of(Rectangle(0, 0, 100, 100), Hole(Polygon(20, 50, 80, 50, 80, 50 + 1e-9, 20, 50 + 1e-9))),
        ["slit closing to 1e-12"] = Graphs.Of(Rectangle(0, 0, 1, 1), Hole(Polygon(0.2, 0.5, 0.8, 0.5, 0.8, 0.5 + 1e-12))),
        ["comb of 500 teeth"] = Graphs.Of(Comb(500, 20)),
        ["ring with a ligament of 1e-6"] = Graphs.Of(Circle(0, 0, 100, 90), Hole(Circle(40 - 1e-6, 0, 60, 60))),
        ["polygon of 10000 corners"] = Graphs.Of(Circle(0, 0, 100, 10000)),
        ["ellipse of 3000 corners"] = Graphs.Of([.. Circle(0, 0, 100, 3000).Select(p => new Point(p.X, 0.01 * p.Y))]),
        ["hole a millionth of the section"] = Graphs.Of(Rectangle(0, 0, 1000, 1000), Hole(Circle(333, 333, 0.0005, 12))),
        ["notch a millionth of the section"] = Graphs.Of(
            Polygon(0, 0, 100, 0, 100, 50, 99.9999, 50.00005, 100, 50.0001, 100, 100, 0, 100)),
        ["bar tangent to a face"] = Graphs.Of(Rectangle(0, 0, 100, 50), Hole(Circle(50, 10 + 1e-7, 10, 64))),
        ["two segments at 2 and 5 degrees in a corner"] = Corner(2, 5),
        ["plate 1000 to 1"] = Graphs.Of(Rectangle(0, 0, 1000, 1)),
        ["coordinates whose products underflow"] = Graphs.Of(
            Polygon(1e-98, -3e-120, 100, 1e-200, 100, 100, -1e-310, 100), Hole(Circle(50, 1e-5, 1e-6, 8))),
        ["needle"] = Graphs.Of(Polygon(0, 0, 1e6, 0.5, 1e6, 1)),
        ["star of thin spikes"] = Star(36, 1, 100),
        ["line along rows of points"] = Rows(300),
        ["line across a disc of 2000 corners"] = new Graphs().Loop(Circle(0, 0, 100, 2000), 0, -1)
            .Line(Circle(0, 0, 100, 2000)[0], Circle(0, 0, 100, 2000)[1000], 0, 0).Build(),
        ["line under hanging teeth"] = Teeth(400),
        // A small figure between two long segments at a small angle, by its apex: the angles across from the corner must
        // be small ones, whatever the method [Shewchuk2002, section on small input angles].
        ["square between the arms of 1 degree"] = new Graphs()
            .Loop(Polygon(-10, -10, 110, -10, 110, 30, -10, 30), 0, -1)
            .Line(Point.Origin, new(100, 0), 0, 0).Line(Point.Origin, 100 * Point.Direction(Math.PI / 180), 0, 0)
            .Loop(Hole(Rectangle(1, 0.007, 0.004, 0.004)), 0, -1).Build(),
        ["stray vertex a millionth from a corner"] = new Graphs()
            .Loop(Rectangle(0, 0, 100, 100), 0, -1).Dot(new(1e-4, 1e-4)).Dot(new(100 - 1e-6, 1e-7)).Build(),
        // Segments under 60 degrees of unequal lengths split each other in turn, unless on shells [Ruppert1995].
        ["fan of 44 degrees with lengths in the golden section"] = GoldenFan(),
        ["spiral arm"] = Spiral(),
        ["nested triangles on one corner"] = Nested(12),
        ["grid of 400 holes"] = Holes(20),
        ["square of a thousandth at 1e9"] = Moved(
            Graphs.Of(Rectangle(0, 0, 1, 1), Hole(Rectangle(0.25, 0.25, 0.5, 0.5))), 1e-3, 0, new Point(1e9, -1e9)),
        ["points where circumcentres would come"] = Circumcentres(),
    };

    /// <summary>Points in rows that draw near to a line from one end of it to the other.</summary>
    private static PlanarGraph Rows(int n)
    {
        var graph = new Graphs().Loop(Rectangle(-50, -50, 1100, 100), 0, -1);
        for (int i = 1; i <= n; i++)
        {
            double x = 1000.0 * i / (n + 1);
            graph.Dot(new(x, 1e-2 * x)).Dot(new(x + 1, -0.05));
        }
        return graph.Line(Point.Origin, new(1000, 0), 0, 0).Build();
    }

    /// <summary>Lines that hang from a face down to a line that lies close below their ends.</summary>
    private static PlanarGraph Teeth(int n)
    {
        var graph = new Graphs().Loop(Rectangle(0, 0, n, 60), 0, -1);
        for (int i = 1; i < n; i++) graph.Line(new(i, 50), new(i + 0.01 * (i % 7), 20 + i % 3), 0, 0).Dot(new(i + 0.5, 10));
        return graph.Line(new(0.25, 15), new(n - 0.25, 15.5), 0, 0).Build();
    }

    private static PlanarGraph GoldenFan()
    {
        var graph = new Graphs().Loop(Circle(0, 0, 150, 40), 0, -1);
        for (int i = 0; i < 8; i++)
        {
            graph.Line(Point.Origin, 100 * Math.Pow(0.6180339887, i) * Point.Direction(i * 44 * Math.PI / 180), 0, 0);
        }
        return graph.Build();
    }

    private static PlanarGraph Spiral()
    {
        Point[] middle = [.. Enumerable.Range(0, 400).Select(i => (5 + 0.2 * i) * Point.Direction(0.1 * i))];
        Point[] inside = [.. Enumerable.Range(0, 400).Select(i => (4 + 0.2 * i) * Point.Direction(0.1 * i))];
        return Graphs.Of([.. middle, .. inside.Reverse()]);
    }

    private static PlanarGraph Nested(int count)
    {
        var graph = new Graphs().Loop(Polygon(0, 0, 200, -60, 200, 60), 0, -1);
        for (int i = 0; i < count; i++)
        {
            double x = 150 * Math.Pow(0.7, i);
            double y = 0.25 * x * Math.Pow(0.8, i);
            graph.Line(Point.Origin, new(x, y), 0, 0).Line(new(x, y), new(x, -y), 0, 0).Line(new(x, -y), Point.Origin, 0, 0);
        }
        return graph.Build();
    }

    private static PlanarGraph Holes(int n)
    {
        var graph = new Graphs().Loop(Rectangle(0, 0, 10 * n, 10 * n), 0, -1);
        for (int i = 0; i < n * n; i++)
        {
            graph.Loop(Hole(Circle(10 * (i % n) + 5, 10 * (i / n) + 5, 1 + 3.9 * (i % 7) / 7.0, 8)), 0, -1);
        }
        return graph.Build();
    }

    /// <summary>Equilateral triangles with their centres as points: every circle has more on it, or at its middle.</summary>
    private static PlanarGraph Circumcentres()
    {
        var graph = new Graphs().Loop(Rectangle(-10, -10, 80, 80), 0, -1);
        double row = Math.Sqrt(3) / 2;
        for (int i = 0; i < 12; i++)
        {
            for (int j = 0; j < 12; j++)
            {
                Point corner = new(4 * i + 2 * (j % 2), 4 * row * j);
                graph.Dot(corner).Dot(corner + new Point(2, 4 * row / 3));
            }
        }
        return graph.Build();
    }

    private static PlanarGraph Plate()
    {
        var graph = new Graphs().Loop(Rectangle(0, 0, 800, 500), 0, -1);
        for (int i = 0; i < 40; i++)
        {
            graph.Loop(Hole(Circle(50 + 100 * (i % 8), 50 + 100 * (i / 8), 30 + 0.4 * i, 24)), 0, -1);
        }
        return graph.Build();
    }

    private static PlanarGraph FourMaterials()
    {
        var graph = new Graphs();
        Point[] rim = Polygon(10, 0, 10, 10, 0, 10, -10, 10, -10, 0, -10, -10, 0, -10, 10, -10);
        for (int i = 0; i < 8; i++) graph.Line(rim[i], rim[(i + 1) % 8], i / 2, -1);
        for (int i = 0; i < 4; i++) graph.Line(Point.Origin, rim[2 * i], i, (i + 3) % 4);
        return graph.Build();
    }

    /// <summary>n x n unit squares, every other one of another material, every edge a segment.</summary>
    private static PlanarGraph Grid(int n)
    {
        var graph = new Graphs();
        int Region(int i, int j) => i < 0 || j < 0 || i >= n || j >= n ? -1 : (i + j) % 2;
        for (int i = 0; i <= n; i++)
        {
            for (int j = 0; j <= n; j++)
            {
                if (i < n) graph.Line(new(i, j), new(i + 1, j), Region(i, j), Region(i, j - 1));
                if (j < n) graph.Line(new(i, j), new(i, j + 1), Region(i - 1, j), Region(i, j));
            }
        }
        return graph.Build();
    }

    private static PlanarGraph Cloud()
    {
        var random = new Random(7);
        var graph = new Graphs().Loop(Rectangle(-1, -1, 102, 102), 0, -1);
        for (int i = 0; i < 500; i++) graph.Dot(new(100 * random.NextDouble(), 100 * random.NextDouble()));
        for (int i = 0; i < 20; i++) graph.Line(new(-0.5, 5 * i), new(100.5, 5 * i + 0.1), 0, 0);
        return graph.Build();
    }

    private static PlanarGraph Fan()
    {
        var graph = new Graphs().Loop(Circle(0, 0, 100, 30), 0, -1);
        for (int i = 0; i < 20; i++)
        {
            graph.Line(Point.Origin, (30 + 3 * i) * Point.Direction(0.05 * i), 0, 0);
        }
        return graph.Build();
    }

    private static Point[] Comb(int teeth, double height)
    {
        var loop = new List<Point>();
        for (int i = 0; i <= 2 * Math.Max(teeth, 20); i++) loop.Add(new(i, 0));
        for (int i = 2 * Math.Max(teeth, 20); i >= 0; i--) loop.Add(new(i, i % 2 == 0 || teeth == 0 ? 1 : 1 + height));
        return [.. loop];
    }

    private static PlanarGraph Corner(double first, double second) => new Graphs()
        .Loop(Rectangle(0, 0, 100, 100), 0, -1)
        .Line(Point.Origin, 60 * Point.Direction(first * Math.PI / 180), 0, 0)
        .Line(Point.Origin, 45 * Point.Direction(second * Math.PI / 180), 0, 0)
        .Build();

    private static PlanarGraph Star(int spikes, double inner, double outer) => Graphs.Of(
        [.. Enumerable.Range(0, 2 * spikes).Select(i => (i % 2 == 0 ? outer : inner) * Point.Direction(Math.PI * i / spikes))]);
}
