using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Placing;
using MeshSection.Dxf.Space;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>Turns placed entities into curves of the drawing's plane.</summary>
internal static class EntityCurves
{
    // Angles nearer than this to a whole turn, in degrees, differ from it by rounding only.
    private const double WholeTurn = 1e-9;

    /// <summary>The curves of an entity; none for a point.</summary>
    public static IEnumerable<PlaneCurve> Of(PlacedEntity placed, DrawingPlane plane) => Of(placed.Entity, placed.Map, plane);

    private static IEnumerable<PlaneCurve> Of(Entity entity, SpaceMap map, DrawingPlane plane)
    {
        switch (entity)
        {
            case LineEntity line:
                return [new StraightCurve([Project(line.Start), Project(line.End)])];
            case SpatialPolylineEntity { Points: var points, IsClosed: var isClosed }:
                return [new StraightCurve([.. (isClosed && points.Length > 1 ? points.Append(points[0]) : points).Select(Project)])];
            case EllipseEntity ellipse:
                var (major, minor) = (plane.Project(map.Turn(ellipse.Major)), plane.Project(map.Turn(ellipse.Minor)));
                return [Elliptic(Project(ellipse.Centre), major, minor, ellipse.StartAngle, ellipse.EndAngle)];
            case SplineEntity { Spline: var spline }:
                return SplineCurves.Of(spline, Project);
            case FillEntity fill:
                return fill.Paths.SelectMany(p => Of(p, map, plane));
            case FlatEntity flat:
                return OfFlat(flat, PlaneMap.Of(map.After(SpaceMap.OfPlane(flat.Normal)), flat.Elevation, plane));
            default:
                return [];
        }

        Point Project(SpacePoint p) => plane.Project(map.Apply(p));
    }

    /// <summary>From one angle on to the other; a whole turn if they differ by turns only.</summary>
    private static EllipticCurve Elliptic(Point centre, Point u, Point v, double start, double end)
    {
        var sweep = Degrees.Sweep(start, end);
        var isWhole = start != end && (sweep < WholeTurn || 360 - sweep < WholeTurn);
        return new EllipticCurve(centre, u, v, start, isWhole ? 360 : sweep);
    }

    private static IEnumerable<PlaneCurve> OfFlat(FlatEntity entity, PlaneMap map)
    {
        switch (entity)
        {
            case ArcEntity arc:
                return [Elliptic(map.Apply(arc.Centre), arc.Radius * map.U, arc.Radius * map.V, arc.StartAngle, arc.EndAngle)];
            case CircleEntity circle:
                return [new EllipticCurve(map.Apply(circle.Centre), circle.Radius * map.U, circle.Radius * map.V, 0, 360)];
            case PolylineEntity polyline:
                return OfPolyline(polyline, map);
            default:
                return [];
        }
    }

    private static IEnumerable<PlaneCurve> OfPolyline(PolylineEntity polyline, PlaneMap map)
    {
        var vertices = polyline.Vertices;
        var count = polyline.IsClosed && vertices.Length > 1 ? vertices.Length : vertices.Length - 1;
        for (var i = 0; i < count; i++)
        {
            var (here, next) = (vertices[i], vertices[(i + 1) % vertices.Length]);
            if (here.Bulge == 0 || map.KeepsCircles || here.Point == next.Point)
            {
                yield return new BulgedCurve(map.Apply(here.Point), map.Apply(next.Point), map.Mirrors ? -here.Bulge : here.Bulge);
            }
            else
            {
                yield return Stretched(here.Point, next.Point, here.Bulge, map);
            }
        }
    }

    /// <summary>An arc of a polyline in a map that makes it a part of an ellipse, from its start to its end.</summary>
    private static EllipticCurve Stretched(Point start, Point end, double bulge, PlaneMap map)
    {
        var arc = new ArcEdge(start, end, bulge);
        var radius = start - arc.Centre;
        var across = Math.Sign(bulge) * radius.Left();
        return new EllipticCurve(
            map.Apply(arc.Centre),
            radius.X * map.U + radius.Y * map.V,
            across.X * map.U + across.Y * map.V,
            0,
            Math.Abs(arc.Sweep) * (180 / Math.PI));
    }
}
