using CsCheck;
using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Loops;

/// <summary>The order, direction and number of times in which pieces are drawn leave no trace in the outline.</summary>
public class OrderTest
{
    // A wavy ring of lines and arcs with a round hole of two arcs; its corners are no round numbers.
    private static readonly List<Piece> Pieces = [.. Ring(11), new(true, 2.1, 0.3, 3, 20, 200), new(true, 2.1, 0.3, 3, 200, 20)];

    [Fact]
    public void Shuffled_reversed_and_doubled_pieces_give_the_same_bits()
    {
        var expected = Edges(Pieces.Select(p => p.Text(false)));
        Assert.Equal(2 + Pieces.Count - 2, expected.Count);
        var copies = Gen.Select(Gen.Shuffle(Enumerable.Range(0, Pieces.Count).ToArray()), Gen.Bool.Array[2 * Pieces.Count], Gen.Bool.Array[Pieces.Count]);
        copies.Sample((order, reversed, doubled) =>
        {
            var texts = order.Select(i => Pieces[i].Text(reversed[i]))
                .Concat(order.Where(i => doubled[i]).Select(i => Pieces[i].Text(reversed[Pieces.Count + i])));
            Assert.Equal(expected, Edges(texts));
        }, iter: 300);
    }

    [Fact]
    public void Gaps_are_closed_in_the_same_bits_whatever_the_order()
    {
        // Every line is short of its corners by its own few ten-thousandths.
        var gappy = Ring(9).Select((p, i) => p.IsArc ? p : p.Shortened(8e-6 * (i + 1))).ToList();
        var expected = Edges(gappy.Select(p => p.Text(false)));
        Gen.Select(Gen.Shuffle(Enumerable.Range(0, gappy.Count).ToArray()), Gen.Bool.Array[gappy.Count]).Sample((order, reversed) =>
            Assert.Equal(expected, Edges(order.Select(i => gappy[i].Text(reversed[i])))), iter: 200);
    }

    [Fact]
    public void Copies_that_do_not_quite_lie_on_one_another_give_the_same_bits_whatever_the_order()
    {
        var sloppy = Enumerable.Range(0, 12).Select(i =>
        {
            var (a, b) = (Math.Tau * (i % 4) / 4, Math.Tau * (i % 4 + 1) / 4);
            double Off(int k) => 1e-6 * ((i * 7 + k * 3) % 11);
            return new Piece(false, 10 * Math.Cos(a) + Off(0), 10 * Math.Sin(a) + Off(1), 10 * Math.Cos(b) + Off(2), 10 * Math.Sin(b) + Off(3), 0);
        }).ToArray();
        var expected = Edges(sloppy.Select(p => p.Text(false)));
        Assert.Equal(4, expected.Count);
        Gen.Select(Gen.Shuffle((Piece[])sloppy.Clone()), Gen.Bool.Array[12]).Sample((order, reversed) =>
            Assert.Equal(expected, Edges(order.Select((p, i) => p.Text(reversed[i])))), iter: 200);
    }

    [Fact]
    public void A_doubled_piece_is_named_with_the_one_that_stays()
    {
        var report = Outline(Drawing([Square(0, 0, 10, "S"), Line(10, 0, 0, 0, "D"), Circle(5, 5, 1, "C"), Circle(5, 5, 1, "E")])).Report;

        Assert.All(report.Repairs, n => Assert.Equal("DR403", n.Name));
        Assert.Equal([("D", "S"), ("E", "C")], report.Repairs.Select(n => (n.Sources[0].Handle!, n.Sources[1].Handle!)));
    }

    [Fact]
    public void An_arc_and_its_chord_are_no_duplicates()
    {
        var loop = Assert.Single(Outline(Drawing([Line(-1, 0, 1, 0), Arc(0, 0, 1, 0, 180)])).Outline.Boundaries).Boundary;
        Assert.Equal(2 + Math.PI, loop.Length, 1e-14);
    }

    private static List<Edge> Edges(IEnumerable<string> texts) =>
        [.. Outline(Drawing(texts)).Outline.Boundaries.SelectMany(b => b.Boundary.Edges)];

    private static List<Piece> Ring(int corners)
    {
        var pieces = new List<Piece>();
        for (var i = 0; i < corners; i++)
        {
            var (a, b) = (Math.Tau * i / corners, Math.Tau * (i + 0.7) / corners);
            var c = Math.Tau * (i + 1) / corners;
            pieces.Add(new(false, 10 * Math.Cos(a), 10 * Math.Sin(a), 11 * Math.Cos(b), 11 * Math.Sin(b), 0));
            pieces.Add(new(false, 11 * Math.Cos(b), 11 * Math.Sin(b), 10 * Math.Cos(c), 10 * Math.Sin(c), 0));
        }

        return pieces;
    }

    private sealed record Piece(bool IsArc, double A, double B, double C, double D, double E)
    {
        public string Text(bool isReversed) => IsArc ? DxfText.Arc(A, B, C, D, E) : isReversed ? Line(C, D, A, B) : Line(A, B, C, D);

        public Piece Shortened(double by)
        {
            var direction = new Point(C - A, D - B) / new Point(C - A, D - B).Length;
            return this with { A = A + by * direction.X, B = B + by * direction.Y, C = C - by * direction.X, D = D - by * direction.Y };
        }
    }
}
