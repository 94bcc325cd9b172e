using System.Globalization;
using System.Text;

namespace MeshSection.Plots.Drawing;

/// <summary>Numbers as an engineer writes them on a sheet: five digits, thin spaces, powers of a thousand.</summary>
internal static class Numbers
{
    public const char ThinSpace = '\u2009';
    public const char Minus = '\u2212';

    private const int Digits = 5;

    // The least mantissa that five digits round up to 1.
    private const double RoundsUp = 0.999995;

    /// <summary>
    /// A value with five significant digits and no trailing zeros: 0.01234, 1 234.5, 123 456, 12.346×10⁶. Whole digits
    /// are never rounded away.
    /// </summary>
    public static string Format(double value)
    {
        if (value == 0)
        {
            return "0";
        }

        var exponent = SharedExponent(Math.Abs(value));
        var mantissa = Fixed(value / Math.Pow(10, exponent), DecimalsFor(Math.Abs(value) / Math.Pow(10, exponent)));
        return exponent == 0 ? mantissa : $"{mantissa}×10{Superscript(exponent)}";
    }

    /// <summary>The power of ten, a multiple of three, that is taken out of a value; 0 for those of plain size.</summary>
    public static int SharedExponent(double size) =>
        size is >= 1e-3 and < 999_999.5 ? 0 : 3 * (int)Math.Floor(Math.Log10(size / RoundsUp) / 3);

    /// <summary>How many decimals give a value its five digits.</summary>
    public static int DecimalsFor(double size) => Math.Clamp(Digits - 1 - (int)Math.Floor(Math.Log10(size)), 0, 15);

    /// <summary>A value with at most so many decimals, thousands set apart by thin spaces.</summary>
    public static string Fixed(double value, int decimals)
    {
        var text = Math.Abs(value).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        var point = text.IndexOf('.', StringComparison.Ordinal);
        var whole = point < 0 ? text : text[..point];
        var fraction = point < 0 ? "" : text[point..].TrimEnd('0').TrimEnd('.');
        var built = new StringBuilder();
        for (var i = 0; i < whole.Length; i++)
        {
            if (i > 0 && (whole.Length - i) % 3 == 0)
            {
                built.Append(ThinSpace);
            }

            built.Append(whole[i]);
        }

        built.Append(fraction);
        var isZero = built.ToString().All(c => c is '0' or '.');
        return value < 0 && !isZero ? Minus + built.ToString() : built.ToString();
    }

    /// <summary>A whole number, thousands set apart by thin spaces.</summary>
    public static string Count(int value) => Fixed(value, 0);

    /// <summary>A whole number as superscript: ⁻⁶.</summary>
    public static string Superscript(int value) =>
        string.Concat(value.ToString(CultureInfo.InvariantCulture).Select(c => c == '-' ? '⁻' : "⁰¹²³⁴⁵⁶⁷⁸⁹"[c - '0']));
}
