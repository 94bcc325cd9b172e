using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>A rectangular tube. The origin is the middle of its bottom side.</summary>
/// <remarks>
/// <code>
///          y
///   +------|------+  -
///   | +----|----+ |  | Thickness
///   | |    |    | |  -
///   | |    |    | |    Height
///   | +----|----+ |
///   +------o------+--> x
///   | | WebThickness
///       Width
/// </code>
/// </remarks>
/// <param name="Width">Outside, across, mm.</param>
/// <param name="Height">Outside, upright, mm.</param>
/// <param name="Thickness">Thickness of the walls, mm.</param>
/// <param name="WebThickness">Thickness of the two upright walls, mm, if it is another.</param>
/// <param name="OuterRadius">Radius of the outer corners, mm; 0 for sharp ones.</param>
/// <param name="InnerRadius">Radius of the inner corners, mm; 0 for sharp ones.</param>
public sealed record HollowBox(
    double Width,
    double Height,
    double Thickness,
    double? WebThickness = null,
    double OuterRadius = 0,
    double InnerRadius = 0) : Shape
{
    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        var web = WebThickness ?? Thickness;
        ShapeCheck.Positive(Width);
        ShapeCheck.Positive(Height);
        ShapeCheck.Positive(Thickness);
        ShapeCheck.Below(Thickness, 0.5 * Height);
        var webName = WebThickness is null ? nameof(Thickness) : nameof(WebThickness);
        ShapeCheck.Positive(web, webName);
        ShapeCheck.Below(web, 0.5 * Width, webName);
        ImmutableArray<Boundary> boundaries =
        [
            Walls(0.5 * Width, 0, Height, OuterRadius, nameof(OuterRadius)),
            Walls(0.5 * Width - web, Thickness, Height - Thickness, InnerRadius, nameof(InnerRadius)),
        ];
        ShapeCheck.Bend(OuterRadius, InnerRadius, Thickness, web);
        return boundaries;
    }

    private static Boundary Walls(double half, double bottom, double top, double radius, string radiusName) =>
        RoundedPolygon.Draw(
            new Corner(-half, bottom, radius, radiusName),
            new Corner(half, bottom, radius, radiusName),
            new Corner(half, top, radius, radiusName),
            new Corner(-half, top, radius, radiusName));
}
