using MeshSection.Geometry;
using MeshSection.Sections.Shapes;
using MeshSection.Torsion;

namespace MeshSection.Tests.Torsion;

public class ShearTests
{
    [Theory]
    [InlineData(-0.5)]
    [InlineData(0)]
    [InlineData(0.3)]
    [InlineData(0.5)]
    public void A_circle_follows_the_energy_of_its_exact_field(double nu)
    {
        // [Renton1991]: 6 (1 + ν)² / (7 + 14ν + 8ν²), 6/7 for ν = 0.
        var k = 6 * (1 + nu) * (1 + nu) / (7 + 14 * nu + 8 * nu * nu);
        var p = TorsionPipeline.Of(new Circle(100).Boundaries(), 500, nu);
        Assert.Equal(k, p.ShearCoefficientX, 2e-6);
        Assert.Equal(k, p.ShearCoefficientY, 2e-6);
        Assert.Equal(k * Math.PI * 2500, p.ShearAreaX, 2e-6 * p.ShearAreaX);
        Assert.Equal(0, p.ShearFlexibility.XY, 1e-7 * p.ShearFlexibility.X);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(8)]
    public void A_rectangle_of_any_ratio_has_five_sixths_without_lateral_strain(double ratio)
    {
        var p = TorsionPipeline.Of(new Rectangle(10, 10 * ratio).Boundaries(), 500);
        Assert.Equal(5.0 / 6, p.ShearCoefficientX, 2e-4);
        Assert.Equal(5.0 / 6, p.ShearCoefficientY, 2e-4);
    }

    [Fact]
    public void A_tall_rectangle_keeps_five_sixths_whatever_the_lateral_strain()
    {
        // Across a width much smaller than the depth the stress stays even; the other way it does not.
        var p = TorsionPipeline.Of(new Rectangle(10, 200).Boundaries(), 1000, 0.3);
        Assert.Equal(5.0 / 6, p.ShearCoefficientY, 1e-4);
        Assert.True(p.ShearCoefficientX < 0.4);
    }

    [Fact]
    public void A_hollow_circle_follows_its_closed_form()
    {
        // [Cowper1966] with ν = 0, where it is the energy's: 6 (1 + m²)² / (7 (1 + m²)² + 20 m²), m = 0.6.
        var square = 1.36 * 1.36;
        var p = TorsionPipeline.Of(new Tube(100, 20).Boundaries());
        Assert.Equal(6 * square / (7 * square + 20 * 0.36), p.ShearCoefficientX, 5e-6);
        Assert.Equal(p.ShearCoefficientX, p.ShearCoefficientY, 5e-6);
    }

    [Fact]
    public void A_semicircle_follows_its_known_coefficients()
    {
        // 6/7 along the flat, as for the full circle; 0.7661457975 across it, from elements of degree 14.
        var p = TorsionPipeline.Of([Solids.Sector(1, 180)], 800);
        Assert.Equal(6.0 / 7, p.ShearCoefficientY, 2e-6);
        Assert.Equal(0.7661457975, p.ShearCoefficientX, 2e-6);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(0.3)]
    public void Flexibility_turns_as_a_tensor(double nu)
    {
        var (turn, angle) = (0.6, new Angle(150, 90, 12, 12, 6).Boundaries());
        var home = TorsionPipeline.Of(angle, 400, nu).ShearFlexibility;
        var turned = TorsionPipeline.Of([.. angle.Select(b => b.Placed(new Placement(default, turn)))], 400, nu).ShearFlexibility;
        var (s, c) = Math.SinCos(turn);
        Assert.Equal(c * c * home.X - 2 * s * c * home.XY + s * s * home.Y, turned.X, 1e-3 * home.X);
        Assert.Equal(s * s * home.X + 2 * s * c * home.XY + c * c * home.Y, turned.Y, 1e-3 * home.X);
        Assert.Equal(s * c * (home.X - home.Y) + (c * c - s * s) * home.XY, turned.XY, 1e-3 * home.X);
        Assert.NotEqual(0, home.XY, 0.01 * home.X);
    }

    [Fact]
    public void Shear_areas_are_the_inverse_of_the_flexibility()
    {
        var p = TorsionPipeline.Of(new Channel(200, 80, 11, 6, 13).Boundaries(), 60);
        Assert.Equal(1 / p.ShearFlexibility.X, p.ShearAreaX);
        Assert.Equal(1 / p.ShearFlexibility.Y, p.ShearAreaY);
        Assert.Equal(p.ShearAreaY / p.Area, p.ShearCoefficientY);
    }

    [Theory]
    [InlineData(-1)]
    [InlineData(0.51)]
    [InlineData(double.NaN)]
    public void A_Poissons_ratio_that_no_material_has_is_refused(double nu)
    {
        var fault = Assert.Throws<TorsionException>(() => TorsionPipeline.Of(new Circle(1).Boundaries(), 10, nu));
        Assert.Equal((TorsionFault.PoissonRatio, nu), (fault.Fault, fault.Value));
    }
}
