using MeshSection.Torsion;

namespace MeshSection.Tests.Torsion;

/// <summary>
/// Thin-wall formulas hold in the limit of thin walls: the difference must be small, of the order of thickness over
/// depth (0.5 % here), and shrink with the thickness.
/// </summary>
public class ThinWallLimitTests
{
    [Fact]
    public void A_channel_tends_to_its_formulas()
    {
        // e = 3 b² tf / (6 b tf + h tw); Iw = tf b³ h² / 12 · (3 b tf + 2 h tw) / (6 b tf + h tw).
        var (b, h) = (77.0, 189.0);
        Shrinks(
            t => TorsionPipeline.Of(ThinWalls.Channel(b, h, 11 * t, 6 * t), 800),
            t => 3 * b * b * 11 / (6 * b * 11 + h * 6),
            p => -p.ShearCentre.X,
            0.004);
        Shrinks(
            t => TorsionPipeline.Of(ThinWalls.Channel(b, h, 11 * t, 6 * t), 800),
            t => t * 11 * b * b * b * h * h / 12 * (3 * b * 11 + 2 * h * 6) / (6 * b * 11 + h * 6),
            p => p.WarpingConstant,
            0.004);
    }

    [Fact]
    public void A_zed_tends_to_its_formula() => Shrinks(
        t => TorsionPipeline.Of(ThinWalls.Zed(77, 189, 11 * t, 6 * t), 800),
        t => t * 11 * 77 * 77 * 77 * 189 * 189.0 / 12 * (77 * 11 + 2 * 189 * 6) / (2 * 77 * 11 + 189 * 6),
        p => p.WarpingConstant,
        0.004);

    [Fact]
    public void An_I_with_unlike_flanges_tends_to_its_formulas()
    {
        // h I₁ / (I₁ + I₂) above the bottom flange; Iw = h² I₁ I₂ / (I₁ + I₂).
        var (top, bottom) = (10 * 1e6 / 12, 8 * 216e3 / 12);
        Shrinks(
            t => TorsionPipeline.Of(ThinWalls.MonoI(100, 10 * t, 60, 8 * t, 190, 6 * t), 800),
            t => 190 * top / (top + bottom),
            p => p.ShearCentre.Y,
            0.002);
        Shrinks(
            t => TorsionPipeline.Of(ThinWalls.MonoI(100, 10 * t, 60, 8 * t, 190, 6 * t), 800),
            t => t * 190 * 190 * top * bottom / (top + bottom),
            p => p.WarpingConstant,
            0.004);
    }

    [Fact]
    public void A_slit_tube_tends_to_its_formulas()
    {
        // With the walls the slit must become narrow too: it moves the shear centre by about its share of the circle.
        Shrinks(t => Slit(t), t => 100, p => -p.ShearCentre.X, 0.004);
        Shrinks(t => Slit(t), t => 2 * Math.PI * 4 * t * Math.Pow(50, 5) * (Math.PI * Math.PI / 3 - 2), p => p.WarpingConstant, 0.01);

        static TorsionProperties Slit(double t) => TorsionPipeline.Of([ThinWalls.SlitTube(50, 4 * t, 1e-3 * t)], 800);
    }

    [Fact]
    public void A_half_circle_of_wall_tends_to_its_formulas()
    {
        var a = Math.PI / 2;
        Shrinks(t => Arc(t), t => 200 / Math.PI, p => p.ShearCentre.X, 0.002);
        Shrinks(t => Arc(t), t => 2 * 5 * t * Math.Pow(50, 5) / 3 * (a * a * a - 6 / a), p => p.WarpingConstant, 0.01);

        static TorsionProperties Arc(double t) => TorsionPipeline.Of([ThinWalls.Arc(50, 5 * t, -Math.PI / 2, Math.PI / 2)], 800);
    }

    [Fact]
    public void A_box_of_two_cells_tends_to_Bredts_formula()
    {
        Shrinks(t => Of(t, 100, 100), t => t * 5 / 3.0 * 8e6, p => p.TorsionConstant.Value, 0.01);
        Shrinks(t => Of(t, 100, 50), t => t * 1e8 / 11, p => p.TorsionConstant.Value, 0.01);

        static TorsionProperties Of(double t, double first, double second) =>
            TorsionPipeline.Of(ThinWalls.Cells(100, 5 * t, first, second), 800);
    }

    [Fact]
    public void Shear_coefficients_tend_to_those_of_the_shear_flow()
    {
        // I: 10 (1 + 3m)² / (12 + 72m + 150m² + 90m³ + 30n² (m + m²)), m = 2 b tf / (h tw), n = b / h [Cowper1966], ν = 0.
        var (m, n) = (2 * 100 * 10 / (190.0 * 6), 100 / 190.0);
        var i = 10 * Math.Pow(1 + 3 * m, 2) / (12 + 72 * m + 150 * m * m + 90 * m * m * m + 30 * n * n * (m + m * m));
        Shrinks(
            t => TorsionPipeline.Of(ThinWalls.MonoI(100, 10 * t, 100, 10 * t, 190, 6 * t), 800),
            t => i,
            p => p.ShearCoefficientY,
            0.006);
        Shrinks(
            t => TorsionPipeline.Of(ThinWalls.Cells(100, 8 * t, 100), 800), t => 5.0 / 12, p => p.ShearCoefficientX, 0.01);
    }

    private static void Shrinks(
        Func<double, TorsionProperties> section,
        Func<double, double> formula,
        Func<TorsionProperties, double> quantity,
        double difference)
    {
        var thick = Math.Abs(quantity(section(0.4)) / formula(0.4) - 1);
        var thin = Math.Abs(quantity(section(0.1)) / formula(0.1) - 1);
        Assert.InRange(thin, 0, difference);
        Assert.True(thin < 0.5 * thick, $"{thick} for thick walls, {thin} for thin ones");
    }
}
