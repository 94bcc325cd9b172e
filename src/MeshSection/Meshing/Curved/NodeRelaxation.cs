using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Lets the nodes inside follow those that were moved onto the curves. Where triangles are much smaller than the chord on
/// which they stand, they would otherwise be turned inside out.
/// </summary>
internal static class NodeRelaxation
{
    // Each sweep carries the movement one layer of triangles further in.
    private const int Sweeps = 40;

    /// <summary>Moves each node inside by the mean of what its neighbours move, several times over.</summary>
    /// <param name="mesh">The mesh.</param>
    /// <param name="corners">Where the nodes lie, those on the outline moved already; the others are moved here.</param>
    public static void Run(Mesh mesh, Span<Point> corners)
    {
        var isFixed = new bool[corners.Length];
        for (var e = 0; e < mesh.Segments.Length; e++)
        {
            if (mesh.Segments[e] >= 0)
            {
                isFixed[MeshEdge.From(mesh, e)] = isFixed[MeshEdge.To(mesh, e)] = true;
            }
        }

        var moves = new Point[corners.Length];
        for (var i = 0; i < moves.Length; i++)
        {
            moves[i] = corners[i] - mesh.Nodes[i];
        }

        var (sums, counts) = (new Point[corners.Length], new int[corners.Length]);
        for (var sweep = 0; sweep < Sweeps; sweep++)
        {
            Array.Clear(sums);
            Array.Clear(counts);
            for (var e = 0; e < mesh.Corners.Length; e++)
            {
                var node = mesh.Corners[e];
                sums[node] += moves[MeshEdge.From(mesh, e)] + moves[MeshEdge.To(mesh, e)];
                counts[node] += 2;
            }

            for (var i = 0; i < moves.Length; i++)
            {
                moves[i] = isFixed[i] ? moves[i] : sums[i] / counts[i];
            }
        }

        for (var i = 0; i < corners.Length; i++)
        {
            corners[i] = isFixed[i] ? corners[i] : mesh.Nodes[i] + moves[i];
        }
    }
}
