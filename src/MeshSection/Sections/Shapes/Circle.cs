using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>A solid circle. The origin is its centre.</summary>
/// <param name="Diameter">Across, mm.</param>
public sealed record Circle(double Diameter) : Shape
{
    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        ShapeCheck.Positive(Diameter);
        return [Boundary.Circle(Point.Origin, 0.5 * Diameter)];
    }
}
