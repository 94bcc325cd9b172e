using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Checks a mesh against the graph that it was made of, whoever made it: by exact signs where a sign decides, and knowing
/// nothing of how the mesh came about.
/// </summary>
public static class MeshCheck
{
    /// <summary>Everything that is wrong with the mesh; empty if it is sound.</summary>
    /// <param name="mesh">The mesh.</param>
    /// <param name="graph">The graph that it should cover.</param>
    public static ImmutableArray<MeshFault> Faults(Mesh mesh, PlanarGraph graph)
    {
        ArgumentNullException.ThrowIfNull(mesh);
        ArgumentNullException.ThrowIfNull(graph);
        var faults = ImmutableArray.CreateBuilder<MeshFault>();
        AddStructureFaults(mesh, graph, faults);
        if (faults.Count > 0) return faults.ToImmutable();

        AddPointFaults(mesh, graph, faults);
        for (int t = 0; t < mesh.TriangleCount; t++) AddTriangleFaults(mesh, graph, t, faults);
        if (faults.Count > 0) return faults.ToImmutable();

        SegmentCheck.AddFaults(mesh, graph, faults);
        AreaCheck.AddFaults(mesh, graph, faults);
        EulerCheck.AddFaults(mesh, graph, faults);
        return faults.ToImmutable();
    }

    private static void AddStructureFaults(Mesh mesh, PlanarGraph graph, ImmutableArray<MeshFault>.Builder faults)
    {
        int count = mesh.TriangleCount;
        if (mesh.Corners.Length != 3 * count || mesh.Neighbours.Length != 3 * count || mesh.Segments.Length != 3 * count
            || mesh.Nodes.Length < graph.Points.Length)
        {
            faults.Add(new MeshFault(MeshFaultKind.Structure, -1, Point.Origin));
            return;
        }
        for (int e = 0; e < 3 * count; e++)
        {
            bool isSound = (uint)mesh.Corners[e] < (uint)mesh.Nodes.Length
                && mesh.Neighbours[e] >= -1 && mesh.Neighbours[e] < count
                && mesh.Segments[e] >= -1 && mesh.Segments[e] < graph.Segments.Length;
            if (!isSound) faults.Add(new MeshFault(MeshFaultKind.Structure, e / 3, Point.Origin));
        }
    }

    private static void AddPointFaults(Mesh mesh, PlanarGraph graph, ImmutableArray<MeshFault>.Builder faults)
    {
        for (int i = 0; i < graph.Points.Length; i++)
        {
            if (mesh.Nodes[i] != graph.Points[i]) faults.Add(new MeshFault(MeshFaultKind.MovedPoint, i, graph.Points[i]));
        }
    }

    private static void AddTriangleFaults(
        Mesh mesh, PlanarGraph graph, int t, ImmutableArray<MeshFault>.Builder faults)
    {
        Point a = Place(mesh.Corners[3 * t]);
        Point b = Place(mesh.Corners[3 * t + 1]);
        Point c = Place(mesh.Corners[3 * t + 2]);
        Point centre = (a + b + c) / 3;
        if (Predicates.Orientation(a.X, a.Y, b.X, b.Y, c.X, c.Y) <= 0) Add(MeshFaultKind.Orientation);
        if (mesh.Regions[t] < 0) Add(MeshFaultKind.Region);
        for (int k = 0; k < 3; k++)
        {
            int e = 3 * t + k;
            int other = mesh.Neighbours[e];
            int segment = mesh.Segments[e];
            int twin = other < 0 ? -1 : SharedEdge(mesh, e, other);
            if (other >= 0 && (twin < 0 || mesh.Neighbours[twin] != t || mesh.Segments[twin] != segment))
            {
                Add(MeshFaultKind.Neighbour);
                continue;
            }
            if (segment >= 0)
            {
                int along = MeshEdge.Along(mesh, graph.Segments[segment], e);
                if (along == 0) Add(MeshFaultKind.Region);
                continue;
            }
            if (other < 0 || mesh.Regions[other] != mesh.Regions[t]) Add(MeshFaultKind.OpenEdge);
            else if (t < other && !IsDelaunay(a, b, c, Place(mesh.Corners[twin]))) Add(MeshFaultKind.NotDelaunay);
        }

        Point Place(int node) => new(Predicates.Sizeable(mesh.Nodes[node].X), Predicates.Sizeable(mesh.Nodes[node].Y));

        void Add(MeshFaultKind kind) => faults.Add(new MeshFault(kind, t, centre));
    }

    private static int SharedEdge(Mesh mesh, int e, int other)
    {
        for (int f = 3 * other; f < 3 * other + 3; f++)
        {
            if (MeshEdge.From(mesh, f) == MeshEdge.To(mesh, e) && MeshEdge.To(mesh, f) == MeshEdge.From(mesh, e)) return f;
        }
        return -1;
    }

    private static bool IsDelaunay(Point a, Point b, Point c, Point d) =>
        Predicates.InCircle(a.X, a.Y, b.X, b.Y, c.X, c.Y, d.X, d.Y) <= 0;
}
