namespace MeshSection.Meshing;

/// <summary>
/// The triangles whose circles hold a new point, as far as segments let it be seen: they are collected without changing
/// anything, looked over, and then refilled with a star about the point [Bowyer1981, Watson1981].
/// </summary>
internal sealed class Cavity(Triangulation mesh)
{
    private int[] triangles = new int[64];
    private int[] pending = new int[64];
    private int[] rim = new int[256];
    private int stamp;

    /// <summary>How many edges surround the cavity; after refilling, how many triangles fill it.</summary>
    public int RimCount { get; private set; }

    private int TriangleCount { get; set; }

    /// <summary>Edge i of the rim, counter-clockwise, as the triangle inside sees it.</summary>
    public int RimEdge(int i) => rim[4 * i];

    /// <summary>Triangle i of those that fill the cavity.</summary>
    public int Triangle(int i) => triangles[i];

    /// <summary>Collects the cavity of the point (x, y) around a triangle whose circle holds it.</summary>
    public void Collect(int start, double x, double y)
    {
        int[] corners = mesh.Corners;
        int[] twins = mesh.Twins;
        int[] segments = mesh.Segments;
        stamp++;
        TriangleCount = 0;
        RimCount = 0;
        Add(start);
        int pendingCount = 0;
        pending[pendingCount++] = 4 * start + 2;
        pending[pendingCount++] = 4 * start + 1;
        pending[pendingCount++] = 4 * start;
        while (pendingCount > 0)
        {
            int e = pending[--pendingCount];
            int f = twins[e];
            int segment = segments[e];
            if (segment < 0 && segments[f | 3] == stamp) continue;
            if (segment < 0 && Contains(f >> 2, x, y))
            {
                Add(f >> 2);
                if (pendingCount + 2 > pending.Length) Array.Resize(ref pending, 2 * pending.Length);
                pending[pendingCount++] = Triangulation.Previous(f);
                pending[pendingCount++] = Triangulation.Next(f);
                continue;
            }
            int r = 4 * RimCount++;
            if (r == rim.Length) Array.Resize(ref rim, 2 * rim.Length);
            rim[r] = e;
            rim[r + 1] = f;
            rim[r + 2] = segment;
            rim[r + 3] = corners[Triangulation.Next(e)];
        }
    }

    /// <summary>Replaces the triangles of the cavity by those that join its rim to vertex p.</summary>
    public void Fill(int p)
    {
        int region = mesh.Corners[4 * triangles[0] + 3];
        while (TriangleCount < RimCount) Append(mesh.AddTriangle());

        int[] corners = mesh.Corners;
        int[] twins = mesh.Twins;
        int[] segments = mesh.Segments;
        int previous = 4 * triangles[RimCount - 1];
        for (int i = 0; i < RimCount; i++)
        {
            int b = 4 * triangles[i];
            int r = 4 * i;
            int outer = rim[r + 1];
            corners[b] = p;
            corners[b + 1] = rim[r + 3];
            corners[previous + 2] = rim[r + 3];
            corners[b + 3] = region;
            twins[b] = outer;
            if (outer >= 0) twins[outer] = b;
            segments[b] = rim[r + 2];
            segments[b + 1] = -1;
            segments[b + 2] = -1;
            twins[previous + 1] = b + 2;
            twins[b + 2] = previous + 1;
            previous = b;
        }
    }

    /// <summary>Whether the circle of triangle t holds the point; that of a ghost is the half-plane beyond its edge.</summary>
    public bool Contains(int t, double x, double y)
    {
        int[] corners = mesh.Corners;
        double[] xy = mesh.Xy;
        int a = corners[4 * t];
        int b = corners[4 * t + 1];
        int c = corners[4 * t + 2];
        if ((a | b | c) < 0) return GhostContains(a, b, c, x, y);
        return Predicates.InCircle(
            xy[2 * a], xy[2 * a + 1], xy[2 * b], xy[2 * b + 1], xy[2 * c], xy[2 * c + 1], x, y) > 0;
    }

    private bool GhostContains(int a, int b, int c, double x, double y)
    {
        if (a == Triangulation.Ghost) (a, b) = (b, c);
        else if (b == Triangulation.Ghost) (a, b) = (c, a);
        double[] xy = mesh.Xy;
        double side = Predicates.Orientation(xy[2 * a], xy[2 * a + 1], xy[2 * b], xy[2 * b + 1], x, y);
        if (side != 0) return side > 0;
        return xy[2 * a] == xy[2 * b]
            ? Math.Min(xy[2 * a + 1], xy[2 * b + 1]) < y && y < Math.Max(xy[2 * a + 1], xy[2 * b + 1])
            : Math.Min(xy[2 * a], xy[2 * b]) < x && x < Math.Max(xy[2 * a], xy[2 * b]);
    }

    private void Add(int t)
    {
        mesh.Segments[4 * t + 3] = stamp;
        Append(t);
    }

    private void Append(int t)
    {
        if (TriangleCount == triangles.Length) Array.Resize(ref triangles, 2 * triangles.Length);
        triangles[TriangleCount++] = t;
    }
}
