using System.Collections.Immutable;
using CsCheck;
using MeshSection.Geometry;

namespace MeshSection.Tests.Geometry;

public class BezierEdgeTests
{
    private static readonly Gen<(ImmutableArray<Point> Controls, ImmutableArray<double> Weights)> AnyCurve =
        from degree in Gen.Int[2, 6]
        from controls in Gen.Select(Gen.Double[-100, 100], Gen.Double[-100, 100], (x, y) => new Point(x, y)).Array[degree + 1]
        from weights in Gen.Double[0.2, 5].Array[degree + 1]
        from rational in Gen.Bool
        where Math.Abs((controls[1] - controls[0]).Cross(controls[2] - controls[0])) > 1e-2 // else it may double back on itself
        select (
            controls.ToImmutableArray(),
            weights.Select(w => rational ? w : 1).ToImmutableArray());

    private static readonly Gen<BezierEdge> AnyPiece =
        from curve in AnyCurve
        from pick in Gen.Int[0, 1000]
        let pieces = BezierPieces.Of(curve.Controls, curve.Weights, 0).OfType<BezierEdge>().Where(p => p.Chord.Length > 1e-3).ToArray()
        where pieces.Length > 0
        select pieces[pick % pieces.Length];

    [Fact]
    public void Pieces_make_the_whole_curve_and_turn_one_way_by_a_quarter_at_most() => AnyCurve.Sample(curve =>
    {
        var pieces = BezierPieces.Of(curve.Controls, curve.Weights, 0);
        Assert.Equal(curve.Controls[0], pieces[0].Start);
        Assert.Equal(curve.Controls[^1], pieces[^1].End);
        foreach (var (piece, next) in pieces.Zip(pieces.Skip(1)))
        {
            Assert.Equal(piece.End, next.Start);
        }

        // A needle turns round at its tip within the last digits.
        foreach (var piece in pieces.Where(p => p.Sag > 1e-6 * p.Length))
        {
            var first = piece.TangentAt(0);
            var (before, sense, turned) = (first, 0, 0.0);
            for (var i = 1; i <= 40; i++)
            {
                var tangent = piece.TangentAt(i / 40.0);
                var turn = Math.Atan2(before.Cross(tangent), before.Dot(tangent));
                if (Math.Abs(turn) > 1e-6)
                {
                    Assert.True(sense == 0 || Math.Sign(turn) == sense, $"{piece} bends both ways");
                    sense = Math.Sign(turn);
                }

                turned += turn;
                before = tangent;
            }

            Assert.InRange(Math.Abs(turned), 0, 0.5 * Math.PI + 1e-5);
        }
    });

    [Fact]
    public void Velocity_and_tangent_are_the_derivative_of_the_point() => Gen.Select(AnyPiece, Gen.Double[0.05, 0.95]).Sample((edge, t) =>
    {
        const double Step = 1e-5;
        var slope = (edge.PointAt(t + Step) - edge.PointAt(t - Step)) / (2 * Step);
        Assert.Equal(0, slope.DistanceTo(edge.VelocityAt(t)), 1e-4);
        Assert.Equal(0, (edge.VelocityAt(t) / edge.VelocityAt(t).Length).DistanceTo(edge.TangentAt(t)), 1e-12);
    });

    [Fact]
    public void A_part_is_the_same_curve_between_its_parameters() =>
        Gen.Select(AnyPiece, Gen.Double[0, 0.5], Gen.Double[0.51, 1], Gen.Double[0, 1]).Sample((edge, from, to, t) =>
        {
            var part = edge.Part(from, to);
            Assert.Equal(edge.PointAt(from), part.Start);
            Assert.Equal(edge.PointAt(to), part.End);

            // The parameter of a part of a rational curve runs otherwise, but its points lie on the same curve.
            var point = part.PointAt(t);
            var normal = part.TangentAt(t).Left();
            var crossings = edge.Crossings(normal.Left(), normal.Left().Dot(point));
            var nearest = crossings.Append(from).Append(to).Min(s => edge.PointAt(s).DistanceTo(point));
            Assert.Equal(0, nearest, 1e-9);
        });

    [Fact]
    public void Reversed_runs_the_other_way() => Gen.Select(AnyPiece, Gen.Double[0, 1]).Sample((edge, t) =>
    {
        Assert.Equal(0, edge.PointAt(t).DistanceTo(edge.Reversed().PointAt(1 - t)), 1e-10);
        Assert.Equal(edge, edge.Reversed().Reversed());
        Assert.Equal(edge.CapArea, -edge.Reversed().CapArea, 1e-9);
    });

    [Fact]
    public void Turnings_and_crossings_are_where_they_should_be() =>
        Gen.Select(AnyCurve, Gen.Double[-Math.PI, Math.PI], Gen.Double[-0.5, 0.5]).Sample((curve, angle, reach) =>
        {
            var edge = new BezierEdge(curve.Controls, curve.Weights);
            var normal = Point.Direction(angle);
            var offset = 100 * reach;
            foreach (var t in edge.Turnings(normal))
            {
                Assert.Equal(0, normal.Dot(edge.VelocityAt(t)), 1e-7);
            }

            foreach (var t in edge.Crossings(normal, offset))
            {
                Assert.Equal(offset, normal.Dot(edge.PointAt(t)), 1e-9);
            }

            // None is missed: the signs seen at many places change as often as roots say.
            var signs = Enumerable.Range(0, 2001).Select(i => Math.Sign(normal.Dot(edge.PointAt(i / 2000.0)) - offset)).Where(s => s != 0).ToArray();
            var seen = signs.Zip(signs.Skip(1)).Count(p => p.First != p.Second);
            Assert.True(edge.Crossings(normal, offset).Count >= seen);
        });

    [Fact]
    public void Steps_keep_the_sag_and_the_turn() => Gen.Select(AnyPiece, Gen.Double[1e-4, 1]).Sample((edge, sag) =>
    {
        var steps = edge.Steps(sag, 0.25);
        for (var i = 0; i < steps; i++)
        {
            var part = edge.Part(i / steps, (i + 1) / steps);
            Assert.InRange(part.Sag, 0, sag * 1.000001);
            Assert.True(part.Sag < 1.1e-6 * sag || part.TangentAt(0).Dot(part.TangentAt(1)) > Math.Cos(0.25) - 1e-9);
        }
    });

    [Fact]
    public void Length_of_a_parabola_is_the_closed_form()
    {
        // y = x² from 0 to 1: √5 / 2 + asinh(2) / 4.
        var parabola = new BezierEdge([new(0, 0), new(0.5, 0), new(1, 1)], [1, 1, 1]);
        Assert.Equal(Math.Sqrt(5) / 2 + Math.Asinh(2) / 4, parabola.Length, 1e-14);
        Assert.Equal(1.0 / 6, parabola.CapArea, 1e-15);
        Assert.Equal(0.25 / Math.Sqrt(2), parabola.Sag, 1e-15);
    }

    [Fact]
    public void Length_and_cap_of_a_quarter_of_a_circle_are_the_closed_forms()
    {
        var quarter = new BezierEdge([new(7, 0), new(7, 7), new(0, 7)], [1, Math.Sqrt(0.5), 1]);
        Assert.Equal(3.5 * Math.PI, quarter.Length, 1e-13);
        Assert.Equal(49 * (Math.PI / 4 - 0.5), quarter.CapArea, 1e-13);
        Assert.Equal(7 * (1 - Math.Sqrt(0.5)), quarter.Sag, 1e-14);
        Assert.Equal(new Box(0, 0, 7, 7), quarter.Bounds);
    }

    [Fact]
    public void Control_points_that_coincide_bring_the_curve_to_rest_but_not_its_tangent()
    {
        var edge = new BezierEdge([new(0, 0), new(0, 0), new(3, 1), new(3, 1)], [1, 1, 1, 1]);
        Assert.Equal(0, edge.TangentAt(0).DistanceTo(new Point(3, 1) / Math.Sqrt(10)), 1e-15);
        Assert.Equal(0, edge.TangentAt(1).DistanceTo(new Point(3, 1) / Math.Sqrt(10)), 1e-15);
        Assert.Equal(Math.Sqrt(10), edge.Length, 1e-12);
    }

    [Fact]
    public void A_cusp_and_a_bend_are_cut()
    {
        // x = t², y = t³ about t = 0, as a cubic from t = -1 to 1: it stops at the origin and turns back.
        Point[] cusp = [new(1, -1), new(-1.0 / 3, 1), new(-1.0 / 3, -1), new(1, 1)];
        var pieces = BezierPieces.Of([.. cusp], [1, 1, 1, 1], 0);
        Assert.Contains(pieces, p => p.End.DistanceTo(Point.Origin) < 1e-7);

        // y = x³ bends at the origin.
        Point[] bend = [new(-1, -1), new(-1.0 / 3, 1), new(1.0 / 3, -1), new(1, 1)];
        Assert.Contains(BezierPieces.Of([.. bend], [1, 1, 1, 1], 0), p => p.End.DistanceTo(Point.Origin) < 1e-7);
    }

    [Fact]
    public void Between_other_ends_the_shape_stays() => Gen.Select(AnyPiece, Gen.Double[-1, 1], Gen.Double[-1, 1], Gen.Double[0, 1])
        .Sample((edge, dx, dy, t) =>
        {
            var moved = edge.Between(edge.Start + new Point(dx, dy), edge.End);
            var scale = moved.Chord.Length / edge.Chord.Length;
            Assert.Equal(edge.Start + new Point(dx, dy), moved.Start);
            Assert.Equal(edge.Length * scale, moved.Length, 1e-9 * edge.Length * scale);
            Assert.Equal(edge.PointAt(t).DistanceTo(edge.Start) * scale, moved.PointAt(t).DistanceTo(moved.Start), 1e-9 * (1 + moved.Length));
        });
}
