using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>
/// Around every node of a map the order of what leaves it. Edge i is two halves: 2i from its start, 2i + 1 from its end.
/// </summary>
internal static class MapTurns
{
    // Directions nearer than this, radians, are compared by the places a little further on: curves may leave side by side.
    private const double SideBySide = 1e-6;

    // How much further on, over the length of the shorter edge.
    private const double Ahead = 0.01;

    /// <summary>For each half the one that follows it around the face on its left.</summary>
    public static int[] Next(ImmutableArray<Edge> edges)
    {
        var leaving = new Dictionary<Point, List<int>>();
        for (var half = 0; half < 2 * edges.Length; half++)
        {
            var from = half % 2 == 0 ? edges[half / 2].Start : edges[half / 2].End;
            if (!leaving.TryGetValue(from, out var halves))
            {
                leaving.Add(from, halves = []);
            }

            halves.Add(half);
        }

        var next = new int[2 * edges.Length];
        foreach (var halves in leaving.Values)
        {
            if (halves.Count > 2)
            {
                halves.Sort((a, b) => Compare(edges, a, b));
            }

            // What arrives along the twin of a half goes on along the one before it, counting counter-clockwise.
            for (var i = 0; i < halves.Count; i++)
            {
                next[halves[i] ^ 1] = halves[(i + halves.Count - 1) % halves.Count];
            }
        }

        return next;
    }

    private static int Compare(ImmutableArray<Edge> edges, int a, int b)
    {
        if (a == b)
        {
            return 0;
        }

        var (p, q) = (Out(edges, a), Out(edges, b));
        var (angleP, angleQ) = (Angle(p.TangentAt(0)), Angle(q.TangentAt(0)));
        var difference = Math.IEEERemainder(angleP - angleQ, Math.Tau);
        if (Math.Abs(difference) > SideBySide)
        {
            return angleP.CompareTo(angleQ);
        }

        var (lengthP, lengthQ) = (p.Length, q.Length);
        var way = Ahead * Math.Min(lengthP, lengthQ);
        var turn = (q.PointAt(way / lengthQ) - q.Start).Cross(p.PointAt(way / lengthP) - p.Start);
        var sideBySide = turn > 0 ? 1 : turn < 0 ? -1 : a.CompareTo(b);

        // Directions on both sides of where the angle jumps from π to -π are side by side too.
        return Math.Abs(angleP - angleQ) > Math.PI ? -sideBySide : sideBySide;
    }

    private static Edge Out(ImmutableArray<Edge> edges, int half) => half % 2 == 0 ? edges[half / 2] : edges[half / 2].Reversed();

    private static double Angle(Point tangent) => Math.Atan2(tangent.Y, tangent.X);
}
