using System.Globalization;
using MeshSection.Dxf.Entities;

namespace MeshSection.Cli.Inputs;

/// <summary>A colour as given on the command line.</summary>
internal static class GivenColour
{
    // The first seven numbers of the format's table, from 1.
    private static readonly string[] Names = ["red", "yellow", "green", "cyan", "blue", "magenta", "white"];

    /// <summary>Reads a number of the format's table, one of its first seven names, or a true colour.</summary>
    /// <exception cref="CommandException">The text is none of these.</exception>
    public static DrawingColour Parse(string text)
    {
        var named = Array.FindIndex(Names, n => n.Equals(text, StringComparison.OrdinalIgnoreCase));
        if (named >= 0)
        {
            return new DrawingColour(named + 1);
        }

        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var index) && index is >= 1 and <= 255)
        {
            return new DrawingColour(index);
        }

        return text.Length == 7 && text[0] == '#' &&
            int.TryParse(text.AsSpan(1), NumberStyles.AllowHexSpecifier, CultureInfo.InvariantCulture, out var rgb)
                ? new DrawingColour(0, rgb)
                : throw new CommandException(
                    $"--colour {text}: expected a number from 1 to 255, {string.Join(", ", Names)}, or a true colour such as #C81E1E.");
    }
}
