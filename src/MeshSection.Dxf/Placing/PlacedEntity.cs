using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Space;

namespace MeshSection.Dxf.Placing;

/// <summary>An entity where it lies in the drawing, itself or as a part of an inserted block; compared by reference.</summary>
/// <param name="entity">What it is.</param>
/// <param name="source">Its place in the file, with the layer and colour that it has in the drawing.</param>
/// <param name="map">From the entity's coordinates to the drawing's.</param>
internal sealed class PlacedEntity(Entity entity, EntitySource source, SpaceMap map)
{
    public Entity Entity => entity;

    public EntitySource Source => source;

    public SpaceMap Map => map;

    /// <summary>True if the drawing states the ends; false if they follow from a centre, a radius and angles.</summary>
    public bool EndsAreStated => entity is LineEntity or PolylineEntity or SpatialPolylineEntity or SplineEntity;

    /// <summary>True if the entity closes by itself.</summary>
    public bool IsClosed => entity is CircleEntity or PolylineEntity { IsClosed: true } or SpatialPolylineEntity { IsClosed: true };

    /// <summary>True for a polyline that is not marked as closed.</summary>
    public bool IsOpenPolyline => entity is PolylineEntity { IsClosed: false } or SpatialPolylineEntity { IsClosed: false };
}
