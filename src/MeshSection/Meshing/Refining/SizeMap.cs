using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// The sides wanted by the triangle of an earlier mesh that a place lies in. Every new vertex knows the triangle of that
/// mesh that it lies in, so that a place is found by a short walk.
/// </summary>
/// <remarks>
/// A triangle that is not of the earlier mesh has a new vertex. From it, or from within a triangle that is, a straight way
/// to a place that the triangle sees stays within the section, however many corners this has.
/// </remarks>
internal sealed class SizeMap
{
    private readonly Triangulation mesh;
    private readonly Mesh earlier;
    private readonly ImmutableArray<double> sides;
    private readonly List<int> triangles = [];

    /// <param name="mesh">The triangulation that is refined.</param>
    /// <param name="earlier">The earlier mesh; its nodes are the first vertices, its triangles the first triangles.</param>
    /// <param name="sides">The longest side wanted in each of its triangles.</param>
    public SizeMap(Triangulation mesh, Mesh earlier, ImmutableArray<double> sides)
    {
        this.mesh = mesh;
        this.earlier = earlier;
        this.sides = sides;
    }

    /// <summary>The longest side wanted at the centre of triangle t, mm.</summary>
    public double At(Point centre, int t) => sides[IsKept(t) ? t : Find(centre, t)];

    /// <summary>Makes the place of the next new vertex known, which triangle t sees.</summary>
    public void Add(Point place, int t) => triangles.Add(Find(place, t));

    /// <summary>True if triangle t is still the one of the earlier mesh.</summary>
    private bool IsKept(int t) => t < earlier.TriangleCount
        && mesh.Corners[4 * t] == earlier.Corners[3 * t]
        && mesh.Corners[4 * t + 1] == earlier.Corners[3 * t + 1]
        && mesh.Corners[4 * t + 2] == earlier.Corners[3 * t + 2];

    private int Find(Point place, int t)
    {
        if (IsKept(t)) return Walk(mesh.CentreOf(t), t, place);
        int newest = Math.Max(mesh.Corners[4 * t], Math.Max(mesh.Corners[4 * t + 1], mesh.Corners[4 * t + 2]));
        return Walk(mesh.PointAt(newest), triangles[newest - earlier.Nodes.Length], place);
    }

    /// <summary>Follows the straight way from a point in triangle t to a place.</summary>
    private int Walk(Point start, int t, Point place)
    {
        Point way = place - start;
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
}
