using System.Text.Json;

namespace MeshSection.Cli.Tests;

/// <summary>What the command line says of how a drawing is to be read.</summary>
public class DrawingOptionsTests
{
    private static readonly string PileCap = Repository.PathOf("dxf-samples/pile-cap.dxf");

    [Fact]
    public void Regions_and_bars_are_in_the_table_and_in_the_json()
    {
        string[] options = ["outline", PileCap, "--region", "CONCRETE", "--region", "STEEL", "--bars", "REBAR=16 mm"];
        Assert.Contains("1206.37", CommandRun.Of(options).Output, StringComparison.Ordinal);
        using var json = JsonDocument.Parse(CommandRun.Of([.. options, "--json"]).Output);
        var faces = json.RootElement.GetProperty("faces").EnumerateArray().ToDictionary(f => f.GetProperty("layer").GetString()!, f => f.GetProperty("area").GetDouble());
        Assert.Equal(7530, faces["STEEL"], 1e-9);
        Assert.Equal(292470, faces["CONCRETE"], 1e-9);
        var bars = json.RootElement.GetProperty("bars").EnumerateArray().ToArray();
        Assert.Equal(6, bars.Length);
        Assert.Equal((50.0, 50.0, 16.0), (bars[0].GetProperty("x").GetDouble(), bars[0].GetProperty("y").GetDouble(), bars[0].GetProperty("diameter").GetDouble()));
    }

    [Theory]
    [InlineData(292470, "--inside", "250,400")]
    [InlineData(7530, "--inside", "300,250")]
    [InlineData(300000, "--region", "CONCRETE", "--region", "STEEL")]
    [InlineData(300000, "--ignore", "ST*")]
    [InlineData(7530, "--colour", "blue")]
    [InlineData(300000, "--colour", "8")]
    public void The_area_is_that_of_what_is_chosen(double area, params string[] options)
    {
        using var json = JsonDocument.Parse(CommandRun.Of(["properties", PileCap, "--json", .. options]).Output);
        Assert.Equal(1, json.RootElement.GetProperty("area").GetDouble() / area, 1e-12);
    }

    [Theory]
    [InlineData("--colour pink", "red, yellow", "#C81E1E")]
    [InlineData("--colour 256", "1 to 255", "256")]
    [InlineData("--inside 250", "2 numbers", "120,35.5")]
    [InlineData("--inside 250,400,3", "2 numbers", "250,400,3")]
    [InlineData("--inside -9,-9", "--inside -9,-9", "no closed boundary")]
    [InlineData("--region ALUMINIUM", "'ALUMINIUM'", "'CONCRETE'")]
    [InlineData("--bars REBAR=wide", "--bars", "wide")]
    [InlineData("--ignore WOOD", "'WOOD'", "'STEEL'")]
    public void A_value_that_makes_no_sense_is_refused(string option, params string[] parts)
    {
        var run = CommandRun.Of(["outline", PileCap, .. option.Split(' ')]);
        Assert.Equal((2, ""), (run.Status, run.Output));
        Assert.All(parts, part => Assert.Contains(part, run.Error, StringComparison.Ordinal));
    }

    [Fact]
    public void Options_for_drawings_are_refused_for_section_files()
    {
        var run = CommandRun.Of("properties", Repository.PathOf("docs/examples/winch-shaft.json"), "--inside", "1,1");
        Assert.Equal(2, run.Status);
        Assert.Contains("--inside is for drawings", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Regions_of_several_layers_are_told_to_be_one_material_and_bars_to_be_left_out()
    {
        var run = CommandRun.Of("properties", PileCap, "--region", "CONCRETE", "--region", "STEEL", "--bars", "REBAR=16");
        Assert.Contains("CONCRETE, STEEL", run.Error, StringComparison.Ordinal);
        Assert.Contains("6 bars", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void An_overlay_never_takes_the_place_of_the_drawing()
    {
        using var folder = new TemporaryFolder();
        var drawing = folder.PathOf("cap.dxf");
        File.Copy(PileCap, drawing);
        var run = CommandRun.Of("properties", drawing, "--out", folder.PathOf("CAP.dxf"));
        Assert.Equal(2, run.Status);
        Assert.Contains("this is the input", run.Error, StringComparison.Ordinal);
        var done = CommandRun.Of("properties", drawing, "--out", folder.PathOf("over.dxf"));
        Assert.Contains($"Overlay: {folder.PathOf("over.dxf")}", done.Output, StringComparison.Ordinal);
        Assert.Equal(0, CommandRun.Of("outline", folder.PathOf("over.dxf")).Status switch { 0 or 2 => 0, var status => status });
    }

    [Fact]
    public void An_overlay_of_a_section_in_another_plane_is_refused()
    {
        using var folder = new TemporaryFolder();
        var drawing = Repository.PathOf("tests/MeshSection.Dxf.Tests/Drawings/06-plane-xz.dxf");
        var run = CommandRun.Of("properties", drawing, "--unit", "mm", "--out", folder.PathOf("over.dxf"));
        Assert.Equal(2, run.Status);
        Assert.Contains("xy plane", run.Error, StringComparison.Ordinal);
    }
}
