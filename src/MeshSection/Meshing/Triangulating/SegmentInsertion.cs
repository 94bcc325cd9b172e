using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Puts the segments into a Delaunay triangulation: the triangles that a segment crosses are taken out, and the hollow
/// on either side of it is filled with constrained Delaunay triangles. Exact, and sure to end.
/// </summary>
internal sealed class SegmentInsertion
{
    private readonly Triangulation mesh;
    private readonly ImmutableArray<Segment> segments;

    /// <summary>An edge opposite each vertex.</summary>
    private readonly int[] starts;

    private readonly List<int> crossed = [];
    private readonly Hollow left;
    private readonly Hollow right;

    private SegmentInsertion(Triangulation mesh, ImmutableArray<Segment> segments)
    {
        this.mesh = mesh;
        this.segments = segments;
        starts = new int[mesh.VertexCount];
        left = new Hollow(mesh);
        right = new Hollow(mesh);
        for (int t = 0; t < mesh.TriangleCount; t++)
        {
            for (int e = 4 * t; e < 4 * t + 3; e++)
            {
                if (mesh.Corners[e] != Triangulation.Ghost) starts[mesh.Corners[e]] = e;
            }
        }
    }

    /// <exception cref="MeshingException">Two segments cross, or a point lies on a segment it does not belong to.</exception>
    public static void Run(Triangulation mesh, ImmutableArray<Segment> segments, CancellationToken cancellation)
    {
        var insertion = new SegmentInsertion(mesh, segments);
        for (int s = 0; s < segments.Length; s++)
        {
            if ((s & 1023) == 0) cancellation.ThrowIfCancellationRequested();
            insertion.Insert(s);
        }
    }

    private void Insert(int s)
    {
        int a = segments[s].From;
        int b = segments[s].To;
        int e = Leave(s, a, b);
        if (mesh.From(e) == a) Mark(e, s);
        else Cross(s, a, b, e);
    }

    /// <summary>The edge a → b if there is one, or else the edge opposite a that the segment crosses first.</summary>
    private int Leave(int s, int a, int b)
    {
        int e = starts[a];
        for (int step = 0; step <= mesh.TriangleCount; step++)
        {
            int u = mesh.From(e);
            int v = mesh.To(e);
            if (u == b) return Triangulation.Previous(e);
            if (u != Triangulation.Ghost)
            {
                double side = mesh.Orientation(a, u, b);
                if (side == 0 && IsAhead(a, u, b)) throw new MeshingException(s, -1, mesh.PointAt(u));
                if (side > 0 && v != Triangulation.Ghost && v != b && mesh.Orientation(a, v, b) < 0) return e;
            }
            e = mesh.Turn(e);
        }
        throw Endless();
    }

    /// <summary>With exact signs neither the turn about a vertex nor the way along a segment comes by a triangle twice.</summary>
    private static InvalidOperationException Endless() =>
        new("A search through the triangulation does not end: the signs are not exact.");

    private bool IsAhead(int a, int u, int b) =>
        (mesh.PointAt(u) - mesh.PointAt(a)).Dot(mesh.PointAt(b) - mesh.PointAt(a)) > 0;

    /// <summary>Takes out the triangles from edge e to b, and fills the hollow on either side of the segment.</summary>
    private void Cross(int s, int a, int b, int e)
    {
        crossed.Clear();
        crossed.Add(e >> 2);
        left.Begin(a);
        right.Begin(a);
        left.Add(mesh.To(e), Triangulation.Next(e));
        right.Add(mesh.From(e), Triangulation.Previous(e));
        while (true)
        {
            if (crossed.Count > mesh.TriangleCount) throw Endless();
            if (mesh.Segments[e] >= 0) throw Crossing(s, mesh.Segments[e]);
            int f = mesh.Twins[e];
            int next = Triangulation.Next(f);
            int previous = Triangulation.Previous(f);
            int d = mesh.Corners[f];
            crossed.Add(f >> 2);
            double side = d == b ? 0 : mesh.Orientation(a, b, d);
            if (side == 0 && d != b) throw new MeshingException(s, -1, mesh.PointAt(d));
            if (side >= 0) left.Add(d, previous);
            if (side <= 0) right.Add(d, next);
            if (d == b) break;
            e = side > 0 ? next : previous;
        }
        right.Reverse();
        left.Detach();
        right.Detach();
        int onLeft = left.Fill(crossed, starts);
        int onRight = right.Fill(crossed, starts);
        mesh.Link(onLeft, onRight);
        Mark(onLeft, s);
    }

    private void Mark(int e, int s)
    {
        if (mesh.Segments[e] >= 0) throw Crossing(s, mesh.Segments[e]);
        mesh.Segments[e] = s;
        mesh.Segments[mesh.Twins[e]] = s;
    }

    private MeshingException Crossing(int s, int other)
    {
        Point a = mesh.PointAt(segments[s].From);
        Point d = mesh.PointAt(segments[s].To) - a;
        Point c = mesh.PointAt(segments[other].From);
        Point g = mesh.PointAt(segments[other].To) - c;
        double turn = d.Cross(g);
        Point place = turn == 0 ? a + 0.5 * d : a + ((c - a).Cross(g) / turn) * d;
        return new MeshingException(Math.Min(s, other), Math.Max(s, other), place);
    }
}
