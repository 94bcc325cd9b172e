using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Entities;

/// <summary>Something drawn. Coordinates are in the drawing's plane, world axes and unit; mirrored entities are mapped.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Height">Its distance from the drawing's plane.</param>
public abstract record Entity(EntitySource Source, double Height);

/// <summary>A straight line.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Height">Its distance from the drawing's plane.</param>
/// <param name="Start">One end.</param>
/// <param name="End">The other end.</param>
public sealed record LineEntity(EntitySource Source, double Height, Point Start, Point End) : Entity(Source, Height);

/// <summary>A circular arc, counter-clockwise.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Height">Its distance from the drawing's plane.</param>
/// <param name="Centre">The centre of the circle.</param>
/// <param name="Radius">The radius, not negative.</param>
/// <param name="StartAngle">Where it begins, degrees.</param>
/// <param name="EndAngle">Where it ends, degrees; may lie a turn or more away.</param>
public sealed record ArcEntity(
    EntitySource Source, double Height, Point Centre, double Radius, double StartAngle, double EndAngle)
    : Entity(Source, Height);

/// <summary>A full circle.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Height">Its distance from the drawing's plane.</param>
/// <param name="Centre">The centre.</param>
/// <param name="Radius">The radius, not negative.</param>
public sealed record CircleEntity(EntitySource Source, double Height, Point Centre, double Radius)
    : Entity(Source, Height);

/// <summary>A vertex of a polyline.</summary>
/// <param name="Point">Where it lies.</param>
/// <param name="Bulge">tan(sweep / 4) of the arc to the next vertex, counter-clockwise positive; 0 for a line.</param>
public readonly record struct PolylineVertex(Point Point, double Bulge);

/// <summary>Lines and arcs in a row.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Height">Its distance from the drawing's plane.</param>
/// <param name="Vertices">The vertices in running order.</param>
/// <param name="IsClosed">True if the last vertex runs back to the first.</param>
public sealed record PolylineEntity(
    EntitySource Source, double Height, ImmutableArray<PolylineVertex> Vertices, bool IsClosed)
    : Entity(Source, Height);

/// <summary>An entity that does not lie parallel to the drawing's plane, so that its true shape is not seen.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
public sealed record TiltedEntity(EntitySource Source) : Entity(Source, 0);

/// <summary>An entity of a kind that is not read, for the count.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
public sealed record UnreadEntity(EntitySource Source) : Entity(Source, 0);
