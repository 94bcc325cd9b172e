namespace MeshSection.Geometry;

/// <summary>
/// Polynomials on [0, 1] by their Bernstein coefficients c: Σ cᵢ C(n, i) tⁱ (1 - t)ⁿ⁻ⁱ, of degree n = length - 1. In this
/// form the roots are the best conditioned of all [FaroukiRajan1987], and no coefficient's sign is lost to cancellation.
/// </summary>
internal static class Bernstein
{
    /// <summary>The value at t, by de Casteljau's steps.</summary>
    public static double Value(ReadOnlySpan<double> c, double t)
    {
        Span<double> steps = c.Length <= 32 ? stackalloc double[c.Length] : new double[c.Length];
        c.CopyTo(steps);
        for (var last = c.Length - 1; last > 0; last--)
        {
            for (var i = 0; i < last; i++)
            {
                steps[i] = (1 - t) * steps[i] + t * steps[i + 1];
            }
        }

        return steps[0];
    }

    /// <summary>The coefficients on [0, t] and on [t, 1], each as of a polynomial on [0, 1].</summary>
    public static (double[] Left, double[] Right) Split(ReadOnlySpan<double> c, double t)
    {
        var (left, right) = (new double[c.Length], c.ToArray());
        for (var done = 0; done < c.Length; done++)
        {
            left[done] = right[0];
            for (var i = 0; i < c.Length - 1 - done; i++)
            {
                right[i] = (1 - t) * right[i] + t * right[i + 1];
            }
        }

        return (left, right);
    }

    /// <summary>The derivative.</summary>
    public static double[] Derivative(ReadOnlySpan<double> c)
    {
        var derivative = new double[Math.Max(1, c.Length - 1)];
        for (var i = 0; i + 1 < c.Length; i++)
        {
            derivative[i] = (c.Length - 1) * (c[i + 1] - c[i]);
        }

        return derivative;
    }

    /// <summary>The product of two polynomials.</summary>
    public static double[] Product(ReadOnlySpan<double> a, ReadOnlySpan<double> b)
    {
        var (m, n) = (a.Length - 1, b.Length - 1);
        var product = new double[m + n + 1];
        for (var i = 0; i <= m; i++)
        {
            for (var j = 0; j <= n; j++)
            {
                product[i + j] += Binomial(m, i) * Binomial(n, j) / Binomial(m + n, i + j) * a[i] * b[j];
            }
        }

        return product;
    }

    /// <summary>
    /// The places strictly between 0 and 1 at which the polynomial changes its sign, in rising order. A piece whose
    /// coefficients change sign once has one root, one whose coefficients do not has none; others are halved.
    /// </summary>
    public static List<double> SignChanges(ReadOnlySpan<double> c)
    {
        var roots = new List<double>(2);
        Collect(c, 0, 1, roots);
        return roots;
    }

    private static void Collect(ReadOnlySpan<double> c, double from, double to, List<double> roots)
    {
        var changes = Changes(c);
        if (changes == 0)
        {
            return;
        }

        var middle = 0.5 * (from + to);
        if (changes == 1 && c[0] * c[^1] < 0)
        {
            roots.Add(from + (to - from) * OnlyRoot(c));
            return;
        }

        if (!(middle > from && middle < to) || to - from < 1e-15)
        {
            // Roots closer together than the numbers can tell: an odd count is one change of sign.
            if (changes % 2 == 1)
            {
                roots.Add(middle);
            }

            return;
        }

        var (left, right) = Split(c, 0.5);
        Collect(left, from, middle, roots);
        if (right[0] == 0 && LastSign(left) * FirstSign(right) < 0)
        {
            roots.Add(middle);
        }

        Collect(right, middle, to, roots);
    }

    private static double OnlyRoot(ReadOnlySpan<double> c)
    {
        // Newton from the secant's root, kept inside a bracket that halves whenever a step would leave it.
        var derivative = Derivative(c);
        var (left, right, atLeft) = (0.0, 1.0, c[0]);
        var t = c[0] / (c[0] - c[^1]);
        for (var step = 0; step < 200; step++)
        {
            var value = Value(c, t);
            if (value == 0)
            {
                return t;
            }

            if (value > 0 == atLeft > 0)
            {
                left = t;
            }
            else
            {
                right = t;
            }

            var next = t - value / Value(derivative, t);
            if (!(next > left && next < right))
            {
                next = 0.5 * (left + right);
            }

            if (Math.Abs(next - t) <= 1e-16 || right - left <= 1e-16)
            {
                return next;
            }

            t = next;
        }

        return t;
    }

    private static int Changes(ReadOnlySpan<double> c)
    {
        var (changes, sign) = (0, 0);
        foreach (var value in c)
        {
            var next = Math.Sign(value);
            changes += next * sign < 0 ? 1 : 0;
            sign = next != 0 ? next : sign;
        }

        return changes;
    }

    private static int FirstSign(ReadOnlySpan<double> c)
    {
        var at = c.IndexOfAnyExcept(0.0);
        return at < 0 ? 0 : Math.Sign(c[at]);
    }

    private static int LastSign(ReadOnlySpan<double> c)
    {
        var at = c.LastIndexOfAnyExcept(0.0);
        return at < 0 ? 0 : Math.Sign(c[at]);
    }

    private static double Binomial(int n, int k)
    {
        var product = 1.0;
        for (var i = 1; i <= Math.Min(k, n - k); i++)
        {
            product = product * (n - i + 1) / i;
        }

        return product;
    }
}
