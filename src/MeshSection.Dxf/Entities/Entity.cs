using System.Collections.Immutable;
using MeshSection.Dxf.Space;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Entities;

/// <summary>Something drawn, as the file states it, in the drawing's unit.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
public abstract record Entity(EntitySource Source);

/// <summary>A straight line.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Start">One end, in space.</param>
/// <param name="End">The other end, in space.</param>
public sealed record LineEntity(EntitySource Source, SpacePoint Start, SpacePoint End) : Entity(Source);

/// <summary>An entity stated in a plane of its own, by the arbitrary axis rule of the format.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Normal">The normal of its plane.</param>
/// <param name="Elevation">The distance of its plane from the origin, along the normal.</param>
public abstract record FlatEntity(EntitySource Source, SpacePoint Normal, double Elevation) : Entity(Source);

/// <summary>A circular arc, counter-clockwise in its plane.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Normal">The normal of its plane.</param>
/// <param name="Elevation">The distance of its plane from the origin, along the normal.</param>
/// <param name="Centre">The centre of the circle.</param>
/// <param name="Radius">The radius, not negative.</param>
/// <param name="StartAngle">Where it begins, degrees.</param>
/// <param name="EndAngle">Where it ends, degrees; may lie a turn or more away.</param>
public sealed record ArcEntity(
    EntitySource Source, SpacePoint Normal, double Elevation, Point Centre, double Radius, double StartAngle, double EndAngle)
    : FlatEntity(Source, Normal, Elevation);

/// <summary>A full circle.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Normal">The normal of its plane.</param>
/// <param name="Elevation">The distance of its plane from the origin, along the normal.</param>
/// <param name="Centre">The centre.</param>
/// <param name="Radius">The radius, not negative.</param>
public sealed record CircleEntity(EntitySource Source, SpacePoint Normal, double Elevation, Point Centre, double Radius)
    : FlatEntity(Source, Normal, Elevation);

/// <summary>A vertex of a polyline.</summary>
/// <param name="Point">Where it lies.</param>
/// <param name="Bulge">tan(sweep / 4) of the arc to the next vertex, counter-clockwise positive; 0 for a line.</param>
public readonly record struct PolylineVertex(Point Point, double Bulge);

/// <summary>Lines and arcs in a row.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Normal">The normal of its plane.</param>
/// <param name="Elevation">The distance of its plane from the origin, along the normal.</param>
/// <param name="Vertices">The vertices in running order.</param>
/// <param name="IsClosed">True if the last vertex runs back to the first.</param>
public sealed record PolylineEntity(
    EntitySource Source, SpacePoint Normal, double Elevation, ImmutableArray<PolylineVertex> Vertices, bool IsClosed)
    : FlatEntity(Source, Normal, Elevation);

/// <summary>Straight lines in a row, in space.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Points">The points in running order.</param>
/// <param name="IsClosed">True if the last point runs back to the first.</param>
public sealed record SpatialPolylineEntity(EntitySource Source, ImmutableArray<SpacePoint> Points, bool IsClosed)
    : Entity(Source);

/// <summary>An ellipse or a part of one: centre + cos t Major + sin t Minor.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Centre">The centre, in space.</param>
/// <param name="Major">From the centre to the end of the longer axis.</param>
/// <param name="Minor">From the centre to the end of the shorter axis, a quarter turn on.</param>
/// <param name="StartAngle">t where it begins, degrees.</param>
/// <param name="EndAngle">t where it ends, degrees.</param>
public sealed record EllipseEntity(
    EntitySource Source, SpacePoint Centre, SpacePoint Major, SpacePoint Minor, double StartAngle, double EndAngle)
    : Entity(Source);

/// <summary>A rational B-spline.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Spline">The curve, in space.</param>
public sealed record SplineEntity(EntitySource Source, Spline Spline) : Entity(Source);

/// <summary>A filled area: what lies inside an odd number of its paths.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Paths">The curves that bound it, each an entity of its own.</param>
public sealed record FillEntity(EntitySource Source, ImmutableArray<Entity> Paths) : Entity(Source);

/// <summary>A point.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Place">Where it lies, in space.</param>
public sealed record PointEntity(EntitySource Source, SpacePoint Place) : Entity(Source);

/// <summary>A block put into the drawing, once or in rows and columns.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
/// <param name="Block">The name of the block.</param>
/// <param name="Normal">The normal of the plane that it is put into.</param>
/// <param name="Place">Where its base point goes, in that plane.</param>
/// <param name="Scale">Factors along its axes; negative ones mirror.</param>
/// <param name="Rotation">Turn counter-clockwise, degrees.</param>
/// <param name="Array">How often it is repeated.</param>
public sealed record InsertEntity(
    EntitySource Source, string Block, SpacePoint Normal, SpacePoint Place, SpacePoint Scale, double Rotation, InsertArray Array)
    : Entity(Source);

/// <summary>Rows and columns of a block, along the turned axes.</summary>
/// <param name="Columns">How many along x, at least 1.</param>
/// <param name="Rows">How many along y, at least 1.</param>
/// <param name="ColumnSpacing">The distance between columns.</param>
/// <param name="RowSpacing">The distance between rows.</param>
public readonly record struct InsertArray(int Columns, int Rows, double ColumnSpacing, double RowSpacing);

/// <summary>An entity of a kind that is not read, for the count.</summary>
/// <param name="Source">Where it stands in the drawing.</param>
public sealed record UnreadEntity(EntitySource Source) : Entity(Source);
