using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>A round tube. The origin is its centre.</summary>
/// <param name="Diameter">Outside diameter, mm.</param>
/// <param name="Thickness">Thickness of the wall, mm, less than half the diameter.</param>
public sealed record Tube(double Diameter, double Thickness) : Shape
{
    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        ShapeCheck.Positive(Diameter);
        ShapeCheck.Positive(Thickness);
        ShapeCheck.Below(Thickness, 0.5 * Diameter);
        return
        [
            Boundary.Circle(Point.Origin, 0.5 * Diameter),
            Boundary.Circle(Point.Origin, 0.5 * Diameter - Thickness),
        ];
    }
}
