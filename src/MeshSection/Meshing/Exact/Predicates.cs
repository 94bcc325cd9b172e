using System.Runtime.CompilerServices;

namespace MeshSection.Meshing;

/// <summary>
/// Orientation and in-circle tests whose sign is always right [Shewchuk1997]: plain arithmetic where its error bound
/// proves the sign, then pairs of doubles, at last exact expansions. Valid while no product overflows or underflows.
/// </summary>
internal static class Predicates
{
    /// <summary>The smallest coordinate of which four may be multiplied without underflow.</summary>
    private const double SmallestCoordinate = 1e-40;

    private const double Epsilon = 1.1102230246251565e-16;
    private const double OrientationBound = (3 + 16 * Epsilon) * Epsilon;
    private const double InCircleBound = (10 + 96 * Epsilon) * Epsilon;

    /// <summary>2^-96: a chain of ten operations, each wrong by 5 · 2^-106 at most, stays far below.</summary>
    private const double DoubleWordBound = 1.2621774483536189e-29;

    /// <summary>A coordinate for which signs are exact: what is too small counts as 0.</summary>
    public static double Sizeable(double coordinate) => Math.Abs(coordinate) < SmallestCoordinate ? 0 : coordinate;

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
        return Math.Abs(det) > InCircleBound * permanent
            ? det
            : CloseInCircle(ax, ay, bx, by, cx, cy, dx, dy, DoubleWordBound * permanent);
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
    private static double CloseInCircle(
        double ax, double ay, double bx, double by, double cx, double cy, double dx, double dy, double bound)
    {
        DoubleWord adx = DoubleWord.Difference(ax, dx);
        DoubleWord ady = DoubleWord.Difference(ay, dy);
        DoubleWord bdx = DoubleWord.Difference(bx, dx);
        DoubleWord bdy = DoubleWord.Difference(by, dy);
        DoubleWord cdx = DoubleWord.Difference(cx, dx);
        DoubleWord cdy = DoubleWord.Difference(cy, dy);
        DoubleWord det = (adx * adx + ady * ady) * (bdx * cdy - cdx * bdy)
            + (bdx * bdx + bdy * bdy) * (cdx * ady - adx * cdy)
            + (cdx * cdx + cdy * cdy) * (adx * bdy - bdx * ady);
        return Math.Abs(det.High) > bound ? det.High : ExactInCircle(ax, ay, bx, by, cx, cy, dx, dy);
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

        Span<double> parts = stackalloc double[96];
        Span<double> aLift = parts[..Lift(adx, ady, parts)];
        Span<double> bLift = parts.Slice(16, Lift(bdx, bdy, parts[16..]));
        Span<double> cLift = parts.Slice(32, Lift(cdx, cdy, parts[32..]));
        Span<double> bc = parts.Slice(48, Minor(bdx, bdy, cdx, cdy, parts[48..]));
        Span<double> ca = parts.Slice(64, Minor(cdx, cdy, adx, ady, parts[64..]));
        Span<double> ab = parts.Slice(80, Minor(adx, ady, bdx, bdy, parts[80..]));

        Span<double> a = stackalloc double[2 * aLift.Length * bc.Length];
        Span<double> b = stackalloc double[2 * bLift.Length * ca.Length];
        Span<double> c = stackalloc double[2 * cLift.Length * ab.Length];
        a = a[..Expansion.Product(aLift, bc, a)];
        b = b[..Expansion.Product(bLift, ca, b)];
        c = c[..Expansion.Product(cLift, ab, c)];
        Span<double> sum = stackalloc double[a.Length + b.Length];
        sum = sum[..Expansion.Sum(a, b, sum)];
        Span<double> det = stackalloc double[sum.Length + c.Length];
        return Expansion.Sign(det[..Expansion.Sum(sum, c, det)]);
    }

    /// <summary>x² + y²; at most 16 components.</summary>
    private static int Lift(ReadOnlySpan<double> x, ReadOnlySpan<double> y, Span<double> h)
    {
        Span<double> xx = stackalloc double[8];
        Span<double> yy = stackalloc double[8];
        xx = xx[..Expansion.Product(x, x, xx)];
        yy = yy[..Expansion.Product(y, y, yy)];
        return Expansion.Sum(xx, yy, h);
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
