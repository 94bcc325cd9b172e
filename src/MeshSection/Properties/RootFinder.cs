namespace MeshSection.Properties;

/// <summary>The root of a continuous function inside a bracket.</summary>
internal static class RootFinder
{
    // Bisection alone needs about 60 steps for the last bit of a double; the method is never much slower than that.
    private const int MaxSteps = 200;

    /// <summary>
    /// Chandrupatla's method [Chandrupatla1997]: inverse quadratic steps where they are
    /// safe, bisection where they are not.
    /// </summary>
    /// <param name="f">The function.</param>
    /// <param name="a">One end of the bracket.</param>
    /// <param name="b">The other end.</param>
    /// <param name="fa">f(a), of the other sign than <paramref name="fb"/>.</param>
    /// <param name="fb">f(b).</param>
    /// <param name="zero">A value as small as this counts as zero.</param>
    /// <param name="width">A bracket as narrow as this is narrow enough.</param>
    public static double Find(
        Func<double, double> f, double a, double b, double fa, double fb, double zero, double width)
    {
        var t = 0.5;
        for (var step = 0; step < MaxSteps; step++)
        {
            var x = a + t * (b - a);
            var fx = f(x);
            double c, fc;
            if (fx > 0 == fa > 0)
            {
                (c, fc, a, fa) = (a, fa, x, fx);
            }
            else
            {
                (c, fc, b, fb, a, fa) = (b, fb, a, fa, x, fx);
            }

            var best = Math.Abs(fa) < Math.Abs(fb) ? a : b;
            if (Math.Min(Math.Abs(fa), Math.Abs(fb)) <= zero || Math.Abs(b - a) <= width)
            {
                return best;
            }

            var xi = (a - b) / (c - b);
            var phi = (fa - fb) / (fc - fb);
            var inside = phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi;
            t = inside
                ? fa / (fb - fa) * (fc / (fb - fc)) + (c - a) / (b - a) * (fa / (fc - fa)) * (fb / (fc - fb))
                : 0.5;
            var least = 0.5 * width / Math.Abs(b - a);
            t = Math.Clamp(t, least, 1 - least);
        }

        return Math.Abs(fa) < Math.Abs(fb) ? a : b;
    }
}
