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
        select new MeshSettings { MinAngle = minAngle, MaxNodes = maxNodes, MaxArea = triangles == 0 ? double.PositiveInfinity : 1.0 / triangles };

    [Fact]
    public void Random_outlines_are_covered_soundly_and_finely() =>
        Gen.Select(Outline, Settings).Sample(
            (graph, settings) =>
            {
                double size = graph.Points[0].DistanceTo(graph.Points[1]);
                settings = settings with { MaxArea = settings.MaxArea * size * size * 10 };
                Mesh mesh = DelaunayMesherTests.Sound(graph, settings);
                bool isLimited = mesh.Nodes.Length >= settings.MaxNodes;
                Assert.True(mesh.Nodes.Length <= Math.Max(settings.MaxNodes, graph.Points.Length));
                if (isLimited) return;
                DelaunayMesherTests.AssertQuality(mesh, settings.MinAngle);
                Assert.True(MeshQuality.Of(mesh).LargestArea <= settings.MaxArea);
            },
            iter: 300,
            threads: 1);

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
