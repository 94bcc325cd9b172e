using System.Globalization;

namespace MeshSection.Cli.Tables;

/// <summary>Numbers for tables: six significant digits, and powers of a thousand taken out of long ones.</summary>
internal static class Digits
{
    private const int Significant = 6;

    /// <summary>12.3457, 12345.7, 123.457×10³, 12.3457×10⁻⁶; zero is 0.</summary>
    public static string Of(double value)
    {
        var size = Math.Abs(value);
        if (size == 0 || !double.IsFinite(size))
        {
            return size == 0 ? "0" : value.ToString(CultureInfo.InvariantCulture);
        }

        if (size is >= 1e-3 and < 99_999.95)
        {
            return Rounded(value);
        }

        var power = 3 * (int)Math.Floor((Math.Log10(size) + 1e-12) / 3);
        return $"{Rounded(value / Math.Pow(10, power))}×10{Superscript(power)}";
    }

    /// <summary>A difference or an error: one digit and a power of ten.</summary>
    public static string Small(double value) =>
        value == 0 ? "0" : value.ToString("0e-0", CultureInfo.InvariantCulture);

    /// <summary>A coordinate or an angle whose last digits are rounding: what lies below a millionth of a scale is 0.</summary>
    public static string Near(double value, double scale) => Of(Math.Abs(value) < 1e-9 * scale ? 0 : value);

    /// <summary>A power as superscript; 1 is not written.</summary>
    public static string Power(int power) => power == 1 ? "" : Superscript(power);

    private static string Rounded(double value)
    {
        var digits = value.ToString($"G{Significant}", CultureInfo.InvariantCulture);
        return digits.Contains('E') ? value.ToString("F0", CultureInfo.InvariantCulture) : digits;
    }

    private static string Superscript(int value) => string.Concat(
        value.ToString(CultureInfo.InvariantCulture).Select(c => c == '-' ? '⁻' : "⁰¹²³⁴⁵⁶⁷⁸⁹"[c - '0']));
}
