using System.Collections.Immutable;
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
    public const int PerTriangle = CurvedMesh.NodesPerTriangle;

    private QuadraticNodes(ImmutableArray<int> triangles, int[] ranks)
    {
        Triangles = triangles;
        Ranks = ranks;
    }

    /// <summary>How many nodes there are.</summary>
    public int Count => Ranks.Length;

    /// <summary>Node i of triangle t at 6t + i: the corners, then the edge opposite each of them.</summary>
    public ImmutableArray<int> Triangles { get; }

    /// <summary>The place of each node in a good order of elimination.</summary>
    public int[] Ranks { get; }

    /// <summary>Ranks the nodes of a mesh.</summary>
    public static QuadraticNodes Of(CurvedMesh curved) =>
        new(curved.Elements, RankNodes(curved.Mesh, curved.Elements, curved.Nodes.Length));

    private static int[] RankNodes(Mesh mesh, ImmutableArray<int> triangles, int count)
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
