namespace MeshSection.Meshing;

/// <summary>
/// A number as the unevaluated sum of two doubles, some 106 bits: relative error of each operation at most 5 · 2^-106,
/// also under cancellation [JoldesMullerPopescu2017].
/// </summary>
internal readonly struct DoubleWord(double high, double low)
{
    public double High => high;

    private double Low => low;

    /// <summary>a - b without error.</summary>
    public static DoubleWord Difference(double a, double b)
    {
        double x = a - b;
        double bVirtual = a - x;
        double aVirtual = x + bVirtual;
        return new DoubleWord(x, (a - aVirtual) + (bVirtual - b));
    }

    public static DoubleWord operator +(DoubleWord a, DoubleWord b)
    {
        DoubleWord s = Difference(a.High, -b.High);
        DoubleWord t = Difference(a.Low, -b.Low);
        DoubleWord v = Renormalised(s.High, s.Low + t.High);
        return Renormalised(v.High, t.Low + v.Low);
    }

    public static DoubleWord operator -(DoubleWord a, DoubleWord b) => a + new DoubleWord(-b.High, -b.Low);

    public static DoubleWord operator *(DoubleWord a, DoubleWord b)
    {
        double high = a.High * b.High;
        double low = Math.FusedMultiplyAdd(a.High, b.High, -high);
        double cross = Math.FusedMultiplyAdd(a.High, b.Low, a.Low * b.High);
        return Renormalised(high, low + cross);
    }

    private static DoubleWord Renormalised(double larger, double smaller)
    {
        double sum = larger + smaller;
        return new DoubleWord(sum, smaller - (sum - larger));
    }
}
