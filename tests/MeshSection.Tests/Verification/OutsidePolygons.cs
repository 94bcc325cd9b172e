using MeshSection.Geometry;
using MeshSection.Meshing;
using NetTopologySuite.Geometries;

namespace MeshSection.Tests.Verification;

/// <summary>The polygons of an outline's chords, as NetTopologySuite holds them: an outside check on ours.</summary>
internal static class OutsidePolygons
{
    private static readonly GeometryFactory Factory = new();

    /// <summary>The regions of a flattened outline, holes cut out.</summary>
    public static MultiPolygon Of(FlatOutline flat)
    {
        var rings = flat.Chords.GroupBy(c => c.Place.Boundary).ToDictionary(g => g.Key, Ring);
        var boundaries = flat.Outline.Boundaries;
        var polygons = Enumerable.Range(0, boundaries.Length)
            .Where(b => boundaries[b].Role != BoundaryRole.Hole)
            .Select(b => Factory.CreatePolygon(
                rings[b],
                [.. Enumerable.Range(0, boundaries.Length).Where(h => boundaries[h].Role == BoundaryRole.Hole && boundaries[h].Parent == b).Select(h => rings[h])]));
        return Factory.CreateMultiPolygon([.. polygons]);
    }

    /// <summary>A polygon of NetTopologySuite as boundaries of ours.</summary>
    public static IEnumerable<Boundary> Boundaries(NetTopologySuite.Geometries.Geometry geometry)
    {
        for (var i = 0; i < geometry.NumGeometries; i++)
        {
            if (geometry.GetGeometryN(i) is Polygon polygon)
            {
                foreach (var ring in polygon.InteriorRings.Prepend(polygon.ExteriorRing))
                {
                    yield return Boundary.Polygon([.. ring.Coordinates[..^1].Select(c => new MeshSection.Geometry.Point(c.X, c.Y))]);
                }
            }
        }
    }

    private static LinearRing Ring(IEnumerable<Chord> chords)
    {
        var points = chords.Select(c => new Coordinate(c.Curve.Start.X, c.Curve.Start.Y)).ToList();
        points.Add(points[0]);
        return Factory.CreateLinearRing([.. points]);
    }
}
