using System.Runtime.CompilerServices;

namespace MeshSection.Meshing;

/// <summary>
/// Orientation and in-circle tests whose sign is always right [Shewchuk1997]: plain arithmetic where its error bound
/// proves the sign, exact expansions elsewhere. Valid while no product overflows or underflows.
/// </summary>
internal static class Predicates
{
    private const double Epsilon = 1.1102230246251565e-16;
    private const double OrientationBound = (3 + 16 * Epsilon) * Epsilon;
    private const double InCircleBound = (10 + 96 * Epsilon) * Epsilon;

    /// <summary>Positive if a, b, c turn counter-clockwise, negative if clockwise, zero if they are collinear.</summary>
    public static double Orientation(double ax, double ay, double bx, double by, double cx, double cy)
    {
        double left = (ax - cx) * (by - cy);
        double right = (ay - cy) * (bx - cx);
        double det = left - right;
        double permanent = Math.Abs(left) + Math.Abs(right);
        return Math.Abs(det) > OrientationBound * permanent ? det : ExactOrientation(ax, ay, bx, by, cx, cy);
    }

    /// <summary>
    /// Positive if d lies inside the circle through a, b, c (counter-clockwise), negative if outside, zero if on it.
    /// </summary>
    public static double InCircle(
        double ax, double ay, double bx, double by, double cx, double cy, double dx, double dy)
    {
        double adx = ax - dx;
        double ady = ay - dy;
        double bdx = bx - dx;
        double bdy = by - dy;
        double cdx = cx - dx;
        double cdy = cy - dy;

        double bc = bdx * cdy;
        double cb = cdx * bdy;
        double ca = cdx * ady;
        double ac = adx * cdy;
        double ab = adx * bdy;
        double ba = bdx * ady;
        double aLift = adx * adx + ady * ady;
        double bLift = bdx * bdx + bdy * bdy;
        double cLift = cdx * cdx + cdy * cdy;

        double det = aLift * (bc - cb) + bLift * (ca - ac) + cLift * (ab - ba);
        double permanent = (Math.Abs(bc) + Math.Abs(cb)) * aLift
            + (Math.Abs(ca) + Math.Abs(ac)) * bLift
            + (Math.Abs(ab) + Math.Abs(ba)) * cLift;
        return Math.Abs(det) > InCircleBound * permanent ? det : ExactInCircle(ax, ay, bx, by, cx, cy, dx, dy);
    }

    [MethodImpl(MethodImplOptions.NoInlining)]
    private static double ExactOrientation(double ax, double ay, double bx, double by, double cx, double cy)
    {
        Span<double> buffer = stackalloc double[8];
        Span<double> acx = buffer[..Expansion.Difference(ax, cx, buffer)];
        Span<double> acy = buffer.Slice(2, Expansion.Difference(ay, cy, buffer[2..]));
        Span<double> bcx = buffer.Slice(4, Expansion.Difference(bx, cx, buffer[4..]));
        Span<double> bcy = buffer.Slice(6, Expansion.Difference(by, cy, buffer[6..]));
        Span<double> minor = stackalloc double[16];
        return Expansion.Sign(minor[..Minor(acx, acy, bcx, bcy, minor)]);
    }

    [MethodImpl(MethodImplOptions.NoInlining)]
    private static double ExactInCircle(
        double ax, double ay, double bx, double by, double cx, double cy, double dx, double dy)
    {
        Span<double> buffer = stackalloc double[12];
        Span<double> adx = buffer[..Expansion.Difference(ax, dx, buffer)];
        Span<double> ady = buffer.Slice(2, Expansion.Difference(ay, dy, buffer[2..]));
        Span<double> bdx = buffer.Slice(4, Expansion.Difference(bx, dx, buffer[4..]));
        Span<double> bdy = buffer.Slice(6, Expansion.Difference(by, dy, buffer[6..]));
        Span<double> cdx = buffer.Slice(8, Expansion.Difference(cx, dx, buffer[8..]));
        Span<double> cdy = buffer.Slice(10, Expansion.Difference(cy, dy, buffer[10..]));

        Span<double> first = stackalloc double[512];
        Span<double> second = stackalloc double[512];
        Span<double> sum = stackalloc double[1024];
        int firstCount = LiftedMinor(adx, ady, bdx, bdy, cdx, cdy, first);
        int secondCount = LiftedMinor(bdx, bdy, cdx, cdy, adx, ady, second);
        int sumCount = Expansion.Sum(first[..firstCount], second[..secondCount], sum);
        firstCount = LiftedMinor(cdx, cdy, adx, ady, bdx, bdy, first);
        Span<double> det = stackalloc double[1536];
        return Expansion.Sign(det[..Expansion.Sum(sum[..sumCount], first[..firstCount], det)]);
    }

    /// <summary>(x² + y²) (u·w − v·z) for vectors (x, y), (u, v), (z, w); at most 512 components.</summary>
    private static int LiftedMinor(
        ReadOnlySpan<double> x,
        ReadOnlySpan<double> y,
        ReadOnlySpan<double> u,
        ReadOnlySpan<double> v,
        ReadOnlySpan<double> z,
        ReadOnlySpan<double> w,
        Span<double> h)
    {
        Span<double> xx = stackalloc double[8];
        Span<double> yy = stackalloc double[8];
        Span<double> lift = stackalloc double[16];
        Span<double> minor = stackalloc double[16];
        xx = xx[..Expansion.Product(x, x, xx)];
        yy = yy[..Expansion.Product(y, y, yy)];
        lift = lift[..Expansion.Sum(xx, yy, lift)];
        minor = minor[..Minor(u, v, z, w, minor)];
        return Expansion.Product(lift, minor, h);
    }

    /// <summary>u·w − v·z; at most 16 components.</summary>
    private static int Minor(
        ReadOnlySpan<double> u, ReadOnlySpan<double> v, ReadOnlySpan<double> z, ReadOnlySpan<double> w, Span<double> h)
    {
        Span<double> uw = stackalloc double[8];
        Span<double> vz = stackalloc double[8];
        uw = uw[..Expansion.Product(u, w, uw)];
        vz = vz[..Expansion.Product(v, z, vz)];
        Expansion.Negate(vz);
        return Expansion.Sum(uw, vz, h);
    }
}
