using System.Collections.Immutable;
using CsCheck;
using MeshSection.Geometry;
using MeshSection.Meshing;

namespace MeshSection.Tests.Meshing;

/// <summary>Refining some triangles of a mesh and keeping the rest.</summary>
public class RefinementTests
{
    private static readonly DelaunayMesher Mesher = new();

    private static CancellationToken Token => TestContext.Current.CancellationToken;

    [Fact]
    public void Nothing_asked_for_changes_nothing()
    {
        foreach (string name in new[]
        {
            "L", "ring", "four materials around one point", "points and lines forced into a region",
            "fan of 20 segments", "two segments at 2 and 5 degrees in a corner", "star of thin spikes",
        })
        {
            PlanarGraph graph = HostileGraphs.All[name];
            Mesh mesh = DelaunayMesherTests.Sound(graph, new MeshSettings { MaxSide = 7 });
            Mesh same = Refined(mesh, graph, t => double.PositiveInfinity, new MeshSettings { MaxSide = 7 });
            Assert.Equal(mesh.Nodes.AsSpan(), same.Nodes.AsSpan());
            Assert.Equal(Triangles(mesh).OrderBy(t => (t.Item1.X, t.Item1.Y, t.Item2.X, t.Item2.Y, t.Item3.X, t.Item3.Y)), Triangles(same).OrderBy(t => (t.Item1.X, t.Item1.Y, t.Item2.X, t.Item2.Y, t.Item3.X, t.Item3.Y)));
        }
    }

    [Fact]
    public void A_corner_is_refined_step_by_step_and_what_is_far_is_kept()
    {
        PlanarGraph graph = HostileGraphs.All["L"];
        Mesh mesh = DelaunayMesherTests.Sound(graph, new MeshSettings { MaxSide = 5 });
        var corner = new Point(10, 10);
        HashSet<(Point, Point, Point)> far = [.. Triangles(mesh).Where(t => t.Item1.DistanceTo(corner) > 30)];
        for (int step = 0; step < 20; step++)
        {
            ImmutableArray<Point> before = mesh.Nodes;
            mesh = Refined(mesh, graph, t => Touches(mesh, t, corner) ? 0.5 * Longest(mesh, t) : double.PositiveInfinity, new MeshSettings());
            Assert.Equal(before.AsSpan(), mesh.Nodes.AsSpan()[..before.Length]);
        }
        DelaunayMesherTests.AssertQuality(mesh, 28);
        Assert.InRange(mesh.TriangleCount, far.Count, far.Count + 2000);
        Assert.Superset(far, Triangles(mesh).ToHashSet());
        Assert.True(Enumerable.Range(0, mesh.TriangleCount).Min(t => Longest(mesh, t)) < 1e-5);
    }

    [Fact]
    public void Refining_all_halves_all()
    {
        PlanarGraph graph = HostileGraphs.All["inclusion"];
        Mesh mesh = DelaunayMesherTests.Sound(graph, new MeshSettings { MaxSide = 4 });
        Mesh finer = Refined(mesh, graph, _ => 2, new MeshSettings());
        Assert.InRange(finer.TriangleCount, 2 * mesh.TriangleCount, 6 * mesh.TriangleCount);
        Assert.All(Enumerable.Range(0, finer.TriangleCount), t => Assert.True(Longest(finer, t) <= 2));
    }

    /// <summary>Random sides for random triangles of the hostile outlines.</summary>
    [Fact]
    public void Sides_are_kept_wherever_they_are_asked_for() =>
        Kept([.. HostileGraphs.All.Keys.Where(n => HostileGraphs.All[n].Points.Length < 500)], 100, 1_500);

    /// <summary>Where no straight way leads from one part to the next, and where several parts meet in one node.</summary>
    [Fact]
    public void Sides_are_kept_around_corners() => Kept(
        ["squares that touch at a corner", "holes that touch at a point", "L", "star of thin spikes", "islands in holes", "spiral arm"],
        300,
        150);

    private static void Kept(string[] names, int count, int nodes)
    {
        Gen.Select(Gen.Int[0, names.Length - 1], Gen.Int[0, 1 << 20], Gen.Double[0.02, 0.9], Gen.Double[0.2, 1]).Sample(
            (name, seed, share, factor) =>
            {
                PlanarGraph graph = HostileGraphs.All[names[name]];
                var settings = new MeshSettings { MaxNodes = 4 * nodes };
                Mesh mesh = Mesher.Triangulate(graph, settings with { MaxNodes = nodes }, Token);
                var random = new Random(seed);
                double[] sides = [.. Enumerable.Range(0, mesh.TriangleCount).Select(
                    t => random.NextDouble() < share ? factor * Longest(mesh, t) : double.PositiveInfinity)];
                Mesh refined = Refined(mesh, graph, t => sides[t], settings);
                Assert.Equal(mesh.Nodes.AsSpan(), refined.Nodes.AsSpan()[..mesh.Nodes.Length]);
                Mesh again = Refined(mesh, graph, t => sides[t], settings);
                Assert.Equal(refined.Corners.AsSpan(), again.Corners.AsSpan());
                if (refined.Nodes.Length >= settings.MaxNodes) return;
                HashSet<int> listed = [.. refined.Unrefined.Select(u => u.Triangle)];
                for (int i = 0; i < 400; i++)
                {
                    int t = random.Next(refined.TriangleCount);
                    if (listed.Contains(t)) continue;
                    int around = Around(mesh, Centre(refined, t));
                    if (around >= 0) Assert.True(Longest(refined, t) <= sides[around] * (1 + 1e-12));
                }
            },
            iter: count,
            threads: 1);
    }

    private static Mesh Refined(Mesh mesh, PlanarGraph graph, Func<int, double> side, MeshSettings settings)
    {
        Mesh refined = Mesher.Refine(
            mesh, graph, [.. Enumerable.Range(0, mesh.TriangleCount).Select(side)], settings, Token);
        Assert.Empty(MeshCheck.Faults(refined, graph));
        return refined;
    }

    private static IEnumerable<(Point, Point, Point)> Triangles(Mesh mesh) => Enumerable.Range(0, mesh.TriangleCount).Select(t =>
    {
        Point[] corners = [.. Enumerable.Range(3 * t, 3).Select(e => mesh.Nodes[mesh.Corners[e]]).OrderBy(p => p.X).ThenBy(p => p.Y)];
        return (corners[0], corners[1], corners[2]);
    });

    private static bool Touches(Mesh mesh, int t, Point point) => Enumerable.Range(3 * t, 3).Any(e => mesh.Nodes[mesh.Corners[e]] == point);

    private static double Longest(Mesh mesh, int t) => TriangleShape.LongestSide(
        mesh.Nodes[mesh.Corners[3 * t]], mesh.Nodes[mesh.Corners[3 * t + 1]], mesh.Nodes[mesh.Corners[3 * t + 2]]);

    private static Point Centre(Mesh mesh, int t) =>
        (mesh.Nodes[mesh.Corners[3 * t]] + mesh.Nodes[mesh.Corners[3 * t + 1]] + mesh.Nodes[mesh.Corners[3 * t + 2]]) / 3;

    /// <summary>The triangle well within which a place lies, by a look at each; -1 if there is none.</summary>
    private static int Around(Mesh mesh, Point place)
    {
        for (int t = 0; t < mesh.TriangleCount; t++)
        {
            bool isInside = true;
            for (int e = 3 * t; e < 3 * t + 3 && isInside; e++)
            {
                Point from = mesh.Nodes[MeshEdge.From(mesh, e)];
                Point along = mesh.Nodes[MeshEdge.To(mesh, e)] - from;
                isInside = along.Cross(place - from) > 1e-9 * along.Length * Longest(mesh, t);
            }
            if (isInside) return t;
        }
        return -1;
    }
}
