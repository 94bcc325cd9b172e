using MeshSection.Dxf.Curves;
using MeshSection.Dxf.Placing;

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
        Dictionary<(PlacedEntity Dropped, PlacedEntity Kept), int> found)
    {
        var candidates = new List<Candidate>(pieces.Count);
        for (var i = 0; i < pieces.Count; i++)
        {
            if (!dropped[i])
            {
                var (a, b) = (nodes.Start(i), nodes.End(i));
                var isForward = nodes.IsBefore(a, b);
                candidates.Add(new Candidate(isForward ? a : b, isForward ? b : a, Rise(pieces[i], isForward), i));
            }
        }

        candidates.Sort();
        for (var k = 1; k < candidates.Count; k++)
        {
            var (kept, next) = (candidates[k - 1], candidates[k]);
            if (next.From == kept.From && next.To == kept.To && next.Rise - kept.Rise <= tolerance)
            {
                dropped[next.Piece] = true;
                var pair = (pieces[next.Piece].Entity, pieces[kept.Piece].Entity);
                found[pair] = found.GetValueOrDefault(pair) + 1;
                candidates[k] = kept;
            }
        }
    }

    /// <summary>How far the piece rises over its chord, to the right of the way from the first of its nodes to the other.</summary>
    private static double Rise(Piece piece, bool isForward)
    {
        var sag = piece.Edge.Sag;
        return sag > 0 && piece.Edge.CapArea > 0 != isForward ? -sag : sag;
    }

    private readonly record struct Candidate(int From, int To, double Rise, int Piece) : IComparable<Candidate>
    {
        public int CompareTo(Candidate other) =>
            From != other.From ? From.CompareTo(other.From)
            : To != other.To ? To.CompareTo(other.To)
            : Rise != other.Rise ? Rise.CompareTo(other.Rise)
            : Piece.CompareTo(other.Piece);
    }
}
