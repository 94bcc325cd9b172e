using System.Collections.Immutable;
using System.Globalization;
using MeshSection.Files.Quantities;
using MeshSection.Files.Tree;
using MeshSection.Geometry;
using MeshSection.Sections.Shapes;
using MeshSection.Units;

namespace MeshSection.Files.Shapes;

/// <summary>Reads one entry of "shapes".</summary>
internal static class ShapeReader
{
    /// <summary>The keys that every shape may have beside its dimensions; the first is required.</summary>
    public static ImmutableArray<string> PlacingKeys { get; } = ["type", "at", "turn", "mirror", "hole"];

    public static PlacedShape Read(Node node, QuantityReader quantities)
    {
        var type = TypeOf(node);
        var entry = new ObjectNode(node, type.WithArticle, [.. PlacingKeys, .. type.Dimensions.Select(d => d.Key)]);
        var dimensions = new DimensionReader(entry, quantities);
        var shape = type.Make(dimensions);
        var placement = new Placement(
            entry.Find("at") is { } at ? dimensions.Point(at) : Point.Origin,
            entry.Find("turn") is { } turn ? turn.FiniteNumber("an angle in degrees") / 90 * (0.5 * Math.PI) : 0,
            Mirrors: entry.Find("mirror")?.TrueOrFalse() ?? false);
        return new PlacedShape(type, placement, entry.Find("hole")?.TrueOrFalse() ?? false, node, Drawn(shape, type, node, quantities));
    }

    private static ShapeType TypeOf(Node node)
    {
        var names = ShapeType.All.Select(t => t.Name).ToArray();
        var word = ObjectNode.AnyObject(node, "a shape").Members.FirstOrDefault(m => m.Key == "type")?.Value
            ?? throw node.Fault(
                "\"type\" is missing from a shape.",
                $"Add \"type\": one of {string.Join(", ", names)}.");
        var name = word.FilledText("tee");
        return ShapeType.All.FirstOrDefault(t => t.Name == name)
            ?? throw word.Fault($"There is no shape \"{name}\".", NearestWord.Advice(name, names));
    }

    private static ImmutableArray<Boundary> Drawn(Shape shape, ShapeType type, Node node, QuantityReader quantities)
    {
        try
        {
            return shape.Boundaries();
        }
        catch (ShapeException fault)
        {
            var key = char.ToLowerInvariant(fault.Parameter[0]) + fault.Parameter[1..];
            throw Place(node, key).Fault(Problem(fault, key, type, quantities.BaseUnit), Remedy(fault, type));
        }
    }

    /// <summary>The node of a dimension, or of an item such as points[2]; the shape's own if the dimension was left out.</summary>
    private static Node Place(Node shape, string key)
    {
        var bracket = key.IndexOf('[', StringComparison.Ordinal);
        var found = shape.Members.FirstOrDefault(m => m.Key == (bracket < 0 ? key : key[..bracket]))?.Value ?? shape;
        return bracket < 0 ? found : found.Items.First(i => i.Path.EndsWith(key, StringComparison.Ordinal));
    }

    private static string Problem(ShapeException fault, string key, ShapeType type, LengthUnit? unit)
    {
        var isLength = type.Dimensions.Any(d => d.Key == key && d.Kind == DimensionKind.Length);
        string Shown(double value) => isLength
            ? string.Create(CultureInfo.InvariantCulture, $"{value / (unit ?? LengthUnit.Millimetre).Millimetres:g6} {unit ?? LengthUnit.Millimetre}")
            : value.ToString("g6", CultureInfo.InvariantCulture);
        var what = $"{key} of {type.WithArticle} is {Shown(fault.Value)}";
        return fault.Bound switch
        {
            ShapeBound.Finite => $"{key} of {type.WithArticle} is no finite number.",
            ShapeBound.Above => $"{what}, but it must be greater than {Shown(fault.Limit)}.",
            ShapeBound.AtLeast => $"{what}, but it must be at least {Shown(fault.Limit)}.",
            ShapeBound.Below => $"{what}, but with the other dimensions it must be less than {Shown(fault.Limit)}.",
            ShapeBound.AtMost => $"{what}, but with the other dimensions it can be {Shown(fault.Limit)} at most.",
            ShapeBound.Distinct => "This point repeats the one before it.",
            _ => throw new ArgumentOutOfRangeException(nameof(fault)),
        };
    }

    private static string Remedy(ShapeException fault, ShapeType type) => fault.Bound == ShapeBound.Distinct
        ? "Remove it; the last point is joined to the first by itself."
        : $"Check it against the other dimensions of the {type.Name} and their units.";
}
