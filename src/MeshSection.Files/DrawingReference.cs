using System.Collections.Immutable;
using MeshSection.Units;

namespace MeshSection.Files;

/// <summary>The drawing that a section file takes its outline from.</summary>
/// <param name="Path">The drawing: as written, joined to the folder of the section file if it is relative.</param>
/// <param name="Unit">The unit of its coordinates; null if the drawing is to say.</param>
/// <param name="Layers">The layers to read, wildcards allowed; empty for all that carry outlines.</param>
/// <param name="Tolerance">The gap up to which loose ends are joined, mm, positive; null for the default.</param>
public sealed record DrawingReference(string Path, LengthUnit? Unit, ImmutableArray<string> Layers, double? Tolerance);
