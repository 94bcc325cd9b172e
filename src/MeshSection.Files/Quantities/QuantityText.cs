using System.Globalization;

namespace MeshSection.Files.Quantities;

/// <summary>A quantity as written: a number and the unit behind it.</summary>
internal readonly record struct QuantityText(double Value, string Unit)
{
    /// <summary>Splits "4.5 in" into 4.5 and "in"; null if there is no number in front.</summary>
    public static QuantityText? Split(string text)
    {
        var trimmed = text.Trim();
        var end = NumberEnd(trimmed);
        return double.TryParse(trimmed.AsSpan(0, end), NumberStyles.Float, CultureInfo.InvariantCulture, out var value)
            && double.IsFinite(value)
            ? new QuantityText(value, trimmed[end..].Trim())
            : null;
    }

    private static int NumberEnd(string text)
    {
        var i = 0;
        while (i < text.Length && (char.IsAsciiDigit(text[i]) || text[i] is '.' or '+' or '-'))
        {
            i++;
        }

        // An e belongs to the number only if an exponent follows it.
        var exponent = i + 1;
        if (i < text.Length && text[i] is 'e' or 'E')
        {
            exponent += exponent < text.Length && text[exponent] is '+' or '-' ? 1 : 0;
            if (exponent < text.Length && char.IsAsciiDigit(text[exponent]))
            {
                i = exponent;
                while (i < text.Length && char.IsAsciiDigit(text[i]))
                {
                    i++;
                }
            }
        }

        return i;
    }
}
