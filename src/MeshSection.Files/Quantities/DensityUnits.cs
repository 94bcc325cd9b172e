using MeshSection.Units;

namespace MeshSection.Files.Quantities;

/// <summary>Units of density: a unit of mass over the cube of a unit of length, as in kg/m3, kg/m³ or lb/ft^3.</summary>
internal static class DensityUnits
{
    /// <summary>To kg/mm³; null if the text is no unit of density.</summary>
    public static UnitFactor? Factor(string unit)
    {
        var cubed = unit.Replace("^3", "³", StringComparison.Ordinal);
        cubed = cubed.EndsWith('3') ? $"{cubed[..^1]}³" : cubed;
        return cubed.Split('/') is [var mass, var volume]
            && volume.EndsWith('³')
            && Kilograms(mass.Trim()) is { } kilograms
            && LengthUnit.TryParse(volume[..^1], out var length) && length is not null
            ? new UnitFactor(kilograms, Math.Pow(length.Millimetres, 3))
            : UncommonUnits.Density(cubed);
    }

    private static double? Kilograms(string symbol) => symbol switch
    {
        "kg" => 1,
        "g" => 1e-3,
        "t" => 1e3,
        "lb" => 0.45359237,
        _ => null,
    };
}
