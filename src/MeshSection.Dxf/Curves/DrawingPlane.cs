using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Placing;
using MeshSection.Dxf.Space;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>The plane that the section is drawn in, with axes of its own.</summary>
/// <param name="X">The unit vector to the right.</param>
/// <param name="Y">The unit vector up.</param>
/// <param name="Name">What it is, for a person; null for the drawing's own plane.</param>
internal sealed record DrawingPlane(SpacePoint X, SpacePoint Y, string? Name)
{
    // The greatest slope of what still counts as parallel to a plane.
    private const double Flatness = 1e-9;

    public static DrawingPlane Own { get; } = new(new(1, 0, 0), new(0, 1, 0), null);

    /// <summary>Seen from the front, as elevations are: z is up.</summary>
    private static DrawingPlane Front { get; } = new(new(1, 0, 0), new(0, 0, 1), "xz, seen from the front: x to the right, z up");

    private static DrawingPlane Side { get; } = new(new(0, 1, 0), new(0, 0, 1), "yz, seen from the right: y to the right, z up");

    private SpacePoint Normal => X.Cross(Y);

    /// <summary>
    /// The plane that all entities are parallel to: the drawing's own if they are parallel to it; else the front, the side,
    /// or that of the first tilted entity, in the axes that the arbitrary axis rule gives it.
    /// </summary>
    /// <exception cref="DrawingException">They are parallel to no common plane.</exception>
    public static DrawingPlane Of(List<PlacedEntity> entities)
    {
        var tilted = entities.FindAll(e => !Own.Holds(e));
        if (tilted.Count == 0)
        {
            return Own;
        }

        foreach (var plane in new[] { Front, Side, OfFirst(tilted) })
        {
            // In another plane than the drawing's, heights would hide what is there: all must lie in one plane.
            if (plane is not null && entities.TrueForAll(plane.Holds) && plane.IsOne(entities))
            {
                return plane;
            }
        }

        throw OutlineFaults.Tilted(tilted);
    }

    public Point Project(SpacePoint p) => new(X.Dot(p), Y.Dot(p));

    /// <summary>The distance from the parallel plane through the origin.</summary>
    public double Height(SpacePoint p) => Normal.Dot(p);

    /// <summary>The height of an entity that is parallel to the plane.</summary>
    public double Height(PlacedEntity placed)
    {
        foreach (var point in SpacePoints.Of(placed))
        {
            return Height(point);
        }

        return 0;
    }

    private bool IsOne(List<PlacedEntity> entities)
    {
        var (lowest, highest, size) = (double.PositiveInfinity, double.NegativeInfinity, 0.0);
        foreach (var entity in entities)
        {
            foreach (var point in SpacePoints.Of(entity))
            {
                lowest = Math.Min(lowest, Height(point));
                highest = Math.Max(highest, Height(point));
                size = Math.Max(size, point.Length);
            }
        }

        return highest - lowest <= 1e-6 * size;
    }

    /// <summary>True if an entity shows its true shape in this plane.</summary>
    public bool Holds(PlacedEntity placed)
    {
        var normal = Normal;
        if (placed.Entity is FlatEntity flat)
        {
            // Circles show their true shape only along the normal of their plane.
            var own = placed.Map.After(SpaceMap.OfPlane(flat.Normal));
            return IsLevel(own.X, normal) && IsLevel(own.Y, normal);
        }

        SpacePoint? first = null;
        var (rise, extent) = (0.0, 0.0);
        foreach (var point in SpacePoints.Of(placed))
        {
            first ??= point;
            var way = point - first.Value;
            rise = Math.Max(rise, Math.Abs(normal.Dot(way)));
            extent = Math.Max(extent, way.Length);
        }

        return rise <= Flatness * extent;
    }

    private static bool IsLevel(SpacePoint along, SpacePoint normal) => Math.Abs(normal.Dot(along)) <= Flatness * along.Length;

    private static DrawingPlane? OfFirst(List<PlacedEntity> tilted)
    {
        var normal = tilted.Select(NormalOf).FirstOrDefault(n => n is not null);
        if (normal is not { } found)
        {
            return null;
        }

        var up = found.Z < 0 ? -1.0 * found : found;
        var axes = SpaceMap.OfPlane(up);
        return new DrawingPlane(axes.X, axes.Y, FormattableString.Invariant($"normal to ({up.X:G6}, {up.Y:G6}, {up.Z:G6})"));
    }

    /// <summary>The unit normal of an entity that does not run straight; else null.</summary>
    private static SpacePoint? NormalOf(PlacedEntity placed)
    {
        if (placed.Entity is FlatEntity flat)
        {
            var own = placed.Map.After(SpaceMap.OfPlane(flat.Normal));
            var cross = own.X.Cross(own.Y);
            return cross.Length > 0 ? 1 / cross.Length * cross : null;
        }

        var points = SpacePoints.Of(placed).ToList();
        for (var i = 2; i < points.Count; i++)
        {
            var cross = (points[1] - points[0]).Cross(points[i] - points[0]);
            if (cross.Length > Flatness * (points[1] - points[0]).Length * (points[i] - points[0]).Length)
            {
                return 1 / cross.Length * cross;
            }
        }

        return null;
    }
}
