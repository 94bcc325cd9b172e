using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Checks nodes - edges + triangles, which is the count of parts less that of holes, against the same count taken from
/// the turning of the graph's outer segments (Gauss-Bonnet): a vertex where b such segments meet and the filled angles
/// add up to A contributes 1 - b / 4 - A / 2π.
/// </summary>
internal static class EulerCheck
{
    public static void AddFaults(Mesh mesh, PlanarGraph graph, ImmutableArray<MeshFault>.Builder faults)
    {
        if (OfMesh(mesh) == OfGraph(graph)) return;
        faults.Add(new MeshFault(MeshFaultKind.EulerCount, -1, graph.Points[0]));
    }

    private static int OfMesh(Mesh mesh)
    {
        var isUsed = new bool[mesh.Nodes.Length];
        int nodes = 0;
        int edges = 0;
        for (int e = 0; e < mesh.Corners.Length; e++)
        {
            if (mesh.Neighbours[e] < e / 3) edges++;
            if (isUsed[mesh.Corners[e]]) continue;
            isUsed[mesh.Corners[e]] = true;
            nodes++;
        }
        return nodes - edges + mesh.TriangleCount;
    }

    private static int OfGraph(PlanarGraph graph)
    {
        var ends = new List<End>(2 * graph.Segments.Length);
        foreach (Segment s in graph.Segments)
        {
            if (s.Left < 0 == s.Right < 0) continue;
            Point along = graph.Points[s.To] - graph.Points[s.From];
            ends.Add(new End(s.From, Math.Atan2(along.Y, along.X), s.Left >= 0));
            ends.Add(new End(s.To, Math.Atan2(-along.Y, -along.X), s.Right >= 0));
        }
        ends.Sort();
        double count = 0;
        for (int first = 0, last; first < ends.Count; first = last)
        {
            last = first + 1;
            while (last < ends.Count && ends[last].Vertex == ends[first].Vertex) last++;
            count += OfVertex(ends, first, last);
        }
        return (int)Math.Round(count);
    }

    private static double OfVertex(List<End> ends, int first, int last)
    {
        double filled = 0;
        for (int i = first; i < last; i++)
        {
            if (!ends[i].IsFilled) continue;
            filled += i + 1 < last ? ends[i + 1].Angle - ends[i].Angle : ends[first].Angle - ends[i].Angle + Math.Tau;
        }
        return 1 - 0.25 * (last - first) - filled / Math.Tau;
    }

    /// <summary>An outer segment as it leaves a vertex, and whether what lies counter-clockwise of it is filled.</summary>
    private readonly record struct End(int Vertex, double Angle, bool IsFilled) : IComparable<End>
    {
        public int CompareTo(End other) =>
            Vertex != other.Vertex ? Vertex.CompareTo(other.Vertex) : Angle.CompareTo(other.Angle);
    }
}
