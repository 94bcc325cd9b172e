using System.Numerics;
using CsCheck;
using MeshSection.Meshing;

namespace MeshSection.Tests.Meshing;

public class PredicatesTests
{
    /// <summary>A coordinate near one of few round numbers, off it by a few units in the last place or not at all.</summary>
    private static readonly Gen<double> Close =
        from round in OneOf(0.5, 12.0, 24.0, 0.1, 1e-3, 100.0, -7.3)
        from steps in Gen.Int[-3, 3]
        select Stepped(round, steps);

    private static readonly Gen<double> OnGrid = Gen.Int[-4, 4].Select(i => (double)i);

    private static readonly Gen<double> Any = Gen.Double[-100, 100].Select(Sizeable);

    [Fact]
    public void Orientation_has_the_sign_of_exact_arithmetic() =>
        Gen.OneOf(Close, OnGrid, Any).Array[6].Sample(
            p => Math.Sign(Predicates.Orientation(p[0], p[1], p[2], p[3], p[4], p[5])) == ExactOrientation(p),
            iter: 20_000);

    [Fact]
    public void Orientation_of_nearly_collinear_points_has_the_sign_of_exact_arithmetic() =>
        Gen.Select(Any.Array[4], Gen.Double[-2, 3], Gen.Int[-2, 2]).Sample(
            (p, fraction, steps) =>
            {
                double x = p[0] + fraction * (p[2] - p[0]);
                double y = Stepped(p[1] + fraction * (p[3] - p[1]), steps);
                return Math.Sign(Predicates.Orientation(p[0], p[1], p[2], p[3], x, y))
                    == ExactOrientation([p[0], p[1], p[2], p[3], x, y]);
            },
            iter: 20_000);

    [Fact]
    public void In_circle_has_the_sign_of_exact_arithmetic() =>
        Gen.OneOf(Close.Array[8], OnGrid.Array[8], Any.Array[8], Gen.OneOf(Close, OnGrid, Any).Array[8]).Sample(
            p => Math.Sign(Predicates.InCircle(p[0], p[1], p[2], p[3], p[4], p[5], p[6], p[7])) == ExactInCircle(p),
            iter: 20_000);

    [Fact]
    public void In_circle_of_nearly_cocircular_points_has_the_sign_of_exact_arithmetic() =>
        Gen.Select(Gen.Double[0, Math.Tau].Array[4], Any, Any, Gen.Double[-6, 6]).Sample(
            (angles, x, y, size) =>
            {
                double radius = Math.Pow(10, size);
                double[] p = [.. angles.SelectMany(a => new[] { Sizeable(x + radius * Math.Cos(a)), Sizeable(y + radius * Math.Sin(a)) })];
                return Math.Sign(Predicates.InCircle(p[0], p[1], p[2], p[3], p[4], p[5], p[6], p[7])) == ExactInCircle(p);
            },
            iter: 20_000);

    [Fact]
    public void Exactly_collinear_and_cocircular_points_give_zero()
    {
        Assert.Equal(0, Predicates.Orientation(0.1, 0.1, 0.2, 0.2, 0.7, 0.7));
        Assert.Equal(0, Predicates.InCircle(5, 0, 0, 5, -5, 0, 3, -4));
        Assert.Equal(0, Predicates.InCircle(1e6 + 5, 0, 1e6, 5, 1e6 - 5, 0, 1e6 - 4, -3));
        Assert.True(Predicates.InCircle(5, 0, 0, 5, -5, 0, 3, Math.BitIncrement(-4.0)) > 0);
        Assert.True(Predicates.InCircle(5, 0, 0, 5, -5, 0, 3, Math.BitDecrement(-4.0)) < 0);
    }

    [Fact]
    public void Signs_that_doubles_and_double_words_miss_are_found()
    {
        // All of 1, 2^-53 and 2^-106 matter here; only the expansions see the last.
        double tiny = Math.ScaleB(1, -106);
        Assert.True(Predicates.Orientation(0, 0, 1, tiny, 1, 2 * tiny) > 0);
        Assert.True(Predicates.InCircle(1, 0, 0, 1, -1, 0, tiny, -1) < 0);
        Assert.True(Predicates.InCircle(1, 0, 0, 1, -1, 0, 0, -1 + Math.ScaleB(1, -53)) > 0);
    }

    /// <summary>The value, or 0 where products of four like it would underflow, which the predicates exclude.</summary>
    private static double Sizeable(double value) => Math.Abs(value) < 1e-40 ? 0 : value;

    private static double Stepped(double value, int steps)
    {
        // Steps from zero would be so small that products underflow, which the predicates exclude.
        if (value == 0) return 0;
        for (; steps > 0; steps--) value = Math.BitIncrement(value);
        for (; steps < 0; steps++) value = Math.BitDecrement(value);
        return value;
    }

    private static int ExactOrientation(double[] p)
    {
        BigInteger[] v = Scaled(p);
        return ((v[0] - v[4]) * (v[3] - v[5]) - (v[1] - v[5]) * (v[2] - v[4])).Sign;
    }

    private static int ExactInCircle(double[] p)
    {
        BigInteger[] v = Scaled(p);
        BigInteger adx = v[0] - v[6], ady = v[1] - v[7], bdx = v[2] - v[6], bdy = v[3] - v[7], cdx = v[4] - v[6], cdy = v[5] - v[7];
        BigInteger det = (adx * adx + ady * ady) * (bdx * cdy - cdx * bdy)
            - (bdx * bdx + bdy * bdy) * (adx * cdy - cdx * ady)
            + (cdx * cdx + cdy * cdy) * (adx * bdy - bdx * ady);
        return det.Sign;
    }

    /// <summary>The coordinates as whole multiples of one power of two.</summary>
    private static BigInteger[] Scaled(double[] p)
    {
        int least = p.Where(x => x != 0).Select(Math.ILogB).DefaultIfEmpty(0).Min() - 52;
        return [.. p.Select(x => Whole(x, least))];
    }

    private static BigInteger Whole(double x, int least)
    {
        if (x == 0) return 0;
        int exponent = Math.ILogB(x) - 52;
        return new BigInteger(Math.ScaleB(x, -exponent)) << (exponent - least);
    }

    private static Gen<T> OneOf<T>(params T[] values) => Gen.Int[0, values.Length - 1].Select(i => values[i]);
}
