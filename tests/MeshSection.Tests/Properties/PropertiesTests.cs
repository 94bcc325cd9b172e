using MeshSection.Geometry;
using MeshSection.Sections.Shapes;

namespace MeshSection.Tests.Properties;

public class PropertiesTests
{
    [Fact]
    public void Across_a_gap_the_plastic_neutral_axis_is_its_middle()
    {
        // 40 × 10 below and 20 × 20 above, the gap between them from 110 to 150 and not in the middle of the whole.
        static Boundary Plate(double y, double width, double height) =>
            Boundary.Polygon(new(0, y), new(width, y), new(width, y + height), new(0, y + height));
        var p = Pipeline.Properties(Outline.Create([Plate(100, 40, 10), Plate(150, 20, 20)]));
        Assert.Equal(130, p.PlasticX.NeutralAxis, 1e-10);
        Assert.Equal(400 * (160 - 105), p.PlasticX.Modulus, 1e-8);
        Assert.All(p.CrossChecks, check => Assert.True(check.Difference < 1e-12, $"{check}"));
    }

    [Theory]
    [InlineData(40, 60, 0)]
    [InlineData(60, 40, 90)]
    [InlineData(50, 50, 0)]
    public void Axis_1_is_the_major_one_and_angle_0_where_every_axis_is_principal(double width, double height, double angle)
    {
        var p = Pipeline.Properties(Outline.Create(new Rectangle(width, height).Boundaries()));
        Assert.Equal(angle, p.Principal.Angle);
        Assert.Equal(Math.Max(width, height) / Math.Min(width, height), Math.Sqrt(p.Principal.I1 / p.Principal.I2), 1e-12);
    }

    [Fact]
    public void Of_level_extreme_points_the_one_to_the_left_looking_outwards_is_named()
    {
        var p = Pipeline.Properties(Outline.Create(new Rectangle(40, 60).Boundaries()));
        Assert.Equal(new Point(-20, 60), p.ElasticX.Positive.Point);
        Assert.Equal(new Point(20, 0), p.ElasticX.Negative.Point);
        Assert.Equal(new Point(20, 60), p.ElasticY.Positive.Point);
        Assert.Equal(new Point(-20, 0), p.ElasticY.Negative.Point);
        Assert.True(p.ElasticX.PositiveGoverns);
    }

    [Fact]
    public void Perimeter_and_paint_count_what_can_be_reached_from_outside()
    {
        static Boundary Square(double side) => Boundary.Polygon(
            new(-side, -side), new(side, -side), new(side, side), new(-side, side));
        var p = Pipeline.Properties(Outline.Create([Square(50), Square(40), Square(10)]));
        Assert.Equal(400, p.OuterPerimeter, 1e-12);
        Assert.Equal(320 + 80, p.InnerPerimeter, 1e-12);
        Assert.Equal(400, p.PaintedSurfacePerLength, 1e-12);
        Assert.Equal(10000 - 6400 + 400, p.Area, 1e-9);
    }
}
