using System.Text.Json;
using System.Text.Json.Nodes;
using Json.Schema;
using MeshSection.Files.Shapes;

namespace MeshSection.Files.Tests;

/// <summary>The published schema says what the reader reads, no more and no less.</summary>
public class SchemaTests
{
    private static readonly JsonDocumentOptions Relaxed =
        new() { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true };

    private static readonly JsonNode Root = Parsed(File.ReadAllText(Path.Combine(Repository.Docs, "section-file.schema.json")));

    private static readonly JsonSchema Schema = JsonSchema.FromText(Root.ToJsonString());

    public static TheoryData<string> Examples => [.. Repository.Examples];

    public static TheoryData<string> ShapeNames => [.. ShapeType.All.Select(t => t.Name)];

    [Fact]
    public void Top_keys_are_those_that_the_reader_knows()
    {
        Assert.Equal(SectionFileReader.TopKeys, Keys(Root));
        Assert.Equal(SectionFileReader.UnitKeys, Keys(Root["properties"]?["units"]));
        Assert.Equal(SectionFileReader.OutlineKeys, Keys(Root["properties"]?["outline"]));
        Assert.Equal(SectionFileReader.MaterialKeys, Keys(Root["properties"]?["materials"]?["additionalProperties"]));
    }

    [Fact]
    public void Shapes_are_those_that_the_reader_knows() => Assert.Equal(
        ShapeType.All.Select(t => $"#/$defs/{t.Name}"),
        Root["properties"]?["shapes"]?["items"]?["oneOf"]?.AsArray().Select(s => s?["$ref"]?.GetValue<string>()));

    [Theory]
    [MemberData(nameof(ShapeNames))]
    public void Keys_of_a_shape_are_those_that_the_reader_knows(string name)
    {
        var type = ShapeType.All.Single(t => t.Name == name);
        var schema = Root["$defs"]?[name];
        Assert.Equal(
            ShapeReader.PlacingKeys.Concat(type.Dimensions.Select(d => d.Key)).Order(StringComparer.Ordinal),
            Keys(schema).Order(StringComparer.Ordinal));
        Assert.Equal(
            type.Dimensions.Where(d => d.IsRequired).Select(d => d.Key).Prepend("type"),
            schema?["required"]?.AsArray().Select(k => k?.GetValue<string>() ?? ""));
        Assert.Equal(name, schema?["properties"]?["type"]?["const"]?.GetValue<string>());
    }

    [Theory]
    [MemberData(nameof(ShapeNames))]
    public void Reader_takes_the_least_that_the_schema_asks_for(string name)
    {
        // One length fits every dimension but these.
        var values = ShapeType.All.Single(t => t.Name == name).Dimensions.Where(d => d.IsRequired).Select(d => d.Key switch
        {
            "sides" => "\"sides\": 6",
            "points" => "\"points\": [[0, 0], [1, 0], [0, 1]]",
            "thickness" or "flangeThickness" or "webThickness" => $"\"{d.Key}\": \"1 mm\"",
            _ => $"\"{d.Key}\": 40",
        });
        var text = SectionText.With($"{{ \"type\": \"{name}\", {string.Join(", ", values)} }}");
        Assert.True(IsValid(text));
        Assert.NotNull(SectionText.Parse(text).Outline);
    }

    [Theory]
    [MemberData(nameof(Examples))]
    public void Examples_are_valid_and_can_be_read(string path)
    {
        Assert.True(IsValid(File.ReadAllText(path)));
        var file = SectionFileReader.Read(path);
        Assert.NotEmpty(file.Title);
        Assert.True(file.Outline is not null ^ file.Drawing is not null);
        Assert.True(file.Drawing is null || File.Exists(file.Drawing.Path));
    }

    [Fact]
    public void There_are_examples() => Assert.True(Examples.Count >= 4);

    [Theory]
    [InlineData("{}")]
    [InlineData("""{ "shapes": [] }""")]
    [InlineData("""{ "shapes": [ { "type": "blob" } ] }""")]
    [InlineData("""{ "shapes": [ { "type": "circle" } ] }""")]
    [InlineData("""{ "shapes": [ { "type": "circle", "diameter": -5 } ] }""")]
    [InlineData("""{ "shapes": [ { "type": "circle", "diameter": "4,5 in" } ] }""")]
    [InlineData("""{ "shapes": [ { "type": "circle", "diameter": "5" } ] }""")]
    [InlineData("""{ "shapes": [ { "type": "circle", "diameter": "5 mm", "radius": 3 } ] }""")]
    [InlineData("""{ "units": {}, "shapes": [ { "type": "circle", "diameter": 5 } ] }""")]
    [InlineData("""{ "shapes": [ { "type": "circle", "diameter": "5 mm" } ], "materials": { "steel": { "density": 7850 } } }""")]
    public void What_the_reader_refuses_the_schema_refuses(string text)
    {
        Assert.False(IsValid(text));
        SectionText.Fault(text);
    }

    private static IEnumerable<string> Keys(JsonNode? schema)
    {
        Assert.False(schema?["additionalProperties"]?.GetValue<bool>());
        return schema?["properties"]?.AsObject().Select(p => p.Key) ?? [];
    }

    private static bool IsValid(string text)
    {
        using var document = JsonDocument.Parse(text, Relaxed);
        return Schema.Evaluate(document.RootElement).IsValid;
    }

    private static JsonNode Parsed(string text) => JsonNode.Parse(text) ?? throw new InvalidOperationException();
}
