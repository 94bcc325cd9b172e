using MeshSection.Geometry;
using MeshSection.Sections.Shapes;

namespace MeshSection.Tests.Sections.Shapes;

/// <summary>Every dimension out of its bounds is refused by name, with the bound.</summary>
public class ShapeRefusalTests
{
    private static readonly Tee Tee = new(150, 140, 12, 9, 14, 5);
    private static readonly IBeam Beam = new(400, 180, 14, 9, 21, 4);
    private static readonly Channel Channel = new(200, 75, 11, 6, 12, 3);
    private static readonly Angle Angle = new(150, 90, 10, 12, 6);
    private static readonly Zed Zed = new(160, 70, 8);
    private static readonly HollowBox Box = new(120, 200, 10);

    public static TheoryData<Shape, string, ShapeBound, double> Refused => new()
    {
        { new Rectangle(-80, 50), "Width", ShapeBound.Above, 0 },
        { new Rectangle(80, 0), "Height", ShapeBound.Above, 0 },
        { new Rectangle(double.NaN, 50), "Width", ShapeBound.Finite, 0 },
        { new Rectangle(80, double.PositiveInfinity), "Height", ShapeBound.Finite, 0 },
        { new Rectangle(80, 50, 26), "CornerRadius", ShapeBound.AtMost, 25 },
        { new Rectangle(80, 50, -1), "CornerRadius", ShapeBound.AtLeast, 0 },
        { new Rectangle(80, 50, double.NaN), "CornerRadius", ShapeBound.Finite, 0 },
        { new Circle(0), "Diameter", ShapeBound.Above, 0 },
        { new Tube(-60, 5), "Diameter", ShapeBound.Above, 0 },
        { new Tube(60, 0), "Thickness", ShapeBound.Above, 0 },
        { new Tube(60, 30), "Thickness", ShapeBound.Below, 30 },
        { Box with { Width = -1 }, "Width", ShapeBound.Above, 0 },
        { Box with { Height = 0 }, "Height", ShapeBound.Above, 0 },
        { Box with { Thickness = 0 }, "Thickness", ShapeBound.Above, 0 },
        { Box with { Thickness = 100 }, "Thickness", ShapeBound.Below, 100 },
        { Box with { Thickness = 60 }, "Thickness", ShapeBound.Below, 60 },
        { Box with { WebThickness = -1 }, "WebThickness", ShapeBound.Above, 0 },
        { Box with { WebThickness = 60 }, "WebThickness", ShapeBound.Below, 60 },
        { Box with { InnerRadius = 51 }, "InnerRadius", ShapeBound.AtMost, 50 },
        { Box with { OuterRadius = 61 }, "OuterRadius", ShapeBound.AtMost, 60 },
        { Box with { OuterRadius = 40 }, "OuterRadius", ShapeBound.Below, 20 + Math.Sqrt(200) },
        { Tee with { Height = 12 }, "Height", ShapeBound.Above, 12 },
        { Tee with { Width = 9 }, "Width", ShapeBound.Above, 9 },
        { Tee with { FlangeThickness = 0 }, "FlangeThickness", ShapeBound.Above, 0 },
        { Tee with { WebThickness = -9 }, "WebThickness", ShapeBound.Above, 0 },
        { Tee with { RootRadius = 62 }, "RootRadius", ShapeBound.AtMost, 65.5 - 5 },
        { Tee with { RootRadius = -1 }, "RootRadius", ShapeBound.AtLeast, 0 },
        { Tee with { ToeRadius = 13 }, "ToeRadius", ShapeBound.AtMost, 12 },
        { Beam with { Height = 28 }, "Height", ShapeBound.Above, 28 },
        { Beam with { Width = 5 }, "Width", ShapeBound.Above, 9 },
        { Beam with { FlangeThickness = -1 }, "FlangeThickness", ShapeBound.Above, 0 },
        { Beam with { WebThickness = 0 }, "WebThickness", ShapeBound.Above, 0 },
        { Beam with { BottomWidth = 8 }, "BottomWidth", ShapeBound.Above, 9 },
        { Beam with { BottomFlangeThickness = 0 }, "BottomFlangeThickness", ShapeBound.Above, 0 },
        { Beam with { RootRadius = 82 }, "RootRadius", ShapeBound.AtMost, 85.5 - 4 },
        { Beam with { Height = 60 }, "RootRadius", ShapeBound.AtMost, 16 },
        { Beam with { ToeRadius = 15 }, "ToeRadius", ShapeBound.AtMost, 14 },
        { Beam with { FlangeSlope = -0.1 }, "FlangeSlope", ShapeBound.AtLeast, 0 },
        { Beam with { FlangeSlope = 0.4 }, "FlangeSlope", ShapeBound.Below, 28 / 85.5 },
        { Channel with { Height = 22 }, "Height", ShapeBound.Above, 22 },
        { Channel with { Width = 6 }, "Width", ShapeBound.Above, 6 },
        { Channel with { FlangeThickness = 0 }, "FlangeThickness", ShapeBound.Above, 0 },
        { Channel with { WebThickness = 0 }, "WebThickness", ShapeBound.Above, 0 },
        { Channel with { RootRadius = 67 }, "RootRadius", ShapeBound.AtMost, 66 },
        { Channel with { ToeRadius = 12 }, "ToeRadius", ShapeBound.AtMost, 11 },
        { Channel with { FlangeSlope = 0.5 }, "FlangeSlope", ShapeBound.Below, 22.0 / 69 },
        { Channel with { FlangeSlope = -0.5 }, "FlangeSlope", ShapeBound.AtLeast, 0 },
        { Channel with { OuterRadius = 41 }, "OuterRadius", ShapeBound.Below, 29 + Math.Sqrt(132) },
        { Angle with { Height = 10 }, "Height", ShapeBound.Above, 10 },
        { Angle with { Width = 10 }, "Width", ShapeBound.Above, 10 },
        { Angle with { Thickness = 0 }, "Thickness", ShapeBound.Above, 0 },
        { Angle with { RootRadius = 75 }, "RootRadius", ShapeBound.AtMost, 74 },
        { Angle with { ToeRadius = 10.5 }, "ToeRadius", ShapeBound.AtMost, 10 },
        { Angle with { OuterRadius = 47 }, "OuterRadius", ShapeBound.Below, 32 + Math.Sqrt(200) },
        { Zed with { Height = 16 }, "Height", ShapeBound.Above, 16 },
        { Zed with { Width = 8 }, "Width", ShapeBound.Above, 8 },
        { Zed with { Thickness = 0 }, "Thickness", ShapeBound.Above, 0 },
        { Zed with { WebThickness = 0 }, "WebThickness", ShapeBound.Above, 0 },
        { Zed with { BottomWidth = 7 }, "BottomWidth", ShapeBound.Above, 8 },
        { Zed with { RootRadius = 63 }, "RootRadius", ShapeBound.AtMost, 62 },
        { Zed with { ToeRadius = 9 }, "ToeRadius", ShapeBound.AtMost, 8 },
        { Zed with { OuterRadius = 30 }, "OuterRadius", ShapeBound.Below, 16 + Math.Sqrt(128) },
        { new RegularPolygon(2, 24), "Sides", ShapeBound.AtLeast, 3 },
        { new RegularPolygon(361, 24), "Sides", ShapeBound.AtMost, 360 },
        { new RegularPolygon(6, 0), "AcrossFlats", ShapeBound.Above, 0 },
        { new RegularPolygon(6, 24, 13), "CornerRadius", ShapeBound.AtMost, 12 },
        { new Polygon([new(0, 0), new(1, 0)]), "Points", ShapeBound.AtLeast, 3 },
        { new Polygon([new(0, 0), new(1, 0), new(1, double.NaN)]), "Points[2]", ShapeBound.Finite, 0 },
        { new Polygon([new(0, 0), new(1, 0), new(1, 0), new(0, 1)]), "Points[2]", ShapeBound.Distinct, 0 },
        { new Polygon([new(0, 0), new(1, 0), new(0, 1), new(0, 0)]), "Points[0]", ShapeBound.Distinct, 0 },
    };

    [Theory]
    [MemberData(nameof(Refused))]
    public void Dimension_out_of_bounds_is_named(Shape shape, string parameter, ShapeBound bound, double limit)
    {
        var fault = Assert.Throws<ShapeException>(() => shape.Boundaries());
        Assert.Equal(parameter, fault.Parameter);
        Assert.Equal(bound, fault.Bound);
        Assert.Equal(limit, fault.Limit, 1e-9);
        Assert.StartsWith(parameter, fault.Message, StringComparison.Ordinal);
    }

    public static TheoryData<Shape> AtTheirLimits =>
    [
        new Rectangle(80, 50, 25),
        new Tee(150, 140, 12, 9, 65.5 - 5, 5),
        new Tee(150, 140, 12, 9, 14, 12),
        new IBeam(60, 180, 14, 9, 16, 4),
        new Angle(150, 90, 10, 74, 6),
        new RegularPolygon(6, 24, 12),
        new HollowBox(120, 200, 10, OuterRadius: 34.1),
        new Angle(150, 90, 10, 12, 6, 46.1),
    ];

    [Theory]
    [MemberData(nameof(AtTheirLimits))]
    public void Dimension_at_its_limit_is_taken(Shape shape) =>
        Assert.Equal(1, Outline.Create(shape.Boundaries()).RegionCount);
}
