using MeshSection.Geometry;
using MeshSection.Meshing;
using static MeshSection.Tests.Meshing.Graphs;

namespace MeshSection.Tests.Meshing;

public class WallTests
{
    private static CancellationToken Token => TestContext.Current.CancellationToken;

    /// <summary>A 1.5 sheet on a block of 500, a tapered flange, a tube, a box with unequal walls, a plate.</summary>
    private static readonly Dictionary<string, (PlanarGraph Graph, double Thinnest)> Sections = new()
    {
        ["sheet on a block"] = (Graphs.Of(Polygon(
            0, 0, 500, 0, 500, 500, 300, 500, 300, 1000, 298.5, 1000, 298.5, 500, 0, 500)), 1.5),
        ["taper"] = (Graphs.Of(Polygon(0, 0, 100, 0, 100, 10, 0, 2)), 2),
        ["taper of 27 degrees"] = (Graphs.Of(Polygon(0, 0, 100, 0, 100, 60, 0, 10)), 10),
        ["faces turned by 109 degrees"] = (Graphs.Of(Polygon(0, 0, 100, 0, 100, 300, 0, 10)), 100),
        ["tube"] = (Graphs.Of(Circle(0, 0, 100, 90), Hole(Circle(0, 0, 80, 90))), 20 * Math.Cos(Math.PI / 90)),
        ["box"] = (Graphs.Of(Rectangle(0, 0, 100, 60), Hole(Rectangle(5, 8, 92, 48))), 3),
        ["plate"] = (Graphs.Of(Rectangle(0, 0, 200, 1)), 1),
        ["two materials"] = (TwoMaterials(), 0.5),
    };

    public static TheoryData<string, int> Counts()
    {
        var data = new TheoryData<string, int>();
        foreach (string name in Sections.Keys)
        {
            foreach (int count in new[] { 1, 2, 3, 7 }) data.Add(name, count);
        }
        return data;
    }

    [Fact]
    public void The_thinnest_wall_is_found_from_the_geometry()
    {
        foreach ((PlanarGraph graph, double thickness) in Sections.Values)
        {
            foreach (double angle in new[] { 0, 0.3, 2 })
            {
                PlanarGraph moved = Moved(graph, 7, angle, new Point(1000, -300));
                Wall wall = WallSurvey.Thinnest(DelaunayMesherTests.Sound(moved, new MeshSettings()), moved)!;
                Assert.Equal(7 * thickness, wall.Thickness, 1e-6 * thickness);
                Assert.Equal(wall.Thickness, wall.From.DistanceTo(wall.To), 1e-9 * thickness);
                Assert.True(wall.Elements >= 1);
            }
        }
    }

    [Fact]
    public void A_wedge_a_triangle_and_a_notch_have_no_wall()
    {
        foreach (PlanarGraph graph in new[]
        {
            Graphs.Of(Wedge(20, 100, 100)),
            Graphs.Of(Polygon(0, 0, 50, 0, 25, 43)),
        })
        {
            Mesh mesh = DelaunayMesherTests.Sound(graph, new MeshSettings { MaxArea = 20 });
            Assert.Null(WallSurvey.Thinnest(mesh, graph));
            Assert.Empty(WallSurvey.Of(mesh, graph).SidesFor(5));
        }
    }

    [Theory]
    [MemberData(nameof(Counts))]
    public void Every_way_across_a_wall_takes_enough_elements(string name, int count)
    {
        PlanarGraph graph = Sections[name].Graph;
        var settings = new MeshSettings();
        var mesher = new DelaunayMesher();
        Mesh mesh = MeshSizing.AcrossWalls(mesher, mesher.Triangulate(graph, settings, Token), graph, settings, count, Token);
        Assert.Empty(MeshCheck.Faults(mesh, graph));
        DelaunayMesherTests.AssertQuality(mesh, settings.MinAngle);
        Wall wall = WallSurvey.Thinnest(mesh, graph)!;
        Assert.True(wall.Elements >= count, $"{wall.Elements} elements across");
        Assert.Empty(WallSurvey.Of(mesh, graph).SidesFor(count));

        // Straight ways across from many places of every boundary, met by brute force.
        foreach ((int e, double place) in Places(mesh))
        {
            if (WayAcross(mesh, graph, e, place) is { } way) Assert.True(way >= count, $"{way} triangles across at edge {e}");
        }
    }

    [Fact]
    public void Only_the_walls_are_refined()
    {
        PlanarGraph graph = Sections["sheet on a block"].Graph;
        var settings = new MeshSettings();
        var mesher = new DelaunayMesher();
        Mesh mesh = MeshSizing.AcrossWalls(mesher, mesher.Triangulate(graph, settings, Token), graph, settings, 3, Token);
        int inBlock = Enumerable.Range(0, mesh.TriangleCount).Count(t => mesh.Nodes[mesh.Corners[3 * t]].Y < 450);
        Assert.InRange(inBlock, 20, 0.05 * mesh.TriangleCount);
    }

    [Fact]
    public void In_walls_of_even_thickness_the_estimate_is_near()
    {
        var mesher = new DelaunayMesher();
        foreach (string name in new[] { "sheet on a block", "tube", "box", "plate" })
        {
            PlanarGraph graph = Sections[name].Graph;
            Mesh mesh = mesher.Triangulate(graph, new MeshSettings(), Token);
            double estimate = WallSurvey.Of(mesh, graph).Estimate(6);
            int count = MeshSizing.AcrossWalls(mesher, mesh, graph, new MeshSettings(), 6, Token).TriangleCount;
            Assert.InRange(count / estimate, 0.7, 1.5);
        }
    }

    /// <summary>A sheet of 0.5 of another material glued to a block, and a strip of 4 on the sheet.</summary>
    private static PlanarGraph TwoMaterials() => new Graphs()
        .Line(new(0, 0), new(60, 0), 0, -1).Line(new(60, 0), new(60, 40), 0, -1)
        .Line(new(60, 40), new(60, 40.5), 1, -1).Line(new(60, 40.5), new(60, 44.5), 0, -1)
        .Line(new(60, 44.5), new(0, 44.5), 0, -1).Line(new(0, 44.5), new(0, 40.5), 0, -1)
        .Line(new(0, 40.5), new(0, 40), 1, -1).Line(new(0, 40), new(0, 0), 0, -1)
        .Line(new(0, 40), new(60, 40), 1, 0).Line(new(0, 40.5), new(60, 40.5), 0, 1)
        .Build();

    private static IEnumerable<(int Edge, double Place)> Places(Mesh mesh)
    {
        var random = new Random(5);
        int[] faces = [.. Enumerable.Range(0, mesh.Segments.Length).Where(e => mesh.Segments[e] >= 0)];
        for (int i = 0; i < 300; i++) yield return (faces[random.Next(faces.Length)], random.NextDouble());
    }

    /// <summary>
    /// How many triangles a way straight in from an edge runs through before it meets a boundary of the region that faces
    /// it; null if what it meets does not face it, or meets it in a corner.
    /// </summary>
    private static int? WayAcross(Mesh mesh, PlanarGraph graph, int face, double fraction)
    {
        Point a = mesh.Nodes[MeshEdge.From(mesh, face)];
        Point chord = mesh.Nodes[MeshEdge.To(mesh, face)] - a;
        Point start = a + fraction * chord;
        Point inward = chord.Left() / chord.Length;
        int count = 0;
        int t = face / 3;
        int entered = face;
        while (true)
        {
            count++;
            int exit = -1;
            for (int e = 3 * t; e < 3 * t + 3; e++)
            {
                if (e == entered) continue;
                double from = inward.Cross(mesh.Nodes[MeshEdge.From(mesh, e)] - start);
                double to = inward.Cross(mesh.Nodes[MeshEdge.To(mesh, e)] - start);
                if (from <= 0 && to >= 0) exit = e;
            }
            if (exit < 0) return null;
            int next = mesh.Neighbours[exit];
            if (next < 0 || mesh.Regions[next] != mesh.Regions[t])
            {
                Point across = mesh.Nodes[MeshEdge.To(mesh, exit)] - mesh.Nodes[MeshEdge.From(mesh, exit)];
                Segment own = graph.Segments[mesh.Segments[face]];
                Segment other = graph.Segments[mesh.Segments[exit]];
                bool isCorner = own.From == other.To || own.To == other.From;
                return !isCorner && across.Dot(chord) < -0.867 * across.Length * chord.Length ? count : null;
            }
            entered = Enumerable.Range(3 * next, 3).First(e => mesh.Neighbours[e] == t);
            t = next;
        }
    }
}
