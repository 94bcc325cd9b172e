using System.Globalization;
using UnitsNet;

namespace MeshSection.Files.Quantities;

/// <summary>
/// Units beyond the everyday ones, and what kind of quantity a misplaced unit belongs to. Building the package's table
/// of abbreviations takes 0.1 to 0.4 s, as long or longer as all else that reading a section takes: this is only
/// asked when the everyday units have not answered.
/// </summary>
internal static class UncommonUnits
{
    /// <summary>To mm; null if the text is no unit of length.</summary>
    public static UnitFactor? Length(string unit) => UnitParser.Default.TryParse<UnitsNet.Units.LengthUnit>(
        unit, CultureInfo.InvariantCulture, out var known)
        ? new UnitFactor(UnitsNet.Length.From(1, known).Millimeters)
        : null;

    /// <summary>To kg/mm³; null if the text is no unit of density.</summary>
    public static UnitFactor? Density(string unit) => UnitParser.Default.TryParse<UnitsNet.Units.DensityUnit>(
        unit, CultureInfo.InvariantCulture, out var known)
        ? new UnitFactor(UnitsNet.Density.From(1, known).KilogramsPerCubicMillimeter)
        : null;

    /// <summary>The kind of quantity that has such a unit, in words; null if none has.</summary>
    public static string? DimensionOf(string unit)
    {
        var name = Quantity.Infos
            .FirstOrDefault(q => UnitParser.Default.TryParse(unit, q.UnitType, CultureInfo.InvariantCulture, out _))?.Name;
        return name is null
            ? null
            : string.Concat(name.Select(c => char.IsUpper(c) ? $" {char.ToLowerInvariant(c)}" : $"{c}")).TrimStart();
    }
}
