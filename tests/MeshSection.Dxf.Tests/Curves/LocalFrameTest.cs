using CsCheck;
using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Curves;

/// <summary>Where a drawing lies, and in which unit it is drawn, does not change its shape.</summary>
public class LocalFrameTest
{
    [Theory]
    [InlineData(1 << 20, 0)]
    [InlineData(-(1 << 24), 5 << 20)]
    [InlineData(64, -128)]
    public void A_drawing_moved_by_a_power_of_two_has_the_same_local_bits(double x, double y)
    {
        var here = Outline(Shape(0, 0, 1)).Outline;
        var there = Outline(Shape(x, y, 1)).Outline;

        Assert.Equal(Edges(here), Edges(there));
        Assert.Equal(here.Origin + new Point(x, y), there.Origin);
    }

    [Fact]
    public void A_drawing_anywhere_has_the_same_shape_to_the_digits_of_its_coordinates() =>
        Gen.Select(Gen.Double[-1e7, 1e7], Gen.Double[-1e7, 1e7]).Sample((x, y) =>
        {
            var here = Outline(Shape(0, 0, 1)).Outline;
            var there = Outline(Shape(x, y, 1)).Outline;
            var shift = there.Origin - here.Origin - new Point(x, y);
            Assert.All(Edges(here).Zip(Edges(there)), pair => Assert.Equal(0, (pair.Second.Start + shift).DistanceTo(pair.First.Start), 1e-8));
        }, iter: 200);

    [Theory]
    [InlineData(6, 1e-3)]
    [InlineData(13, 1e3)]
    [InlineData(5, 0.1)]
    [InlineData(1, 1 / 25.4)]
    public void A_drawing_in_another_unit_has_the_same_shape_in_mm(int unit, double perMillimetre)
    {
        var mm = Outline(Shape(0, 0, 1)).Outline;
        var other = Outline(Shape(0, 0, perMillimetre, unit)).Outline;
        var shift = other.Origin - mm.Origin;
        Assert.All(Edges(mm).Zip(Edges(other)), pair =>
        {
            Assert.Equal(0, (pair.Second.Start + shift).DistanceTo(pair.First.Start), 1e-11);
            Assert.Equal(pair.First.Length, pair.Second.Length, 1e-11);
        });
    }

    [Fact]
    public void The_origin_lies_within_the_drawing()
    {
        var outline = Outline(Shape(123_456.789, -987_654.321, 1)).Outline;
        Assert.True(outline.Bounds.Contains(new Point(0, 0)));
        Assert.Equal(123_456.789, outline.Origin.X + outline.Bounds.MinX, 1e-9);
    }

    [Fact]
    public void So_far_away_that_digits_are_lost_calls_for_attention() =>
        Assert.Equal(NoteCode.FewDigits, Assert.Single(Outline(Drawing([Square(1e9, 1e9, 16)])).Report.Cautions).Code);

    private static List<Edge> Edges(Outline outline) => [.. outline.Boundaries.SelectMany(b => b.Boundary.Edges)];

    private static string Shape(double x, double y, double scale, int unit = 4)
    {
        double X(double v) => x + v * scale;
        double Y(double v) => y + v * scale;
        return Drawing(
        [
            Line(X(0), Y(0), X(90), Y(0)), Arc(X(90), Y(30), 30 * scale, 270, 90), Line(X(90), Y(60), X(0), Y(60.5)), Line(X(0), Y(60.5), X(0), Y(0)),
            Circle(X(200), Y(30), 7.7 * scale), // what is drawn ends at no round number
            Circle(X(40.25), Y(30), 12.5 * scale),
            LwPolyline([(X(70), Y(20), 0.25), (X(80), Y(20), 0), (X(80), Y(40), -0.5), (X(70), Y(40), 0)]),
        ], unit);
    }
}
