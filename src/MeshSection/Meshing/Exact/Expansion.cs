namespace MeshSection.Meshing;

/// <summary>
/// Exact sums and products of doubles, kept as expansions: components that do not overlap, smallest first, without
/// zeros; the sign of the last one is the sign of the whole [Shewchuk1997].
/// </summary>
internal static class Expansion
{
    /// <summary>Writes a - b; returns the count of components, at most 2.</summary>
    public static int Difference(double a, double b, Span<double> h)
    {
        double x = a - b;
        double bVirtual = a - x;
        double aVirtual = x + bVirtual;
        return Store((a - aVirtual) + (bVirtual - b), x, h);
    }

    /// <summary>Writes e + f; returns the count of components, at most the two counts together.</summary>
    public static int Sum(ReadOnlySpan<double> e, ReadOnlySpan<double> f, Span<double> h)
    {
        if (e.Length + f.Length == 0) return 0;
        int i = 0;
        int j = 0;
        int count = 0;
        double q = Smaller(e, f, ref i, ref j);
        while (i < e.Length || j < f.Length)
        {
            q = TwoSum(q, Smaller(e, f, ref i, ref j), out double tail);
            if (tail != 0) h[count++] = tail;
        }
        if (q != 0) h[count++] = q;
        return count;
    }

    /// <summary>Writes e · f; returns the count of components, at most twice the product of the counts.</summary>
    public static int Product(ReadOnlySpan<double> e, ReadOnlySpan<double> f, Span<double> h)
    {
        Span<double> scaled = stackalloc double[2 * e.Length];
        Span<double> sum = stackalloc double[2 * e.Length * f.Length];
        int count = 0;
        foreach (double b in f)
        {
            int scaledCount = Scaled(e, b, scaled);
            int sumCount = Sum(h[..count], scaled[..scaledCount], sum);
            sum[..sumCount].CopyTo(h);
            count = sumCount;
        }
        return count;
    }

    /// <summary>The sign of the whole: that of its largest component.</summary>
    public static double Sign(ReadOnlySpan<double> e) => e.Length == 0 ? 0 : e[^1];

    public static void Negate(Span<double> e)
    {
        for (int i = 0; i < e.Length; i++) e[i] = -e[i];
    }

    private static int Scaled(ReadOnlySpan<double> e, double b, Span<double> h)
    {
        int count = 0;
        double q = 0;
        foreach (double component in e)
        {
            double product = component * b;
            double productTail = Math.FusedMultiplyAdd(component, b, -product);
            double sum = TwoSum(q, productTail, out double tail);
            if (tail != 0) h[count++] = tail;
            q = TwoSum(product, sum, out tail);
            if (tail != 0) h[count++] = tail;
        }
        if (q != 0) h[count++] = q;
        return count;
    }

    private static double Smaller(ReadOnlySpan<double> e, ReadOnlySpan<double> f, ref int i, ref int j) =>
        j == f.Length || (i < e.Length && Math.Abs(e[i]) < Math.Abs(f[j])) ? e[i++] : f[j++];

    private static double TwoSum(double a, double b, out double tail)
    {
        double x = a + b;
        double bVirtual = x - a;
        double aVirtual = x - bVirtual;
        tail = (a - aVirtual) + (b - bVirtual);
        return x;
    }

    private static int Store(double tail, double head, Span<double> h)
    {
        int count = 0;
        if (tail != 0) h[count++] = tail;
        if (head != 0) h[count++] = head;
        return count;
    }
}
