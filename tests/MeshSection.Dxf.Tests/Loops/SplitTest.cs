using CsCheck;
using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Loops;

/// <summary>Linework that closes only once it is cut, and what leads nowhere in it.</summary>
public class SplitTest
{
    [Fact]
    public void Lines_that_cross_at_the_corners_make_one_boundary_and_their_ends_are_named()
    {
        var result = Outline(Drawing([Line(-2, 0, 22, 0, "1"), Line(20, -2, 20, 12, "2"), Line(22, 10, -2, 10, "3"), Line(0, 12, 0, -2, "4")]));

        Assert.Equal(4, Assert.Single(result.Outline.Boundaries).Boundary.Edges.Length);
        Assert.Equal(200, result.Outline.Boundaries[0].Boundary.SignedArea, 1e-12);
        Assert.Equal(8, result.Report.Repairs.Count(r => r.Code == NoteCode.DanglingLeftOut));
        Assert.Contains("4 crossings", Assert.Single(result.Report.Repairs, r => r.Code == NoteCode.LinesSplit).Message, StringComparison.Ordinal);
        Assert.Equal(8, result.LeftOut.Count(l => l.LeadsNowhere));
    }

    [Fact]
    public void Lines_that_cross_curves_are_cut_exactly_there()
    {
        // A half disc: a line of y = 3 across an arc of radius 5 that reaches below it, and a spline-like ellipse beside it.
        var result = Outline(Drawing([Arc(0, 0, 5, -10, 190, "1"), Line(-9, 3, 9, 3, "2")]));
        var boundary = Assert.Single(result.Outline.Boundaries).Boundary;
        Assert.Equal(25 * Math.Acos(0.6) - 3 * 4, boundary.SignedArea, 1e-12);
        Assert.Equal(3, result.Outline.Origin.Y + boundary.Edges.Min(e => e.Start.Y), 1e-12);
    }

    [Fact]
    public void An_end_on_a_line_is_a_joint_and_one_a_hair_off_is_drawn_onto_it()
    {
        string[] flange = [Line(0, 40, 80, 40, "1"), Line(80, 40, 80, 50, "2"), Line(80, 50, 0, 50, "3"), Line(0, 50, 0, 40, "4")];
        foreach (var short_ in new[] { 0, 0.0005 })
        {
            var result = Outline(Drawing([.. flange, Line(35, 40 - short_, 35, 0, "5"), Line(35, 0, 45, 0, "6"), Line(45, 0, 45, 40 - short_, "7")]));
            Assert.Equal(1200, Assert.Single(result.Outline.Boundaries).Boundary.SignedArea, 1e-9);
            Assert.Equal(short_ == 0 ? 0 : 2, result.Report.Repairs.Count(r => r.Code == NoteCode.GapBridged));
            Assert.Contains(result.Report.Cautions, c => c.Code == NoteCode.FacesTogether);

            // The flange's bottom line stays straight.
            Assert.All(result.Outline.Boundaries[0].Boundary.Edges, e => Assert.True(e.Chord.X == 0 || e.Chord.Y == 0 || short_ > 0));
        }
    }

    [Theory]
    [InlineData(0, 60, 40, 100)]
    [InlineData(0, 100, 30, 70)]
    [InlineData(0, 40, 30, 100)]
    public void Lines_that_lie_on_each_other_in_part_count_once(double a, double b, double c, double d)
    {
        var result = Outline(Drawing([Line(a, 0, b, 0, "1"), Line(d, 0, c, 0, "2"), Line(100, 0, 100, 50, "3"), Line(100, 50, 0, 50, "4"), Line(0, 50, 0, 0, "5")]));

        Assert.Equal(5000, Assert.Single(result.Outline.Boundaries).Boundary.SignedArea, 1e-12);
        var note = Assert.Single(result.Report.Repairs, r => r.Code == NoteCode.DuplicateDropped);
        Assert.Equal(["1", "2"], note.Sources.Select(s => s.Handle!).Order());
    }

    [Fact]
    public void A_line_over_a_side_and_beyond_is_dropped_where_it_doubles_and_named_where_it_leads_nowhere()
    {
        var result = Outline(Drawing([Square(0, 0, 10, "1"), Line(-5, 0, 15, 0, "2")]));

        Assert.Equal(4, Assert.Single(result.Outline.Boundaries).Boundary.Edges.Length);
        Assert.Contains(result.Report.Repairs, r => r.Code == NoteCode.DuplicateDropped && r.Sources.Any(s => s.Handle == "2"));
        Assert.Equal([5.0, 5.0], result.LeftOut.Where(l => l.LeadsNowhere).Select(l => l.Edge.Length));
    }

    [Theory]
    [InlineData(0.4, 2.2)]
    [InlineData(3, 7)]
    public void A_part_of_an_ellipse_over_the_whole_of_it_counts_once(double from, double to)
    {
        string Ellipse(string handle, double start, double end) => Tagged(
            (0, "ELLIPSE"), (5, handle), (8, "0"), (10, 5.0), (20, 7.0), (30, 0.0), (11, 40.0), (21, 15.0), (31, 0.0), (40, 0.6), (41, start), (42, end));
        var result = Outline(Drawing([Ellipse("1", 0, Math.Tau), Ellipse("2", from, to)]));
        Assert.Equal(Math.PI * 0.6 * (40 * 40 + 15 * 15), Assert.Single(result.Outline.Boundaries).Boundary.SignedArea, 1e-9);
        Assert.Contains(result.Report.Repairs, r => r.Code == NoteCode.DuplicateDropped);
    }

    [Fact]
    public void Centre_lines_over_a_closed_outline_change_no_bit_of_it()
    {
        string[] section = [Square(0, 0, 10), Circle(5, 5, 2)];
        string[] centres = [Line(-3, 5, 13, 5, "C1", "CENTRE"), Line(5, -3, 5, 13, "C2", "CENTRE"), Line(-2, -2, 12, 12, "C3", "CENTRE")];
        var (plain, crossed) = (Outline(Drawing(section)), Outline(Drawing([.. centres, .. section])));

        Assert.Equal(Edges(plain), Edges(crossed));
        Assert.Equal(["C1", "C2", "C3"], crossed.Report.Repairs.Select(r => Assert.Single(r.Sources).Handle!).Order());
    }

    [Theory]
    [InlineData(8.0, true)]     // a hole of three sides: its ends are nearer than half of its length
    [InlineData(0.02, true)]    // a hole with a gap beyond the tolerance
    [InlineData(0.0001, false)] // one within it
    public void A_hole_that_does_not_close_is_refused_not_left_out(double gap, bool isRefused)
    {
        var text = Drawing([Square(0, 0, 30, "1"), Line(10, 10, 18, 10, "2"), Line(18, 10, 18, 18, "3"), Line(18, 18, 10, 18, "4"), Line(10, 18, 10, 10 + gap, "5")]);
        if (!isRefused)
        {
            Assert.Equal(2, Outline(text).Outline.Boundaries.Length);
            return;
        }

        var refusal = Refusal(gap == 8 ? text.Replace(Line(10, 18, 10, 18, "5"), "", StringComparison.Ordinal) : text);
        Assert.Equal(DrawingFault.OpenBoundary, refusal.Fault);
        Assert.Equal(gap, refusal.Distance!.Value, 1e-12);
        Assert.DoesNotContain(refusal.Places, p => p.Source.Handle == "1");
    }

    [Fact]
    public void An_end_that_stops_short_of_a_line_ahead_is_refused_with_both()
    {
        // The web ends 0.1 below the flange.
        var refusal = Refusal(Drawing([Square(0, 40, 30, "1"), Line(10, 39.9, 10, 0, "5"), Line(10, 0, 12, -5, "6"), Line(12, -5, 60, -5, "7")]));
        Assert.Equal(DrawingFault.OpenBoundary, refusal.Fault);
        Assert.Equal(["5", "1"], refusal.Places.Take(2).Select(p => p.Source.Handle));
        Assert.Equal(0.1, refusal.Distance!.Value, 1e-9);
    }

    [Fact]
    public void Two_chains_whose_free_ends_nearly_meet_are_refused()
    {
        var refusal = Refusal(Drawing([Square(0, 0, 100, "1"), Line(20, 20, 50, 40, "2"), Line(50.3, 40, 80, 20, "3")]));
        Assert.Equal(DrawingFault.OpenBoundary, refusal.Fault);
        Assert.Equal(["2", "3"], refusal.Places.Take(2).Select(p => p.Source.Handle!).Order());
    }

    [Fact]
    public void What_was_cut_comes_out_the_same_however_it_was_drawn()
    {
        // A frame of overlapping, crossing and doubled lines: in any order and direction the same outline, but for rounding.
        (double, double, double, double)[] lines =
        [
            (-2, 0, 60, 0), (40, 0, 100, 0), (100, -3, 100, 50), (100, 50, 0, 50), (0, 50, 0, -1), (100, 30, 100, 50),
            (20, 20, 60, 20), (60, 20, 60, 30), (60, 30, 20, 30), (20, 32, 20, 18),
        ];
        var expected = Edges(Outline(Drawing(lines.Select((l, i) => Line(l.Item1, l.Item2, l.Item3, l.Item4, $"{i:X}")))));
        Gen.Select(Gen.Shuffle(lines), Gen.Bool.Array[lines.Length]).Sample((shuffled, turned) =>
        {
            var drawn = shuffled.Select((l, i) => turned[i] ? Line(l.Item3, l.Item4, l.Item1, l.Item2, $"{i:X}") : Line(l.Item1, l.Item2, l.Item3, l.Item4, $"{i:X}"));
            Assert.Equal(expected, Edges(Outline(Drawing(drawn))));
        }, iter: 200);
    }

    private static List<(Point, Point)> Edges(DrawingOutline result) => [.. result.Outline.Boundaries
        .SelectMany(b => b.Boundary.Edges).Select(e => (e.Start + result.Outline.Origin, e.End + result.Outline.Origin))];
}
