using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// The sides wanted by the triangle of an earlier mesh that a place lies in. Every vertex knows a triangle of that mesh
/// that it lies in or on; a place is found by a walk straight to it from a corner of the triangle that it lies in now, for
/// this way stays within the section.
/// </summary>
internal sealed class SizeMap
{
    private readonly Triangulation mesh;
    private readonly Mesh earlier;
    private readonly ImmutableArray<double> sides;
    private int[] triangles;

    /// <param name="mesh">The triangulation that is refined.</param>
    /// <param name="earlier">The earlier mesh; its nodes are the first vertices.</param>
    /// <param name="sides">The longest side wanted in each of its triangles.</param>
    public SizeMap(Triangulation mesh, Mesh earlier, ImmutableArray<double> sides)
    {
        this.mesh = mesh;
        this.earlier = earlier;
        this.sides = sides;
        triangles = new int[2 * earlier.Nodes.Length];
        for (int e = 0; e < earlier.Corners.Length; e++) triangles[earlier.Corners[e]] = e / 3;
    }

    /// <summary>The longest side wanted at a place that triangle t sees from all its corners, mm.</summary>
    public double At(Point place, int t) => sides[IsKept(t) ? t : Find(place, t)];

    /// <summary>Makes the place of a new vertex known, which triangle t sees from all its corners.</summary>
    public void Add(int vertex, Point place, int t)
    {
        if (vertex >= triangles.Length) Array.Resize(ref triangles, 2 * vertex);
        triangles[vertex] = Find(place, t);
    }

    /// <summary>True if triangle t is still the one of the earlier mesh.</summary>
    private bool IsKept(int t) => t < earlier.TriangleCount
        && mesh.Corners[4 * t] == earlier.Corners[3 * t]
        && mesh.Corners[4 * t + 1] == earlier.Corners[3 * t + 1]
        && mesh.Corners[4 * t + 2] == earlier.Corners[3 * t + 2];

    private int Find(Point place, int t)
    {
        int found = -1;
        for (int e = 4 * t; e < 4 * t + 3; e++)
        {
            // A corner where separate pieces touch may know a triangle of another piece, from which no way leads here.
            found = Walk(mesh.Corners[e], place);
            if (Holds(found, place)) break;
        }
        return found;
    }

    private int Walk(int vertex, Point place)
    {
        Point start = mesh.PointAt(vertex);
        Point way = place - start;
        int t = vertex < earlier.Nodes.Length ? Facing(vertex, way) : triangles[vertex];
        int before = -1;
        for (int step = 0; step < earlier.TriangleCount; step++)
        {
            int next = -1;
            for (int e = 3 * t; e < 3 * t + 3; e++)
            {
                int beyond = earlier.Neighbours[e];
                if (beyond < 0 || beyond == before) continue;
                Point from = earlier.Nodes[MeshEdge.From(earlier, e)];
                Point to = earlier.Nodes[MeshEdge.To(earlier, e)];
                if ((to - from).Cross(place - from) >= 0) continue;
                next = beyond;
                if (way.Cross(from - start) <= 0 && way.Cross(to - start) >= 0) break;
            }
            if (next < 0) break;
            before = t;
            t = next;
        }
        return t;
    }

    /// <summary>Of the triangles around a node, the one into which a way from it leads.</summary>
    private int Facing(int node, Point way)
    {
        for (int turn = 1; turn <= 2; turn++)
        {
            int t = triangles[node];
            do
            {
                int e = 3 * t;
                while (earlier.Corners[e] != node) e++;
                Point corner = earlier.Nodes[node];
                Point first = earlier.Nodes[MeshEdge.From(earlier, e)] - corner;
                Point last = earlier.Nodes[MeshEdge.To(earlier, e)] - corner;
                if (first.Cross(way) >= 0 && way.Cross(last) >= 0) return t;

                // Across the edge opposite the next corner, or the one before, lies the next triangle about the node.
                t = earlier.Neighbours[3 * t + (e + turn) % 3];
            }
            while (t >= 0 && t != triangles[node]);
        }
        return triangles[node];
    }

    private bool Holds(int t, Point place)
    {
        for (int e = 3 * t; e < 3 * t + 3; e++)
        {
            Point from = earlier.Nodes[MeshEdge.From(earlier, e)];
            Point along = earlier.Nodes[MeshEdge.To(earlier, e)] - from;
            if (along.Cross(place - from) < 0) return false;
        }
        return true;
    }
}
