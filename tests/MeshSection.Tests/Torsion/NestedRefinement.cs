using MeshSection.Meshing;

namespace MeshSection.Tests.Torsion;

/// <summary>Cuts every triangle into four at the middles of its edges, so that what the old mesh can hold the new one can.</summary>
internal static class NestedRefinement
{
    public static Mesh Of(Mesh mesh)
    {
        var nodes = mesh.Nodes.ToList();
        var middles = new Dictionary<(int, int), int>();
        int[] corners = new int[12 * mesh.TriangleCount], segments = new int[12 * mesh.TriangleCount];
        Array.Fill(segments, -1);
        for (var t = 0; t < mesh.TriangleCount; t++)
        {
            var c = mesh.Corners.AsSpan(3 * t, 3);
            int[] m = [Middle(c[1], c[2]), Middle(c[2], c[0]), Middle(c[0], c[1])];
            int[] children = [c[0], m[2], m[1], m[2], c[1], m[0], m[1], m[0], c[2], m[0], m[1], m[2]];
            children.CopyTo(corners, 12 * t);
            for (var child = 0; child < 3; child++)
            {
                for (var k = 0; k < 3; k++)
                {
                    segments[12 * t + 3 * child + k] = k == child ? -1 : mesh.Segments[3 * t + k];
                }
            }
        }

        return new Mesh(
            [.. nodes], [.. corners], [.. Neighbours(corners)], [.. mesh.Regions.SelectMany(r => Enumerable.Repeat(r, 4))], [.. segments], []);

        int Middle(int a, int b)
        {
            var key = (Math.Min(a, b), Math.Max(a, b));
            if (!middles.TryGetValue(key, out var middle))
            {
                middles[key] = middle = nodes.Count;
                nodes.Add(0.5 * (nodes[a] + nodes[b]));
            }

            return middle;
        }
    }

    private static int[] Neighbours(int[] corners)
    {
        var sides = new Dictionary<(int From, int To), int>();
        for (var e = 0; e < corners.Length; e++)
        {
            sides[(corners[e - e % 3 + (e + 1) % 3], corners[e - e % 3 + (e + 2) % 3])] = e / 3;
        }

        var neighbours = new int[corners.Length];
        foreach (var ((from, to), triangle) in sides)
        {
            for (var k = 0; k < 3; k++)
            {
                if (corners[3 * triangle + (k + 1) % 3] == from)
                {
                    neighbours[3 * triangle + k] = sides.GetValueOrDefault((to, from), -1);
                }
            }
        }

        return neighbours;
    }
}
