using MeshSection.Dxf.Entities;
using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Faces;

/// <summary>Which faces are the section, where lines leave a choice.</summary>
public class ChoiceTest
{
    private static readonly string Overlapping = Drawing([Square(0, 0, 10, "1"), Square(6, 4, 10, "2")]);

    [Fact]
    public void Overlapping_boundaries_are_refused_and_points_settle_it()
    {
        Assert.Equal(DrawingFault.CrossingBoundaries, Refusal(Overlapping).Fault);
        Assert.Equal(100 + 100 - 24, Area(Overlapping, new(1, 1), new(8, 8), new(14, 12)), 1e-12);
        Assert.Equal(24, Area(Overlapping, new Point(8, 8)), 1e-12);
        Assert.Equal(76, Area(Overlapping, new Point(1, 1)), 1e-12);
    }

    [Fact]
    public void A_point_chooses_one_section_of_several_with_its_holes()
    {
        var sheet = Drawing([Square(0, 0, 10, "1"), Circle(5, 5, 2, "2"), Square(40, 0, 10, "3")]);
        var result = Outline(sheet, new OutlineOptions { Inside = [new Point(1, 1)] });
        Assert.Equal([BoundaryRole.Outer, BoundaryRole.Hole], result.Outline.Boundaries.Select(b => b.Role).Order());
        Assert.Equal(100 - 4 * Math.PI, Assert.Single(result.Faces).Area, 1e-12);
        Assert.Equal(4 * Math.PI, Area(sheet, new Point(5, 5)), 1e-12);
    }

    [Fact]
    public void A_point_outside_of_everything_is_refused()
    {
        var refusal = Refusal(Overlapping, new OutlineOptions { Inside = [new Point(1, 1), new Point(-5, 3)] });
        Assert.Equal(DrawingFault.NothingThere, refusal.Fault);
        Assert.Contains("--inside -5,3", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Faces_of_which_one_is_surrounded_are_refused_with_their_areas_and_places()
    {
        // A box with a rib across: the chamber's halves could be holes, or not.
        var refusal = Refusal(Drawing([Square(0, 0, 100, "1"), Square(20, 20, 60, "2"), Line(50, 20, 50, 80, "3"), Line(54, 20, 54, 80, "4")]));
        Assert.Equal(DrawingFault.Ambiguous, refusal.Fault);
        Assert.Contains("4 faces", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("6400 around", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("(50, 20)", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("--inside", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Layers_of_regions_decide_and_the_later_one_has_the_place()
    {
        var text = Drawing([Square(0, 0, 100, "1", "CONCRETE"), Square(40, 40, 20, "2", "STEEL"), Square(90, 10, 30, "3", "STEEL"), Line(0, 0, 300, 9, "4", "NOTES")]);
        var result = Outline(text, new OutlineOptions { Regions = ["CONCRETE", "STEEL"] });

        Assert.Equal(10000 + 900 - 300, Assert.Single(result.Outline.Boundaries).Boundary.SignedArea, 1e-9);
        Assert.Equal(
            [("CONCRETE", 10000.0 - 400 - 300), ("STEEL", 400 + 300 + 600.0)],
            result.Faces.GroupBy(f => f.Layer).Select(g => (g.Key, Math.Round(g.Sum(f => f.Area), 9))).Order());
        Assert.Equal(2, result.Report.Cautions.Count(c => c.Code == NoteCode.RegionsOverlap));

        var other = Outline(text, new OutlineOptions { Regions = ["STEEL", "CONCRETE"] });
        Assert.Equal(10000, other.Faces.Where(f => f.Layer == "CONCRETE").Sum(f => f.Area), 1e-9);
    }

    [Fact]
    public void A_layer_of_regions_that_does_not_close_or_is_not_there_is_named()
    {
        var text = Drawing([Square(0, 0, 10, "1", "A"), Line(0, 0, 4, 4, "2", "B")]);
        Assert.Equal(DrawingFault.OpenBoundary, Refusal(text, new OutlineOptions { Regions = ["A", "B"] }).Fault);
        Assert.Contains("'C'", Refusal(text, new OutlineOptions { Regions = ["C"] }).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Circles_and_points_on_a_layer_of_bars_are_bars_and_the_rest_of_it_is_left_out()
    {
        string Point(double x, double y, string layer) => Tagged((0, "POINT"), (5, "P"), (8, layer), (10, x), (20, y), (30, 0));
        var text = Drawing(
            [Square(0, 0, 100, "1", "WALL"), Circle(20, 20, 8, "2", "BARS"), Point(80, 20, "BARS"), Point(150, 20, "BARS"), Line(0, 20, 100, 20, "3", "BARS")]);
        var result = Outline(text, new OutlineOptions { Layers = ["WALL"], Bars = [new BarLayer("BAR*", 12)] });

        Assert.Single(result.Outline.Boundaries);
        Assert.Equal([16.0, 12.0, 12.0], result.Bars.Select(b => b.Diameter!.Value));
        Assert.Equal(new Point(20, 20), result.Bars[0].Place + result.Outline.Origin);
        Assert.Equal(Dxf.Selection.LeftOutReason.NoBar, Assert.Single(result.Report.LeftOut).Reason);
        Assert.Contains("(150, 20)", Assert.Single(result.Report.Cautions, c => c.Code == NoteCode.BarOutside).Message, StringComparison.Ordinal);
        Assert.Null(Outline(text, new OutlineOptions { Layers = ["WALL"], Bars = [new BarLayer("BARS")] }).Bars[1].Diameter);
    }

    [Fact]
    public void Fills_bound_the_section_only_where_no_lines_do()
    {
        var solid = Tagged((0, "SOLID"), (5, "S"), (8, "F"), (10, 0), (20, 0), (11, 10), (21, 0), (12, 0), (22, 10), (13, 10), (23, 10));
        Assert.Equal(100, Outline(Drawing([solid])).Outline.Boundaries[0].Boundary.SignedArea, 1e-12);
        var both = Outline(Drawing([solid, Square(50, 50, 5, "1")]));
        Assert.Equal(25, Assert.Single(both.Outline.Boundaries).Boundary.SignedArea, 1e-12);
        Assert.Equal(Dxf.Selection.LeftOutReason.FillBesideLines, Assert.Single(both.Report.LeftOut).Reason);
    }

    [Theory]
    [InlineData(1, null, 1)]
    [InlineData(3, null, 2)]
    [InlineData(0, 0xC81E1E, 1)]
    public void Colours_are_chosen_by_number_by_layer_and_by_true_colour(int index, int? rgb, int boundaries)
    {
        var text = Drawing(
            [
                Square(0, 0, 10, "1") + Tagged((62, 1), (420, 0xC81E1E)), Square(20, 0, 10, "2", "GREEN"),
                Square(40, 0, 10, "3") + Tagged((62, 3)), Line(0, 0, 300, 300, "4") + Tagged((62, 5)),
            ],
            layers: Layer("GREEN", colour: 3));
        var result = Outline(text, new OutlineOptions { Colours = [new DrawingColour(index, rgb)] });
        Assert.Equal(boundaries, result.Outline.Boundaries.Length);
        Assert.Contains(result.Report.LeftOut, l => l.Reason == Dxf.Selection.LeftOutReason.ColourNotAsked);
    }

    [Fact]
    public void Layers_can_be_ignored()
    {
        var result = Outline(Drawing([Square(0, 0, 10, "1", "A"), Square(3, 3, 30, "2", "B1")]), new OutlineOptions { Ignored = ["B*"] });
        Assert.Single(result.Outline.Boundaries);
        Assert.Equal(Dxf.Selection.LeftOutReason.LayerIgnored, Assert.Single(result.Report.LeftOut).Reason);
        Assert.False(Assert.Single(result.LeftOut.Take(1)).LeadsNowhere);
    }

    [Fact]
    public void A_boundary_in_a_hole_is_told_with_its_place()
    {
        var result = Outline(Drawing([Square(0, 0, 30, "1"), Square(5, 5, 20, "2"), Square(10, 10, 4, "3")]));
        Assert.Contains("(10, 10)", Assert.Single(result.Report.Cautions, c => c.Code == NoteCode.NestedOuter).Message, StringComparison.Ordinal);
    }

    private static double Area(string text, params Point[] inside) =>
        Outline(text, new OutlineOptions { Inside = inside }).Outline.Boundaries.Sum(b => b.Boundary.SignedArea);
}
