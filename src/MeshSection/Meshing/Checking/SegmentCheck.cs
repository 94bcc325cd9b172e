using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Checks that each segment beside a region is, on each side that has one, a chain of edges from its start to its end:
/// edges in the segment's order whose ends lie on it as nearly as the digits of the coordinates allow.
/// </summary>
internal static class SegmentCheck
{
    public static void AddFaults(Mesh mesh, PlanarGraph graph, ImmutableArray<MeshFault>.Builder faults)
    {
        int sides = 2 * graph.Segments.Length;
        double resolution = Digits.Resolution(graph);
        int[] starts = CountBySide(mesh, graph, sides);
        var edges = new int[starts[sides]];
        var next = (int[])starts.Clone();
        for (int e = 0; e < mesh.Segments.Length; e++)
        {
            if (mesh.Segments[e] >= 0) edges[next[SideOf(mesh, graph, e)]++] = e;
        }
        for (int side = 0; side < sides; side++)
        {
            Segment segment = graph.Segments[side >> 1];
            bool isFilled = ((side & 1) == 0 ? segment.Left : segment.Right) >= 0;
            Span<int> chain = edges.AsSpan(starts[side]..starts[side + 1]);
            if (!isFilled || IsChain(mesh, segment, (side & 1) == 0, chain, resolution)) continue;
            faults.Add(new MeshFault(MeshFaultKind.BrokenSegment, side >> 1, mesh.Nodes[segment.From]));
        }
    }

    private static int[] CountBySide(Mesh mesh, PlanarGraph graph, int sides)
    {
        var starts = new int[sides + 1];
        for (int e = 0; e < mesh.Segments.Length; e++)
        {
            if (mesh.Segments[e] >= 0) starts[SideOf(mesh, graph, e) + 1]++;
        }
        for (int side = 0; side < sides; side++) starts[side + 1] += starts[side];
        return starts;
    }

    private static int SideOf(Mesh mesh, PlanarGraph graph, int e) =>
        2 * mesh.Segments[e] + (MeshEdge.Along(mesh, graph.Segments[mesh.Segments[e]], e) > 0 ? 0 : 1);

    private static bool IsChain(Mesh mesh, Segment segment, bool isLeft, Span<int> edges, double resolution)
    {
        Point start = mesh.Nodes[segment.From];
        Point along = mesh.Nodes[segment.To] - start;
        var places = new double[edges.Length];
        for (int i = 0; i < edges.Length; i++)
        {
            Point from = mesh.Nodes[isLeft ? MeshEdge.From(mesh, edges[i]) : MeshEdge.To(mesh, edges[i])] - start;
            if (Math.Abs(from.Cross(along)) > along.Length * resolution) return false;
            places[i] = from.Dot(along);
        }
        places.AsSpan().Sort(edges);
        int at = segment.From;
        foreach (int e in edges)
        {
            if ((isLeft ? MeshEdge.From(mesh, e) : MeshEdge.To(mesh, e)) != at) return false;
            at = isLeft ? MeshEdge.To(mesh, e) : MeshEdge.From(mesh, e);
        }
        return at == segment.To;
    }
}
