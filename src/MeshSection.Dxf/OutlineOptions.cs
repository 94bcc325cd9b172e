using MeshSection.Dxf.Entities;
using MeshSection.Geometry;
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

    /// <summary>The layers to leave out, by name or with wildcards.</summary>
    public IReadOnlyList<string> Ignored { get; init; } = [];

    /// <summary>The colours to read; empty to read every colour.</summary>
    public IReadOnlyList<DrawingColour> Colours { get; init; } = [];

    /// <summary>The layers whose circles and points are bars, not outline.</summary>
    public IReadOnlyList<BarLayer> Bars { get; init; } = [];

    /// <summary>
    /// The layers whose closed boundaries are regions, in order: where two overlap, the later one has the place. Empty if
    /// nesting alone decides what is material.
    /// </summary>
    public IReadOnlyList<string> Regions { get; init; } = [];

    /// <summary>
    /// Points in the drawing's axes and unit: what holds one of them is the section, and nothing else is. Empty to take
    /// everything that nesting makes material.
    /// </summary>
    public IReadOnlyList<Point> Inside { get; init; } = [];

    /// <summary>How to join loose pieces.</summary>
    public Joining Joining { get; init; } = new();
}

/// <summary>Layers on which bars are drawn.</summary>
/// <param name="Layers">Their name, or a pattern with wildcards.</param>
/// <param name="Diameter">The diameter of bars drawn as points, in the drawing's unit; null if all are circles.</param>
public sealed record BarLayer(string Layers, double? Diameter = null);

/// <summary>How loose pieces are joined.</summary>
public sealed record Joining
{
    /// <summary>
    /// The greatest distance between two ends that are joined, in the drawing's unit; null to take 1e-5 of the
    /// diagonal of what is drawn, but at most a quarter of the shortest edge.
    /// </summary>
    public double? MaxGap { get; init; }
}
