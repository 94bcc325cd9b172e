using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;
using MeshSection.Sections;

namespace MeshSection.Properties;

/// <summary>Computes every area property of a section, by both integrators.</summary>
public static class PropertiesAnalysis
{
    /// <summary>Computes the properties of a section.</summary>
    /// <param name="section">The section.</param>
    /// <param name="flat">Its outline, flattened.</param>
    /// <param name="mesh">The mesh of <paramref name="flat"/>: its fibers check the boundary integrals.</param>
    public static SectionProperties Of(Section section, FlatOutline flat, Mesh mesh)
    {
        var outline = section.Outline;
        var exact = AreaProperties.Of(new BoundaryIntegrator(outline), outline);
        var fibers = AreaProperties.Of(new FiberIntegrator(mesh, flat), outline, exact.Principal);
        var chords = AreaProperties.CentroidalMoments(new FiberIntegrator(mesh), outline.Bounds.Centre);
        var bounds = outline.Bounds;
        var origin = outline.Origin;
        var centroid = origin + exact.Centroid;
        var (area, own) = (exact.Area, exact.SecondMoment);
        return new SectionProperties
        {
            Area = area,
            OuterPerimeter = Perimeter(outline, isOuter: true),
            InnerPerimeter = Perimeter(outline, isOuter: false),
            BoundingBox = new Box(
                bounds.MinX + origin.X, bounds.MinY + origin.Y, bounds.MaxX + origin.X, bounds.MaxY + origin.Y),
            Centroid = centroid,
            FirstMomentDatum = new AxisPair(area * centroid.Y, area * centroid.X),
            SecondMomentDatum = new SecondMoments(
                own.X + area * centroid.Y * centroid.Y,
                own.Y + area * centroid.X * centroid.X,
                own.XY + area * centroid.X * centroid.Y),
            SecondMoment = own,
            Principal = exact.Principal,
            ElasticX = ElasticBending.Fibres(outline, exact.Centroid, Point.AlongY, own.X),
            ElasticY = ElasticBending.Fibres(outline, exact.Centroid, Point.AlongX, own.Y),
            Elastic1 = ElasticBending.Fibres(outline, exact.Centroid, exact.Axis2, exact.Principal.I1),
            Elastic2 = ElasticBending.Fibres(outline, exact.Centroid, exact.Axis1, exact.Principal.I2),
            PlasticX = Plastic(exact.PlasticX, origin.Y, Point.AlongY, own.X),
            PlasticY = Plastic(exact.PlasticY, origin.X, Point.AlongX, own.Y),
            Plastic1 = Plastic(exact.Plastic1, -exact.Axis2.Dot(exact.Centroid), exact.Axis2, exact.Principal.I1),
            Plastic2 = Plastic(exact.Plastic2, -exact.Axis1.Dot(exact.Centroid), exact.Axis1, exact.Principal.I2),
            MassPerLength = section.Material?.Density * area,
            CrossChecks = CrossChecking.Compare(fibers, exact, bounds.Diagonal, origin),
            Chords = new ChordError(
                flat.MaxSag,
                (chords.Area - area) / area,
                (chords.SecondMoment.X - own.X) / own.X,
                (chords.SecondMoment.Y - own.Y) / own.Y),
            Mesh = new MeshSummary(
                mesh.TriangleCount, mesh.Nodes.Length, MeshQuality.Of(mesh).SmallestAngle, mesh.Unrefined.Length),
        };

        PlasticBending Plastic(PlasticAxis axis, double shift, Point direction, double secondMoment)
        {
            var governing = ElasticBending.Fibres(outline, exact.Centroid, direction, secondMoment).Governing.Modulus;
            return new PlasticBending(axis.Offset + shift, axis.Modulus, axis.Modulus / governing);
        }
    }

    private static double Perimeter(Outline outline, bool isOuter) => outline.Boundaries
        .Where(b => b.Role == BoundaryRole.Outer == isOuter)
        .Sum(b => b.Boundary.Length);
}
