using CsCheck;
using MeshSection.Geometry;
using MeshSection.Meshing;

namespace MeshSection.Tests.Meshing;

public class RandomOutlineTests
{
    private static readonly Gen<Point[]> Star =
        from count in Gen.Int[6, 40]
        from radii in Gen.Double[0.5, 1].Array[count]
        from jitter in Gen.Double[0, 0.9].Array[count]
        select Enumerable.Range(0, count)
            .Select(i => radii[i] * Point.Direction(Math.Tau * (i + jitter[i]) / count)).ToArray();

    /// <summary>
    /// A star that keeps clear of the disc of radius 0.18 about its centre, with up to four smaller stars in that disc:
    /// empty, or of other materials.
    /// </summary>
    private static readonly Gen<PlanarGraph> Outline =
        from outer in Star
        from inner in Star.Array[0, 4]
        from region in Gen.Int[-1, 2].Array[4]
        from scale in Gen.Double[-3, 5]
        from size in Gen.Double[-5, 0].Array[4]
        from angle in Gen.Double[0, Math.Tau]
        from far in OneOf(0.0, 0.0, 1e3)
        select Build(outer, inner, region, size, Math.Pow(10, scale), angle, far);

    private static readonly Gen<MeshSettings> Settings =
        from minAngle in Gen.OneOf(Gen.Const(28.0), Gen.Const(0.0), Gen.Double[0, 30])
        from triangles in OneOf(0, 10, 300)
        from maxNodes in OneOf(60, 100_000)
        from sides in OneOf(0, 0, 5, 40)
        select new MeshSettings { MinAngle = minAngle, MaxNodes = maxNodes, MaxArea = triangles == 0 ? double.PositiveInfinity : 1.0 / triangles, MaxSide = sides == 0 ? double.PositiveInfinity : 1.0 / sides };

    [Fact]
    public void Random_outlines_are_covered_soundly_and_finely() =>
        Gen.Select(Outline, Settings).Sample(
            (graph, settings) =>
            {
                double size = graph.Points[0].DistanceTo(graph.Points[1]);
                settings = settings with { MaxArea = settings.MaxArea * size * size * 10, MaxSide = settings.MaxSide * size * 10 };
                Mesh mesh = DelaunayMesherTests.Sound(graph, settings);
                bool isLimited = mesh.Nodes.Length >= settings.MaxNodes;
                Assert.True(mesh.Nodes.Length <= Math.Max(settings.MaxNodes, graph.Points.Length));
                if (isLimited) return;
                DelaunayMesherTests.AssertQuality(mesh, settings.MinAngle);
                Assert.True(MeshQuality.Of(mesh).LargestArea <= settings.MaxArea);
                Assert.True(LongestSide(mesh) <= settings.MaxSide * (1 + 1e-12));
            },
            iter: 3500,
            threads: 1,
            print: Print);

    /// <summary>
    /// Triangles of a lattice, each of one of three regions or of none, with some more lines and points between: holes,
    /// islands, pieces that touch in corners, and collinear and cocircular points everywhere, exactly.
    /// </summary>
    [Fact]
    public void Random_pieces_of_a_lattice_are_covered_soundly_and_finely() =>
        Gen.Select(Lattice, Settings).Sample(
            (graph, settings) =>
            {
                settings = settings with { MaxArea = settings.MaxArea * 1000, MaxSide = settings.MaxSide * 20 };
                Mesh mesh = DelaunayMesherTests.Sound(graph, settings);
                if (mesh.Nodes.Length >= settings.MaxNodes) return;
                DelaunayMesherTests.AssertQuality(mesh, settings.MinAngle);
                Assert.True(LongestSide(mesh) <= settings.MaxSide * (1 + 1e-12));
            },
            iter: 2500,
            threads: 1,
            print: Print);

    private static readonly Gen<PlanarGraph> Lattice =
        from columns in Gen.Int[1, 6]
        from rows in Gen.Int[1, 6]
        from regions in Gen.Int[-1, 2].Array[2 * columns * rows]
        from isKept in Gen.Int[0, 9].Array[3 * (columns + 1) * (rows + 1)]
        from skew in Gen.Int[-2, 2]
        from flatness in Gen.Int[0, 12]
        select Pieces(columns, rows, regions, isKept, new Point(1, 0), new Point(skew, Math.ScaleB(1, -flatness)));

    /// <summary>A failing case as code that makes it again.</summary>
    private static string Print((PlanarGraph Graph, MeshSettings Settings) one) => FormattableString.Invariant(
        $"{one.Settings with { RegionMaxSides = [] }} points [{string.Join(", ", one.Graph.Points.Select(p => FormattableString.Invariant($"new({p.X:R}, {p.Y:R})")))}] segments [{string.Join(", ", one.Graph.Segments.Select(s => $"new({s.From}, {s.To}, {s.Left}, {s.Right})"))}]");

    private static double LongestSide(Mesh mesh) => Enumerable.Range(0, mesh.Corners.Length)
        .Select(e => mesh.Nodes[MeshEdge.From(mesh, e)].DistanceTo(mesh.Nodes[MeshEdge.To(mesh, e)]))
        .Append(0)
        .Max();

    private static PlanarGraph Pieces(int columns, int rows, int[] regions, int[] isKept, Point right, Point up)
    {
        var graph = new Graphs();
        for (int i = 0; i <= columns; i++)
        {
            for (int j = 0; j <= rows; j++)
            {
                int kept = 3 * (i * (rows + 1) + j);
                if (i < columns) Line(i, j, i + 1, j, Region(i, j, 0), Region(i, j - 1, 1), isKept[kept]);
                if (j < rows) Line(i, j, i, j + 1, Region(i - 1, j, 1), Region(i, j, 0), isKept[kept + 1]);
                if (i < columns && j < rows) Line(i + 1, j, i, j + 1, Region(i, j, 0), Region(i, j, 1), isKept[kept + 2]);
                if (isKept[kept] == 1) graph.Dot(Place(i, j));
            }
        }
        return graph.Build();

        // Half 0 of a cell is the one at its lower left, half 1 at its upper right.
        int Region(int i, int j, int half) =>
            i < 0 || j < 0 || i >= columns || j >= rows ? -1 : regions[2 * (i * rows + j) + half];

        Point Place(int i, int j) => i * right + j * up;

        void Line(int i, int j, int k, int l, int left, int rightOf, int kept)
        {
            if (left != rightOf || kept == 0) graph.Line(Place(i, j), Place(k, l), left, rightOf);
        }
    }

    private static PlanarGraph Build(
        Point[] outer, Point[][] inner, int[] region, double[] size, double scale, double angle, double far)
    {
        var graph = new Graphs().Loop(outer, 0, -1);
        for (int i = 0; i < inner.Length; i++)
        {
            Point centre = 0.11 * Point.Direction(Math.Tau * i / 4);
            double radius = 0.06 * Math.Pow(10, size[i]);
            graph.Loop([.. inner[i].Select(p => centre + radius * p)], region[i], 0);
        }
        return Graphs.Moved(graph.Build(), scale, angle, new Point(far * scale, far * scale));
    }

    private static Gen<T> OneOf<T>(params T[] values) => Gen.Int[0, values.Length - 1].Select(i => values[i]);
}
