using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Dxf.Overlay;

/// <summary>How a line of an overlay is drawn.</summary>
public enum OverlayLine
{
    /// <summary>Without breaks.</summary>
    Continuous,

    /// <summary>In dashes.</summary>
    Dashed,

    /// <summary>In dashes and dots, as axes are.</summary>
    DashDot,
}

/// <summary>A layer of an overlay.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Colour">Its colour in the format's table, 1 to 255.</param>
/// <param name="Line">How its lines are drawn.</param>
public sealed record OverlayLayer(string Name, int Colour, OverlayLine Line = OverlayLine.Continuous);

/// <summary>Something drawn on a layer, in the drawing's axes and unit.</summary>
/// <param name="Layer">The name of the layer.</param>
public abstract record OverlayMark(string Layer);

/// <summary>A straight line.</summary>
/// <param name="Layer">The name of the layer.</param>
/// <param name="Start">One end.</param>
/// <param name="End">The other end.</param>
public sealed record OverlayStroke(string Layer, Point Start, Point End) : OverlayMark(Layer);

/// <summary>A circle.</summary>
/// <param name="Layer">The name of the layer.</param>
/// <param name="Centre">The centre.</param>
/// <param name="Radius">The radius.</param>
public sealed record OverlayCircle(string Layer, Point Centre, double Radius) : OverlayMark(Layer);

/// <summary>A point.</summary>
/// <param name="Layer">The name of the layer.</param>
/// <param name="Place">Where.</param>
public sealed record OverlayPoint(string Layer, Point Place) : OverlayMark(Layer);

/// <summary>A line of text.</summary>
/// <param name="Layer">The name of the layer.</param>
/// <param name="Place">Its lower left corner, or the middle of it.</param>
/// <param name="Height">The height of a capital letter.</param>
/// <param name="Words">What it says.</param>
/// <param name="IsCentred">True if <paramref name="Place"/> is its middle.</param>
public sealed record OverlayText(string Layer, Point Place, double Height, string Words, bool IsCentred = false) : OverlayMark(Layer);

/// <summary>A drawing to lay over another.</summary>
/// <param name="Unit">The unit of its coordinates.</param>
/// <param name="Size">The size of what is drawn, in that unit: dashes are made to suit it.</param>
/// <param name="Layers">Its layers.</param>
/// <param name="Marks">What is drawn, in order.</param>
public sealed record OverlayDrawing(
    LengthUnit Unit, double Size, ImmutableArray<OverlayLayer> Layers, ImmutableArray<OverlayMark> Marks);
