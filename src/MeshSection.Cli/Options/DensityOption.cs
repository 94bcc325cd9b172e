using System.CommandLine;
using MeshSection.Files.Quantities;

namespace MeshSection.Cli.Options;

/// <summary>The density of the material, for mass per length.</summary>
internal sealed class DensityOption
{
    private readonly Option<string?> _density = new("--density")
    {
        Description = "Density of the material, for mass per length: \"2700 kg/m3\", \"490 lb/ft3\"",
        HelpName = "DENSITY",
    };

    /// <summary>Adds the option to a command.</summary>
    public void AddTo(Command command) => command.Add(_density);

    /// <summary>The density, kg/mm³; null if none is given.</summary>
    /// <exception cref="CommandException">The text is no density.</exception>
    public double? Of(ParseResult parsed) => parsed.GetValue(_density) is not { } text
        ? null
        : DensityText.Parse(text) ?? throw new CommandException(
            $"--density {text}: expected a density above zero with its unit, such as \"2700 kg/m3\" or \"490 lb/ft3\".");
}
