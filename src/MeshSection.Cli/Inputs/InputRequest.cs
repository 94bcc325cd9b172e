using MeshSection.Units;

namespace MeshSection.Cli.Inputs;

/// <summary>What the command line says of the input.</summary>
/// <param name="Path">The file.</param>
/// <param name="Unit">The unit of its coordinates, if given.</param>
/// <param name="Layers">The layers to read; empty for the default.</param>
/// <param name="Tolerance">The greatest gap to join, if given.</param>
/// <param name="Density">The density of the material, kg/mm³, if given.</param>
internal sealed record InputRequest(
    string Path, LengthUnit? Unit, IReadOnlyList<string> Layers, GivenLength? Tolerance, double? Density = null);
