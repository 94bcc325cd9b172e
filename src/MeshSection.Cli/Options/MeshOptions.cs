using System.CommandLine;
using MeshSection.Cli.Inputs;

namespace MeshSection.Cli.Options;

/// <summary>How fine the mesh is to be.</summary>
internal sealed class MeshOptions
{
    private readonly Option<int?> _elements = new("--elements")
    {
        Description = "About how many triangles to make [default: 1000; more where the outline needs them]",
        HelpName = "COUNT",
    };

    private readonly Option<string?> _elementSize = new("--element-size")
    {
        Description = "Largest side of a triangle, instead of --elements: 2, \"2 mm\"",
        HelpName = "LENGTH",
    };

    private readonly Option<double?> _minAngle = new("--min-angle")
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
        command.Add(_minAngle);
        command.Add(_sag);
    }

    /// <summary>What the command line asks for.</summary>
    /// <exception cref="CommandException">A value is out of its range, or two say the same thing.</exception>
    public MeshRequest Of(ParseResult parsed)
    {
        var elements = parsed.GetValue(_elements);
        var size = GivenLength.Parse(parsed.GetValue(_elementSize), "--element-size");
        var angle = parsed.GetValue(_minAngle);
        if (elements is not null && size is not null)
        {
            throw new CommandException("--elements and --element-size say the same thing: give one of them.");
        }

        if (elements is < 1 or > MeshRequest.MostElements)
        {
            throw new CommandException($"--elements {elements}: expected 1 to {MeshRequest.MostElements}.");
        }

        if (angle is not (null or >= 0 and <= MeshRequest.LargestMinAngle))
        {
            throw new CommandException(
                FormattableString.Invariant($"--min-angle {angle}: expected 0 to {MeshRequest.LargestMinAngle} degrees."));
        }

        return new MeshRequest(
            elements ?? MeshRequest.DefaultElements,
            size,
            angle,
            GivenLength.Parse(parsed.GetValue(_sag), "--sag"));
    }
}
