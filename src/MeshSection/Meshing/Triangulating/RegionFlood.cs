using System.Collections.Immutable;

namespace MeshSection.Meshing;

/// <summary>Gives every triangle the region that the segments around it name, and drops those that lie in none.</summary>
internal static class RegionFlood
{
    private const int Nothing = -1;

    /// <exception cref="ArgumentException">Two segments name different regions for one place.</exception>
    public static void Run(Triangulation mesh, ImmutableArray<Segment> segments)
    {
        Assign(mesh, segments);
        Compact(mesh);
    }

    private static void Assign(Triangulation mesh, ImmutableArray<Segment> segments)
    {
        var pending = new int[mesh.TriangleCount];
        int pendingCount = 0;
        for (int t = 0; t < mesh.TriangleCount; t++)
        {
            int b = 4 * t;
            bool isGhost = (mesh.Corners[b] | mesh.Corners[b + 1] | mesh.Corners[b + 2]) < 0;
            if (isGhost) Claim(t, Nothing, -1);
            for (int e = b; e < b + 3; e++)
            {
                int s = mesh.Segments[e];
                if (s >= 0) Claim(t, mesh.From(e) == segments[s].From ? segments[s].Left : segments[s].Right, s);
            }
        }
        while (pendingCount > 0)
        {
            int t = pending[--pendingCount];
            for (int e = 4 * t; e < 4 * t + 3; e++)
            {
                if (mesh.Segments[e] < 0) Claim(mesh.Twins[e] >> 2, mesh.Corners[4 * t + 3], -1);
            }
        }

        void Claim(int t, int region, int s)
        {
            int known = mesh.Corners[4 * t + 3];
            if (known == region) return;
            if (known != Triangulation.Unassigned) throw Contradiction(mesh, t, known, region, s);
            mesh.Corners[4 * t + 3] = region;
            pending[pendingCount++] = t;
        }
    }

    private static ArgumentException Contradiction(Triangulation mesh, int t, int known, int region, int s)
    {
        int v = mesh.Corners[4 * t];
        if (v == Triangulation.Ghost) v = mesh.Corners[4 * t + 1];
        string by = s < 0 ? "segments" : $"segment {s} and others";
        return new ArgumentException(
            $"Regions {known} and {region} are both named by {by} for one place near {mesh.PointAt(v)}; -1 is nothing.");
    }

    private static void Compact(Triangulation mesh)
    {
        int[] corners = mesh.Corners;
        int[] twins = mesh.Twins;
        int[] segments = mesh.Segments;
        var place = new int[mesh.TriangleCount];
        int count = 0;
        for (int t = 0; t < mesh.TriangleCount; t++) place[t] = corners[4 * t + 3] >= 0 ? count++ : -1;
        for (int t = 0; t < mesh.TriangleCount; t++)
        {
            if (place[t] < 0) continue;
            int to = 4 * place[t];
            for (int k = 0; k < 3; k++)
            {
                int twin = twins[4 * t + k];
                corners[to + k] = corners[4 * t + k];
                segments[to + k] = segments[4 * t + k];
                twins[to + k] = place[twin >> 2] < 0 ? -1 : 4 * place[twin >> 2] + (twin & 3);
            }
            corners[to + 3] = corners[4 * t + 3];
            segments[to + 3] = 0;
            twins[to + 3] = Triangulation.NotQueued;
        }
        mesh.Truncate(count);
    }
}
