using CsCheck;
using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;
using NetTopologySuite.Geometries;

namespace MeshSection.Tests.Verification;

/// <summary>NetTopologySuite, a general-purpose geometry library, on the same polygons.</summary>
public class OutsideLibraryTests
{
    public static TheoryData<string> Sections => [.. PublishedCase.All.Select(c => c.Id)];

    [Theory]
    [MemberData(nameof(Sections))]
    public void Area_length_and_centroid_are_those_of_NetTopologySuite(string id)
    {
        var (flat, mesh) = Pipeline.Mesh(PublishedSections.Outline(id));
        Compare(flat, mesh);
    }

    [Fact]
    public void So_they_are_on_random_polygons() => Gen.Select(Gen.Double[0.2, 1].Array[5, 40], Gen.Double[0.05, 0.9]).Sample(
        (radii, hole) =>
        {
            var outline = Outline.Create([Star(radii, 100), Star(radii, 100 * hole)]);
            var (flat, mesh) = Pipeline.Mesh(outline, 50);
            Compare(flat, mesh);
        },
        iter: 50);

    [Fact]
    public void Any_polygon_that_is_accepted_is_valid_and_any_that_is_invalid_is_refused() => Gen
        .Select(Gen.Int[0, 12], Gen.Int[0, 12]).Array[3, 8].Sample(
            corners =>
            {
                var points = corners.Select(c => new MeshSection.Geometry.Point(c.Item1, c.Item2)).ToArray();
                var isAccepted = true;
                try
                {
                    Outline.Create([Boundary.Polygon(points)]);
                }
                catch (OutlineException)
                {
                    isAccepted = false;
                }

                // It accepts a ring with a point twice in a row, which is no outline of ours.
                var ring = points.Append(points[0]).Select(p => new Coordinate(p.X, p.Y)).ToArray();
                var isValid = new GeometryFactory().CreatePolygon(ring).IsValid
                    && Enumerable.Range(1, ring.Length - 1).All(i => !ring[i].Equals2D(ring[i - 1]));
                Assert.Equal(isValid, isAccepted);
            },
            iter: 2000);

    [Fact]
    public void The_two_parts_of_a_section_cut_by_a_line_add_up_to_it() => Gen
        .Select(Gen.Double[0.3, 1].Array[5, 20], Gen.Double[0.1, 0.6], Gen.Double[-Math.PI, Math.PI], Gen.Double[-40, 40]).Sample(
            (radii, hole, angle, offset) =>
            {
                var whole = Outline.Create([Star(radii, 100), Star(radii, 100 * hole)]);
                var (flat, _) = Pipeline.Mesh(whole, 1);
                var outside = OutsidePolygons.Of(flat);
                var normal = MeshSection.Geometry.Point.Direction(angle);
                if (flat.Graph.Points.Any(p => Math.Abs(normal.Dot(p) - offset) < 1e-6))
                {
                    // A cut through a corner can leave parts that touch themselves there: no outlines.
                    return;
                }

                var sum = default(AreaMoments);
                foreach (var side in new[] { 1, -1 })
                {
                    var part = Outline.Create(OutsidePolygons.Boundaries(outside.Intersection(HalfPlane(normal, offset, side))));
                    var moments = new BoundaryIntegrator(part).Moments(new MeshSection.Geometry.Point(3, 4));
                    sum += moments;
                    // The same part without cutting the polygon, by the integrator itself.
                    Assert.Equal(moments.Area, new BoundaryIntegrator(whole).Beyond(side * normal, side * offset).Area, 1e-8);
                }

                var all = new BoundaryIntegrator(whole).Moments(new MeshSection.Geometry.Point(3, 4));
                // The cut's own corners are rounded to the digits of the coordinates, 1e-14 of the section.
                Assert.Equal(all.Area, sum.Area, 1e-11 * all.Area);
                Assert.Equal(all.X, sum.X, 1e-11 * all.Area * 100);
                Assert.Equal(all.Y, sum.Y, 1e-11 * all.Area * 100);
                Assert.Equal(all.XX, sum.XX, 1e-11 * all.XX);
                Assert.Equal(all.YY, sum.YY, 1e-11 * all.YY);
                Assert.Equal(all.XY, sum.XY, 1e-11 * (all.XX + all.YY));
            },
            iter: 100);

    private static void Compare(FlatOutline flat, Mesh mesh)
    {
        var outside = OutsidePolygons.Of(flat);
        Assert.True(outside.IsValid);
        var about = flat.Outline.Bounds.Centre;
        var ours = new FiberIntegrator(mesh).Moments(about);
        var size = flat.Outline.Bounds.Diagonal;
        Assert.Equal(outside.Area, ours.Area, 1e-12 * ours.Area);
        Assert.Equal(outside.Length, flat.Chords.Sum(c => c.Curve.Chord.Length), 1e-12 * outside.Length);
        Assert.Equal(outside.Centroid.X, about.X + ours.Centroid.X, 1e-12 * size);
        Assert.Equal(outside.Centroid.Y, about.Y + ours.Centroid.Y, 1e-12 * size);
    }

    private static Boundary Star(double[] radii, double scale) => Boundary.Polygon(
        [.. radii.Select((r, i) => scale * r * MeshSection.Geometry.Point.Direction(i * Math.Tau / radii.Length))]);

    private static Polygon HalfPlane(MeshSection.Geometry.Point normal, double offset, int side)
    {
        const double Far = 500;
        var (along, on) = (normal.Left(), offset * normal);
        MeshSection.Geometry.Point[] corners =
        [
            on - Far * along, on + Far * along, on + Far * along + side * Far * normal, on - Far * along + side * Far * normal,
        ];
        return new GeometryFactory().CreatePolygon([.. corners.Append(corners[0]).Select(p => new Coordinate(p.X, p.Y))]);
    }
}
