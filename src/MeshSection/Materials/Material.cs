namespace MeshSection.Materials;

/// <summary>A material of a section.</summary>
/// <param name="Name">Its name in the section file; never empty.</param>
/// <param name="Density">Mass per volume, kg/mm³, positive; null if not given.</param>
public sealed record Material(string Name, double? Density = null);
