using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Properties;
using MeshSection.Sections;
using MeshSection.Units;

namespace MeshSection.Plots.Tests.Samples;

/// <summary>A section with a mesh and properties made by hand, apart from the engine's own mesher and analyses.</summary>
internal sealed record Sample(Section Section, Mesh Mesh, SectionProperties Properties)
{
    public Figure Figure(PictureSize? size = null, LengthUnit? unit = null) =>
        SectionFigure.Of(Section, Mesh, Properties, unit ?? LengthUnit.Millimetre, size);

    /// <summary>A report on the mesh, with a wall of 3 and two points that were to be kept.</summary>
    public MeshReport Report => new(
        MeshQuality.Of(Mesh), MeshRegion.Of(Mesh), [], new Wall(3, Mesh.Nodes[0], Mesh.Nodes[1], 2), 0, [Mesh.Nodes[2], Mesh.Nodes[3]]);

    public Sample Titled(string title) => this with { Section = Section with { Title = title } };

    /// <summary>Corners on the lines of a grid; loops inside others are holes.</summary>
    public static Sample Rectilinear(string title, double cell, Placement placement, IReadOnlyList<Point[]> loops)
    {
        var xs = Lines(loops.SelectMany(l => l).Select(p => p.X), cell);
        var ys = Lines(loops.SelectMany(l => l).Select(p => p.Y), cell);
        var nodes = ys.SelectMany(y => xs.Select(x => placement.Apply(new Point(x, y)))).ToArray();
        var triangles = new List<int>();
        for (var j = 0; j + 1 < ys.Length; j++)
        {
            for (var i = 0; i + 1 < xs.Length; i++)
            {
                var middle = new Point(0.5 * (xs[i] + xs[i + 1]), 0.5 * (ys[j] + ys[j + 1]));
                if (loops.Count(l => Holds(l, middle)) % 2 == 1)
                {
                    var a = j * xs.Length + i;
                    var b = a + xs.Length;
                    triangles.AddRange((i + j) % 2 == 0
                        ? [a, a + 1, b + 1, a, b + 1, b]
                        : [a, a + 1, b, a + 1, b + 1, b]);
                }
            }
        }

        return Of(title, loops.Select(l => Boundary.Polygon(l).Placed(placement)), nodes, triangles);
    }

    /// <summary>A circular tube.</summary>
    public static Sample Tube(string title, double inner, double outer, int around, int across)
    {
        var nodes = new List<Point>();
        var triangles = new List<int>();
        for (var j = 0; j <= across; j++)
        {
            for (var i = 0; i < around; i++)
            {
                nodes.Add((inner + (outer - inner) * j / across) * Point.Direction(Math.Tau * i / around));
                if (j < across)
                {
                    var (a, b) = (j * around + i, j * around + (i + 1) % around);
                    triangles.AddRange([a, a + around, b + around, a, b + around, b]);
                }
            }
        }

        return Of(title, [Boundary.Circle(default, outer), Boundary.Circle(default, inner)], [.. nodes], triangles);
    }

    public static Sample Rectangle(double width, double height, double cell, string title = "Rectangle") => Rectilinear(
        title, cell, Placement.Moved(0, 0), [[new(0, 0), new(width, 0), new(width, height), new(0, height)]]);

    public static Sample Angle(double turn = 0, double scale = 1) => Rectilinear(
        "Unequal angle 150 × 90 × 12", 6, new Placement(new Point(0, 0), turn, scale),
        [[new(0, 0), new(90, 0), new(90, 12), new(12, 12), new(12, 150), new(0, 150)]]);

    private static Sample Of(string title, IEnumerable<Boundary> loops, Point[] nodes, List<int> corners)
    {
        var outline = Outline.Create(loops);
        var mesh = MeshOf(nodes, corners);
        return new Sample(new Section(outline, Title: title), mesh, SampleProperties.Of(outline, mesh));
    }

    private static Mesh MeshOf(Point[] nodes, List<int> corners)
    {
        var edges = new Dictionary<(int, int), int>();
        for (var i = 0; i < corners.Count; i++)
        {
            edges[End(i)] = i / 3;
        }

        var neighbours = Enumerable.Range(0, corners.Count).Select(i =>
        {
            var (from, to) = End(i);
            return edges.GetValueOrDefault((to, from), -1);
        }).ToImmutableArray();
        var segment = 0;
        return new Mesh(
            [.. nodes],
            [.. corners],
            neighbours,
            [.. new int[corners.Count / 3]],
            [.. neighbours.Select(n => n < 0 ? segment++ : -1)],
            []);

        (int, int) End(int i) => (corners[i / 3 * 3 + (i + 1) % 3], corners[i / 3 * 3 + (i + 2) % 3]);
    }

    private static double[] Lines(IEnumerable<double> stops, double cell)
    {
        var sorted = stops.Distinct().Order().ToArray();
        var lines = new List<double> { sorted[0] };
        for (var i = 1; i < sorted.Length; i++)
        {
            var (from, to) = (sorted[i - 1], sorted[i]);
            var count = (int)Math.Clamp(Math.Ceiling((to - from) / cell), 1, 400);
            lines.AddRange(Enumerable.Range(1, count).Select(k => k == count ? to : from + (to - from) * k / count));
        }

        return [.. lines];
    }

    private static bool Holds(Point[] loop, Point p)
    {
        var inside = false;
        for (var i = 0; i < loop.Length; i++)
        {
            var (a, b) = (loop[i], loop[(i + 1) % loop.Length]);
            if (a.Y > p.Y != b.Y > p.Y && p.X < a.X + (p.Y - a.Y) / (b.Y - a.Y) * (b.X - a.X))
            {
                inside = !inside;
            }
        }

        return inside;
    }
}
