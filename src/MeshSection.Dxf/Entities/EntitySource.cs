using MeshSection.Dxf.Tags;

namespace MeshSection.Dxf.Entities;

/// <summary>Where an entity stands in the drawing.</summary>
/// <param name="Kind">What it is, as the format names it, such as "LINE".</param>
/// <param name="Handle">Its handle, in hexadecimal digits; null if the drawing gives none.</param>
/// <param name="Layer">The layer that it lies on.</param>
/// <param name="Place">Where in the file it begins.</param>
public sealed record EntitySource(string Kind, string? Handle, string Layer, FilePlace Place)
{
    /// <summary>Its colour; within a placed block, what it comes to there.</summary>
    public DrawingColour Colour { get; init; } = DrawingColour.ByLayer;

    /// <summary>True if it lies on a layout sheet instead of in the model.</summary>
    public bool IsOnPaper { get; init; }

    /// <summary>True if it is marked as invisible.</summary>
    public bool IsInvisible { get; init; }

    /// <summary>The insertion through which it came into the drawing; null if it stands there itself.</summary>
    public EntitySource? Inserted { get; init; }

    /// <summary>Names the entity for a person: "LINE #2F on layer 'SECTION'".</summary>
    public override string ToString() => $"{Name} on layer '{Wording.Shown(Layer)}'";

    /// <summary>Names the entity without its layer: "LINE #2F", or "LINE at line 214" if it has no handle.</summary>
    public string Name =>
        (Handle is null ? $"{Wording.Shown(Kind)} at {Place}" : $"{Wording.Shown(Kind)} #{Wording.Shown(Handle)}") + (Inserted is null ? "" : $" of {Inserted.Name}");
}
