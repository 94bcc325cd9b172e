using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>A tee, its flange at the top. The origin is the middle of the foot of the web.</summary>
/// <remarks>
/// <code>
///         Width
///   +------|------+  -
///   +---+  |  +---+  - FlangeThickness
///   toe |  |  |
///       |  |  |        Height
///       |  |  |
///       +--o--+--> x
///     WebThickness
/// </code>
/// </remarks>
/// <param name="Height">Overall, flange included, mm.</param>
/// <param name="Width">Of the flange, mm.</param>
/// <param name="FlangeThickness">Thickness of the flange, mm.</param>
/// <param name="WebThickness">Thickness of the web, mm.</param>
/// <param name="RootRadius">Radius of the fillets between web and flange, mm.</param>
/// <param name="ToeRadius">Radius of the flange's lower edges at its toes, mm.</param>
public sealed record Tee(
    double Height,
    double Width,
    double FlangeThickness,
    double WebThickness,
    double RootRadius = 0,
    double ToeRadius = 0) : Shape
{
    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        ShapeCheck.Positive(FlangeThickness);
        ShapeCheck.Positive(WebThickness);
        ShapeCheck.Above(Width, WebThickness);
        ShapeCheck.Above(Height, FlangeThickness);
        var half = 0.5 * Width;
        var web = 0.5 * WebThickness;
        var under = Height - FlangeThickness;
        return
        [
            RoundedPolygon.Draw(
                new Corner(-web, 0),
                new Corner(web, 0),
                new Corner(web, under, RootRadius),
                new Corner(half, under, ToeRadius),
                new Corner(half, Height),
                new Corner(-half, Height),
                new Corner(-half, under, ToeRadius),
                new Corner(-web, under, RootRadius)),
        ];
    }
}
