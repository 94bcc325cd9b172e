using System.Globalization;
using MeshSection.Files.Tree;
using MeshSection.Units;

namespace MeshSection.Files.Quantities;

/// <summary>Reads quantities: bare numbers in the file's base unit, or texts with a unit.</summary>
/// <param name="BaseUnit">The unit of bare lengths; null if the file names none.</param>
internal sealed record QuantityReader(LengthUnit? BaseUnit)
{
    private const string LengthExample = "\"250 mm\"";
    private const string DensityExample = "\"7850 kg/m3\"";

    /// <summary>A length in mm.</summary>
    public double Length(Node node)
    {
        if (node.Kind != NodeKind.Number)
        {
            return Quantity(node, "a length", LengthExample, LengthFactor);
        }

        var value = node.FiniteNumber("a length");
        return value == 0 ? 0 : value * (BaseUnit ?? throw node.Fault(
            $"{Shown(value)} has no unit, and the file has no base unit.",
            $"Write {LengthExample}, or \"units\": {{ \"length\": \"mm\" }} at the top.")).Millimetres;
    }

    /// <summary>A length greater than zero, mm.</summary>
    public double PositiveLength(Node node) => Positive(node, Length(node), "a length");

    /// <summary>A density greater than zero, kg/mm³. It must name its unit: a bare one would be a guess.</summary>
    public static double Density(Node node) => node.Kind != NodeKind.Number
        ? Positive(node, Quantity(node, "a density", DensityExample, DensityUnits.Factor), "a density")
        : throw node.Fault(
            $"{Shown(node.Number)} has no unit.",
            $"Write a density with its unit, for example {DensityExample}.");

    /// <summary>A unit of length.</summary>
    public static LengthUnit Unit(Node node)
    {
        var text = node.FilledText("mm");
        return LengthUnit.TryParse(text, out var unit) && unit is not null
            ? unit
            : throw WrongUnit(node, text, "a length", "\"mm\"");
    }

    /// <summary>Rise over run: a number, or a text such as "1:6".</summary>
    public static double Slope(Node node)
    {
        if (node.Kind == NodeKind.Text
            && node.Text.Split(':') is [var rise, var run]
            && QuantityText.Split(rise) is { Unit: "" } up
            && QuantityText.Split(run) is { Unit: "", Value: > 0 } along)
        {
            return up.Value / along.Value;
        }

        return node.Kind == NodeKind.Number && double.IsFinite(node.Number)
            ? node.Number
            : throw node.Fault(
                $"Expected a slope, but found {node.Described}.",
                "Write rise over run, for example \"1:6\" or 0.08.");
    }

    private static UnitFactor? LengthFactor(string unit) => LengthUnit.TryParse(unit, out var known) && known is not null
        ? new UnitFactor(known.Millimetres)
        : UncommonUnits.Length(unit);

    private static double Quantity(Node node, string what, string example, Func<string, UnitFactor?> factor)
    {
        if (node.Kind != NodeKind.Text || QuantityText.Split(node.Text) is not { } quantity)
        {
            throw node.Fault(
                $"Expected {what}, but found {node.Described}.",
                $"Write a number and a unit, for example {example}.");
        }

        if (quantity.Unit.StartsWith(','))
        {
            throw node.Fault(
                $"\"{node.Text}\" has a comma in its number.",
                $"Write a decimal point and no commas, for example {example}.");
        }

        if (quantity.Unit.Length == 0)
        {
            throw node.Fault($"\"{node.Text}\" has no unit.", $"Write {what} with its unit, for example {example}.");
        }

        var toInternal = factor(quantity.Unit) ?? throw WrongUnit(node, quantity.Unit, what, example);
        var value = toInternal.Of(quantity.Value);
        return double.IsFinite(value)
            ? value
            : throw node.Fault($"\"{node.Text}\" is too large.", $"Write {what} of a real section.");
    }

    private static double Positive(Node node, double value, string what) => value > 0
        ? value
        : throw node.Fault(
            $"Expected {what} greater than zero, but found {node.Described}.",
            "Check its sign and its digits.");

    private static SectionFileException WrongUnit(Node node, string unit, string what, string example) => node.Fault(
        UncommonUnits.DimensionOf(unit) is { } dimension
            ? $"\"{unit}\" is a unit of {dimension}, but {what} is expected."
            : $"\"{unit}\" is no unit that is known.",
        $"Write {what} such as {example}.");

    private static string Shown(double number) => number.ToString("g6", CultureInfo.InvariantCulture);
}
