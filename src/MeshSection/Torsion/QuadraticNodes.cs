using MeshSection.LinearAlgebra;
using MeshSection.Meshing;

namespace MeshSection.Torsion;

/// <summary>
/// The nodes of second-order triangles: the corners of the mesh, then one for each edge. They are ranked for elimination
/// by the order of the corners alone, each edge right before the first of its two ends: a quarter of the work.
/// </summary>
internal sealed class QuadraticNodes
{
    /// <summary>Nodes of one triangle.</summary>
    public const int PerTriangle = 6;

    private QuadraticNodes(int[] triangles, int[] ranks)
    {
        Triangles = triangles;
        Ranks = ranks;
    }

    /// <summary>How many nodes there are.</summary>
    public int Count => Ranks.Length;

    /// <summary>Node i of triangle t at 6t + i: the corners, then the edge opposite each of them.</summary>
    public int[] Triangles { get; }

    /// <summary>The place of each node in a good order of elimination.</summary>
    public int[] Ranks { get; }

    /// <summary>Numbers the nodes of a mesh.</summary>
    public static QuadraticNodes Of(Mesh mesh)
    {
        var count = mesh.Nodes.Length;
        var triangles = new int[PerTriangle * mesh.TriangleCount];
        for (var t = 0; t < mesh.TriangleCount; t++)
        {
            for (var k = 0; k < 3; k++)
            {
                triangles[6 * t + k] = mesh.Corners[3 * t + k];
                var neighbour = mesh.Neighbours[3 * t + k];
                triangles[6 * t + 3 + k] = neighbour >= 0 && neighbour < t
                    ? triangles[6 * neighbour + 3 + SideTo(mesh, neighbour, t)]
                    : count++;
            }
        }

        return new QuadraticNodes(triangles, RankNodes(mesh, triangles, count));
    }

    private static int SideTo(Mesh mesh, int triangle, int neighbour)
    {
        var k = 0;
        while (mesh.Neighbours[3 * triangle + k] != neighbour)
        {
            k++;
        }

        return k;
    }

    private static int[] RankNodes(Mesh mesh, int[] triangles, int count)
    {
        var corners = mesh.Nodes.Length;
        var order = MinimumDegree.Order(SymmetricPattern.OfElements(mesh.Corners.AsSpan(), 3, corners));
        var cornerRanks = new int[corners];
        for (var k = 0; k < corners; k++)
        {
            cornerRanks[order[k]] = k;
        }

        // Every edge belongs to the end that is eliminated first; edges of one corner stand before it.
        var groups = new int[count];
        for (var slot = 0; slot < triangles.Length; slot++)
        {
            var (first, k) = (slot - slot % PerTriangle, slot % PerTriangle);
            groups[triangles[slot]] = k < 3
                ? cornerRanks[triangles[slot]]
                : Math.Min(cornerRanks[triangles[first + (k - 2) % 3]], cornerRanks[triangles[first + (k - 1) % 3]]);
        }

        var starts = new int[corners + 1];
        foreach (var group in groups)
        {
            starts[group + 1]++;
        }

        for (var k = 0; k < corners; k++)
        {
            starts[k + 1] += starts[k];
        }

        var ranks = new int[count];
        for (var node = count - 1; node >= 0; node--)
        {
            // From the back: the corner has the lowest number of its group.
            ranks[node] = starts[groups[node]]++;
        }

        return ranks;
    }
}
