namespace MeshSection.Cli.Tests;

/// <summary>Wrong input gets one clear message on standard error and exit status 2; nothing goes to standard output.</summary>
public class BadInputTests
{
    private static readonly string Square = DxfText.Square(0, 0, 10);

    /// <summary>Name, drawing, and facts that its message must hold.</summary>
    private static readonly Dictionary<string, (string Text, string[] Facts)> Drawings = new()
    {
        ["empty"] = ("", ["empty"]),
        ["no dxf"] = ("Dear Sir,\nplease find attached\n", ["line 1", "Dear Sir,"]),
        ["cut off"] = (DxfText.Drawing(Square)[..^40], ["cut off"]),
        ["group code"] = (DxfText.Drawing(Square).Replace("\n90\n", "\nninety\n", StringComparison.Ordinal), ["Line 21", "ninety"]),
        ["not a number"] = (DxfText.Drawing(DxfText.Line(0, 0, 1, 0)).Replace("\n21\n0\n", "\n21\nNaN\n", StringComparison.Ordinal), ["group 21", "LINE #A1", "FRAME", "NaN"]),
        ["infinite"] = (DxfText.Drawing(DxfText.Line(0, 0, 1, 0)).Replace("\n21\n0\n", "\n21\n1e400\n", StringComparison.Ordinal), ["group 21", "LINE #A1", "1e400"]),
        ["decimal comma"] = (DxfText.Drawing(DxfText.Line(0, 0, 1, 0)).Replace("\n21\n0\n", "\n21\n0,5\n", StringComparison.Ordinal), ["0,5", "decimal point"]),
        ["no boundary"] = (DxfText.Drawing("0\nTEXT\n8\nNOTES\n1\nhello\n"), ["TEXT", "NOTES"]),
        ["open"] = (
            DxfText.Drawing(DxfText.Line(0, 0, 10, 0, "A1") + DxfText.Line(10, 0, 10, 10, "A2") + DxfText.Line(10, 10, 0.5, 0.7, "A3")),
            ["open", "#A1", "#A3", "FRAME", "(0, 0)", "(0.5, 0.7)", "0.86", "--tolerance"]),
        ["crosses itself"] = (DxfText.Drawing(DxfText.Polyline("B7", (0, 0), (10, 10), (10, 0), (0, 10))), ["#B7", "(5, 5)", "crosses itself"]),
        ["overlap"] = (DxfText.Drawing(Square + DxfText.Square(5, 5, 10, "B2")), ["#B1", "#B2"]),
        ["hole touches"] = (DxfText.Drawing(Square + DxfText.Circle(2, 5, 2)), ["#B1", "#C1", "touch"]),
        ["hole crosses"] = (DxfText.Drawing(Square + DxfText.Circle(0, 5, 2)), ["#B1", "#C1", "cross"]),
        ["no area"] = (DxfText.Drawing(DxfText.Polyline("B3", (0, 0), (10, 0), (4, 0))), ["#B3"]),
        ["no unit"] = (DxfText.Drawing(Square, unit: null), ["--unit", "10 x 10 mm", "254"]),
        ["no unit in the header"] = (DxfText.Drawing(Square, unit: 0), ["--unit"]),
    };

    public static TheoryData<string> Names => [.. Drawings.Keys];

    [Theory]
    [MemberData(nameof(Names))]
    public void A_wrong_drawing_is_refused_with_what_where_and_what_to_do(string name)
    {
        using var folder = new TemporaryFolder();
        var path = folder.Write("drawing.dxf", Drawings[name].Text);
        foreach (var command in new[] { "outline", "mesh", "properties" })
        {
            Refused(CommandRun.Of(command, path), ["drawing.dxf", .. Drawings[name].Facts]);
        }
    }

    [Fact]
    public void Edges_drawn_twice_are_dropped_and_listed()
    {
        using var folder = new TemporaryFolder();
        var sides = DxfText.Line(0, 0, 9, 0, "A1") + DxfText.Line(9, 0, 9, 9, "A2") + DxfText.Line(9, 9, 0, 0, "A3");
        var path = folder.Write("twice.dxf", DxfText.Drawing(sides + DxfText.Line(9, 0, 0, 0, "A4")));
        var run = CommandRun.Of("properties", path);
        Assert.Equal(0, run.Status);
        Assert.Contains("DR403", run.Error, StringComparison.Ordinal);
        Assert.Contains("#A4", run.Error, StringComparison.Ordinal);
        Assert.Contains("40.5", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_that_is_not_there_is_named_with_what_is_near()
    {
        using var folder = new TemporaryFolder();
        folder.Write("bracket.dxf", DxfText.Drawing(Square));
        Refused(CommandRun.Of("outline", folder.PathOf("bracket2.dxf")), ["bracket2.dxf", "no such file", "bracket.dxf"]);
        Refused(CommandRun.Of("outline", folder.PathOf("none/x.json")), ["x.json", "no such file"]);
        Directory.CreateDirectory(folder.PathOf("folder.dxf"));
        Refused(CommandRun.Of("outline", folder.PathOf("folder.dxf")), ["is a folder"]);
        Directory.CreateDirectory(folder.PathOf("drawings"));
        Refused(CommandRun.Of("outline", folder.PathOf("drawings")), ["drawings", "is a folder"]);
        Refused(CommandRun.Of("outline", folder.PathOf("bracket")), ["no such file", "bracket.dxf"]);
        Refused(CommandRun.Of("outline", ""), ["no such file"]);
        Refused(CommandRun.Of("outline", folder.Write("sheet.pdf", "x")), [".dxf", ".json", "'.pdf'"]);
    }

    [Theory]
    [InlineData("prop", "no command", "properties")]
    [InlineData("properties FILE --densty 3", "--densty", "--density")]
    [InlineData("properties", "INPUT")]
    [InlineData("properties FILE other.dxf", "other.dxf", "one input")]
    [InlineData("properties FILE --elements 10 --element-size 1", "--element-size", "one of them")]
    [InlineData("properties FILE --elements 0", "--elements 0")]
    [InlineData("properties FILE --elements many", "--elements many", "whole number")]
    [InlineData("properties FILE --elements 99999999999", "--elements 99999999999", "5000000")]
    [InlineData("properties FILE --min-angle 20,5", "--min-angle 20,5", "decimal point")]
    [InlineData("properties FILE --sag 1e-300", "--sag 1E-300", "chords")]
    [InlineData("properties @none.dxf", "@none.dxf", "no such file")]
    [InlineData("properties FILE --element-size 1e-5", "--element-size", "triangles")]
    [InlineData("properties FILE --min-angle 40", "--min-angle 40", "33")]
    [InlineData("properties FILE --min-angle NaN", "--min-angle")]
    [InlineData("properties FILE --sag 0", "--sag 0")]
    [InlineData("properties FILE --tolerance -1", "--tolerance")]
    [InlineData("properties FILE --tolerance 0,05", "0,05", "decimal point")]
    [InlineData("properties FILE --tolerance 50", "tolerance")]
    [InlineData("properties FILE --tolerance 1furlong", "furlong", "mm")]
    [InlineData("properties FILE --unit milimeter", "milimeter", "mm")]
    [InlineData("properties FILE --layer NOTHING", "NOTHING", "FRAME")]
    [InlineData("properties FILE --density 2700", "2700", "kg/m3")]
    [InlineData("properties FILE --density -1kg/m3", "--density")]
    [InlineData("properties FILE --out picture.jpg", "picture.jpg", ".png")]
    [InlineData("properties FILE --out no/such/folder/p.png", "no folder")]
    [InlineData("properties FILE --across 0", "--across 0", "whole number")]
    [InlineData("properties FILE --across 1000", "--across 1000", "triangles", "Give fewer")]
    [InlineData("mesh FILE --point 5", "--point 5", "2 numbers", "decimal points")]
    [InlineData("mesh FILE --point 1,2,3", "--point 1,2,3", "2 numbers")]
    [InlineData("mesh FILE --point 1e999,2", "--point 1e999,2", "2 numbers")]
    [InlineData("mesh FILE --point 50,5", "--point (50, 5)", "outside of the section", "(0, 0) to (10, 10) mm")]
    [InlineData("mesh FILE --point 5,5", "--point (5, 5)", "outside of the section")]
    [InlineData("mesh FILE --point -1,5", "--point (-1, 5)", "outside of the section")]
    [InlineData("mesh FILE --line 1,1,20,1", "--line from (1, 1) to (20, 1)", "its end (20, 1)", "outside")]
    [InlineData("mesh FILE --line 1,5.5,9,5.5", "meets a boundary of the section at (3.06")]
    [InlineData("mesh FILE --line 1,1,1,1", "ends where it begins")]
    [InlineData("mesh FILE --size-at 1,1,0", "--size-at 1,1,0", "above zero")]
    [InlineData("mesh FILE --region-size 2=1mm", "--region-size 2", "one region, number 1")]
    [InlineData("mesh FILE --region-size 1=1e-6mm", "--region-size", "triangles", "longer")]
    [InlineData("mesh FILE --region-size 1mm", "--region-size 1mm", "2=1.5mm")]
    [InlineData("mesh FILE --order 3", "--order 3", "1 or 2")]
    [InlineData("mesh FILE --out mesh.stl", "mesh.stl", ".png, .vtu or .msh")]
    [InlineData("properties FILE --out mesh.vtu", "mesh.vtu", ".png")]
    [InlineData("properties JSON --unit mm", "--unit", "units")]
    [InlineData("completion tcsh", "tcsh")]
    public void A_wrong_command_line_is_refused_with_the_option(string line, params string[] facts)
    {
        using var folder = new TemporaryFolder();
        var drawing = folder.Write("square.dxf", DxfText.Drawing(Square + DxfText.Circle(5, 5, 2)));
        var section = folder.Write("square.json", """{ "shapes": [{ "type": "rectangle", "width": "1 mm", "height": "1 mm" }] }""");
        Refused(CommandRun.Of(line.Split(' ').Select(w => w == "FILE" ? drawing : w == "JSON" ? section : w).ToArray()), facts);
    }

    [Fact]
    public void A_wrong_section_file_is_refused_with_line_and_path()
    {
        using var folder = new TemporaryFolder();
        var path = folder.Write("beam.json", "{\n  \"shapes\": [\n    { \"type\": \"rectangle\", \"width\": \"10 kg\", \"height\": \"1 mm\" }\n  ]\n}\n");
        Refused(CommandRun.Of("properties", path), ["beam.json:3:", "shapes[0].width", "10 kg".Split(' ')[1]]);
    }

    [Fact]
    public void A_wrong_drawing_that_a_section_file_names_is_named_itself()
    {
        using var folder = new TemporaryFolder();
        folder.Write("rail.dxf", DxfText.Drawing(DxfText.Line(0, 0, 1, 0)));
        var path = folder.Write("rail.json", """{ "outline": { "drawing": "rail.dxf" } }""");
        Refused(CommandRun.Of("properties", path), ["rail.dxf: ", "open", "#A1"]);
    }

    private static void Refused(CommandRun run, IEnumerable<string> facts)
    {
        Assert.Equal((2, ""), (run.Status, run.Output));
        Assert.StartsWith("meshsection: ", run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("System.", run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("Exception", run.Error, StringComparison.Ordinal);
        Assert.All(facts, fact => Assert.Contains(fact, run.Error, StringComparison.Ordinal));
    }
}
