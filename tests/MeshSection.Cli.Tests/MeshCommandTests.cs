using System.Text.Json;
using MeshSection.Cli.Inputs;

namespace MeshSection.Cli.Tests;

/// <summary>What the mesh command can be asked for.</summary>
public class MeshCommandTests
{
    private static readonly string Shaft = Repository.PathOf("dxf-samples/winch-shaft.dxf");
    private static readonly string Deck = Repository.PathOf("dxf-samples/pontoon-deck.dxf");

    [Fact]
    public void Elements_across_walls_are_made_and_told()
    {
        var mesh = Json(Deck, "--across", "4");
        var wall = mesh.GetProperty("thinnestWall");
        Assert.Equal(2.43249, wall.GetProperty("thickness").GetDouble(), 1e-4);
        Assert.True(wall.GetProperty("elements").GetInt32() >= 4);
        Assert.True(mesh.GetProperty("triangles").GetInt32() > 2 * Json(Deck).GetProperty("triangles").GetInt32());
        Assert.Contains("elements across", CommandRun.Of("mesh", Deck, "--across", "2").Output, StringComparison.Ordinal);
    }

    [Fact]
    public void No_side_is_longer_than_the_element_size()
    {
        // An equilateral triangle of 2 mm has 1.732 mm².
        Assert.True(Json(Deck, "--element-size", "2mm").GetProperty("largestTriangle").GetDouble() <= 1.7321);
        Assert.True(Json(Deck, "--elements", "10").GetProperty("largestTriangle").GetDouble() > 1.7321);
        Assert.True(Json(Deck, "--region-size", "1=2mm").GetProperty("largestTriangle").GetDouble() <= 1.7321);
    }

    [Fact]
    public void Places_can_be_finer_and_kept()
    {
        using var folder = new TemporaryFolder();
        var file = folder.PathOf("mesh.msh");
        var run = CommandRun.Of(
            "mesh", Shaft, "--point", "1.25,4", "--line", "0.5,4.5,1.5,4.5", "--size-at", "1.25,4,0.01", "--out", file, "--quiet");
        Assert.Equal(new CommandRun(0, "", ""), run);
        var lines = File.ReadAllLines(file);
        Assert.Contains(lines, l => l.Split(' ') is [_, "1.25", "4", "0", ..]);
        Assert.Contains(lines, l => l.Split(' ') is [_, "0.5", "4.5", "0", ..]);
        Assert.Contains("1 3 \"line\"", lines);
    }

    [Fact]
    public void Several_files_are_written_and_named()
    {
        using var folder = new TemporaryFolder();
        string[] files = [folder.PathOf("a.vtu"), folder.PathOf("a.MSH"), folder.PathOf("a.png")];
        var run = CommandRun.Of("mesh", Shaft, "--order", "2", "--out", files[0], "--out", files[1], "--out", files[2]);
        Assert.Equal(0, run.Status);
        Assert.All(files, f => Assert.Contains(f, run.Output, StringComparison.Ordinal));
        Assert.All(files, f => Assert.True(new FileInfo(f).Length > 1000));
        Assert.Contains("<VTKFile", File.ReadAllText(files[0]), StringComparison.Ordinal);
        Assert.StartsWith("$MeshFormat", File.ReadAllText(files[1]), StringComparison.Ordinal);
        Assert.Equal("", CommandRun.Of("mesh", Shaft, "--out", files[0], "--quiet").Output);
    }

    [Fact]
    public void A_mesh_file_that_cannot_be_written_is_told()
    {
        using var folder = new TemporaryFolder();
        Directory.CreateDirectory(folder.PathOf("taken.vtu"));
        var run = CommandRun.Of("mesh", Shaft, "--quiet", "--out", folder.PathOf("taken.vtu"));
        Assert.Equal((2, ""), (run.Status, run.Output));
        Assert.Contains("taken.vtu: cannot be written", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void A_minimum_angle_beyond_the_proof_comes_with_a_caution()
    {
        Assert.Contains("28.6 degrees", CommandRun.Of("mesh", Shaft, "--min-angle", "33").Error, StringComparison.Ordinal);
        Assert.Contains("28.6 degrees", CommandRun.Of("properties", Shaft, "--min-angle", "33").Error, StringComparison.Ordinal);
        Assert.Equal("", CommandRun.Of("mesh", Shaft, "--min-angle", "28.6").Error);
        Assert.Equal("", CommandRun.Of("mesh", Shaft, "--min-angle", "33", "--quiet").Error);
    }

    [Fact]
    public void Sharp_corners_of_the_outline_are_named()
    {
        using var folder = new TemporaryFolder();
        var wedge = folder.Write("wedge.dxf", DxfText.Drawing(DxfText.Polyline("B1", (20, 30), (120, 30), (120, 40))));
        var run = CommandRun.Of("mesh", wedge);
        Assert.Equal(0, run.Status);
        Assert.Contains("Sharp corners of the outline", run.Output, StringComparison.Ordinal);
        Assert.Contains("(20, 30)", run.Output, StringComparison.Ordinal);
        Assert.Contains("5.71059°", run.Output, StringComparison.Ordinal);
        var corner = Assert.Single(Json(wedge).GetProperty("inputAngles").EnumerateArray());
        Assert.Equal(Math.Atan(0.1) * 180 / Math.PI, corner.GetProperty("angle").GetDouble(), 1e-10);
    }

    [Fact]
    public void A_mesh_that_ends_at_its_limit_says_so()
    {
        using var folder = new TemporaryFolder();
        var foil = folder.Write("foil.dxf", DxfText.Drawing(DxfText.Polyline("B1", (0, 0), (1e6, 0), (1e6, 1), (0, 1))));
        var run = CommandRun.Of("mesh", foil, "--json");
        Assert.Equal(0, run.Status);
        Assert.Contains("limit of", run.Error, StringComparison.Ordinal);
        Assert.Contains("thinner than it is long", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void What_memory_cannot_hold_is_refused_before_the_work()
    {
        new MemoryNeed(400).Check(1000, "--elements 1000", "Give fewer.");
        var fault = Assert.Throws<CommandException>(() => new MemoryNeed(1e12).Check(1e6, "--elements 1000000", "Give fewer."));
        Assert.Matches(@"^--elements 1000000: about 1E\+06 triangles would take 931322574\.6 GB of memory, and this process may use \d+\.\d GB\. Give fewer\.$", fault.Message);
    }

    private static JsonElement Json(string drawing, params string[] options)
    {
        var run = CommandRun.Of(["mesh", drawing, "--json", .. options]);
        Assert.Equal(0, run.Status);
        return JsonDocument.Parse(run.Output).RootElement.Clone();
    }
}
