using System.Globalization;
using MeshSection.Units;

namespace MeshSection.Cli.Inputs;

/// <summary>A length as given on the command line.</summary>
/// <param name="Value">The number.</param>
/// <param name="Unit">Its unit; null if it stands bare and is in the input's unit.</param>
internal readonly record struct GivenLength(double Value, LengthUnit? Unit)
{
    /// <summary>Reads "0.05", "0.05mm" or "0.05 mm".</summary>
    /// <param name="text">The text; null if the option was not given.</param>
    /// <param name="option">The option's name, for the message.</param>
    /// <exception cref="CommandException">The text is no positive length.</exception>
    public static GivenLength? Parse(string? text, string option)
    {
        if (text is null)
        {
            return null;
        }

        var word = text.Trim();
        var digits = word.Length;
        while (digits > 0 && !char.IsAsciiDigit(word[digits - 1]) && word[digits - 1] != '.')
        {
            digits--;
        }

        if (!double.TryParse(word[..digits], NumberStyles.Float, CultureInfo.InvariantCulture, out var value))
        {
            throw new CommandException(
                $"{option} {text}: expected a length such as 0.05 or \"0.05 mm\" (with a decimal point).");
        }

        if (!double.IsFinite(value) || value <= 0)
        {
            throw new CommandException($"{option} {text}: expected a length above zero.");
        }

        return new GivenLength(value, digits == word.Length ? null : ParseUnit(word[digits..].Trim(), option));
    }

    /// <summary>Reads a unit of length.</summary>
    /// <param name="text">Its symbol or name.</param>
    /// <param name="option">The option's name, for the message.</param>
    /// <exception cref="CommandException">No unit has that name.</exception>
    public static LengthUnit ParseUnit(string text, string option) => LengthUnit.TryParse(text, out var unit)
        ? unit!
        : throw new CommandException(
            $"{option} {text}: no such unit of length. Give mm, cm, m, in or ft, or another that a drawing can state, by symbol or name.");

    /// <summary>The length in a unit.</summary>
    /// <param name="unit">The unit wanted.</param>
    /// <param name="bare">The unit of a bare number.</param>
    public double In(LengthUnit unit, LengthUnit bare) =>
        (Unit ?? bare) == unit ? Value : Value * (Unit ?? bare).Millimetres / unit.Millimetres;
}
