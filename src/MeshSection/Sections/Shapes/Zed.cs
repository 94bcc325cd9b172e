using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>
/// A zed: the web upright, the top flange pointing left and the bottom flange pointing right. The origin is the foot
/// of the web's left face.
/// </summary>
/// <remarks>
/// <code>
///       Width
///   +-----------+   -
///   +-------+   |   - Thickness
///   toe     |   |
///           |   |     Height
///           |   | root
///           |   +-------+ toe
///           o-----------+--> x
///     WebThickness
///            BottomWidth
/// </code>
/// </remarks>
/// <param name="Height">Overall, mm.</param>
/// <param name="Width">Of the flanges, web included, mm.</param>
/// <param name="Thickness">Thickness of flanges and web, mm.</param>
/// <param name="WebThickness">Thickness of the web, mm, if it is another.</param>
/// <param name="BottomWidth">Of the bottom flange, web included, mm, if it is another.</param>
/// <param name="RootRadius">Radius of the fillets between web and flanges, mm.</param>
/// <param name="ToeRadius">Radius of the flanges' inner edges at their toes, mm.</param>
/// <param name="OuterRadius">Radius of the two outer corners of a bent zed, mm; 0 for a rolled one.</param>
public sealed record Zed(
    double Height,
    double Width,
    double Thickness,
    double? WebThickness = null,
    double? BottomWidth = null,
    double RootRadius = 0,
    double ToeRadius = 0,
    double OuterRadius = 0) : Shape
{
    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        var web = WebThickness ?? Thickness;
        var bottomWidth = BottomWidth ?? Width;
        ShapeCheck.Positive(Thickness);
        ShapeCheck.Positive(web, nameof(WebThickness));
        ShapeCheck.Above(Width, web);
        ShapeCheck.Above(bottomWidth, web, nameof(BottomWidth));
        ShapeCheck.Above(Height, 2 * Thickness);
        var boundary = RoundedPolygon.Draw(
            new Corner(0, 0, OuterRadius),
            new Corner(bottomWidth, 0),
            new Corner(bottomWidth, Thickness, ToeRadius),
            new Corner(web, Thickness, RootRadius),
            new Corner(web, Height, OuterRadius),
            new Corner(web - Width, Height),
            new Corner(web - Width, Height - Thickness, ToeRadius),
            new Corner(0, Height - Thickness, RootRadius));
        ShapeCheck.Bend(OuterRadius, RootRadius, Thickness, web);
        return [boundary];
    }
}
