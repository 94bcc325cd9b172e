using System.Collections.Immutable;
using MeshSection.Dxf.Selection;
using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Dxf;

/// <summary>How a drawing was understood: what was read, joined, mended and left out.</summary>
public sealed record DrawingReport
{
    /// <summary>The release that the drawing names, such as "AC1015"; null if it names none.</summary>
    public required string? Release { get; init; }

    /// <summary>The unit of the drawing's coordinates.</summary>
    public required LengthUnit Unit { get; init; }

    /// <summary>True if the caller gave the unit, false if the drawing states it.</summary>
    public required bool IsUnitGiven { get; init; }

    /// <summary>The extents of the entities used, in the drawing's axes and unit.</summary>
    public required Box Extents { get; init; }

    /// <summary>The greatest distance between two ends that were joined, in the drawing's unit.</summary>
    public required double MaxGap { get; init; }

    /// <summary>True if the caller gave <see cref="MaxGap"/>, false if it was chosen from the size of the drawing.</summary>
    public required bool IsMaxGapGiven { get; init; }

    /// <summary>The entities used, by kind and layer.</summary>
    public required ImmutableArray<EntityCount> Used { get; init; }

    /// <summary>The entities left out, by kind, layer and reason.</summary>
    public required ImmutableArray<EntityCount> LeftOut { get; init; }

    /// <summary>The number of lines and arcs that make the boundaries.</summary>
    public required int Pieces { get; init; }

    /// <summary>The number of places at which ends of different entities were joined.</summary>
    public required int Joins { get; init; }

    /// <summary>What was mended, file first, then entities, then joining.</summary>
    public required ImmutableArray<DrawingNote> Repairs { get; init; }

    /// <summary>What calls for attention.</summary>
    public required ImmutableArray<DrawingNote> Cautions { get; init; }
}
