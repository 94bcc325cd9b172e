using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// The Delaunay triangulation of points known beforehand: they are inserted in rounds along a Hilbert curve, each found
/// by a walk from the one before; ghost triangles outside the hull make the hull exact.
/// </summary>
internal sealed class PointInsertion
{
    private readonly Triangulation mesh;
    private readonly Cavity cavity;
    private int last;

    private PointInsertion(Triangulation mesh)
    {
        this.mesh = mesh;
        cavity = new Cavity(mesh);
    }

    /// <summary>Triangulates the vertices of the mesh, which has no triangles yet.</summary>
    /// <returns>False if all vertices are collinear, so that there is no triangle.</returns>
    /// <exception cref="ArgumentException">Two points are alike.</exception>
    public static bool Run(Triangulation mesh, CancellationToken cancellation)
    {
        int[] order = HilbertOrder.InRounds(mesh.Xy, mesh.VertexCount);
        var insertion = new PointInsertion(mesh);
        if (!insertion.Start(order)) return false;
        for (int i = 3; i < order.Length; i++)
        {
            if ((i & 1023) == 0) cancellation.ThrowIfCancellationRequested();
            insertion.Insert(order[i]);
        }
        return true;
    }

    /// <summary>Makes the first triangle, and brings its corners to the front of the order.</summary>
    private bool Start(int[] order)
    {
        if (order.Length > 1) RefuseAlike(order[0], order[1]);
        for (int i = 2; i < order.Length; i++)
        {
            double turn = mesh.Orientation(order[0], order[1], order[i]);
            if (turn == 0) continue;
            (order[2], order[i]) = (order[i], order[2]);
            if (turn > 0) AddFirst(order[0], order[1], order[2]);
            else AddFirst(order[1], order[0], order[2]);
            return true;
        }
        return false;
    }

    private void AddFirst(int a, int b, int c)
    {
        int t = 4 * mesh.AddTriangle();
        mesh.SetCorners(t >> 2, a, b, c);
        for (int k = 0; k < 3; k++)
        {
            int ghost = mesh.AddTriangle();
            mesh.SetCorners(ghost, Triangulation.Ghost, mesh.To(t + k), mesh.From(t + k));
            mesh.Link(t + k, 4 * ghost);
        }
        for (int k = 0; k < 3; k++)
        {
            int ghost = mesh.Twins[t + k];
            int next = mesh.Twins[Triangulation.Next(t + k)];
            mesh.Link(ghost + 2, next + 1);
        }
        last = t >> 2;
    }

    private void Insert(int v)
    {
        double x = mesh.Xy[2 * v];
        double y = mesh.Xy[2 * v + 1];
        int t = Locate(x, y);
        for (int e = 4 * t; e < 4 * t + 3; e++)
        {
            if (mesh.Corners[e] != Triangulation.Ghost) RefuseAlike(mesh.Corners[e], v);
        }
        cavity.Collect(t, x, y);
        cavity.Fill(v);
        int i = 0;
        while (IsGhost(cavity.Triangle(i))) i++;
        last = cavity.Triangle(i);
    }

    /// <summary>
    /// The triangle that holds the point, or a ghost beyond whose edge it lies. In a Delaunay triangulation no walk comes
    /// by a triangle twice [DevillersPionTeillaud2002].
    /// </summary>
    private int Locate(double x, double y)
    {
        int entered = -1;
        int b = 4 * last;
        for (int step = 0; step <= mesh.TriangleCount; step++)
        {
            int exit = -1;
            for (int e = b; e < b + 3 && exit < 0; e++)
            {
                if (e != entered && IsRightOf(e, x, y)) exit = e;
            }
            if (exit < 0) return b >> 2;
            entered = mesh.Twins[exit];
            b = entered & ~3;
            if (IsGhost(b >> 2)) return b >> 2;
        }
        throw new InvalidOperationException("A walk through the triangulation does not end: the signs are not exact.");
    }

    private bool IsRightOf(int e, double x, double y)
    {
        double[] xy = mesh.Xy;
        int u = mesh.From(e);
        int v = mesh.To(e);
        return Predicates.Orientation(xy[2 * u], xy[2 * u + 1], xy[2 * v], xy[2 * v + 1], x, y) < 0;
    }

    private bool IsGhost(int t)
    {
        int b = 4 * t;
        return (mesh.Corners[b] | mesh.Corners[b + 1] | mesh.Corners[b + 2]) < 0;
    }

    private void RefuseAlike(int v, int w)
    {
        Point point = mesh.PointAt(v);
        if (mesh.PointAt(w) != point) return;
        throw new ArgumentException($"Points {Math.Min(v, w)} and {Math.Max(v, w)} of the graph are alike, at {point}.");
    }
}
