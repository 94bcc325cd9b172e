using MeshSection.Geometry;

namespace MeshSection.Plots;

/// <summary>A place to point out on the picture of an outline: a gap that was bridged, a piece that was dropped.</summary>
/// <param name="Place">Where, in the drawing's axes, mm.</param>
/// <param name="Text">What happened there, in a few words; may be empty.</param>
public sealed record OutlineMark(Point Place, string Text);
