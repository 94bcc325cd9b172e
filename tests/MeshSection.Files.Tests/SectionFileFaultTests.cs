using System.Text;

namespace MeshSection.Files.Tests;

/// <summary>Each thing that can be wrong has one clear message with its path, line and column.</summary>
public class SectionFileFaultTests
{
    private const string Mm = "\"units\": { \"length\": \"mm\" },";

    public static TheoryData<string, string, string, string> Wrong => new()
    {
        // Text, place, path, a part of the message.
        { "", "", "", "empty" },
        { " \n\t", "", "", "empty" },
        { "[1]", "1:1", "", "Expected a section file" },
        { "{ \"title\": }", "1:12", "", "not JSON" },
        { "{\n  \"title\": \"Rail\"\n  \"units\": 1 }", "3:3", "", "not JSON" },
        { "{ \"title\": \"Rail\"", "1:18", "", "not JSON" },
        { "{ \"title\": \"Rail\" } x", "1:21", "", "not JSON" },
        { "{ \"title\": \"a\",\n  \"title\": \"b\" }", "2:3", "title", "twice" },
        { "{ \"titel\": \"Rail\" }", "1:3", "titel", "Did you mean \"title\"?" },
        { "{ \"colour\": \"red\" }", "1:3", "colour", "Known here: $schema, title, units" },
        { "{ \"title\": 7 }", "1:12", "title", "Expected a text, but found the number 7." },
        { "{ \"title\": \" \" }", "1:12", "title", "Expected a text" },
        { "{ \"title\": \"Rail\" }", "1:1", "", "neither an outline nor a shape" },
        { "{ \"units\": \"mm\" }", "1:12", "units", "Expected the units, an object" },
        { "{ \"units\": {} }", "1:12", "units", "\"length\" is missing from the units" },
        { "{ \"units\": { \"lenght\": \"mm\" } }", "1:14", "units.lenght", "Did you mean \"length\"?" },
        { "{ \"units\": { \"length\": \"furlang\" } }", "1:24", "units.length", "\"furlang\" is no unit" },
        { "{ \"units\": { \"length\": \"kN\" } }", "1:24", "units.length", "\"kN\" is a unit of force" },
        { $"{{ {Mm} \"shapes\": [] }}", "1:42", "shapes", "an empty one" },
        { $"{{ {Mm} \"shapes\": 5 }}", "1:42", "shapes", "Expected a list of shapes" },
        { $"{{ {Mm} \"shapes\": [5] }}", "1:43", "shapes[0]", "Expected a shape, an object { }, but found the number 5." },
        { $"{{ {Mm} \"shapes\": [{{}}] }}", "1:43", "shapes[0]", "\"type\" is missing" },
        { $"{{ {Mm} \"shapes\": [{{ \"type\": null }}] }}", "1:53", "shapes[0].type", "found null" },
        { $"{{ {Mm} \"shapes\": [{{ \"type\": \"chanel\" }}] }}", "1:53", "shapes[0].type", "Did you mean \"channel\"?" },
        { $"{{ {Mm} \"outline\": {{ \"drawing\": \"a.dxf\" }}, \"shapes\": [] }}", "1:77", "shapes", "both an outline and shapes" },
        { "{ \"outline\": {} }", "1:14", "outline", "\"drawing\" is missing" },
        { "{ \"outline\": \"a.dxf\" }", "1:14", "outline", "Expected the outline, an object" },
        { "{ \"outline\": { \"drawing\": \"no-such.dxf\" } }", "1:27", "outline.drawing", "There is no drawing no-such.dxf." },
        { "{ \"materials\": [] }", "1:16", "materials", "Expected the materials, an object" },
        { "{ \"materials\": { \"steel\": 7850 } }", "1:27", "materials.steel", "Expected a material, an object" },
        { "{ \"materials\": { \"\": {} } }", "1:22", "materials.", "no name" },
        { "{ \"materials\": { \"steel\": { \"density\": 7850 } } }", "1:40", "materials.steel.density", "7850 has no unit" },
        { "{ \"materials\": { \"steel\": { \"density\": \"7850\" } } }", "1:40", "materials.steel.density", "has no unit" },
        { "{ \"materials\": { \"steel\": { \"density\": \"-1 kg/m3\" } } }", "1:40", "materials.steel.density", "greater than zero" },
        { "{ \"materials\": { \"steel\": { \"density\": \"0 kg/m3\" } } }", "1:40", "materials.steel.density", "greater than zero" },
        { "{ \"materials\": { \"steel\": { \"density\": \"7850 MPa\" } } }", "1:40", "materials.steel.density", "\"MPa\" is a unit of pressure, but a density" },
        { "{ \"materials\": { \"steel\": { \"weight\": 1 } } }", "1:29", "materials.steel.weight", "Known here: density" },
        { "{ \"material\": \"steel\" }", "1:15", "material", "No material \"steel\" is defined" },
        { "{ \"materials\": { \"steel\": {} }, \"material\": \"stele\" }", "1:45", "material", "Did you mean \"steel\"?" },
        { "{ \"materials\": { \"steel\": {}, \"oak\": {} } }", "1:1", "", "none is chosen" },
    };

    public static TheoryData<string, string, string> WrongShapes => new()
    {
        // Shape, path below shapes[0], a part of the message.
        { "\"type\": \"tee\"", "", "\"height\" is missing from a tee" },
        { "\"type\": \"circle\", \"diameter\": 5, \"radius\": 5", ".radius", "There is no key \"radius\" in a circle" },
        { "\"type\": \"circle\", \"diametre\": 5", ".diametre", "Did you mean \"diameter\"?" },
        { "\"type\": \"circle\", \"diameter\": -5", ".diameter", "diameter of a circle is -5 mm, but it must be greater than 0 mm" },
        { "\"type\": \"circle\", \"diameter\": 0", ".diameter", "must be greater than 0 mm" },
        { "\"type\": \"circle\", \"diameter\": 1e999", ".diameter", "Expected a length" },
        { "\"type\": \"circle\", \"diameter\": true", ".diameter", "Expected a length, but found true" },
        { "\"type\": \"circle\", \"diameter\": [5]", ".diameter", "Expected a length, but found a list" },
        { "\"type\": \"circle\", \"diameter\": \"five\"", ".diameter", "Expected a length, but found the text \"five\"" },
        { "\"type\": \"circle\", \"diameter\": \"5\"", ".diameter", "\"5\" has no unit" },
        { "\"type\": \"circle\", \"diameter\": \"4,5 in\"", ".diameter", "comma" },
        { "\"type\": \"circle\", \"diameter\": \"5 kg\"", ".diameter", "\"kg\" is a unit of mass, but a length is expected" },
        { "\"type\": \"circle\", \"diameter\": \"5 mmm\"", ".diameter", "\"mmm\" is no unit that is known" },
        { "\"type\": \"circle\", \"diameter\": \"NaN mm\"", ".diameter", "Expected a length" },
        { "\"type\": \"circle\", \"diameter\": \"1e300 km\", \"at\": [0, \"1e305 km\"]", ".at[1]", "too large" },
        { "\"type\": \"circle\", \"diameter\": 5, \"at\": 3", ".at", "Expected a point" },
        { "\"type\": \"circle\", \"diameter\": 5, \"at\": [1]", ".at", "Expected a point" },
        { "\"type\": \"circle\", \"diameter\": 5, \"at\": [1, \"2 s\"]", ".at[1]", "\"s\" is a unit of duration" },
        { "\"type\": \"circle\", \"diameter\": 5, \"turn\": \"90\"", ".turn", "Expected an angle in degrees" },
        { "\"type\": \"circle\", \"diameter\": 5, \"mirror\": 1", ".mirror", "Expected true or false, but found the number 1" },
        { "\"type\": \"circle\", \"diameter\": 5, \"hole\": \"yes\"", ".hole", "Expected true or false" },
        { "\"type\": \"rectangle\", \"width\": \"2 cm\", \"height\": 40, \"cornerRadius\": 11", ".cornerRadius", "is 11 mm, but with the other dimensions it can be 10 mm at most" },
        { "\"type\": \"tube\", \"diameter\": 5, \"thickness\": 3", ".thickness", "must be less than 2.5 mm" },
        { "\"type\": \"box\", \"width\": 50, \"height\": 90, \"thickness\": 5, \"outerRadius\": 20", ".outerRadius", "less than 17.0711 mm" },
        { "\"type\": \"regularPolygon\", \"sides\": 2, \"acrossFlats\": 5", ".sides", "is 2, but it must be at least 3" },
        { "\"type\": \"regularPolygon\", \"sides\": 6.5, \"acrossFlats\": 5", ".sides", "Expected a whole number" },
        { "\"type\": \"channel\", \"height\": 90, \"width\": 40, \"flangeThickness\": 6, \"webThickness\": 4, \"flangeSlope\": \"1:2\"", ".flangeSlope", "is 0.5, but with the other dimensions it must be less than 0.333333." },
        { "\"type\": \"channel\", \"height\": 90, \"width\": 40, \"flangeThickness\": 6, \"webThickness\": 4, \"flangeSlope\": \"steep\"", ".flangeSlope", "Expected a slope" },
        { "\"type\": \"polygon\", \"points\": []", ".points", "an empty one" },
        { "\"type\": \"polygon\", \"points\": [[0, 0], [1, 0]]", ".points", "is 2, but it must be at least 3" },
        { "\"type\": \"polygon\", \"points\": [[0, 0], [1, 0], [1, 0], [0, 1]]", ".points[2]", "repeats the one before it" },
        { "\"type\": \"polygon\", \"points\": [[0, 0], [10, 10], [20, 0], [0, 5]]", "", "crosses itself at (4, 4) mm" },
    };

    [Theory]
    [MemberData(nameof(Wrong))]
    public void A_wrong_file_is_told_with_its_place(string json, string place, string path, string part)
    {
        var fault = SectionText.Fault(json);
        Assert.Equal(place, fault.Place?.ToString() ?? "");
        Assert.Equal(path, fault.Path);
        Assert.Contains(part, fault.Message, StringComparison.Ordinal);
        Assert.StartsWith(place.Length > 0 ? $"rail.json:{place}: " : "rail.json: ", fault.Message, StringComparison.Ordinal);
        Assert.EndsWith(fault.Remedy, fault.Message, StringComparison.Ordinal);
        Assert.NotEmpty(fault.Remedy);
    }

    [Theory]
    [MemberData(nameof(WrongShapes))]
    public void A_wrong_shape_is_told_with_its_path(string shape, string path, string part)
    {
        var fault = SectionText.Fault(SectionText.With($"{{ {shape} }}"));
        Assert.Equal("shapes[0]" + path, fault.Path);
        Assert.Contains(part, fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_bare_length_without_a_base_unit_is_refused() => Assert.Contains(
        "12.5 has no unit, and the file has no base unit.",
        SectionText.Fault("""{ "shapes": [ { "type": "circle", "diameter": 12.5 } ] }""").Message,
        StringComparison.Ordinal);

    [Fact]
    public void Limits_are_told_in_the_base_unit_of_the_file() => Assert.Contains(
        "thickness of a tube is 3 in, but with the other dimensions it must be less than 2 in.",
        SectionText.Fault(
            """{ "units": { "length": "in" }, "shapes": [ { "type": "tube", "diameter": 4, "thickness": 3 } ] }""").Message,
        StringComparison.Ordinal);

    [Fact]
    public void Columns_count_characters_and_lines_count_from_one()
    {
        var fault = SectionText.Fault("{\n  \"title\": \"Träger\", \"größe\": 3\n}");
        Assert.Equal(new TextPlace(2, 22), fault.Place);
    }

    [Fact]
    public void Text_that_is_no_utf8_is_refused()
    {
        byte[] json = [.. Encoding.UTF8.GetBytes("{ \"title\": \"Tr"), 0xE4, .. Encoding.UTF8.GetBytes("ger\" }")];
        var fault = Assert.Throws<SectionFileException>(() => SectionFileReader.Parse(json, "rail.json"));
        Assert.Equal("1:12", fault.Place?.ToString());
    }

    [Fact]
    public void Nesting_without_end_is_refused() => Assert.Contains(
        "not JSON", SectionText.Fault(new string('[', 100_000)).Message, StringComparison.Ordinal);
}
