using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Materials;
using MeshSection.Units;

namespace MeshSection.Files;

/// <summary>
/// What a section file says. One that exists is sound: its shapes make an outline, its quantities have their units.
/// </summary>
public sealed record SectionFile
{
    /// <summary>The file, as its path was given.</summary>
    public required string Path { get; init; }

    /// <summary>What the section is called; may be empty.</summary>
    public required string Title { get; init; }

    /// <summary>The unit of bare lengths, and of results; null if the file names none.</summary>
    public required LengthUnit? Unit { get; init; }

    /// <summary>The drawing that holds the outline; null if the file has shapes.</summary>
    public required DrawingReference? Drawing { get; init; }

    /// <summary>The outline that the shapes make; null if the file names a drawing.</summary>
    public required Outline? Outline { get; init; }

    /// <summary>The materials that are defined, in their order.</summary>
    public required ImmutableArray<Material> Materials { get; init; }

    /// <summary>The material that fills the section; null if none is defined.</summary>
    public required Material? Material { get; init; }
}
