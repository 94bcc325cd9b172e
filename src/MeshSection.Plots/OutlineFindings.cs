using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Plots;

/// <summary>A place to point out on the picture of an outline: a gap that was bridged, a face that was chosen.</summary>
/// <param name="Place">Where, in the drawing's axes, mm.</param>
/// <param name="Text">What happened there, in a few words; may be empty.</param>
public sealed record OutlineMark(Point Place, string Text);

/// <summary>What a line beside the outline is.</summary>
public enum PieceRole
{
    /// <summary>It was read, but bounds nothing.</summary>
    LeadsNowhere,

    /// <summary>It was not chosen.</summary>
    LeftOut,
}

/// <summary>A line or curve beside the outline.</summary>
/// <param name="Edge">The curve, in the outline's local axes, mm.</param>
/// <param name="Role">What it is.</param>
public sealed record OutlinePiece(Edge Edge, PieceRole Role);

/// <summary>A bar in the section.</summary>
/// <param name="Place">Its centre, in the outline's local axes, mm.</param>
/// <param name="Diameter">Its diameter, mm; null if it is not known.</param>
public sealed record OutlineBar(Point Place, double? Diameter);

/// <summary>A face of the section that was told apart.</summary>
/// <param name="Layer">What it belongs to.</param>
/// <param name="Boundaries">Its boundaries, in the outline's local axes, mm.</param>
public sealed record OutlineFace(string Layer, ImmutableArray<Boundary> Boundaries);

/// <summary>What the picture of an outline shows beside its boundaries.</summary>
/// <param name="Marks">Places to point out.</param>
/// <param name="Pieces">Lines and curves that took no part.</param>
/// <param name="Bars">Bars.</param>
/// <param name="Faces">Faces that were told apart; none if the boundaries say it all.</param>
public sealed record OutlineFindings(
    ImmutableArray<OutlineMark> Marks,
    ImmutableArray<OutlinePiece> Pieces,
    ImmutableArray<OutlineBar> Bars,
    ImmutableArray<OutlineFace> Faces)
{
    /// <summary>Nothing beside the boundaries.</summary>
    public static OutlineFindings None { get; } = new([], [], [], []);
}
