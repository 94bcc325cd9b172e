using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// The growing triangulation, in flat arrays of four slots a triangle. Edge e = 4t + k (k = 0, 1, 2) is the edge of
/// triangle t opposite its corner k, with t on its left; the fourth slot of each array holds a figure of the triangle.
/// </summary>
internal sealed class Triangulation
{
    /// <summary>The corner at infinity of the triangles outside the hull, while points are being inserted.</summary>
    public const int Ghost = -1;

    /// <summary>A region that is not known yet.</summary>
    public const int Unassigned = -2;

    /// <summary>The queue link of a triangle that waits in no queue.</summary>
    public const int NotQueued = -2;

    private int[] pending = new int[64];
    private int pendingCount;

    public Triangulation(int vertexCapacity, int triangleCapacity)
    {
        Xy = new double[2 * vertexCapacity];
        Home = new int[vertexCapacity];
        Corners = GC.AllocateUninitializedArray<int>(4 * triangleCapacity);
        Twins = GC.AllocateUninitializedArray<int>(4 * triangleCapacity);
        Segments = GC.AllocateUninitializedArray<int>(4 * triangleCapacity);
    }

    /// <summary>Coordinates, x of vertex v at 2v and y at 2v + 1.</summary>
    public double[] Xy { get; private set; }

    /// <summary>The segment inside which each vertex lies, or -1 for a given point or one off all segments.</summary>
    public int[] Home { get; private set; }

    /// <summary>Corner k of triangle t at 4t + k, counter-clockwise; its region at 4t + 3.</summary>
    public int[] Corners { get; private set; }

    /// <summary>The same edge as the triangle beyond sees it, or -1; at 4t + 3 the link of the queue.</summary>
    public int[] Twins { get; private set; }

    /// <summary>The segment on which the edge lies, or -1; at 4t + 3 the stamp of the last cavity it was part of.</summary>
    public int[] Segments { get; private set; }

    public int VertexCount { get; private set; }

    public int TriangleCount { get; private set; }

    public static int Next(int e) => (e & 3) == 2 ? e - 2 : e + 1;

    public static int Previous(int e) => (e & 3) == 0 ? e + 2 : e - 1;

    public int From(int e) => Corners[Next(e)];

    public int To(int e) => Corners[Previous(e)];

    public Point PointAt(int v) => new(Xy[2 * v], Xy[2 * v + 1]);

    public Point CentreOf(int t) =>
        (PointAt(Corners[4 * t]) + PointAt(Corners[4 * t + 1]) + PointAt(Corners[4 * t + 2])) / 3;

    /// <summary>Adds a vertex that was given, not made.</summary>
    public int AddGiven(Point point) => AddVertex(Predicates.Sizeable(point.X), Predicates.Sizeable(point.Y), -1);

    public int AddVertex(double x, double y, int home)
    {
        int v = VertexCount++;
        if (v == Home.Length)
        {
            Home = Grown(Home, v);
            Xy = Grown(Xy, 2 * v, 2 * Home.Length);
        }
        Xy[2 * v] = x;
        Xy[2 * v + 1] = y;
        Home[v] = home;
        return v;
    }

    /// <summary>Adds an unlinked triangle and returns its index.</summary>
    public int AddTriangle()
    {
        int t = TriangleCount++;
        int b = 4 * t;
        if (b == Corners.Length)
        {
            Corners = Grown(Corners, b);
            Twins = Grown(Twins, b, Corners.Length);
            Segments = Grown(Segments, b, Corners.Length);
        }
        Corners[b + 3] = Unassigned;
        Twins[b + 3] = NotQueued;
        Segments[b] = -1;
        Segments[b + 1] = -1;
        Segments[b + 2] = -1;
        Segments[b + 3] = 0;
        return t;
    }

    public void SetCorners(int t, int a, int b, int c)
    {
        Corners[4 * t] = a;
        Corners[4 * t + 1] = b;
        Corners[4 * t + 2] = c;
    }

    public void Link(int e, int f)
    {
        Twins[e] = f;
        if (f >= 0) Twins[f] = e;
    }

    public double Orientation(int a, int b, int c) => Predicates.Orientation(
        Xy[2 * a], Xy[2 * a + 1], Xy[2 * b], Xy[2 * b + 1], Xy[2 * c], Xy[2 * c + 1]);

    public double InCircle(int a, int b, int c, int d) => Predicates.InCircle(
        Xy[2 * a], Xy[2 * a + 1], Xy[2 * b], Xy[2 * b + 1], Xy[2 * c], Xy[2 * c + 1], Xy[2 * d], Xy[2 * d + 1]);

    /// <summary>
    /// Splits the segment's edge e at vertex p, which lies on it but for rounding, and restores the Delaunay property.
    /// Every triangle that changed has p as a corner afterwards.
    /// </summary>
    /// <returns>The edge opposite p in the triangle from which turning about p meets all others.</returns>
    public int SplitEdge(int e, int p)
    {
        int f = Twins[e];
        int first = SplitSide(e, p);
        if (f >= 0)
        {
            int other = SplitSide(f, p);
            Link(e, Previous(other));
            Link(f, Previous(first));
        }
        Legalise();
        return first;
    }

    /// <summary>The edge opposite p in the triangle that follows counter-clockwise about p, or -1 at the boundary.</summary>
    public int Turn(int e)
    {
        int twin = Twins[Next(e)];
        return twin < 0 ? -1 : Next(twin);
    }

    /// <summary>Keeps the first triangles only.</summary>
    public void Truncate(int triangleCount) => TriangleCount = triangleCount;

    private static T[] Grown<T>(T[] old, int used) => Grown(old, used, checked((used + used / 2 + 64) & ~3));

    private static T[] Grown<T>(T[] old, int used, int length)
    {
        T[] grown = GC.AllocateUninitializedArray<T>(length);
        Array.Copy(old, grown, used);
        return grown;
    }

    /// <summary>
    /// Makes (c, u, p) and (c, p, v) of the triangle with apex c over the edge e from u to v, and marks their edges
    /// opposite p for legalising; returns that of the second.
    /// </summary>
    private int SplitSide(int e, int p)
    {
        int next = Next(e);
        int previous = Previous(e);
        int t = AddTriangle();
        int b = 4 * t;
        SetCorners(t, Corners[e], p, Corners[previous]);
        Corners[b + 3] = Corners[(e & ~3) + 3];
        Twins[b] = -1;
        Segments[b] = Segments[e];
        Link(b + 1, Twins[next]);
        Segments[b + 1] = Segments[next];

        Corners[previous] = p;
        Twins[e] = -1;
        Link(next, b + 2);
        Segments[next] = -1;
        Push(previous);
        Push(b + 1);
        return b + 1;
    }

    private void Push(int e)
    {
        if (pendingCount == pending.Length) pending = Grown(pending, pendingCount);
        pending[pendingCount++] = e;
    }

    /// <summary>
    /// Flips the pending edges, each opposite a new vertex, and those that come into their place, until all are locally
    /// Delaunay.
    /// </summary>
    private void Legalise()
    {
        while (pendingCount > 0)
        {
            int e = pending[--pendingCount];
            int f = Twins[e];
            if (f < 0 || Segments[e] >= 0) continue;
            if (InCircle(Corners[e], From(e), To(e), Corners[f]) <= 0) continue;

            Flip(e, f);
            Push(e);
            Push(Previous(f));
        }
    }

    private void Flip(int e, int f)
    {
        int ne = Next(e);
        int nf = Next(f);
        Corners[Previous(e)] = Corners[f];
        Corners[Previous(f)] = Corners[e];
        Link(e, Twins[nf]);
        Segments[e] = Segments[nf];
        Link(f, Twins[ne]);
        Segments[f] = Segments[ne];
        Link(ne, nf);
        Segments[ne] = -1;
        Segments[nf] = -1;
    }
}
