using System.Collections.Immutable;
using MeshSection.Files.Quantities;
using MeshSection.Files.Shapes;
using MeshSection.Files.Tree;
using MeshSection.Geometry;
using MeshSection.Materials;
using MeshSection.Units;

namespace MeshSection.Files;

/// <summary>Reads section files: JSON with comments and trailing commas, as <c>docs/section-file.schema.json</c> describes.</summary>
public static class SectionFileReader
{
    internal static ImmutableArray<string> TopKeys { get; } =
        ["$schema", "title", "units", "outline", "shapes", "materials", "material"];

    internal static ImmutableArray<string> UnitKeys { get; } = ["length"];

    internal static ImmutableArray<string> OutlineKeys { get; } = ["drawing", "unit", "layers", "tolerance"];

    internal static ImmutableArray<string> MaterialKeys { get; } = ["density"];

    /// <summary>Reads a section file.</summary>
    /// <param name="path">Path of the file.</param>
    /// <exception cref="SectionFileException">The file cannot be read, or something in it is wrong.</exception>
    public static SectionFile Read(string path)
    {
        byte[] json;
        try
        {
            json = File.ReadAllBytes(path);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw new SectionFileException(
                path, null, "", File.Exists(path) ? "The file cannot be read." : "There is no such file.", "Check its path and its rights.");
        }

        return Parse(json, path);
    }

    /// <summary>Reads the text of a section file.</summary>
    /// <param name="json">The text, UTF-8.</param>
    /// <param name="path">The path of the file: named in messages, and the start of relative paths in it.</param>
    /// <exception cref="SectionFileException">Something in the text is wrong.</exception>
    public static SectionFile Parse(ReadOnlySpan<byte> json, string path)
    {
        var root = TreeReader.Read(json, path);
        var top = new ObjectNode(root, "a section file", TopKeys);
        var title = top.Find("title")?.FilledText("Sill beam") ?? "";
        var unit = top.Find("units") is { } units ? BaseUnit(units) : null;
        var quantities = new QuantityReader(unit);
        var materials = top.Find("materials") is { } list ? Materials(list) : [];
        var material = top.Find("material") is { } filling ? Named(filling, materials) : Only(materials, root);
        var drawing = top.Find("outline");
        var shapes = top.Find("shapes");
        if (drawing is null == shapes is null)
        {
            throw (shapes ?? root).Fault(
                shapes is null ? "There is neither an outline nor a shape." : "There are both an outline and shapes.",
                "Give \"outline\", which names a drawing, or \"shapes\", a list.");
        }

        return new SectionFile
        {
            Path = path,
            Title = title,
            Unit = unit,
            Drawing = drawing is null ? null : Drawing(drawing, quantities, path),
            Outline = shapes is null ? null : OutlineOf(shapes, quantities),
            Materials = materials,
            Material = material,
        };
    }

    private static LengthUnit BaseUnit(Node node) =>
        QuantityReader.Unit(new ObjectNode(node, "the units", UnitKeys).Require("length"));

    private static DrawingReference Drawing(Node node, QuantityReader quantities, string path)
    {
        var entry = new ObjectNode(node, "the outline", OutlineKeys);
        var name = entry.Require("drawing");
        var drawing = Path.Combine(Path.GetDirectoryName(path) ?? "", name.FilledText("frame.dxf"));
        if (!File.Exists(drawing))
        {
            throw name.Fault($"There is no drawing {drawing}.", "Give its path from the folder of the section file.");
        }

        return new DrawingReference(
            drawing,
            entry.Find("unit") is { } unit ? QuantityReader.Unit(unit) : null,
            entry.Find("layers") is { } layers ? [.. layers.FilledList("layers").Select(l => l.FilledText("OUTLINE"))] : [],
            entry.Find("tolerance") is { } tolerance ? quantities.PositiveLength(tolerance) : null);
    }

    private static Outline OutlineOf(Node node, QuantityReader quantities) => ShapeAssembly.Outline(
        [.. node.FilledList("shapes").Select(shape => ShapeReader.Read(shape, quantities))],
        quantities.BaseUnit ?? LengthUnit.Millimetre);

    private static ImmutableArray<Material> Materials(Node node) =>
        [.. ObjectNode.AnyObject(node, "the materials").Members.Select(Material)];

    private static Material Material(Member member)
    {
        if (string.IsNullOrWhiteSpace(member.Key))
        {
            throw member.Value.Fault("A material has no name.", "Name it, for example \"steel\".");
        }

        var entry = new ObjectNode(member.Value, "a material", MaterialKeys);
        return new Material(member.Key, entry.Find("density") is { } density ? QuantityReader.Density(density) : null);
    }

    private static Material? Only(ImmutableArray<Material> materials, Node root) => materials.Length <= 1
        ? materials.FirstOrDefault()
        : throw root.Fault(
            "Several materials are defined, but none is chosen.", $"Add \"material\": \"{materials[0].Name}\", or another of them.");

    private static Material Named(Node node, ImmutableArray<Material> materials)
    {
        var name = node.FilledText("steel");
        return materials.FirstOrDefault(m => m.Name == name) ?? throw node.Fault(
            $"No material \"{name}\" is defined.",
            materials.IsEmpty
                ? "Define it in \"materials\"."
                : NearestWord.Advice(name, [.. materials.Select(m => m.Name)]));
    }
}
