using MeshSection.Geometry;

namespace MeshSection.Dxf.Tests;

/// <summary>The drawings that come with the program are read as their description says.</summary>
public class SampleDrawingsTest
{
    [Theory]
    [InlineData("handrail-channel", 0, 32, 16, 70, 32)]
    [InlineData("deck-plank", 4, 114, 46, 256, 53)]
    [InlineData("runway-tee", 0, 10, 0, 8 * 25.4, 10.75 * 25.4)]
    [InlineData("eaves-angle", 0, 9, 3, 90, 150)]
    [InlineData("winch-shaft", 1, 4, 4, 90, 90)]
    [InlineData("footbridge-girder", 0, 16, 0, 500, 2000)]
    [InlineData("gate-post", 3, 26, 14, 120, 80)]
    [InlineData("pontoon-deck", 9, 196, 84, 300, 71.5)]
    public void Sample_has_the_holes_edges_and_size_of_its_description(
        string name, int holes, int edges, int arcs, double width, double height)
    {
        var outline = Outline(name, ["SECTION", "STEEL", "ANGLE", "SHAFT", "GIRDER"]).Outline;

        Assert.Single(outline.Boundaries, b => b.Role == BoundaryRole.Outer);
        Assert.Equal(holes, outline.Boundaries.Count(b => b.Role == BoundaryRole.Hole));
        Assert.Equal(edges, outline.Boundaries.Sum(b => b.Boundary.Edges.Length));
        Assert.Equal(arcs, outline.Boundaries.Sum(b => b.Boundary.Edges.Count(e => e is ArcEdge)));
        Assert.Equal(width, outline.Bounds.Width, 1e-3);
        Assert.Equal(height, outline.Bounds.Height, 1e-3);
    }

    [Fact]
    public void Only_three_have_something_to_tell()
    {
        // Faults in the gate post, centre lines on the fender, and steel in the concrete of the pile cap.
        foreach (var name in Names.Except(["gate-post", "quay-fender", "pile-cap"]))
        {
            var report = Outline(name, []).Report;
            Assert.Empty(report.Repairs);
            Assert.Empty(report.Cautions);
        }
    }

    [Fact]
    public void The_gate_post_shows_every_repair_and_what_was_left_out()
    {
        var report = Outline("gate-post", ["sect*"]).Report;

        Assert.Equal(
            [NoteCode.GapBridged, NoteCode.GapBridged, NoteCode.PolylineClosed, NoteCode.DuplicateDropped],
            report.Repairs.Select(n => n.Code));
        Assert.Equal([0.0003, 0.0004], report.Repairs.Take(2).Select(n => Math.Round(n.Distance!.Value, 9)));
        Assert.Equal(9, report.LeftOut.Sum(c => c.Count));
    }

    [Fact]
    public void The_gate_post_as_a_whole_is_the_same_without_its_centre_lines()
    {
        var (whole, section) = (Outline("gate-post", []), Outline("gate-post", ["SECTION"]));

        Assert.Equal(Coordinates(section), Coordinates(whole));
        Assert.All(whole.Report.Repairs.Where(r => r.Code == NoteCode.DanglingLeftOut), r => Assert.Equal("CENTRE", Assert.Single(r.Sources).Layer));
        Assert.Contains(whole.Report.Repairs, r => r.Code == NoteCode.DanglingLeftOut);
    }

    private static IEnumerable<(Geometry.Point, Geometry.Point)> Coordinates(DrawingOutline outline) => outline.Outline.Boundaries
        .SelectMany(b => b.Boundary.Edges).Select(e => (e.Start + outline.Outline.Origin, e.End + outline.Outline.Origin));

    private static string Folder => Path.Combine(AppContext.BaseDirectory, "dxf-samples");

    private static IEnumerable<string> Names => Directory.GetFiles(Folder, "*.dxf").Select(f => Path.GetFileNameWithoutExtension(f)!);

    private static DrawingOutline Outline(string name, string[] layers)
    {
        using var file = File.OpenRead(Path.Combine(Folder, name + ".dxf"));
        var drawing = new DxfReader().Read(file);
        var known = layers.Where(l => l.Contains('*') || drawing.Layers.Any(k => k.Name == l)).ToArray();
        return DrawingOutliner.Outline(drawing, new OutlineOptions { Layers = known });
    }
}
