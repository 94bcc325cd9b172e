using CsCheck;
using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Tests.Verification;

namespace MeshSection.Tests.Integration;

public class IntegratorTests
{
    public static TheoryData<string> Sections => [.. PublishedCase.All.Select(c => c.Id)];

    [Theory]
    [MemberData(nameof(Sections))]
    public void On_the_polygon_of_the_chords_fibers_and_boundary_agree(string id)
    {
        var (flat, mesh) = Pipeline.Mesh(PublishedSections.Outline(id));
        var loops = flat.Chords
            .GroupBy(c => c.Place.Boundary)
            .Select(g => Boundary.Polygon([.. g.Select(c => c.Curve.Start)]));
        var about = new Point(3, -7);
        var size = flat.Outline.Bounds.Diagonal + 7;
        var fiber = new FiberIntegrator(mesh).Moments(about);
        var boundary = new BoundaryIntegrator(Outline.Create(loops)).Moments(about);
        Assert.Equal(1, fiber.Area / boundary.Area, 1e-12);
        Assert.Equal(fiber.X, boundary.X, 1e-12 * boundary.Area * size);
        Assert.Equal(fiber.Y, boundary.Y, 1e-12 * boundary.Area * size);
        Assert.Equal(1, fiber.XX / boundary.XX, 1e-12);
        Assert.Equal(1, fiber.YY / boundary.YY, 1e-12);
        Assert.Equal(fiber.XY, boundary.XY, 1e-12 * Math.Sqrt(boundary.XX * boundary.YY));
    }

    [Theory]
    [MemberData(nameof(Sections))]
    public void Beyond_any_line_fibers_and_boundary_agree_on_the_true_outline(string id)
    {
        var outline = PublishedSections.Outline(id);
        var (flat, mesh) = Pipeline.Mesh(outline);
        var fiber = new FiberIntegrator(mesh, flat);
        var boundary = new BoundaryIntegrator(outline);
        var whole = boundary.Moments(outline.Bounds.Centre).Area;
        var size = outline.Bounds.Diagonal;
        Gen.Select(Gen.Double[-Math.PI, Math.PI], Gen.Double[-0.6, 0.6]).Sample(
            (angle, reach) =>
            {
                var normal = Point.Direction(angle);
                var offset = normal.Dot(outline.Bounds.Centre) + reach * size;
                var (f, b) = (fiber.Beyond(normal, offset), boundary.Beyond(normal, offset));
                Assert.Equal(f.Area, b.Area, 1e-12 * whole);
                Assert.Equal(f.Moment, b.Moment, 1e-12 * whole * size);
            },
            iter: 50);
    }

    [Fact]
    public void A_line_through_a_corner_along_an_edge_or_touching_an_arc_cuts_exactly()
    {
        var outline = PublishedSections.Outline("geo-semicircle");
        var (flat, mesh) = Pipeline.Mesh(outline);
        foreach (IIntegrator integrator in new IIntegrator[] { new FiberIntegrator(mesh, flat), new BoundaryIntegrator(outline) })
        {
            Assert.Equal(Math.PI * 1250, integrator.Beyond(Point.AlongY, 0).Area, 1e-9);
            Assert.Equal(0, integrator.Beyond(-Point.AlongY, 0).Area, 1e-9);
            Assert.Equal(0, integrator.Beyond(Point.AlongY, 50).Area, 1e-9);
            Assert.Equal(Math.PI * 625, integrator.Beyond(Point.AlongX, 0).Area, 1e-9);
            // Above 45 degrees through the centre: three eighths of the circle.
            Assert.Equal(Math.PI * 2500 * 3 / 8, integrator.Beyond(Point.Direction(Math.PI / 4), 0).Area, 1e-9);
            Assert.Equal(2.0 / 3 * 50 * 50 * 50, integrator.Beyond(Point.AlongY, 0).Moment, 1e-7);
        }
    }

    [Fact]
    public void A_line_that_grazes_an_arc_or_misses_it_by_a_rounding_gives_numbers()
    {
        var outline = PublishedSections.Outline("geo-hollow-circle");
        var integrator = new BoundaryIntegrator(outline);
        foreach (var radius in new[] { 30.0, 50 })
        {
            var above = integrator.Beyond(Point.AlongY, radius);
            for (var step = -20; step <= 20; step++)
            {
                var offset = radius;
                for (var i = 0; i < Math.Abs(step); i++)
                {
                    offset = step > 0 ? Math.BitIncrement(offset) : Math.BitDecrement(offset);
                }

                var part = integrator.Beyond(Point.AlongY, offset);
                Assert.Equal(above.Area, part.Area, 1e-6);
                Assert.Equal(above.Moment, part.Moment, 1e-6);
            }
        }
    }

    [Fact]
    public void A_gap_in_the_section_is_found_by_both()
    {
        static Boundary Plate(double y) => Boundary.Polygon(new(0, y), new(40, y), new(40, y + 10), new(0, y + 10));
        var outline = Outline.Create([Plate(0), Plate(50)]);
        var (flat, mesh) = Pipeline.Mesh(outline);
        foreach (IIntegrator integrator in new IIntegrator[] { new FiberIntegrator(mesh, flat), new BoundaryIntegrator(outline) })
        {
            Assert.Equal((10, 50), integrator.Gap(Point.AlongY, 12));
            Assert.Equal((5, 5), integrator.Gap(Point.AlongY, 5));
        }
    }
}
