using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Checks the area of each region's triangles against the area within its segments by Green's theorem, to 1e-13 and what
/// the digits of the coordinates lose along the segments.
/// </summary>
internal static class AreaCheck
{
    private const double Relative = 1e-13;

    public static void AddFaults(Mesh mesh, PlanarGraph graph, ImmutableArray<MeshFault>.Builder faults)
    {
        int count = 0;
        foreach (Segment s in graph.Segments) count = Math.Max(count, Math.Max(s.Left, s.Right) + 1);
        var enclosed = new CompensatedSum[count];
        var covered = new CompensatedSum[count];
        var perimeters = new double[count];
        foreach (Segment s in graph.Segments)
        {
            if (s.Left == s.Right) continue;
            Point from = graph.Points[s.From] - graph.Points[0];
            Point to = graph.Points[s.To] - graph.Points[0];
            if (s.Left >= 0) Add(s.Left, 0.5);
            if (s.Right >= 0) Add(s.Right, -0.5);

            void Add(int region, double half)
            {
                // In this form the terms of short segments keep their digits.
                enclosed[region].Add(half * from.Cross(to - from));
                perimeters[region] += from.DistanceTo(to);
            }
        }
        for (int t = 0; t < mesh.TriangleCount; t++)
        {
            covered[mesh.Regions[t]].Add(TriangleShape.Area(
                mesh.Nodes[mesh.Corners[3 * t]],
                mesh.Nodes[mesh.Corners[3 * t + 1]],
                mesh.Nodes[mesh.Corners[3 * t + 2]]));
        }
        double resolution = Digits.Resolution(graph);
        for (int r = 0; r < count; r++)
        {
            double allowed = Relative * Math.Abs(enclosed[r].Value) + resolution * perimeters[r];
            if (Math.Abs(covered[r].Value - enclosed[r].Value) <= allowed) continue;
            faults.Add(new MeshFault(MeshFaultKind.Area, r, graph.Points[0]));
        }
    }

    /// <summary>A sum with its rounding errors carried along [Neumaier1974].</summary>
    private struct CompensatedSum
    {
        private double sum;
        private double lost;

        public readonly double Value => sum + lost;

        public void Add(double term)
        {
            double next = sum + term;
            lost += Math.Abs(sum) >= Math.Abs(term) ? sum - next + term : term - next + sum;
            sum = next;
        }
    }
}
