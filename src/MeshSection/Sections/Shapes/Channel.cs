using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>
/// A channel, its web upright and its flanges pointing right. The origin is the lower left corner: the foot of the
/// back of the web.
/// </summary>
/// <remarks>
/// <code>
///   y
///   +---------+   -
///   |   +-----+   - FlangeThickness, at half the outstand
///   |   | root  toe
///   |   |         Height
///   |   | WebThickness
///   |   +-----+
///   o---------+--> x
///      Width
/// </code>
/// </remarks>
/// <param name="Height">Overall, mm.</param>
/// <param name="Width">From the back of the web to the toes, mm.</param>
/// <param name="FlangeThickness">Thickness of the flanges, mm; of sloped ones, at half the outstand from web to toe.</param>
/// <param name="WebThickness">Thickness of the web, mm.</param>
/// <param name="RootRadius">Radius of the fillets between web and flanges, mm.</param>
/// <param name="ToeRadius">Radius of the flanges' inner edges at their toes, mm.</param>
/// <param name="FlangeSlope">Rise over run of the flanges' inner faces, such as 1/6; 0 for parallel flanges.</param>
/// <param name="OuterRadius">Radius of the two outer corners of a bent channel, mm; 0 for a rolled one.</param>
public sealed record Channel(
    double Height,
    double Width,
    double FlangeThickness,
    double WebThickness,
    double RootRadius = 0,
    double ToeRadius = 0,
    double FlangeSlope = 0,
    double OuterRadius = 0) : Shape
{
    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        ShapeCheck.Positive(FlangeThickness);
        ShapeCheck.Positive(WebThickness);
        ShapeCheck.Above(Width, WebThickness);
        var flange = new Flange(Width - WebThickness, FlangeThickness, FlangeSlope);
        ShapeCheck.AtLeast(FlangeSlope, 0);
        ShapeCheck.Below(FlangeSlope, flange.SlopeLimit);
        ShapeCheck.Above(Height, 2 * flange.AtWeb);
        var boundary = RoundedPolygon.Draw(
            new Corner(0, 0, OuterRadius),
            new Corner(Width, 0),
            new Corner(Width, flange.AtToe, ToeRadius),
            new Corner(WebThickness, flange.AtWeb, RootRadius),
            new Corner(WebThickness, Height - flange.AtWeb, RootRadius),
            new Corner(Width, Height - flange.AtToe, ToeRadius),
            new Corner(Width, Height),
            new Corner(0, Height, OuterRadius));
        ShapeCheck.Bend(OuterRadius, RootRadius, flange.AtWeb, WebThickness);
        return [boundary];
    }
}
