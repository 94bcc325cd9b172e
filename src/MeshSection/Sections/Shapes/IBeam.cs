using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>An I section, its web upright. The origin is the middle of its bottom side.</summary>
/// <remarks>
/// <code>
///          Width
///     +------|------+   -
///     +---+  |  +---+   - FlangeThickness, at half the outstand
///     toe |  |  | root
///         |  |  |         Height
///         |  |  | WebThickness
///   +-----+  |  +-----+ -
///   +--------o--------+ - BottomFlangeThickness --> x
///       BottomWidth
/// </code>
/// </remarks>
/// <param name="Height">Overall, mm.</param>
/// <param name="Width">Of the flanges, mm.</param>
/// <param name="FlangeThickness">Thickness of the flanges, mm; of sloped ones, at half the outstand from web to toe.</param>
/// <param name="WebThickness">Thickness of the web, mm.</param>
/// <param name="RootRadius">Radius of the fillets between web and flanges, mm.</param>
/// <param name="ToeRadius">Radius of the flanges' inner edges at their toes, mm.</param>
/// <param name="FlangeSlope">Rise over run of the flanges' inner faces, such as 1/6; 0 for parallel flanges.</param>
/// <param name="BottomWidth">Of the bottom flange, mm, if it is another.</param>
/// <param name="BottomFlangeThickness">Thickness of the bottom flange, mm, if it is another.</param>
public sealed record IBeam(
    double Height,
    double Width,
    double FlangeThickness,
    double WebThickness,
    double RootRadius = 0,
    double ToeRadius = 0,
    double FlangeSlope = 0,
    double? BottomWidth = null,
    double? BottomFlangeThickness = null) : Shape
{
    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        var bottomWidth = BottomWidth ?? Width;
        var bottomThickness = BottomFlangeThickness ?? FlangeThickness;
        ShapeCheck.Positive(FlangeThickness);
        ShapeCheck.Positive(bottomThickness, nameof(BottomFlangeThickness));
        ShapeCheck.Positive(WebThickness);
        ShapeCheck.Above(Width, WebThickness);
        ShapeCheck.Above(bottomWidth, WebThickness, nameof(BottomWidth));
        var top = new Flange(0.5 * (Width - WebThickness), FlangeThickness, FlangeSlope);
        var bottom = new Flange(0.5 * (bottomWidth - WebThickness), bottomThickness, FlangeSlope);
        ShapeCheck.AtLeast(FlangeSlope, 0);
        ShapeCheck.Below(FlangeSlope, Math.Min(top.SlopeLimit, bottom.SlopeLimit));
        ShapeCheck.Above(Height, top.AtWeb + bottom.AtWeb);
        var web = 0.5 * WebThickness;
        var half = 0.5 * Width;
        var bottomHalf = 0.5 * bottomWidth;
        return
        [
            RoundedPolygon.Draw(
                new Corner(-bottomHalf, 0),
                new Corner(bottomHalf, 0),
                new Corner(bottomHalf, bottom.AtToe, ToeRadius),
                new Corner(web, bottom.AtWeb, RootRadius),
                new Corner(web, Height - top.AtWeb, RootRadius),
                new Corner(half, Height - top.AtToe, ToeRadius),
                new Corner(half, Height),
                new Corner(-half, Height),
                new Corner(-half, Height - top.AtToe, ToeRadius),
                new Corner(-web, Height - top.AtWeb, RootRadius),
                new Corner(-web, bottom.AtWeb, RootRadius),
                new Corner(-bottomHalf, bottom.AtToe, ToeRadius)),
        ];
    }
}
