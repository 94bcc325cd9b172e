using System.CommandLine;
using System.Globalization;
using MeshSection.Cli.Inputs;

namespace MeshSection.Cli.Options;

/// <summary>How fine the mesh is to be.</summary>
internal sealed class MeshOptions
{
    private readonly Option<string?> _elements = new("--elements")
    {
        Description = "How many triangles to make, to 2 % [default: about 1000]; more where the outline needs them",
        HelpName = "COUNT",
    };

    private readonly Option<string?> _elementSize = new("--element-size")
    {
        Description = "Longest side of any triangle, instead of --elements: 2, \"2 mm\"",
        HelpName = "LENGTH",
    };

    private readonly Option<string?> _across = new("--across")
    {
        Description = "At least this many elements across every wall, however thin",
        HelpName = "COUNT",
    };

    private readonly Option<string?> _minAngle = new("--min-angle")
    {
        Description = "Smallest angle of a triangle, 0 to 33 degrees [default: 28]",
        HelpName = "DEGREES",
    };

    private readonly Option<string?> _sag = new("--sag")
    {
        Description = "Farthest that a chord of the mesh may lie from its curve [default: 1e-4 of the section's diagonal]",
        HelpName = "LENGTH",
    };

    /// <summary>Adds the options to a command.</summary>
    public void AddTo(Command command)
    {
        command.Add(_elements);
        command.Add(_elementSize);
        command.Add(_across);
        command.Add(_minAngle);
        command.Add(_sag);
    }

    /// <summary>What the command line asks for.</summary>
    /// <exception cref="CommandException">A value is out of its range, or two say the same thing.</exception>
    public MeshRequest Of(ParseResult parsed)
    {
        var elements = Count(parsed, _elements, MeshRequest.MostElements);
        var size = GivenLength.Parse(parsed.GetValue(_elementSize), "--element-size");
        if (elements is not null && size is not null)
        {
            throw new CommandException("--elements and --element-size say the same thing: give one of them.");
        }

        return new MeshRequest(
            elements,
            size,
            Count(parsed, _across, MeshRequest.MostAcross),
            parsed.GetValue(_minAngle) is { } angle ? MinAngle(angle) : null,
            GivenLength.Parse(parsed.GetValue(_sag), "--sag"));
    }

    private static int? Count(ParseResult parsed, Option<string?> option, int most) =>
        parsed.GetValue(option) is not { } text ? null
        : int.TryParse(text, NumberStyles.Integer, CultureInfo.InvariantCulture, out var count) && count >= 1 && count <= most ? count
        : throw new CommandException($"{option.Name} {text}: expected a whole number from 1 to {most}.");

    private static double MinAngle(string text) =>
        double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var angle) &&
        angle is >= 0 and <= MeshRequest.LargestMinAngle
            ? angle
            : throw new CommandException(FormattableString.Invariant(
                $"--min-angle {text}: expected 0 to {MeshRequest.LargestMinAngle} degrees (with a decimal point)."));
}
