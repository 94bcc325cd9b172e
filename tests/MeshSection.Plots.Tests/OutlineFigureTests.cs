using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using MeshSection.Plots.Layout;
using MeshSection.Plots.Tests.Samples;
using MeshSection.Units;
using OxyPlot;

namespace MeshSection.Plots.Tests;

public class OutlineFigureTests
{
    [Fact]
    public void Every_boundary_has_its_number_role_and_edges()
    {
        var figure = Of(Outlines.Plate());
        Assert.Equal(["1", "2", "3", "4"], Rings(figure).Order());
        string[] expected = ["outer boundary", "hole", "island", "4 lines, 4 arcs", "0 lines, 2 arcs", "4 lines, 0 arcs", "200 × 120, dimensions in mm"];
        Assert.Superset(new HashSet<string>(expected), Texts(figure));
    }

    [Fact]
    public void Each_role_has_a_style_of_its_own()
    {
        var styles = Enum.GetValues<BoundaryRole>().Select(BoundaryMarks.StrokeOf).ToArray();
        Assert.Equal(styles.Length, styles.Select(s => s.Colour).Distinct().Count());
        Assert.Equal(styles.Length, styles.Select(s => string.Join(' ', s.Dash)).Distinct().Count());
        Assert.All(styles, s => Assert.Contains(Of(Outlines.Plate()).Marks.OfType<Area>(), a => a.Rim.Colour == s.Colour && a.Rim.Dash.SequenceEqual(s.Dash)));
    }

    [Fact]
    public void Arcs_and_joints_can_be_told()
    {
        var figure = Of(Outlines.Plate());

        // 4 rounded corners and two circles of two arcs; one band and one joint more in the legend.
        Assert.Equal(8 + 1, figure.Marks.OfType<Polyline>().Count(p => p.Stroke.Colour == BoundaryMarks.ArcBand.Colour));
        Assert.Equal(8 + 2 + 2 + 4 + 1, figure.Marks.OfType<Disc>().Count(d => d.Radius < 5));
        Assert.DoesNotContain("arc", Texts(Of(Outlines.Strip())));
    }

    [Fact]
    public void Marks_stand_where_they_belong_wherever_the_drawing_lies()
    {
        var origin = new Point(5e6, -3e6);
        var home = Of(Outlines.Plate(), new OutlineMark(new Point(180, 60), "gap 0.02 bridged"));
        var far = Of(Outlines.Plate(origin), new OutlineMark(new Point(180, 60) + origin, "gap 0.02 bridged"));

        // The right side of the square hole.
        var hole = home.Marks.OfType<Area>().Where(a => a.Rim.Dash.Length == 2).Last().Loops[0];
        var ring = Ring(home);
        Assert.Equal(hole.Max(p => p.X), ring.X, 6);
        Assert.True(ring.DistanceTo(Ring(far)) < 1e-3);
        Assert.Superset(new HashSet<string>(["gap 0.02 bridged", "repaired, or to be checked"]), Texts(far));

        static ScreenPoint Ring(Figure f) => f.Marks.OfType<Disc>().Single(d => d.Radius == 16).Centre;
    }

    [Fact]
    public void A_mark_beside_the_outline_is_shown_and_one_far_away_left_out()
    {
        Assert.Contains("dropped", Texts(Of(Outlines.Plate(), new OutlineMark(new Point(260, 60), "dropped"))));
        var figure = Of(Outlines.Plate(), new OutlineMark(new Point(1e5, 60), "dropped"));
        Assert.DoesNotContain("dropped", Texts(figure));
        Assert.Equal(PngWriter.Encode(Of(Outlines.Plate())), PngWriter.Encode(figure));
    }

    [Fact]
    public void Many_boundaries_are_counted_and_never_hidden_by_numbers()
    {
        var figure = Of(Outlines.Perforated());
        Assert.Contains("189 more", Texts(figure));

        var holes = figure.Marks.OfType<Area>().Where(a => a.Rim.Dash.Length == 2).Select(a => a.Loops[0][0]).ToArray();
        var rings = figure.Marks.OfType<Disc>().Where(d => d.Radius > 16).ToArray();
        Assert.Equal(200, holes.Length);
        Assert.NotEmpty(rings);
        Assert.All(rings, r => Assert.All(holes, h => Assert.True(h.DistanceTo(r.Centre) > r.Radius)));
    }

    private static Figure Of(Outline outline, params OutlineMark[] marks) =>
        OutlineFigure.Of(outline, "Title", LengthUnit.Millimetre, new OutlineFindings([.. marks], [], [], []));

    private static HashSet<string> Texts(Figure figure) => [.. figure.Marks.OfType<Label>().Select(l => l.Text)];

    private static IEnumerable<string> Rings(Figure figure)
    {
        var centres = figure.Marks.OfType<Disc>().Where(d => d.Radius > 16).Select(d => d.Centre).ToHashSet();
        return figure.Marks.OfType<Label>().Where(l => centres.Contains(l.Centre)).Select(l => l.Text);
    }
}
