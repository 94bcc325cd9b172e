using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>A solid rectangle. The origin is the middle of its bottom side.</summary>
/// <remarks>
/// <code>
///        y
///   +----|----+
///   |    |    | Height
///   +----o----+--> x
///      Width
/// </code>
/// </remarks>
/// <param name="Width">Across, mm.</param>
/// <param name="Height">Upright, mm.</param>
/// <param name="CornerRadius">Radius of all four corners, mm, at most half the shorter side; 0 for sharp ones.</param>
public sealed record Rectangle(double Width, double Height, double CornerRadius = 0) : Shape
{
    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        ShapeCheck.Positive(Width);
        ShapeCheck.Positive(Height);
        var half = 0.5 * Width;
        return
        [
            RoundedPolygon.Draw(
                new Corner(-half, 0, CornerRadius),
                new Corner(half, 0, CornerRadius),
                new Corner(half, Height, CornerRadius),
                new Corner(-half, Height, CornerRadius)),
        ];
    }
}
