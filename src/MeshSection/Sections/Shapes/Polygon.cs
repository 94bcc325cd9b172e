using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>Any polygon, given by its corners in running order. The origin is that of the coordinates.</summary>
/// <param name="Points">
/// At least three corners, mm, in either direction; the last is joined to the first, which is not repeated.
/// </param>
public sealed record Polygon(ImmutableArray<Point> Points) : Shape
{
    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        ShapeCheck.AtLeast(Points.Length, 3, nameof(Points));
        for (var i = 0; i < Points.Length; i++)
        {
            if (!Points[i].IsFinite)
            {
                throw new ShapeException($"{nameof(Points)}[{i}]", double.NaN, ShapeBound.Finite);
            }

            if (Points[i] == Points[(i + Points.Length - 1) % Points.Length])
            {
                throw new ShapeException($"{nameof(Points)}[{i}]", 0, ShapeBound.Distinct);
            }
        }

        return [Boundary.Polygon(Points.AsSpan())];
    }
}
