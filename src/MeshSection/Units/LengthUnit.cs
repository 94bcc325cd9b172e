using System.Collections.Immutable;

namespace MeshSection.Units;

/// <summary>A unit of length, as drawings and people name it.</summary>
/// <param name="Symbol">The short form, such as "mm".</param>
/// <param name="Name">The full name in the singular, such as "millimetre".</param>
/// <param name="Millimetres">How many millimetres it is.</param>
public sealed record LengthUnit(string Symbol, string Name, double Millimetres)
{
    // By the codes 1 to 24 that the DXF reference gives for $INSUNITS; 0 means "no unit". Inches are 25.4 mm; the
    // United States survey foot is 1200/3937 m.
    private static readonly ImmutableArray<LengthUnit> ByCode =
    [
        new("in", "inch", 25.4),
        new("ft", "foot", 304.8),
        new("mi", "mile", 1_609_344),
        new("mm", "millimetre", 1),
        new("cm", "centimetre", 10),
        new("m", "metre", 1000),
        new("km", "kilometre", 1e6),
        new("µin", "microinch", 25.4e-6),
        new("mil", "mil", 0.0254),
        new("yd", "yard", 914.4),
        new("Å", "angstrom", 1e-7),
        new("nm", "nanometre", 1e-6),
        new("µm", "micrometre", 1e-3),
        new("dm", "decimetre", 100),
        new("dam", "decametre", 1e4),
        new("hm", "hectometre", 1e5),
        new("Gm", "gigametre", 1e12),
        new("au", "astronomical unit", 1.495978707e14),
        new("ly", "light year", 9.4607304725808e18),
        new("pc", "parsec", 3.0856775814913673e19),
        new("ftUS", "US survey foot", 1_200_000.0 / 3937),
        new("inUS", "US survey inch", 100_000.0 / 3937),
        new("ydUS", "US survey yard", 3_600_000.0 / 3937),
        new("miUS", "US survey mile", 6_336_000_000.0 / 3937),
    ];

    /// <summary>The unit that results are kept in.</summary>
    public static LengthUnit Millimetre => ByCode[3];

    /// <summary>The metre.</summary>
    public static LengthUnit Metre => ByCode[5];

    /// <summary>The inch.</summary>
    public static LengthUnit Inch => ByCode[0];

    /// <summary>Every unit that a drawing can state, in the order of the codes of $INSUNITS, from 1.</summary>
    public static ImmutableArray<LengthUnit> All => ByCode;

    /// <summary>The unit that a drawing states by $INSUNITS.</summary>
    /// <param name="code">The value of $INSUNITS.</param>
    /// <returns>The unit; null if the code is 0, which means "no unit", or is none that the format knows.</returns>
    public static LengthUnit? FromDrawingCode(int code) => code >= 1 && code <= ByCode.Length ? ByCode[code - 1] : null;

    /// <summary>The value of $INSUNITS by which a drawing states this unit.</summary>
    public int DrawingCode => ByCode.IndexOf(this) + 1;

    /// <summary>
    /// Finds a unit by symbol or name: "mm", "um", "inch", "Feet", "millimeters". Symbols are matched exactly first
    /// (so that "Gm" and "mm" stay apart), then without regard to case; names may be plural and may be spelled the
    /// American way.
    /// </summary>
    /// <param name="text">The symbol or name; blanks around it do not count.</param>
    /// <param name="unit">The unit, if one has that name.</param>
    /// <returns>True if there is such a unit.</returns>
    public static bool TryParse(string? text, out LengthUnit? unit)
    {
        unit = null;
        var word = text?.Trim() ?? "";
        if (word.Length == 0)
        {
            return false;
        }

        // The Greek letter and the sign for micro look alike and are two characters; keyboards have neither.
        var symbol = word.Replace('μ', 'µ');
        symbol = symbol is "um" or "uin" ? "µ" + symbol[1..] : symbol;
        unit = ByCode.FirstOrDefault(u => u.Symbol == symbol)
            ?? ByCode.FirstOrDefault(u => u.Symbol.Equals(symbol, StringComparison.OrdinalIgnoreCase))
            ?? ByName(word.Replace("meter", "metre", StringComparison.OrdinalIgnoreCase));
        return unit is not null;
    }

    /// <summary>Finds a unit by symbol or name, as <see cref="TryParse"/> does.</summary>
    /// <param name="text">The symbol or name.</param>
    /// <exception cref="FormatException">No unit has that name; the message lists the symbols that are known.</exception>
    public static LengthUnit Parse(string text) =>
        TryParse(text, out var unit) && unit is not null
            ? unit
            : throw new FormatException(
                $"'{text}' is no unit of length. Known are {string.Join(", ", ByCode.Select(u => u.Symbol))}.");

    /// <summary>A quantity in a power of mm, in the same power of this unit.</summary>
    /// <param name="value">The quantity, mm to the power.</param>
    /// <param name="power">The power of length; 0 for a quantity without.</param>
    public double FromMillimetres(double value, int power = 1) => value / Math.Pow(Millimetres, power);

    /// <summary>The symbol of a power of the unit: "mm", "mm⁴".</summary>
    /// <param name="power">The power, 1 to 9.</param>
    public string SymbolOf(int power) => power == 1 ? Symbol : Symbol + "⁰¹²³⁴⁵⁶⁷⁸⁹"[power];

    /// <inheritdoc/>
    public override string ToString() => Symbol;

    private static LengthUnit? ByName(string word) => word.ToLowerInvariant() switch
    {
        "\"" or "inches" => Inch,
        "'" or "feet" => ByCode[1],
        "thou" => ByCode[8],
        "micron" or "microns" => ByCode[12],
        var name => ByCode.FirstOrDefault(u => u.Name.Equals(name, StringComparison.OrdinalIgnoreCase))
            ?? ByCode.FirstOrDefault(u => name.Equals(u.Name + "s", StringComparison.OrdinalIgnoreCase)),
    };
}
