using System.CommandLine;
using MeshSection.Cli.Inputs;
using MeshSection.Geometry;

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

    private readonly Option<string[]> _ignored = new("--ignore")
    {
        Description = "Leave this layer of a drawing out; * and ? stand for any letters. May be repeated",
        HelpName = "NAME",
    };

    private readonly Option<string[]> _colours = new("--colour")
    {
        Description = "Read only what has this colour: 1 to 255, red, yellow, green, cyan, blue, magenta, white, or #RRGGBB. May be repeated",
        HelpName = "COLOUR",
    };

    private readonly Option<string[]> _regions = new("--region")
    {
        Description = "The closed boundaries on this layer are a region; of two that overlap the later one has the place. May be repeated",
        HelpName = "LAYER",
    };

    private readonly Option<string[]> _bars = new("--bars")
    {
        Description = "Circles and points on this layer are bars, points of this diameter: REBAR, REBAR=16mm. May be repeated",
        HelpName = "LAYER[=LENGTH]",
    };

    private readonly Option<string[]> _inside = new("--inside")
    {
        Description = "What holds this point is the section, and nothing else is: 120,35.5 in the drawing's axes. May be repeated",
        HelpName = "X,Y",
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
        command.Add(_ignored);
        command.Add(_colours);
        command.Add(_regions);
        command.Add(_bars);
        command.Add(_inside);
        command.Add(_tolerance);
    }

    /// <summary>What the command line asks for.</summary>
    /// <exception cref="CommandException">A value is not what it should be.</exception>
    public InputRequest Of(ParseResult parsed) => new(parsed.GetRequiredValue(_input), new DrawingRequest
    {
        Unit = parsed.GetValue(_unit) is { } unit ? GivenLength.ParseUnit(unit, "--unit") : null,
        Layers = parsed.GetValue(_layers) ?? [],
        Ignored = parsed.GetValue(_ignored) ?? [],
        Colours = [.. (parsed.GetValue(_colours) ?? []).Select(GivenColour.Parse)],
        Regions = parsed.GetValue(_regions) ?? [],
        Bars = [.. (parsed.GetValue(_bars) ?? []).Select(Bars)],
        Inside = [.. (parsed.GetValue(_inside) ?? []).Select(Inside)],
        Tolerance = GivenLength.Parse(parsed.GetValue(_tolerance), "--tolerance"),
    });

    private static (string Layers, GivenLength? Diameter) Bars(string text)
    {
        // The last sign: a layer's name may hold others.
        var at = text.LastIndexOf('=');
        return at < 0 ? (text, null) : (text[..at], GivenLength.Parse(text[(at + 1)..], "--bars"));
    }

    private static Point Inside(string text)
    {
        var numbers = GivenPoint.Numbers(text, "--inside", 2, "120,35.5");
        return new Point(numbers[0], numbers[1]);
    }
}
