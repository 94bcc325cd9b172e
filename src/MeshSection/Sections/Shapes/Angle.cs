using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>
/// An angle, one leg upright and one pointing right. The origin is the heel, at the lower left.
/// </summary>
/// <remarks>
/// <code>
///   y
///   +---+ toe
///   |   |
///   |   |         Height
///   |   | root
///   |   +-----+ toe
///   o---------+--> x
///      Width      Thickness, of both legs
/// </code>
/// </remarks>
/// <param name="Height">Length of the upright leg, heel included, mm.</param>
/// <param name="Width">Length of the level leg, heel included, mm.</param>
/// <param name="Thickness">Thickness of both legs, mm.</param>
/// <param name="RootRadius">Radius of the fillet between the legs, mm.</param>
/// <param name="ToeRadius">Radius of the legs' inner edges at their toes, mm.</param>
/// <param name="OuterRadius">Radius of the heel of a bent angle, mm; 0 for a rolled one.</param>
public sealed record Angle(
    double Height,
    double Width,
    double Thickness,
    double RootRadius = 0,
    double ToeRadius = 0,
    double OuterRadius = 0) : Shape
{
    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        ShapeCheck.Positive(Thickness);
        ShapeCheck.Above(Height, Thickness);
        ShapeCheck.Above(Width, Thickness);
        var boundary = RoundedPolygon.Draw(
            new Corner(0, 0, OuterRadius),
            new Corner(Width, 0),
            new Corner(Width, Thickness, ToeRadius),
            new Corner(Thickness, Thickness, RootRadius),
            new Corner(Thickness, Height, ToeRadius),
            new Corner(0, Height));
        ShapeCheck.Bend(OuterRadius, RootRadius, Thickness, Thickness);
        return [boundary];
    }
}
