using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>Turns a finished mesh back into a triangulation that can be refined: nodes and triangles keep their numbers.</summary>
internal static class MeshReopening
{
    public static Triangulation Run(Mesh mesh, PlanarGraph graph)
    {
        int count = mesh.TriangleCount;
        var opened = new Triangulation(mesh.Nodes.Length + mesh.Nodes.Length / 4 + 16, count + count / 4 + 64);
        foreach (Point node in mesh.Nodes) opened.AddGiven(node);
        for (int t = 0; t < count; t++)
        {
            opened.AddTriangle();
            opened.SetCorners(t, mesh.Corners[3 * t], mesh.Corners[3 * t + 1], mesh.Corners[3 * t + 2]);
            opened.Corners[4 * t + 3] = mesh.Regions[t];
        }
        for (int e = 0; e < 3 * count; e++)
        {
            int neighbour = mesh.Neighbours[e];
            int to = 4 * (e / 3) + e % 3;
            opened.Twins[to] = neighbour < 0 ? -1 : 4 * neighbour + MeshEdge.SideTo(mesh, neighbour, e / 3, MeshEdge.To(mesh, e));
            opened.Segments[to] = mesh.Segments[e];
            if (mesh.Segments[e] >= 0) SetHome(opened, graph.Segments[mesh.Segments[e]], mesh.Segments[e], to);
        }
        return opened;
    }

    /// <summary>Every vertex inside a segment ends an edge along it, seen from either side.</summary>
    private static void SetHome(Triangulation opened, Segment segment, int s, int e)
    {
        int to = opened.To(e);
        if (to != segment.From && to != segment.To) opened.Home[to] = s;
    }
}
