namespace MeshSection.Geometry;

/// <summary>
/// Gauss-Legendre quadrature with 10 points on (0, 1): exact for polynomials of degree 19 [AbramowitzStegun1964].
/// </summary>
internal static class GaussLegendre
{
    // Abscissa and weight of the upper half on (-1, 1).
    private static readonly double[] Abscissae =
    [
        0.1488743389816312, 0.4333953941292472, 0.6794095682990244, 0.8650633666889845, 0.9739065285171717,
    ];

    private static readonly double[] Weights =
    [
        0.2955242247147529, 0.2692667193099964, 0.2190863625159820, 0.1494513491505806, 0.0666713443086881,
    ];

    // Halving 12 times reaches 1e-14 even where the slope of f is infinite at one end.
    private const int MostHalvings = 12;

    /// <summary>The points and weights, in pairs that lie alike about the middle, from the middle outwards.</summary>
    public static (double At, double Weight)[] Points { get; } =
    [
        .. Enumerable.Range(0, Abscissae.Length).SelectMany(i => new[]
        {
            (0.5 * (1 - Abscissae[i]), 0.5 * Weights[i]),
            (0.5 * (1 + Abscissae[i]), 0.5 * Weights[i]),
        }),
    ];

    /// <summary>The integral of f over (0, 1); the interval is halved until that changes nothing but rounding.</summary>
    /// <param name="f">A smooth function.</param>
    /// <param name="scale">The size of what is added up in f, which tells how large rounding is.</param>
    public static double Integral(Func<double, double> f, double scale) =>
        Refined(f, 0, 1, Rule(f, 0, 1), 1e-15 * scale, MostHalvings);

    private static double Refined(Func<double, double> f, double from, double to, double whole, double rounding, int halvings)
    {
        var middle = 0.5 * (from + to);
        var (left, right) = (Rule(f, from, middle), Rule(f, middle, to));
        return halvings == 0 || Math.Abs(left + right - whole) <= rounding
            ? left + right
            : Refined(f, from, middle, left, rounding, halvings - 1) + Refined(f, middle, to, right, rounding, halvings - 1);
    }

    private static double Rule(Func<double, double> f, double from, double to)
    {
        var sum = 0.0;
        foreach (var (at, weight) in Points)
        {
            sum += weight * f(from + at * (to - from));
        }

        return (to - from) * sum;
    }
}
