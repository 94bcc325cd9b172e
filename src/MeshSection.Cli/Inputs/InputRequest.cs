namespace MeshSection.Cli.Inputs;

/// <summary>What the command line says of the input.</summary>
/// <param name="Path">The file.</param>
/// <param name="Drawing">How to read it if it is a drawing.</param>
/// <param name="Density">The density of the material, kg/mm³, if given.</param>
internal sealed record InputRequest(string Path, DrawingRequest Drawing, double? Density = null);
