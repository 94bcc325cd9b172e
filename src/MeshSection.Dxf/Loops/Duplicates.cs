using System.Runtime.InteropServices;
using MeshSection.Dxf.Curves;
using MeshSection.Dxf.Entities;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>Drops pieces that run between the same nodes along the same curve as another.</summary>
internal static class Duplicates
{
    /// <param name="pieces">All pieces.</param>
    /// <param name="dropped">Which pieces take no part; those dropped here are added.</param>
    /// <param name="nodes">Where the pieces meet.</param>
    /// <param name="tolerance">How far apart two curves between the same nodes may be and still be one, mm.</param>
    /// <param name="found">How many edges of one entity were dropped for those of another; added to.</param>
    public static void Drop(
        List<Piece> pieces,
        bool[] dropped,
        EndNodes nodes,
        double tolerance,
        Dictionary<(Entity Dropped, Entity Kept), int> found)
    {
        var firstBetween = new Dictionary<(int, int), int>(pieces.Count);
        var next = new int[pieces.Count];
        for (var i = 0; i < pieces.Count; i++)
        {
            next[i] = -1;
            if (dropped[i])
            {
                continue;
            }

            var (a, b) = (nodes.Start(i), nodes.End(i));
            ref var first = ref CollectionsMarshal.GetValueRefOrAddDefault(
                firstBetween, a < b ? (a, b) : (b, a), out var exists);
            if (!exists)
            {
                first = i;
                continue;
            }

            var twin = first;
            while (twin >= 0 && Math.Abs(Rise(pieces[twin], nodes.Start(twin) < nodes.End(twin)) - Rise(pieces[i], a < b)) > tolerance)
            {
                twin = next[twin];
            }

            if (twin < 0)
            {
                next[i] = first;
                first = i;
                continue;
            }

            dropped[i] = true;
            var pair = (pieces[i].Entity, pieces[twin].Entity);
            found[pair] = found.GetValueOrDefault(pair) + 1;
        }
    }

    /// <summary>How far the piece rises over its chord, to the right of the way from the lower to the higher node.</summary>
    private static double Rise(Piece piece, bool isForward) => piece.Edge is ArcEdge arc
        ? 0.5 * arc.Chord.Length * (isForward ? arc.Bulge : -arc.Bulge)
        : 0;
}
