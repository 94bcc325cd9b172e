using MeshSection.Geometry;
using MeshSection.Sections.Shapes;

namespace MeshSection.Tests.Torsion;

public class ShearCentreTests
{
    [Theory]
    [InlineData(0)]
    [InlineData(0.25)]
    [InlineData(0.3)]
    [InlineData(0.5)]
    public void A_semicircle_has_both_shear_centres_where_theory_puts_them(double nu)
    {
        var p = TorsionPipeline.Of([Solids.Sector(1, 180)], 500, nu);
        Assert.Equal(8 / (5 * Math.PI), p.TrefftzShearCentre.X, 5e-7);
        // Zero twist on the diameter at 8 (3 + 4ν) / (15 π (1 + ν)); in the mean, less ν xc J / (2 (1 + ν) I).
        var (xc, j, i) = (4 / (3 * Math.PI), Math.PI / 2 - 4 / Math.PI, Math.PI / 8);
        var elastic = (8 * (3 + 4 * nu) / (15 * Math.PI) - nu * xc * j / (2 * i)) / (1 + nu);
        Assert.Equal(elastic, p.ElasticShearCentre.X, 5e-7);
        Assert.Equal(0, p.TrefftzShearCentre.Y, 5e-7);
        Assert.Equal(0, p.ElasticShearCentre.Y, 5e-7);
        Assert.Equal(p.TrefftzShearCentre, p.ShearCentre);
    }

    [Fact]
    public void Without_lateral_strain_the_two_shear_centres_are_one()
    {
        var p = TorsionPipeline.Of(new Angle(150, 90, 12, 12, 6).Boundaries(), 100);
        Assert.Equal(p.TrefftzShearCentre.X, p.ElasticShearCentre.X, 1e-9);
        Assert.Equal(p.TrefftzShearCentre.Y, p.ElasticShearCentre.Y, 1e-9);
        var strained = TorsionPipeline.Of(new Angle(150, 90, 12, 12, 6).Boundaries(), 100, 0.3);
        Assert.Equal(p.TrefftzShearCentre, strained.TrefftzShearCentre);
        Assert.NotEqual(p.ElasticShearCentre.X, strained.ElasticShearCentre.X, 1e-4);
    }

    [Fact]
    public void Double_symmetry_puts_the_shear_centre_at_the_centroid()
    {
        var p = TorsionPipeline.Of(new IBeam(200, 100, 8.5, 5.6, 12).Boundaries(), 400, 0.3);
        Assert.Equal(0, p.ShearCentre.X, 1e-4);
        Assert.Equal(100, p.ShearCentre.Y, 1e-4);
        Assert.Equal(100, p.ElasticShearCentre.Y, 1e-4);
    }

    [Fact]
    public void The_shear_centre_of_an_angle_lies_near_the_crossing_of_its_walls()
    {
        var p = TorsionPipeline.Of(new Angle(100, 100, 2).Boundaries(), 1000);
        Assert.Equal(1, p.ShearCentre.X, 0.1);
        Assert.Equal(1, p.ShearCentre.Y, 0.1);
    }

    [Fact]
    public void Coordinates_are_the_drawings_own()
    {
        var home = TorsionPipeline.Of(Outline.Create(new Channel(200, 80, 11, 6, 13).Boundaries()), 100);
        var away = TorsionPipeline.Of(Outline.Create(new Channel(200, 80, 11, 6, 13).Boundaries(), new Point(1e6, -2e6)), 100);
        Assert.Equal(home.ShearCentre.X + 1e6, away.ShearCentre.X, 1e-9);
        Assert.Equal(home.ShearCentre.Y - 2e6, away.ShearCentre.Y, 1e-9);
        Assert.Equal(home.TorsionConstant, away.TorsionConstant);
    }
}
