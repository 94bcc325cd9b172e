using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// The sides wanted by the triangle of an earlier mesh that a place lies in. Every vertex knows a triangle of that mesh
/// that it lies in or on, so that a place is found by a short walk from a vertex nearby.
/// </summary>
internal sealed class SizeMap
{
    private readonly Mesh earlier;
    private readonly ImmutableArray<double> sides;
    private int[] triangles;

    /// <param name="earlier">The earlier mesh; its nodes are the first vertices.</param>
    /// <param name="sides">The longest side wanted in each of its triangles.</param>
    public SizeMap(Mesh earlier, ImmutableArray<double> sides)
    {
        this.earlier = earlier;
        this.sides = sides;
        triangles = new int[2 * earlier.Nodes.Length];
        for (int e = 0; e < earlier.Corners.Length; e++) triangles[earlier.Corners[e]] = e / 3;
    }

    /// <summary>The longest side wanted at a place near vertex v, mm.</summary>
    public double At(Point place, int v) => sides[Find(place, triangles[v])];

    /// <summary>Makes a new vertex known, which lies near a vertex known before.</summary>
    public void Add(int vertex, Point place, int near)
    {
        if (vertex >= triangles.Length) Array.Resize(ref triangles, 2 * vertex);
        triangles[vertex] = Find(place, triangles[near]);
    }

    /// <summary>
    /// Walks to the triangle that holds the place. The walk goes around corners of the outline only as far as it can
    /// without turning back, and ends in the nearest triangle met.
    /// </summary>
    private int Find(Point place, int start)
    {
        int t = start;
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
                if ((to - from).Cross(place - from) < 0)
                {
                    next = beyond;
                    break;
                }
            }
            if (next < 0) break;
            before = t;
            t = next;
        }
        return t;
    }
}
