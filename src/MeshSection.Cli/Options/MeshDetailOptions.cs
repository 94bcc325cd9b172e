using System.Collections.Immutable;
using System.CommandLine;
using System.Globalization;
using MeshSection.Cli.Inputs;

namespace MeshSection.Cli.Options;

/// <summary>What the mesh is to be like at single places.</summary>
internal sealed class MeshDetailOptions
{
    private readonly Option<string[]> _points = new("--point")
    {
        Description = "Make a node here, as for a bar or a load: 120,35.5 in the drawing's axes. May be repeated",
        HelpName = "X,Y",
    };

    private readonly Option<string[]> _lines = new("--line")
    {
        Description = "Let edges run along this line between two points of the section: 0,20,120,20. May be repeated",
        HelpName = "X,Y,X,Y",
    };

    private readonly Option<string[]> _sizes = new("--size-at")
    {
        Description = "Longest side of a triangle around this place, growing by 0.3 with the distance: 120,35.5,0.5. May be repeated",
        HelpName = "X,Y,LENGTH",
    };

    private readonly Option<string[]> _regionSizes = new("--region-size")
    {
        Description = "Longest side of a triangle in one piece of the section: 2=1.5mm. May be repeated",
        HelpName = "NUMBER=LENGTH",
    };

    private readonly Option<string?> _order = new("--order")
    {
        Description = "Triangles in mesh files: 1 with three nodes, 2 with six, those along the outline on the true curves [default: 1]",
        HelpName = "1|2",
    };

    /// <summary>Adds the options to a command.</summary>
    public void AddTo(Command command)
    {
        command.Add(_points);
        command.Add(_lines);
        command.Add(_sizes);
        command.Add(_regionSizes);
        command.Add(_order);
    }

    /// <summary>What the command line asks for.</summary>
    /// <exception cref="CommandException">A value is not what it should be.</exception>
    public MeshDetail Of(ParseResult parsed) => new(
        Numbers(parsed, _points, 2, "120,35.5"),
        Numbers(parsed, _lines, 4, "0,20,120,20"),
        [.. Numbers(parsed, _sizes, 3, "120,35.5,0.5").Select(WithSide)],
        [.. (parsed.GetValue(_regionSizes) ?? []).Select(RegionSize)]);

    /// <summary>True if mesh files are to have triangles of second order.</summary>
    /// <exception cref="CommandException">The order is neither 1 nor 2.</exception>
    public bool IsSecondOrder(ParseResult parsed) => parsed.GetValue(_order) switch
    {
        null or "1" => false,
        "2" => true,
        var text => throw new CommandException($"--order {text}: expected 1 or 2."),
    };

    private static ImmutableArray<double[]> Numbers(ParseResult parsed, Option<string[]> option, int count, string example) =>
        [.. (parsed.GetValue(option) ?? []).Select(text => GivenPoint.Numbers(text, option.Name, count, example))];

    private static double[] WithSide(double[] numbers) => numbers[2] > 0
        ? numbers
        : throw new CommandException(FormattableString.Invariant(
            $"--size-at {numbers[0]},{numbers[1]},{numbers[2]}: expected a length above zero."));

    private static (int Region, GivenLength Side) RegionSize(string text) =>
        text.Split('=') is [var number, var side] && int.TryParse(number, CultureInfo.InvariantCulture, out var region)
            ? (region, GivenLength.Parse(side, "--region-size")!.Value)
            : throw new CommandException($"--region-size {text}: expected a region's number and a length, such as 2=1.5mm.");
}
