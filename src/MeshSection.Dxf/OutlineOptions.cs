using MeshSection.Units;

namespace MeshSection.Dxf;

/// <summary>How to make an outline of a drawing.</summary>
public sealed record OutlineOptions
{
    /// <summary>The unit of the drawing's coordinates; null to take the drawing's own.</summary>
    public LengthUnit? Unit { get; init; }

    /// <summary>
    /// The layers to read, by name or with the wildcards * (any characters) and ? (one character), in any case. Empty
    /// to read every layer that is on, thawed and plotted; a hidden layer is only read if it is named in full.
    /// </summary>
    public IReadOnlyList<string> Layers { get; init; } = [];

    /// <summary>How to join loose pieces.</summary>
    public Joining Joining { get; init; } = new();
}

/// <summary>How loose pieces are joined.</summary>
public sealed record Joining
{
    /// <summary>
    /// The greatest distance between two ends that are joined, in the drawing's unit; null to take 1e-5 of the
    /// diagonal of what is drawn, but at most a quarter of the shortest edge.
    /// </summary>
    public double? MaxGap { get; init; }
}
