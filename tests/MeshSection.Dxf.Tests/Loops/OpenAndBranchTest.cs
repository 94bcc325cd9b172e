using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Loops;

public class OpenAndBranchTest
{
    [Fact]
    public void A_missing_side_is_refused_with_its_two_ends_and_no_tolerance()
    {
        var refusal = Refusal(Drawing([Line(0, 0, 10, 0, "1"), Line(10, 0, 10, 8, "2"), Line(10, 8, 0, 8, "3")]));

        Assert.Equal(DrawingFault.OpenBoundary, refusal.Fault);
        Assert.Equal((8.0, null), (refusal.Distance, refusal.Tolerance));
        Assert.Equal([("1", new Point(0, 0)), ("3", new Point(0, 8))], refusal.Places.Select(p => (p.Source.Handle!, p.Point!.Value)).Order(ByHandle));
        Assert.Contains("Draw what is missing", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_stray_piece_beside_a_closed_boundary_is_left_out_and_named()
    {
        var result = Outline(Drawing([Square(0, 0, 10, layer: "WALL"), Line(3, 3, 4, 4, "9", "AXES")]));

        Assert.Single(result.Outline.Boundaries);
        var note = Assert.Single(result.Report.Repairs);
        Assert.Equal((NoteCode.DanglingLeftOut, "9"), (note.Code, Assert.Single(note.Sources).Handle));
        Assert.Contains("LINE #9 on layer 'AXES'", note.Message, StringComparison.Ordinal);
        Assert.Contains("(3, 3)", note.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void An_open_boundary_names_what_was_not_read()
    {
        var refusal = Refusal(Drawing([Line(0, 0, 10, 0), Line(10, 0, 10, 8), Tagged((0, "REGION"), (5, "1"), (8, "0"), (10, "0,0"))]));
        Assert.Contains("1 REGION not read", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_line_that_leads_away_from_a_corner_is_left_out()
    {
        var result = Outline(Drawing([.. GapTest.LooseSquare(5e6, 2e6, 10), Line(5e6 + 10, 2e6, 5e6 + 20, 2e6, "77", "AXES")]));

        Assert.Equal(4, Assert.Single(result.Outline.Boundaries).Boundary.Edges.Length);
        var note = Assert.Single(result.Report.Repairs);
        Assert.Equal((NoteCode.DanglingLeftOut, new Point(5e6 + 20, 2e6)), (note.Code, note.Point));
    }

    [Fact]
    public void Closed_polylines_that_share_a_corner_touch()
    {
        var refusal = Refusal(Drawing([Square(0, 0, 10, "1"), Square(10, 10, 10, "2")]));

        Assert.Equal(DrawingFault.TouchingBoundaries, refusal.Fault);
        Assert.Equal(["1", "2"], refusal.Places.Select(p => p.Source.Handle!).Distinct().Order());
        Assert.Contains("(10, 10)", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_nearest_of_many_free_ends_are_named_first()
    {
        var lines = Enumerable.Range(0, 50).Select(i => Line(20 * i, 0, 20 * i + 10, (i * i) % 7, $"{i:X}"));
        var refusal = Refusal(Drawing([.. lines, Line(110.5, 3, 300, 300, "FF")]));

        Assert.Equal(102, refusal.Places.Length);
        Assert.Equal(new Point(110, 25 % 7), refusal.Places.Take(2).Single(p => p.Source.Handle == "5").Point);
        Assert.Equal(double.Hypot(0.5, 1), refusal.Distance!.Value, 1e-12);
    }

    private static Comparer<(string, Point)> ByHandle => Comparer<(string, Point)>.Create((a, b) => string.CompareOrdinal(a.Item1, b.Item1));
}
