namespace MeshSection.Files.Quantities;

/// <summary>A density as a person writes it: a number and its unit.</summary>
public static class DensityText
{
    /// <summary>Reads "7850 kg/m3", "490 lb/ft³".</summary>
    /// <param name="text">The text.</param>
    /// <returns>kg/mm³; null if the text is not a positive number followed by a unit of density.</returns>
    public static double? Parse(string text) =>
        QuantityText.Split(text) is { Unit.Length: > 0 } quantity
        && DensityUnits.Factor(quantity.Unit) is { } factor
        && factor.Of(quantity.Value) is > 0 and < double.PositiveInfinity and var density
            ? density
            : null;
}
