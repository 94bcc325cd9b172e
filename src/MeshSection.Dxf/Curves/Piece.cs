using MeshSection.Dxf.Entities;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>A line or an arc of the drawing, in local axes, mm.</summary>
/// <param name="Edge">The curve.</param>
/// <param name="Entity">The entity that it came from.</param>
internal readonly record struct Piece(Edge Edge, Entity Entity)
{
    /// <summary>True if the drawing states the ends; false if they follow from a centre, a radius and angles.</summary>
    public bool EndsAreStated => Entity is LineEntity or PolylineEntity;

    /// <summary>True if the entity closes by itself.</summary>
    public bool IsOfClosedEntity => Entity is CircleEntity or PolylineEntity { IsClosed: true };
}
