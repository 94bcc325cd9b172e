using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>The edge of a triangle opposite one of its corners, counted as the arrays of <see cref="Mesh"/> are.</summary>
internal static class MeshEdge
{
    /// <summary>The node where edge e begins, with its triangle on the left.</summary>
    public static int From(Mesh mesh, int e) => mesh.Corners[e - e % 3 + (e + 1) % 3];

    /// <summary>The node where edge e ends.</summary>
    public static int To(Mesh mesh, int e) => mesh.Corners[e - e % 3 + (e + 2) % 3];

    /// <summary>The place, 0 to 2, of a triangle's edge to its neighbour; that which begins at the node, if it has several.</summary>
    public static int SideTo(Mesh mesh, int triangle, int neighbour, int from)
    {
        int e = 3 * triangle;
        while (mesh.Neighbours[e] != neighbour || From(mesh, e) != from) e++;
        return e - 3 * triangle;
    }

    /// <summary>
    /// 1 if edge e runs with the segment, -1 if against it, 0 if its triangle is not of the region on that side.
    /// </summary>
    public static int Along(Mesh mesh, Segment segment, int e)
    {
        Point edge = mesh.Nodes[To(mesh, e)] - mesh.Nodes[From(mesh, e)];
        bool isWith = edge.Dot(mesh.Nodes[segment.To] - mesh.Nodes[segment.From]) > 0;
        if (mesh.Regions[e / 3] != (isWith ? segment.Left : segment.Right)) return 0;
        return isWith ? 1 : -1;
    }
}
