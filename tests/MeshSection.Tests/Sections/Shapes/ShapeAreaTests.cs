using MeshSection.Geometry;
using MeshSection.Sections.Shapes;

namespace MeshSection.Tests.Sections.Shapes;

/// <summary>Area and perimeter of each shape against the formula that a handbook gives.</summary>
public class ShapeAreaTests
{
    /// <summary>What one right-angled fillet of radius 1 adds to or takes from the area of the sharp corner.</summary>
    private const double Fillet = 1 - Math.PI / 4;

    /// <summary>What one right-angled rounding of radius 1 takes from the perimeter.</summary>
    private const double Shortening = 2 - Math.PI / 2;

    [Fact]
    public void Rectangle() =>
        Measures(new Rectangle(80, 50, 6), 80 * 50 - 4 * 36 * Fillet, 2 * (80 + 50) - 4 * 6 * Shortening);

    [Fact]
    public void Rectangle_rounded_to_a_stadium() =>
        Measures(new Rectangle(80, 50, 25), 30 * 50 + Math.PI * 625, 60 + 50 * Math.PI);

    [Fact]
    public void Rectangle_rounded_to_a_circle() =>
        Measures(new Rectangle(50, 50, 25), Math.PI * 625, 50 * Math.PI);

    [Fact]
    public void Circle() => Measures(new Circle(30), Math.PI * 225, Math.PI * 30);

    [Fact]
    public void Tube() => Measures(new Tube(60, 5), Math.PI * (900 - 625), Math.PI * (60 + 50));

    [Fact]
    public void Box_with_walls_of_two_thicknesses() => Measures(
        new HollowBox(120, 200, 10, 6, 15, 9),
        120 * 200 - 225 * 4 * Fillet - (108 * 180 - 81 * 4 * Fillet),
        2 * (120 + 200) - 4 * 15 * Shortening + 2 * (108 + 180) - 4 * 9 * Shortening);

    [Fact]
    public void Tee() => Measures(
        new Tee(150, 140, 12, 9, 14, 5),
        140 * 12 + 138 * 9 + 2 * (14 * 14 - 25) * Fillet,
        2 * (150 + 140) - 2 * (14 + 5) * Shortening);

    [Fact]
    public void I_with_unequal_flanges() => Measures(
        new IBeam(400, 180, 14, 9, 21, 4, BottomWidth: 240, BottomFlangeThickness: 20),
        180 * 14 + 240 * 20 + 366 * 9 + 4 * (21 * 21 - 16) * Fillet,
        2 * (400 + 180 + 240 - 9) - 4 * 25 * Shortening);

    [Fact]
    public void Channel() => Measures(
        new Channel(200, 75, 11, 6, 12, 3, OuterRadius: 8),
        200 * 75 - 178 * 69 + 2 * (144 - 9 - 64) * Fillet,
        2 * 200 + 4 * 75 - 2 * 6 - 2 * (12 + 3 + 8) * Shortening);

    [Fact]
    public void Angle() => Measures(
        new Angle(150, 90, 10, 12, 6), 150 * 10 + 80 * 10 + (144 - 2 * 36) * Fillet, 2 * (150 + 90) - 24 * Shortening);

    [Fact]
    public void Zed() => Measures(
        new Zed(160, 70, 8, 6, 60, 10, 4, 5),
        (70 + 60) * 8 + 144 * 6 + 2 * (100 - 16 - 25) * Fillet,
        2 * (160 + 70 + 60 - 6) - 2 * (10 + 4 + 5) * Shortening);

    [Fact]
    public void Regular_polygon()
    {
        // Each corner of a hexagon turns by 60 degrees.
        var tan = Math.Tan(Math.PI / 6);
        var lost = tan - Math.PI / 6;
        Measures(
            new RegularPolygon(6, 24, 3),
            6 * 144 * tan - 6 * 9 * lost,
            6 * 24 * tan - 6 * 3 * 2 * lost);
    }

    [Fact]
    public void Polygon() => Measures(
        new Polygon([new(0, 0), new(40, 0), new(0, 30)]), 600, 120);

    [Fact]
    public void Sloped_flanges_keep_the_area_of_their_mean_thickness()
    {
        var slope = 1.0 / 6;
        var parallel = new IBeam(300, 125, 16, 11).Boundaries()[0];
        var sloped = new IBeam(300, 125, 16, 11, FlangeSlope: slope).Boundaries()[0];
        Assert.Equal(LoopMeasure.Area(parallel), LoopMeasure.Area(sloped), 1e-9);

        // Four inner faces are longer, and the web and the toes stand between them as before.
        var outstand = 57.0;
        Assert.Equal(parallel.Length + 4 * (Math.Sqrt(1 + slope * slope) - 1) * outstand - 4 * slope * outstand, sloped.Length, 1e-9);
    }

    [Fact]
    public void Fillets_of_a_sloped_flange_turn_through_its_own_angle()
    {
        var slope = 0.14;
        var turn = Math.PI / 2 - Math.Atan(slope);
        var fillet = 13 * 13 * (Math.Tan(turn / 2) - turn / 2);
        var toe = 6 * 6 * (Math.Tan(turn / 2) - turn / 2);
        var sharp = new Channel(240, 85, 13, 9.5, FlangeSlope: slope).Boundaries()[0];
        var rounded = new Channel(240, 85, 13, 9.5, 13, 6, slope).Boundaries()[0];
        Assert.Equal(LoopMeasure.Area(sharp) + 2 * fillet - 2 * toe, LoopMeasure.Area(rounded), 1e-9);
    }

    [Fact]
    public void Rolled_equal_angle_has_its_tabulated_area() =>
        // L 100x100x10, r1 = 12, r2 = 6: 19.2 cm² in EN 10056-1.
        Assert.Equal(1920, LoopMeasure.Area(new Angle(100, 100, 10, 12, 6).Boundaries()[0]), 5.0);

    [Theory]
    [MemberData(nameof(Places))]
    public void Bounding_box_tells_where_the_origin_is(Shape shape, Box expected)
    {
        var box = shape.Boundaries().Aggregate(Box.Empty, (all, b) => all.With(b.Bounds));
        Assert.Equal(expected.MinX, box.MinX, 1e-12);
        Assert.Equal(expected.MinY, box.MinY, 1e-12);
        Assert.Equal(expected.MaxX, box.MaxX, 1e-12);
        Assert.Equal(expected.MaxY, box.MaxY, 1e-12);
    }

    public static TheoryData<Shape, Box> Places => new()
    {
        { new Rectangle(80, 50, 6), new Box(-40, 0, 40, 50) },
        { new Circle(30), new Box(-15, -15, 15, 15) },
        { new Tube(60, 5), new Box(-30, -30, 30, 30) },
        { new HollowBox(120, 200, 10), new Box(-60, 0, 60, 200) },
        { new Tee(150, 140, 12, 9, 14, 5), new Box(-70, 0, 70, 150) },
        { new IBeam(400, 180, 14, 9, BottomWidth: 240), new Box(-120, 0, 120, 400) },
        { new Channel(200, 75, 11, 6, 12), new Box(0, 0, 75, 200) },
        { new Angle(150, 90, 10, 12, 6), new Box(0, 0, 90, 150) },
        { new Zed(160, 70, 8, 6, 60), new Box(-64, 0, 60, 160) },
        { new RegularPolygon(4, 20), new Box(-10, -10, 10, 10) },
    };

    private static void Measures(Shape shape, double area, double perimeter)
    {
        var boundaries = shape.Boundaries();
        var enclosed = boundaries.Select(LoopMeasure.Area).ToArray();
        Assert.Equal(area, enclosed[0] - enclosed.Skip(1).Sum(), 1e-9);
        Assert.Equal(perimeter, boundaries.Sum(b => b.Length), 1e-9);
    }
}
