using System.Collections.Immutable;
using MeshSection.Dxf.Placing;

namespace MeshSection.Dxf.Curves;

/// <summary>An entity and its curves in the drawing's plane.</summary>
/// <param name="Placed">The entity.</param>
/// <param name="Curves">Its curves in running order; none if it is damaged to nothing.</param>
internal sealed record DrawnEntity(PlacedEntity Placed, ImmutableArray<PlaneCurve> Curves)
{
    public static DrawnEntity Of(PlacedEntity placed, DrawingPlane plane) => new(placed, [.. EntityCurves.Of(placed, plane)]);
}
