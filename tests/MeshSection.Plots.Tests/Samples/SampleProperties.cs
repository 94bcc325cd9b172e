using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Properties;

namespace MeshSection.Plots.Tests.Samples;

/// <summary>Enough of the properties for a picture, from the triangles alone.</summary>
internal static class SampleProperties
{
    public static SectionProperties Of(Outline outline, Mesh mesh)
    {
        var (area, c) = AreaAndCentroid(mesh);
        var moments = Moments(mesh, c);
        var principal = Principal(moments);
        var about1 = Point.Direction(principal.Angle * Math.PI / 180);
        var box = outline.Bounds;
        return new SectionProperties
        {
            Area = area,
            OuterPerimeter = outline.Boundaries.Where(b => b.Role != BoundaryRole.Hole).Sum(b => b.Boundary.Length),
            InnerPerimeter = outline.Boundaries.Where(b => b.Role == BoundaryRole.Hole).Sum(b => b.Boundary.Length),
            BoundingBox = box,
            Centroid = c,
            FirstMomentDatum = new AxisPair(area * c.Y, area * c.X),
            SecondMomentDatum = moments,
            SecondMoment = moments,
            Principal = principal,
            ElasticX = Elastic(mesh, c, new Point(0, 1), moments.X),
            ElasticY = Elastic(mesh, c, new Point(1, 0), moments.Y),
            Elastic1 = Elastic(mesh, c, about1.Left(), principal.I1),
            Elastic2 = Elastic(mesh, c, about1, principal.I2),
            PlasticX = default,
            PlasticY = default,
            Plastic1 = default,
            Plastic2 = default,
            MassPerLength = null,
            CrossChecks = [],
            Chords = default,
            Mesh = new MeshSummary(mesh.TriangleCount, mesh.Nodes.Length, 45),
        };
    }

    private static (double Area, Point Centroid) AreaAndCentroid(Mesh mesh)
    {
        var area = 0.0;
        var first = Point.Origin;
        foreach (var (a, b, c) in Triangles(mesh))
        {
            var part = 0.5 * (b - a).Cross(c - a);
            area += part;
            first += part / 3 * (a + b + c);
        }

        return (area, first / area);
    }

    private static SecondMoments Moments(Mesh mesh, Point centroid)
    {
        double x = 0, y = 0, xy = 0;
        foreach (var (a, b, c) in Triangles(mesh))
        {
            var part = 0.5 * (b - a).Cross(c - a);
            foreach (var middle in (Point[])[0.5 * (a + b), 0.5 * (b + c), 0.5 * (c + a)])
            {
                var d = middle - centroid;
                x += part / 3 * d.Y * d.Y;
                y += part / 3 * d.X * d.X;
                xy += part / 3 * d.X * d.Y;
            }
        }

        return new SecondMoments(x, y, xy);
    }

    private static PrincipalAxes Principal(SecondMoments m)
    {
        var radius = double.Hypot(0.5 * (m.X - m.Y), m.XY);
        var middle = 0.5 * (m.X + m.Y);
        var angle = radius < 1e-12 * middle ? 0 : 0.5 * Math.Atan2(-m.XY, 0.5 * (m.X - m.Y)) * 180 / Math.PI;
        return new PrincipalAxes(middle + radius, middle - radius, angle <= -90 ? angle + 180 : angle);
    }

    private static ExtremeFibres Elastic(Mesh mesh, Point centroid, Point across, double moment)
    {
        return new ExtremeFibres(Farthest(across), Farthest(-across));

        ExtremeFibre Farthest(Point direction)
        {
            var used = mesh.Corners.Select(i => mesh.Nodes[i]);
            var point = used.MaxBy(p => (p - centroid).Dot(direction));
            var distance = (point - centroid).Dot(direction);
            return new ExtremeFibre(distance, point, moment / distance);
        }
    }

    private static IEnumerable<(Point A, Point B, Point C)> Triangles(Mesh mesh)
    {
        for (var i = 0; i < mesh.Corners.Length; i += 3)
        {
            yield return (mesh.Nodes[mesh.Corners[i]], mesh.Nodes[mesh.Corners[i + 1]], mesh.Nodes[mesh.Corners[i + 2]]);
        }
    }
}
