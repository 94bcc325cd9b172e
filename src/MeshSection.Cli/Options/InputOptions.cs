using System.CommandLine;
using MeshSection.Cli.Inputs;

namespace MeshSection.Cli.Options;

/// <summary>What to read, and how to read a drawing.</summary>
internal sealed class InputOptions
{
    private readonly Argument<string> _input = new("INPUT")
    {
        Description = "A drawing (.dxf) or a section file (.json)",
        HelpName = "INPUT",
    };

    private readonly Option<string?> _unit = new("--unit")
    {
        Description = "The unit of a drawing that does not say, or says it wrongly: mm, cm, m, in, ft, ...",
        HelpName = "UNIT",
    };

    private readonly Option<string[]> _layers = new("--layer")
    {
        Description = "Read only this layer of a drawing; * and ? stand for any letters. May be repeated",
        HelpName = "NAME",
    };

    private readonly Option<string?> _tolerance = new("--tolerance")
    {
        Description = "Join ends of a drawing's pieces that lie up to this far apart: 0.05, \"0.05 mm\"",
        HelpName = "LENGTH",
    };

    public InputOptions()
    {
        _input.CompletionSources.Add(context => InputFiles.StartingWith(context.WordToComplete));
        _unit.CompletionSources.Add("mm", "cm", "m", "in", "ft");
    }

    /// <summary>Adds the options to a command.</summary>
    public void AddTo(Command command)
    {
        command.Add(_input);
        command.Add(_unit);
        command.Add(_layers);
        command.Add(_tolerance);
    }

    /// <summary>What the command line asks for.</summary>
    public InputRequest Of(ParseResult parsed) => new(
        parsed.GetRequiredValue(_input),
        parsed.GetValue(_unit) is { } unit ? GivenLength.ParseUnit(unit, "--unit") : null,
        parsed.GetValue(_layers) ?? [],
        GivenLength.Parse(parsed.GetValue(_tolerance), "--tolerance"));
}
