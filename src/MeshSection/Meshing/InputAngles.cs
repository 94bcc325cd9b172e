using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>Finds the small angles of a graph.</summary>
public static class InputAngles
{
    /// <summary>
    /// The angles of regions below a limit, the smallest first, equals by point. Angles between which nothing lies, as
    /// outside of a spike, are none.
    /// </summary>
    /// <param name="graph">The graph.</param>
    /// <param name="degrees">The limit, degrees.</param>
    public static ImmutableArray<InputAngle> Below(PlanarGraph graph, double degrees)
    {
        ArgumentNullException.ThrowIfNull(graph);
        List<InputAngle> found = [];
        (int[] starts, int[] ends) = EndsByPoint(graph);
        for (int v = 0; v < graph.Points.Length; v++)
        {
            if (starts[v + 1] - starts[v] > 1) AddAt(graph, v, ends.AsSpan(starts[v]..starts[v + 1]), degrees, found);
        }
        return [.. found.OrderBy(angle => angle.Degrees)];
    }

    /// <summary>Ends of segments, 2s where segment s begins and 2s + 1 where it ends, sorted by their points.</summary>
    private static (int[] Starts, int[] Ends) EndsByPoint(PlanarGraph graph)
    {
        ImmutableArray<Segment> segments = graph.Segments;
        var starts = new int[graph.Points.Length + 1];
        foreach (Segment s in segments)
        {
            starts[s.From]++;
            starts[s.To]++;
        }
        for (int v = 1; v < starts.Length; v++) starts[v] += starts[v - 1];
        var ends = new int[2 * segments.Length];
        for (int end = 0; end < ends.Length; end++)
        {
            Segment s = segments[end >> 1];
            ends[--starts[(end & 1) == 0 ? s.From : s.To]] = end;
        }
        return (starts, ends);
    }

    private static void AddAt(PlanarGraph graph, int v, Span<int> ends, double limit, List<InputAngle> found)
    {
        var directions = new double[ends.Length];
        for (int i = 0; i < ends.Length; i++) directions[i] = Direction(graph, ends[i]);
        MemoryExtensions.Sort(directions.AsSpan(), ends);
        for (int i = 0; i < ends.Length; i++)
        {
            int j = (i + 1) % ends.Length;
            Segment first = graph.Segments[ends[i] >> 1];
            int between = (ends[i] & 1) == 0 ? first.Left : first.Right;
            double turn = directions[j] - directions[i];
            double degrees = (j == 0 ? turn + Math.Tau : turn) * (180 / Math.PI);
            if (between < 0 || degrees >= limit) continue;
            found.Add(new InputAngle(v, graph.Points[v], degrees, ends[i] >> 1, ends[j] >> 1));
        }
    }

    private static double Direction(PlanarGraph graph, int end)
    {
        Segment s = graph.Segments[end >> 1];
        Point along = graph.Points[s.To] - graph.Points[s.From];
        return (end & 1) == 0 ? Math.Atan2(along.Y, along.X) : Math.Atan2(-along.Y, -along.X);
    }
}
