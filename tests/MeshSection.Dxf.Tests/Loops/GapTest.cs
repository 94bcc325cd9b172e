using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Loops;

/// <summary>Ends that do not quite meet.</summary>
public class GapTest
{
    private const double MaxGap = 0.01;

    [Fact]
    public void Ends_moved_by_half_the_gap_are_joined_and_every_repair_is_listed()
    {
        var result = Outline(Channel(0.5 * MaxGap), Within(MaxGap));

        var boundary = Assert.Single(result.Outline.Boundaries).Boundary;
        Assert.Equal(6, boundary.Edges.Length);
        Assert.Equal(6, result.Report.Repairs.Length);
        Assert.Equal((MaxGap, true), (result.Report.MaxGap, result.Report.IsMaxGapGiven));
        Assert.All(result.Report.Repairs, n =>
        {
            Assert.Equal(NoteCode.GapBridged, n.Code);
            Assert.Equal(0.5 * MaxGap, n.Distance!.Value, 1e-12);
            Assert.Equal(2, n.Sources.Length);
        });
        Assert.Equal((20, 0), Rounded(result.Report.Repairs.MaxBy(n => n.Point!.Value.X - n.Point.Value.Y)!.Point!.Value));
    }

    [Fact]
    public void Ends_moved_by_twice_the_gap_are_refused_with_both_ends_and_the_tolerance_that_joins_them()
    {
        var refusal = Refusal(Channel(2 * MaxGap), Within(MaxGap));

        Assert.Equal(DrawingFault.OpenBoundary, refusal.Fault);
        Assert.Equal(12, refusal.Places.Length);
        Assert.Equal(0.02, refusal.Distance!.Value, 1e-12);
        Assert.Equal(0.021, refusal.Tolerance);
        var (a, b) = (refusal.Places[0], refusal.Places[1]);
        Assert.Equal(0.02, a.Point!.Value.DistanceTo(b.Point!.Value), 1e-12);
        Assert.Contains($"{a.Source.Kind} #{a.Source.Handle} on layer 'WALL' ends freely at (", refusal.Message, StringComparison.Ordinal);
        Assert.Contains($"{b.Source.Kind} #{b.Source.Handle} on layer 'WALL'", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("0.02 away", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("--tolerance 0.021", refusal.Message, StringComparison.Ordinal);

        Assert.Single(Outline(Channel(2 * MaxGap), Within(refusal.Tolerance!.Value)).Outline.Boundaries);
    }

    [Fact]
    public void The_tolerance_chosen_goes_with_the_size_of_the_drawing_and_the_shortest_edge()
    {
        Assert.Equal(1e-5 * 10 * Math.Sqrt(2), Outline(Drawing([Square(0, 0, 10)])).Report.MaxGap, 1e-15);
        var notched = LwPolyline([(0, 0, 0), (10, 0, 0), (10, 10, 0), (0, 10, 0), (0, 4e-5, 0), (-1, 4e-5, 0), (-1, 0, 0)]);
        Assert.Equal(1e-5, Outline(Drawing([notched])).Report.MaxGap, 1e-15);
    }

    [Fact]
    public void A_tolerance_as_large_as_the_shortest_edge_is_refused_with_that_edge()
    {
        var refusal = Refusal(Drawing([Square(0, 0, 10), LwPolyline([(2, 2, 0), (3, 2, 0), (3, 2.5, 0), (2, 2.5, 0)], handle: "5B")]), Within(0.5));

        Assert.Equal((DrawingFault.ToleranceUnusable, 0.5, 0.5), (refusal.Fault, refusal.Tolerance, refusal.Distance));
        Assert.Equal("5B", Assert.Single(refusal.Places).Source.Handle);
        Assert.Contains("0.5 long", refusal.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void A_tolerance_that_is_no_length_is_refused(double gap) =>
        Assert.Equal(DrawingFault.ToleranceUnusable, Refusal(Drawing([Square(0, 0, 10)]), Within(gap)).Fault);

    [Fact]
    public void With_no_tolerance_only_exact_ends_are_joined()
    {
        Assert.Single(Outline(Channel(0), Within(0)).Outline.Boundaries);
        Assert.Equal(DrawingFault.OpenBoundary, Refusal(Channel(1e-9), Within(0)).Fault);
    }

    [Fact]
    public void Ends_that_differ_by_rounding_are_joined_without_a_word()
    {
        // The arc's ends are computed from angles; the lines state theirs, and keep them.
        var c = Math.Cos(Math.PI / 180 * 37);
        var s = Math.Sin(Math.PI / 180 * 37);
        var result = Outline(Drawing([Arc(0, 0, 7, 37, 180), Line(7 * c, 7 * s, 0, -3), Line(0, -3, -7, 0)]));
        Assert.Empty(result.Report.Repairs);
        Assert.Contains(result.Outline.Boundaries[0].Boundary.Edges, e => e.Start + result.Outline.Origin == new Point(-7, 0));
    }

    [Fact]
    public void Where_a_line_meets_an_arc_the_end_that_the_drawing_states_holds()
    {
        // cos 37° and sin 37° to six digits.
        var stated = new Point(7 * 0.798636, 7 * 0.601815);
        var result = Outline(Drawing([Arc(0, 0, 7, 37, 180), Line(stated.X, stated.Y, 0, -3), Line(0, -3, -7, 0)]));
        Assert.Equal(stated, Assert.Single(result.Report.Repairs).Point);
    }

    [Fact]
    public void A_gap_that_can_be_closed_in_two_ways_is_refused()
    {
        string[] pieces = [Line(0, 0, 10, 0, "1"), Line(10, 0.004, 10, 10, "2"), Line(10, 10, 0, 0, "3"), Line(10.004, 0, 20, 0, "4")];
        var refusal = Refusal(Drawing(pieces), Within(0.01));

        Assert.Equal(DrawingFault.AmbiguousGap, refusal.Fault);
        Assert.Equal(["1", "2", "4"], refusal.Places.Select(p => p.Source.Handle!).Order());
        Assert.Contains("smaller --tolerance than 0.01", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Ends_that_meet_exactly_are_not_drawn_to_others_within_the_gap()
    {
        // Two squares a hair apart, and a gap that would reach across.
        var result = Outline(Drawing([.. LooseSquare(0, 0, 10), .. LooseSquare(10.005, 0, 10)]), Within(0.01));
        Assert.Equal(2, result.Outline.Boundaries.Length);
        Assert.Empty(result.Report.Repairs);
    }

    [Fact]
    public void A_polyline_whose_ends_meet_is_closed_and_listed()
    {
        (double, double, double)[] open = [(0, 0, 0), (10, 0, 0), (10, 10, 0), (0, 0, 0)];
        var result = Outline(Drawing([LwPolyline(open, isClosed: false)]));
        Assert.Equal(NoteCode.PolylineClosed, Assert.Single(result.Report.Repairs).Code);
        Assert.Equal(3, result.Outline.Boundaries[0].Boundary.Edges.Length);
    }

    [Fact]
    public void A_vertex_given_twice_is_dropped_and_listed()
    {
        (double, double, double)[] repeated = [(0, 0, 0), (10, 0, 0), (10, 0, 0), (10, 10, 0), (0, 0, 0)];
        var result = Outline(Drawing([LwPolyline(repeated)]));
        Assert.Contains("2 of its vertices", Assert.Single(result.Report.Repairs).Message, StringComparison.Ordinal);
        Assert.Equal(3, result.Outline.Boundaries[0].Boundary.Edges.Length);
    }

    [Fact]
    public void Entities_without_length_are_left_out_and_listed()
    {
        var report = Outline(Drawing(
            [Square(0, 0, 10), Line(3, 3, 3, 3, "Z1"), Circle(3, 3, 0, "Z2"), Arc(3, 3, 1, 40, 40, "Z3"), LwPolyline([(3, 3, 1)], handle: "Z4")])).Report;
        Assert.Equal(["Z1", "Z2", "Z3", "Z4"], report.Repairs.Select(n => n.Sources[0].Handle!));
        Assert.All(report.Repairs, n => Assert.Equal("DR301", n.Name));
    }

    [Fact]
    public void A_sliver_becomes_a_point_and_is_listed()
    {
        var result = Outline(Drawing([Line(0, 0, 10, 0), Line(10, 0, 10, 1e-9, "5F"), Line(10, 1e-9, 5, 5), Line(5, 5, 0, 0)]));
        Assert.Equal(3, result.Outline.Boundaries[0].Boundary.Edges.Length);
        Assert.Contains("LINE #5F", Assert.Single(result.Report.Repairs, n => n.Code == NoteCode.Sliver).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Only_entities_without_length_make_no_boundary() =>
        Assert.Equal(DrawingFault.NoBoundary, Refusal(Drawing([Line(3, 3, 3, 3)])).Fault);

    [Fact]
    public void Thousands_of_ends_within_the_tolerance_are_refused_with_their_place()
    {
        var rays = Enumerable.Range(0, 2000).Select(i => Line(4 + 1e-6 * i, 3, 100 * Math.Cos(i), 100 * Math.Sin(i)));
        var refusal = Refusal(Drawing(rays), Within(0.01));
        Assert.Equal((DrawingFault.ToleranceUnusable, 0.01), (refusal.Fault, refusal.Tolerance));
        Assert.Contains("about (4", refusal.Message, StringComparison.Ordinal);
    }

    internal static string[] LooseSquare(double x, double y, double side) =>
    [
        Line(x, y, x + side, y), Line(x + side, y, x + side, y + side), Line(x + side, y + side, x, y + side), Line(x, y + side, x, y),
    ];

    private static OutlineOptions Within(double gap) => new() { Joining = new Joining { MaxGap = gap } };

    /// <summary>Four lines and two arcs in a row, the start of each moved along it by a distance.</summary>
    private static string Channel(double gap)
    {
        // Moved along an arc of radius 5 until the chord is the gap.
        var turn = 2 * Math.Asin(gap / 10) * 180 / Math.PI;
        return Drawing(
        [
            Line(0 + gap, 0, 20, 0, "11", "WALL"), Arc(15, 0, 5, 0 + turn, 90, "12", "WALL"), Line(15 - gap, 5, 5, 5, "13", "WALL"),
            Line(5, 5 + gap, 5, 9, "14", "WALL"), Arc(0, 9, 5, 0 + turn, 90, "15", "WALL"), Line(0, 14 - gap, 0, 0, "16", "WALL"),
        ]);
    }

    private static (double, double) Rounded(Point p) => (Math.Round(p.X, 1), Math.Round(p.Y, 1));
}
