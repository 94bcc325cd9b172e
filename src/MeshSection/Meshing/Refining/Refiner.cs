using System.Collections.Immutable;
using System.Numerics;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Delaunay refinement [Ruppert1995, Shewchuk2002]: pieces of segments that a vertex encroaches upon are split; triangles
/// with too small an angle or too large an area get a new vertex at their circumcentre, or nearer to their shortest edge
/// where that does [Ungor2009]. A new vertex that would encroach upon a segment, or lies beyond it, splits it instead.
/// </summary>
internal sealed class Refiner
{
    /// <summary>By how much an angle may miss the bound, degrees: an input angle equal to it is not refined.</summary>
    private const double AngleSlack = 1e-6;

    /// <summary>
    /// The shortest edge that may be split, and the longest of a triangle that may be refined, in units of the largest
    /// coordinate.
    /// </summary>
    private const double LeastEdge = 1.0 / (1L << 44);

    /// <summary>The urgency of a triangle that is only too large.</summary>
    private const int BySize = 0;

    private readonly Triangulation mesh;
    private readonly ImmutableArray<Segment> segments;
    private readonly MeshSettings settings;
    private readonly Cavity cavity;
    private readonly TriangleQueue queue;
    private readonly SmallCorners smallCorners;
    private readonly WantedSides sides;
    private readonly SizeMap? map;
    private readonly double uniformSideSquared;
    private readonly bool isSizeVaried;
    private readonly double sinSquared;
    private readonly double lensCosSquared;
    private readonly double offCentre;
    private readonly double leastEdgeSquared;
    private readonly int largestExponent;
    private int[] encroached = new int[64];
    private int encroachedCount;

    /// <param name="mesh">The triangulation to refine.</param>
    /// <param name="graph">What it covers.</param>
    /// <param name="settings">What is asked of it.</param>
    /// <param name="map">What is asked of it besides, by an earlier mesh; null for nothing.</param>
    public Refiner(Triangulation mesh, PlanarGraph graph, MeshSettings settings, SizeMap? map = null)
    {
        this.mesh = mesh;
        this.settings = settings;
        this.map = map;
        sides = new WantedSides(mesh, settings, map);
        uniformSideSquared = sides.UniformSquared;
        isSizeVaried = sides.IsVaried;
        segments = graph.Segments;
        cavity = new Cavity(mesh);
        queue = new TriangleQueue(mesh);
        smallCorners = new SmallCorners(mesh, graph);

        double radians = Math.Max(0, settings.MinAngle - AngleSlack) * Math.PI / 180;
        sinSquared = Math.Sin(radians) * Math.Sin(radians);
        lensCosSquared = Math.Cos(2 * radians) * Math.Cos(2 * radians);
        offCentre = 0.5 / Math.Tan(settings.MinAngle * Math.PI / 360);
        double largest = 0;
        for (int i = 0; i < 2 * mesh.VertexCount; i++) largest = Math.Max(largest, Math.Abs(mesh.Xy[i]));
        leastEdgeSquared = largest * LeastEdge * (largest * LeastEdge);
        largestExponent = largest > 0 ? Math.ILogB(largest) * 2 + 4 : 0;
    }

    /// <summary>Refines until all is good, or no more can be done, or the limit on the number of nodes is reached.</summary>
    public void Run(CancellationToken cancellation)
    {
        ExamineAll();
        int round = 0;
        while (mesh.VertexCount < settings.MaxNodes)
        {
            if ((++round & 1023) == 0) cancellation.ThrowIfCancellationRequested();
            if (encroachedCount > 0)
            {
                int e = encroached[--encroachedCount];
                if (mesh.Segments[e] >= 0 && IsEncroached(e)) Split(e);
                continue;
            }
            int t = queue.Pop(out int urgency);
            if (t < 0) break;
            int now = Urgency(t, out int shortest, out bool isSpared);
            if (now < 0) continue;
            if (now < urgency) queue.Push(t, now);
            else if (now > BySize || !SplitLongSide(t)) Refine(t, shortest, isSpared);
        }
    }

    /// <summary>Why triangle t is not as asked for; null if it is.</summary>
    public UnrefinedCause? Complaint(int t)
    {
        int urgency = Urgency(t, out _, out bool isSpared);
        if (urgency < 0) return isSpared ? UnrefinedCause.InputAngle : null;
        return mesh.VertexCount >= settings.MaxNodes ? UnrefinedCause.NodeLimit : UnrefinedCause.LeastEdge;
    }

    /// <summary>
    /// Examines every triangle, in steps that spread over the whole section: where very many share nearly one circle, as
    /// in a polygon of 100 000 corners, each new vertex then changes few of them.
    /// </summary>
    private void ExamineAll()
    {
        int count = mesh.TriangleCount;
        long step = SpreadingStep(count);
        for (long i = 0, t = 0; i < count; i++, t = (t + step) % count) Examine((int)t);
    }

    /// <summary>Near the golden section of the count, and without a divisor in common: every triangle has its turn.</summary>
    private static long SpreadingStep(int count)
    {
        long step = (long)(0.6180339887498949 * count);
        while (BigInteger.GreatestCommonDivisor(step, count) > 1) step++;
        return step;
    }

    private void Examine(int t)
    {
        for (int e = 4 * t; e < 4 * t + 3; e++)
        {
            if (mesh.Segments[e] >= 0 && IsEncroached(e)) PushEncroached(e);
        }
        int urgency = Urgency(t, out _, out _);
        if (urgency >= 0) queue.Push(t, urgency);
    }

    /// <summary>
    /// How urgently triangle t wants refining: by the shortest edge for its angle, 0 for its size, -1 not at all.
    /// </summary>
    /// <param name="t">The triangle.</param>
    /// <param name="shortest">Its shortest edge.</param>
    /// <param name="isSpared">Whether an angle is too small and left so, for the sake of a corner of the outline.</param>
    private int Urgency(int t, out int shortest, out bool isSpared)
    {
        double[] xy = mesh.Xy;
        int[] corners = mesh.Corners;
        int b = 4 * t;
        int va = 2 * corners[b];
        int vb = 2 * corners[b + 1];
        int vc = 2 * corners[b + 2];
        double abx = xy[vb] - xy[va];
        double aby = xy[vb + 1] - xy[va + 1];
        double acx = xy[vc] - xy[va];
        double acy = xy[vc + 1] - xy[va + 1];
        double bcx = acx - abx;
        double bcy = acy - aby;
        double twiceArea = abx * acy - aby * acx;
        double aa = bcx * bcx + bcy * bcy;
        double bb = acx * acx + acy * acy;
        double cc = abx * abx + aby * aby;

        double least;
        double p;
        double q;
        if (aa <= bb && aa <= cc) (shortest, least, p, q) = (b, aa, bb, cc);
        else if (bb <= cc) (shortest, least, p, q) = (b + 1, bb, cc, aa);
        else (shortest, least, p, q) = (b + 2, cc, aa, bb);

        isSpared = false;
        if (twiceArea * twiceArea < sinSquared * p * q)
        {
            isSpared = IsSpared(shortest, twiceArea * twiceArea >= sinSquared * least * Math.Max(p, q));
            if (!isSpared) return Math.Clamp(largestExponent - Math.ILogB(least), 1, TriangleQueue.Top);
        }
        bool isTooLarge = twiceArea > 2 * settings.MaxArea
            || Math.Max(p, q) > (isSizeVaried ? sides.SquaredAt(t) : uniformSideSquared);
        return isTooLarge ? BySize : -1;
    }

    /// <summary>
    /// Whether a small angle is left as it is: it is an input angle itself, and the triangle's only small one, or lies
    /// across from one.
    /// </summary>
    private bool IsSpared(int shortest, bool isOnlyOne)
    {
        bool isInputAngle = mesh.Segments[Triangulation.Next(shortest)] >= 0
            && mesh.Segments[Triangulation.Previous(shortest)] >= 0;
        return (isInputAngle && isOnlyOne) || smallCorners.Spans(mesh.From(shortest), mesh.To(shortest));
    }

    /// <summary>
    /// Whether the corner opposite the segment's edge e lies in its lens, so that their triangle has a small angle.
    /// </summary>
    private bool IsEncroached(int e)
    {
        Point apex = mesh.PointAt(mesh.Corners[e]);
        Point u = mesh.PointAt(mesh.From(e)) - apex;
        Point v = mesh.PointAt(mesh.To(e)) - apex;
        double dot = u.Dot(v);
        return dot < 0 && dot * dot > lensCosSquared * u.Dot(u) * v.Dot(v);
    }

    private void Refine(int t, int shortest, bool isSpared)
    {
        if (IsTiny(shortest)) return;
        Point place = NewPlace(shortest, isSpared);
        if (!cavity.Contains(t, place.X, place.Y)) return;
        cavity.Collect(t, place.X, place.Y);
        int blocking = Blocking(place);
        if (blocking >= 0)
        {
            if (Split(blocking)) PushAgain(t);
            return;
        }
        cavity.Fill(AddVertex(place, -1, t));
        for (int i = 0; i < cavity.RimCount; i++) Examine(cavity.Triangle(i));
    }

    /// <summary>Whether no edge of a triangle is long enough for the digits of the coordinates.</summary>
    private bool IsTiny(int shortest) => LengthSquared(shortest) < leastEdgeSquared
        && LengthSquared(Triangulation.Next(shortest)) < leastEdgeSquared
        && LengthSquared(Triangulation.Previous(shortest)) < leastEdgeSquared;

    private int AddVertex(Point place, int home, int t)
    {
        map?.Add(place, t);
        return mesh.AddVertex(place.X, place.Y, home);
    }

    /// <summary>Halves the longest side of triangle t if it is too long and lies on a segment.</summary>
    private bool SplitLongSide(int t)
    {
        int longest = 4 * t;
        for (int e = longest + 1; e < 4 * t + 3; e++)
        {
            if (LengthSquared(e) > LengthSquared(longest)) longest = e;
        }
        if (mesh.Segments[longest] < 0) return false;
        if (LengthSquared(longest) <= (isSizeVaried ? sides.SquaredAt(t) : uniformSideSquared)) return false;
        return Split(longest);
    }

    private double LengthSquared(int e)
    {
        Point along = mesh.PointAt(mesh.To(e)) - mesh.PointAt(mesh.From(e));
        return along.Dot(along);
    }

    private void PushAgain(int t)
    {
        int urgency = Urgency(t, out _, out _);
        if (urgency >= 0) queue.Push(t, urgency);
    }

    /// <summary>
    /// Where a triangle gets its new vertex: at its circumcentre, or where that and its shortest edge would make another
    /// small angle, nearer to the edge.
    /// </summary>
    private Point NewPlace(int shortest, bool isSpared)
    {
        Point p = mesh.PointAt(mesh.From(shortest));
        Point q = mesh.PointAt(mesh.To(shortest)) - p;
        Point r = mesh.PointAt(mesh.Corners[shortest]) - p;
        double qq = q.Dot(q);
        Point centre = (1 / (2 * q.Cross(r))) * (qq * -r.Left() + r.Dot(r) * q.Left());
        if (isSpared) return p + centre;
        Point off = 0.5 * q + offCentre * q.Left();
        return p + (off.Dot(off) < centre.Dot(centre) ? off : centre);
    }

    /// <summary>An edge of the rim on a segment that the point encroaches upon or lies beyond; -1 if there is none.</summary>
    private int Blocking(Point point)
    {
        int found = -1;
        for (int i = 0; i < cavity.RimCount; i++)
        {
            int e = cavity.RimEdge(i);
            if (mesh.Segments[e] < 0) continue;
            Point u = mesh.PointAt(mesh.From(e));
            Point v = mesh.PointAt(mesh.To(e));
            if (Predicates.Orientation(u.X, u.Y, v.X, v.Y, point.X, point.Y) <= 0) return e;
            if ((u - point).Dot(v - point) < 0) found = e;
        }
        return found;
    }

    /// <summary>Splits a segment's edge, unless the pieces would be too short for the digits of the coordinates.</summary>
    private bool Split(int e)
    {
        int s = mesh.Segments[e];
        int u = mesh.From(e);
        int v = mesh.To(e);
        Point along = mesh.PointAt(v) - mesh.PointAt(u);
        if (along.Dot(along) < leastEdgeSquared) return false;
        Point place = OnSegment(s, mesh.PointAt(u) + SplitFraction(s, u, v, along.Length) * along);
        int f = mesh.Twins[e];
        if (!IsBetween(e, place) || (f >= 0 && !IsBetween(f, place))) return false;

        int first = mesh.SplitEdge(e, AddVertex(place, s, e >> 2));
        int around = first;
        do
        {
            Examine(around >> 2);
            around = mesh.Turn(around);
        }
        while (around >= 0 && around != first);
        return true;
    }

    private double SplitFraction(int s, int u, int v, double length)
    {
        bool atU = smallCorners.Has(s, u);
        bool atV = smallCorners.Has(s, v);
        if (!atU && !atV) return 0.5;
        double fraction = SmallCorners.Radius(length) / length;
        return atU && (!atV || u < v) ? fraction : 1 - fraction;
    }

    /// <summary>The point of the whole segment nearest to the one given: rounding does not add up from split to split.</summary>
    private Point OnSegment(int s, Point point)
    {
        Point a = mesh.PointAt(segments[s].From);
        Point b = mesh.PointAt(segments[s].To);
        Point along = b - a;
        double fraction = (point - a).Dot(along) / along.Dot(along);
        return fraction < 0.5 ? a + fraction * along : b + ((point - b).Dot(along) / along.Dot(along)) * along;
    }

    /// <summary>Whether the triangle left of e can be split at a point of e, which rounding has moved a little.</summary>
    private bool IsBetween(int e, Point place)
    {
        Point u = mesh.PointAt(mesh.From(e));
        Point v = mesh.PointAt(mesh.To(e));
        Point apex = mesh.PointAt(mesh.Corners[e]);
        return Predicates.Orientation(u.X, u.Y, place.X, place.Y, apex.X, apex.Y) > 0
            && Predicates.Orientation(place.X, place.Y, v.X, v.Y, apex.X, apex.Y) > 0;
    }

    private void PushEncroached(int e)
    {
        if (encroachedCount == encroached.Length) Array.Resize(ref encroached, 2 * encroachedCount);
        encroached[encroachedCount++] = e;
    }
}
