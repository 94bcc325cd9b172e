using System.Collections.Immutable;
using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Placing;
using MeshSection.Dxf.Space;

namespace MeshSection.Dxf.Curves;

/// <summary>The points of the drawing's space that fix where an entity lies.</summary>
internal static class SpacePoints
{
    public static IEnumerable<SpacePoint> Of(PlacedEntity placed)
    {
        var map = placed.Map;
        return placed.Entity switch
        {
            FillEntity fill => fill.Paths.SelectMany(p => Of(new PlacedEntity(p, placed.Source, map))),
            FlatEntity flat => OfFlat(flat).Select(map.After(SpaceMap.OfPlane(flat.Normal)).Apply),
            var other => OfSpatial(other).Select(map.Apply),
        };
    }

    private static ImmutableArray<SpacePoint> OfSpatial(Entity entity) => entity switch
    {
        LineEntity line => [line.Start, line.End],
        SpatialPolylineEntity polyline => polyline.Points,
        EllipseEntity ellipse => [ellipse.Centre, ellipse.Centre + ellipse.Major, ellipse.Centre + ellipse.Minor],
        SplineEntity { Spline: var spline } => spline.Controls.IsEmpty ? spline.FitPoints : spline.Controls,
        PointEntity point => [point.Place],
        _ => [],
    };

    private static IEnumerable<SpacePoint> OfFlat(FlatEntity entity) => entity switch
    {
        ArcEntity arc => [new(arc.Centre.X, arc.Centre.Y, arc.Elevation)],
        CircleEntity circle => [new(circle.Centre.X, circle.Centre.Y, circle.Elevation)],
        PolylineEntity polyline => polyline.Vertices.Select(v => new SpacePoint(v.Point.X, v.Point.Y, polyline.Elevation)),
        _ => [],
    };
}
