using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>
/// A common section given by its dimensions, mm, in axes of its own: x to the right, y up. A shape stands on the x axis;
/// one with a vertical axis of symmetry is centred on the y axis; round shapes and regular polygons are centred on the
/// origin. Radii are true arcs.
/// </summary>
public abstract record Shape
{
    private protected Shape()
    {
    }

    /// <summary>The closed boundaries in the shape's own axes, outer boundary first, counter-clockwise.</summary>
    /// <exception cref="ShapeException">A dimension is out of its bounds.</exception>
    public abstract ImmutableArray<Boundary> Boundaries();
}
