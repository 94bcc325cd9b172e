using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using MeshSection.Plots.Tests.Samples;
using MeshSection.Sections;
using MeshSection.Units;
using OxyPlot;

namespace MeshSection.Plots.Tests;

public class SectionFigureTests
{
    [Fact]
    public void Key_values_are_stated_with_their_units()
    {
        // 100 × 50: Ix = 100·50³/12, Iy = 50·100³/12, Wx = Ix/25, Wy = Iy/50.
        var texts = Texts(Sample.Rectangle(100, 50, 10).Figure());
        Assert.Superset(
            new HashSet<string>(["5_000 mm²", "1.0417×10⁶ mm⁴", "4.1667×10⁶ mm⁴", "41_667 mm³", "83_333 mm³", "100 triangles"]),
            new HashSet<string>(texts.Select(t => t.Replace(Numbers.ThinSpace, '_'))));
    }

    [Fact]
    public void Values_are_converted_to_the_unit_asked_for()
    {
        var texts = Texts(Sample.Rectangle(254, 127, 25.4).Figure(unit: LengthUnit.Inch));
        Assert.Superset(
            new HashSet<string>(["50 in²", "104.17 in⁴", "416.67 in⁴", "41.667 in³", "83.333 in³", "dimensions in in"]),
            new HashSet<string>(texts));
    }

    [Fact]
    public void The_governing_side_is_marked_and_named()
    {
        var sample = Sample.Angle();
        var figure = sample.Figure();

        // The angle's centroid lies near its heel, so that top and right are farthest.
        Assert.Superset(new HashSet<string>(["top governs", "right governs", "● 98.61", "51.39", "21.39", "● 68.61"]), Texts(figure));
        Assert.Equal(2, Signs(figure));
    }

    [Fact]
    public void Equal_sides_both_govern()
    {
        var figure = Sample.Rectangle(100, 50, 10).Figure();
        Assert.Superset(new HashSet<string>(["top = bottom", "right = left", "● 25", "● 50"]), Texts(figure));
        Assert.Equal(4, Signs(figure));
    }

    [Theory]
    [InlineData(100, 50, "x = 2", "y = 1")]
    [InlineData(50, 100, "x = 1", "y = 2")]
    public void Principal_axes_along_x_and_y_share_their_lines(double width, double height, string x, string y)
    {
        var texts = Texts(Sample.Rectangle(width, height, 10).Figure());
        Assert.Superset(new HashSet<string>([x, y, "centroidal and principal axes"]), texts);
    }

    [Fact]
    public void Turned_principal_axes_have_lines_of_their_own_and_their_angle()
    {
        var sample = Sample.Angle(0.5);
        var figure = sample.Figure();
        var angle = Layout.KeyValues.Angle(sample.Properties.Principal.Angle);
        Assert.Contains($"principal axes, 1 at {angle}", Texts(figure));

        var lines = figure.Marks.OfType<Polyline>().Where(p => p.Stroke is { Dash.Length: 2 } && p.Points[0].DistanceTo(p.Points[1]) > 100).ToArray();
        Assert.Equal(2, lines.Length);
        var way = lines[0].Points[1] - lines[0].Points[0];
        Assert.Equal(sample.Properties.Principal.Angle, Math.Atan(-way.Y / way.X) * 180 / Math.PI, 6);
        Assert.Equal(0, way.X * (lines[1].Points[1] - lines[1].Points[0]).X + way.Y * (lines[1].Points[1] - lines[1].Points[0]).Y, 6);
    }

    [Fact]
    public void A_section_far_from_the_origin_is_drawn_the_same()
    {
        var sample = Sample.Angle();
        var far = new Point(1e7, -2e7);
        var outline = Outline.Create(sample.Section.Outline.Boundaries.Select(b => b.Boundary), far);
        var properties = sample.Properties with
        {
            Centroid = sample.Properties.Centroid + far,
            ElasticX = Moved(sample.Properties.ElasticX),
            ElasticY = Moved(sample.Properties.ElasticY),
        };
        var moved = SectionFigure.Of(new Section(outline, Title: sample.Section.Title), sample.Mesh, properties, LengthUnit.Millimetre);
        var home = sample.Figure();

        Assert.Contains($"10×10⁶ mm", Texts(moved));
        Assert.Equal(Discs(home).Length, Discs(moved).Length);
        Assert.All(Discs(home).Zip(Discs(moved)), p => Assert.True(p.First.DistanceTo(p.Second) < 1e-4));

        Properties.ExtremeFibres Moved(Properties.ExtremeFibres f) => new(
            f.Positive with { Point = f.Positive.Point + far }, f.Negative with { Point = f.Negative.Point + far });
        static ScreenPoint[] Discs(Figure f) => [.. f.Marks.OfType<Disc>().Select(d => d.Centre)];
    }

    [Fact]
    public void Every_inner_edge_of_the_mesh_is_drawn_once_and_none_of_the_outline()
    {
        var sample = Sample.Tube("Tube", 60, 80, 40, 5);
        var edges = Assert.Single(sample.Figure().Marks.OfType<Segments>());

        // Euler: a ring of 40 by 5 cells has 3·40·5 - 40 + 2·40 edges in all, 2·40 of them on its two boundaries.
        Assert.Equal(2 * (3 * 40 * 5 - 40), edges.Ends.Length);
        Assert.Equal(edges.Ends.Length / 2, DistinctEdges(edges));
    }

    [Fact]
    public void Curves_are_drawn_as_curves()
    {
        var sample = Sample.Tube("Tube", 60, 80, 12, 1);
        var figure = sample.Figure();
        var loop = figure.Marks.OfType<Area>().First(a => a.Rim.Thickness > 3).Loops[0];
        var centre = new ScreenPoint(loop.Average(p => p.X), loop.Average(p => p.Y));
        var radius = loop[0].DistanceTo(centre);

        Assert.True(loop.Length > 60);
        Assert.All(loop, p => Assert.Equal(radius, p.DistanceTo(centre), 6));
        Assert.All(
            loop.Zip(loop.Skip(1)),
            c => Assert.True(radius - new ScreenPoint(0.5 * (c.First.X + c.Second.X), 0.5 * (c.First.Y + c.Second.Y)).DistanceTo(centre) < 0.1));
    }

    [Fact]
    public void The_scale_is_the_same_both_ways_and_the_bar_is_true_to_it()
    {
        var figure = Sample.Rectangle(400, 150, 50).Figure();
        var areas = figure.Marks.OfType<Area>().ToArray();
        var section = areas.First(a => a.Rim.Thickness > 3).Loops[0];
        var scale = (section.Max(p => p.X) - section.Min(p => p.X)) / 400;
        Assert.Equal(scale, (section.Max(p => p.Y) - section.Min(p => p.Y)) / 150, 9);

        var bar = areas.First(a => a.Rim.Thickness == 2).Loops[0];
        Assert.Equal(100 * scale, bar.Max(p => p.X) - bar.Min(p => p.X), 9);
        Assert.Contains("100 mm", Texts(figure));
    }

    [Fact]
    public void Holes_are_left_empty()
    {
        using var picture = SkiaSharp.SKBitmap.Decode(PngWriter.Encode(Sample.Tube("Tube", 60, 80, 40, 5).Figure()));
        var centre = Sample.Tube("Tube", 60, 80, 40, 5).Figure().Marks.OfType<Area>().First(a => a.Rim.Thickness > 3).Loops[0];
        var (x, y) = (centre.Average(p => p.X), centre.Average(p => p.Y));
        Assert.Equal(SkiaSharp.SKColors.White, picture.GetPixel((int)x + 60, (int)y + 60));
    }

    private static HashSet<string> Texts(Figure figure) => [.. figure.Marks.OfType<Label>().Select(l => l.Text)];

    // One of the signs stands in the legend.
    private static int Signs(Figure figure) => figure.Marks.OfType<Disc>().Count(d => d.Fill == Palette.Orange) - 1;

    private static int DistinctEdges(Segments edges) => edges.Ends.Chunk(2)
        .Select(e => e.OrderBy(p => p.X).ThenBy(p => p.Y).ToArray())
        .Select(e => (e[0].X, e[0].Y, e[1].X, e[1].Y)).Distinct().Count();
}
