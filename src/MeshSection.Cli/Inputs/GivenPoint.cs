using System.Globalization;
using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Cli.Inputs;

/// <summary>Coordinates as given on the command line: in the drawing's axes and the input's unit.</summary>
internal static class GivenPoint
{
    /// <summary>Reads numbers with commas between them: "120,35.5".</summary>
    /// <param name="text">The text.</param>
    /// <param name="option">The option's name, for the message.</param>
    /// <param name="count">How many numbers there must be.</param>
    /// <param name="example">What would be right, for the message.</param>
    /// <exception cref="CommandException">The text is something else.</exception>
    public static double[] Numbers(string text, string option, int count, string example)
    {
        var words = text.Split(',');
        var numbers = new double[words.Length];
        var isRight = words.Length == count;
        for (var i = 0; i < words.Length; i++)
        {
            isRight &= double.TryParse(words[i], NumberStyles.Float, CultureInfo.InvariantCulture, out numbers[i])
                && double.IsFinite(numbers[i]);
        }

        return isRight ? numbers : throw new CommandException(
            $"{option} {text}: expected {count} numbers with commas between them, such as {example} (with decimal points).");
    }

    /// <summary>The point of an outline that coordinates of the drawing mean.</summary>
    /// <param name="x">Along x, in the unit.</param>
    /// <param name="y">Along y, in the unit.</param>
    /// <param name="unit">The unit.</param>
    /// <param name="outline">The outline.</param>
    public static Point In(double x, double y, LengthUnit unit, Outline outline) =>
        new Point(x * unit.Millimetres, y * unit.Millimetres) - outline.Origin;
}
