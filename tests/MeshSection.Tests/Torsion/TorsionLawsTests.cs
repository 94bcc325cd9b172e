using CsCheck;
using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Sections.Shapes;
using MeshSection.Tests.Sections.Shapes;
using MeshSection.Torsion;

namespace MeshSection.Tests.Torsion;

/// <summary>Laws that hold for every section, over every starter shape.</summary>
public class TorsionLawsTests
{
    private const int Iterations = 8;

    public static TheoryData<string> Shapes => ShapeCases.Names;

    [Theory]
    [MemberData(nameof(Shapes))]
    public void Bounds_and_signs_are_as_physics_has_them(string shape) => ShapeCases.All[shape].Sample(
        s =>
        {
            var outline = Outline.Create(s.Boundaries());
            var p = TorsionPipeline.Of(outline, 60, 0.3);
            var area = Pipeline.Properties(outline, 60);
            Assert.Equal(0, p.OutlineDeviation);
            Assert.Equal(area.Area, p.Area, 1e-11 * area.Area);
            Assert.InRange(p.TorsionConstant.Lower, 0, p.TorsionConstant.Upper * (1 + 1e-12));
            Assert.True(p.TorsionConstant.Upper <= area.SecondMoment.Polar * (1 + 1e-12));
            // Pólya's inequality: of all sections without holes the circle is the stiffest for its area.
            if (outline.Boundaries.Length == 1)
            {
                Assert.True(p.TorsionConstant.Lower <= p.Area * p.Area / (2 * Math.PI) * (1 + 1e-12));
            }

            Assert.True(p.WarpingConstant > -1e-9 * p.Area * p.Area * p.Area);
            Assert.InRange(p.ShearCoefficientX, 0, 1);
            Assert.InRange(p.ShearCoefficientY, 0, 1);
            Assert.True(p.ShearFlexibility.X * p.ShearFlexibility.Y > p.ShearFlexibility.XY * p.ShearFlexibility.XY);
        },
        iter: Iterations);

    [Theory]
    [MemberData(nameof(Shapes))]
    public void A_mesh_that_is_moved_turned_and_scaled_gives_the_same(string shape) =>
        Gen.Select(ShapeCases.All[shape], Gen.Double[-3, 3], Gen.Double[-100, 100], Gen.Double[0.01, 100]).Sample(
            (s, turn, shift, scale) =>
            {
                var placement = new Placement(new Point(shift, -2 * shift), turn, scale);
                var flattening = Flattening.For(Outline.Create(s.Boundaries()));
                var outline = Outline.Create(s.Boundaries());
                var flat = flattening.Apply(outline);
                var mesh = new DelaunayMesher().Triangulate(flat.Graph, new MeshSettings());
                var placed = (flattening with { MaxSag = scale * flattening.MaxSag }).Apply(
                    Outline.Create(s.Boundaries().Select(b => b.Placed(placement))));
                Assert.Equal(flat.Chords.Length, placed.Chords.Length);
                var home = TorsionAnalysis.Of(flat, mesh, 0.3);
                var away = TorsionAnalysis.Of(placed, Placed(mesh, placement), 0.3);
                var size = outline.Bounds.Diagonal;
                Same(Math.Pow(scale, 4) * home.TorsionConstant.Lower, away.TorsionConstant.Lower, 1e-9);
                Same(Math.Pow(scale, 4) * home.TorsionConstant.Upper, away.TorsionConstant.Upper, 1e-9);
                Near(placement.Apply(home.TrefftzShearCentre), away.TrefftzShearCentre);
                Near(placement.Apply(home.ElasticShearCentre), away.ElasticShearCentre);
                // Round sections do not warp: what is left of Iw is rounding of the sixth power of their size.
                Assert.Equal(
                    Math.Pow(scale, 6) * home.WarpingConstant,
                    away.WarpingConstant,
                    1e-8 * Math.Pow(scale, 6) * (home.WarpingConstant + 1e-6 * home.Area * Math.Pow(size, 4)));
                Same(
                    (home.ShearFlexibility.X + home.ShearFlexibility.Y) / (scale * scale),
                    away.ShearFlexibility.X + away.ShearFlexibility.Y,
                    1e-9);

                void Near(Point expected, Point actual) =>
                    Assert.Equal(0, expected.DistanceTo(actual), 1e-8 * (scale * size + Math.Abs(shift)));
            },
            iter: Iterations);

    [Theory]
    [MemberData(nameof(Shapes))]
    public void A_mirror_image_differs_by_no_more_than_the_meshes(string shape) => ShapeCases.All[shape].Sample(
        s =>
        {
            var home = TorsionPipeline.Of(s.Boundaries(), 150, 0.3);
            var mirrored = TorsionPipeline.Of([.. s.Boundaries().Select(b => b.Placed(new Placement(default, Mirrors: true)))], 150, 0.3);
            Assert.True(home.TorsionConstant.Lower <= mirrored.TorsionConstant.Upper * (1 + 1e-12));
            Assert.True(mirrored.TorsionConstant.Lower <= home.TorsionConstant.Upper * (1 + 1e-12));
            Same(home.ShearFlexibility.X, mirrored.ShearFlexibility.X, 0.02);
            Assert.Equal(home.ShearFlexibility.XY, -mirrored.ShearFlexibility.XY, 0.02 * home.ShearFlexibility.X);
            Assert.Equal(home.ShearCentre.X, -mirrored.ShearCentre.X, 5e-3 * Math.Sqrt(home.Area));
            Assert.Equal(home.ShearCentre.Y, mirrored.ShearCentre.Y, 5e-3 * Math.Sqrt(home.Area));
        },
        iter: Iterations);

    [Fact]
    public void The_order_of_the_boundaries_does_not_matter()
    {
        var boundaries = ThinWalls.Cells(100, 10, 100, 50, 70);
        var home = TorsionPipeline.Of(boundaries, 100);
        foreach (var turn in new[] { 1, 2, 3 })
        {
            var other = TorsionPipeline.Of([.. boundaries.Skip(turn), .. boundaries.Take(turn)], 100);
            Assert.True(home.TorsionConstant.Lower <= other.TorsionConstant.Upper);
            Assert.True(other.TorsionConstant.Lower <= home.TorsionConstant.Upper);
            Same(home.TorsionConstant.Lower, other.TorsionConstant.Lower, 0.02);
        }
    }

    [Fact]
    public void The_same_input_gives_the_same_bits()
    {
        var boundaries = new Channel(200, 80, 11, 6, 13).Boundaries();
        Assert.Equal(TorsionPipeline.Of(boundaries, 200, 0.3), TorsionPipeline.Of(boundaries, 200, 0.3));
    }

    [Fact]
    public void Separate_pieces_are_refused_with_their_number()
    {
        var apart = Assert.Throws<TorsionException>(() => TorsionPipeline.Of(
            [Boundary.Circle(default, 5), Boundary.Circle(new Point(20, 0), 5), Boundary.Circle(new Point(40, 0), 5)]));
        Assert.Equal((TorsionFault.Disconnected, 3), (apart.Fault, apart.Value));
        var inside = Assert.Throws<TorsionException>(() => TorsionPipeline.Of(
            [Boundary.Circle(default, 20), Boundary.Circle(default, 15), Boundary.Circle(default, 5)]));
        Assert.Equal((TorsionFault.Disconnected, 2), (inside.Fault, inside.Value));
    }

    private static Mesh Placed(Mesh mesh, Placement placement) => new(
        [.. mesh.Nodes.Select(placement.Apply)], mesh.Corners, mesh.Neighbours, mesh.Regions, mesh.Segments, mesh.Unrefined);

    private static void Same(double expected, double actual, double relative) =>
        Assert.Equal(expected, actual, relative * Math.Abs(expected));
}
