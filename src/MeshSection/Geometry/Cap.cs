namespace MeshSection.Geometry;

/// <summary>
/// Moments of the region between an arc and its chord (a circular segment), in axes of its own: u along the chord from
/// its middle, v away from it towards the arc. With c half the chord, α half the sweep, s = sin α, k = cos α and
/// g = α - s k ([YoungBudynas2002], moved from the centre to the chord):
/// <code>
/// area    c² g / s²                                first  ∫ v   c³ (2/3 s³ - k g) / s³
/// along   ∫ u²  c⁴ (g/4 - k s³/6) / s⁴             across ∫ v²  c⁴ ((1/4 + k²) g - 5/6 k s³) / s⁴
/// </code>
/// </summary>
/// <param name="Area">Area, mm²; all four are negative where the bulge is: there the region lacks the cap.</param>
/// <param name="First">∫ v dA, mm³.</param>
/// <param name="Along">∫ u² dA, mm⁴.</param>
/// <param name="Across">∫ v² dA, mm⁴.</param>
internal readonly record struct Cap(double Area, double First, double Along, double Across)
{
    // Below this the closed forms subtract nearly equal numbers; the series, in powers of α², needs no more terms.
    private const double SeriesLimit = 0.5;

    private static ReadOnlySpan<double> AreaSeries =>
    [
        2.0 / 3, 4.0 / 45, 4.0 / 315, 8.0 / 4725, 4.0 / 18711, 2.5972851369676765e-05, 3.069632699262329e-06,
        3.5543374063967485e-07, 4.0514123730256185e-08, 4.561030240918436e-09, 5.083415171780577e-10,
    ];

    private static ReadOnlySpan<double> FirstSeries =>
    [
        2.0 / 15, 2.0 / 63, 4.0 / 675, 2.0 / 2079, 1.4285068253322222e-04, 1.995261254520514e-05,
        2.6657530547975617e-06, 3.4437005170717757e-07, 4.332978728872515e-08, 5.337585930369606e-09,
        6.461631082271668e-10,
    ];

    private static ReadOnlySpan<double> AlongSeries =>
    [
        2.0 / 15, 8.0 / 315, 8.0 / 1575, 16.0 / 17325, 1.5467190070364673e-04, 2.428142110681793e-05,
        3.62165068047421e-06, 5.183990257161826e-07, 7.174703488813042e-08, 9.656148257435749e-09,
        1.2693559512794821e-09,
    ];

    private static ReadOnlySpan<double> AcrossSeries =>
    [
        4.0 / 105, 4.0 / 315, 152.0 / 51975, 5.595815119624644e-04, 9.54342541644129e-05, 1.503862070310872e-05,
        2.236561387941238e-06, 3.182210507103959e-07, 4.3719711046260315e-08, 5.838438239219352e-09,
        7.615683827796638e-10,
    ];

    /// <summary>The cap of an arc, in closed form.</summary>
    public static Cap Of(ArcEdge arc)
    {
        var c = 0.5 * arc.Chord.Length;
        var alpha = 0.5 * Math.Abs(arc.Sweep);
        double area, first, along, across;
        if (alpha < SeriesLimit)
        {
            var square = alpha * alpha;
            area = alpha * Horner(AreaSeries, square);
            first = square * Horner(FirstSeries, square);
            along = alpha * Horner(AlongSeries, square);
            across = square * alpha * Horner(AcrossSeries, square);
        }
        else
        {
            var (s, k) = Math.SinCos(alpha);
            var g = alpha - s * k;
            var cube = s * s * s;
            area = g / (s * s);
            first = (2.0 / 3 * cube - k * g) / cube;
            along = (0.25 * g - k * cube / 6) / (cube * s);
            across = ((0.25 + k * k) * g - 5.0 / 6 * k * cube) / (cube * s);
        }

        var sign = Math.Sign(arc.Bulge);
        var c2 = c * c;
        return new Cap(sign * c2 * area, sign * c2 * c * first, sign * c2 * c2 * along, sign * c2 * c2 * across);
    }

    private static double Horner(ReadOnlySpan<double> series, double x)
    {
        var sum = 0.0;
        for (var i = series.Length - 1; i >= 0; i--)
        {
            sum = sum * x + series[i];
        }

        return sum;
    }
}
