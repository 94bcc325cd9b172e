using System.Collections.Immutable;
using MeshSection.Units;

namespace MeshSection.Dxf.Entities;

/// <summary>What was read from a drawing, before any of it is chosen or joined.</summary>
/// <param name="Release">The release that the drawing names, such as "AC1015"; null if it names none.</param>
/// <param name="Unit">The unit that the drawing states; null if it states none.</param>
/// <param name="Layers">The layers: those of the layer table, then those that only entities name.</param>
/// <param name="Blocks">The blocks by name, in any case.</param>
/// <param name="Entities">The entities in the order of the file.</param>
/// <param name="Notes">What was mended or assumed while reading.</param>
public sealed record Drawing(
    string? Release,
    LengthUnit? Unit,
    ImmutableArray<Layer> Layers,
    ImmutableDictionary<string, Block> Blocks,
    ImmutableArray<Entity> Entities,
    ImmutableArray<DrawingNote> Notes);
