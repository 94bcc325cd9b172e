using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>Finds curves that run between the same nodes along the same way as another.</summary>
internal static class Duplicates
{
    /// <summary>Each duplicate and the one that stays for it.</summary>
    /// <param name="curves">The curves, each with its nodes and a number.</param>
    /// <param name="places">The places of the nodes, by which the direction is chosen in which they are compared.</param>
    /// <param name="tolerance">How far apart two curves between the same nodes may be and still be one, mm.</param>
    public static List<(int Dropped, int Kept)> Find(
        IEnumerable<(int From, int To, Edge Edge, int Number)> curves, IReadOnlyList<Point> places, double tolerance)
    {
        var candidates = new List<Candidate>();
        foreach (var (from, to, edge, number) in curves)
        {
            var isForward = (places[from].X, places[from].Y).CompareTo((places[to].X, places[to].Y)) < 0;
            candidates.Add(new Candidate(isForward ? from : to, isForward ? to : from, Rise(edge, isForward), number));
        }

        candidates.Sort();
        var found = new List<(int Dropped, int Kept)>();
        for (var k = 1; k < candidates.Count; k++)
        {
            var (kept, next) = (candidates[k - 1], candidates[k]);
            if (next.From == kept.From && next.To == kept.To && next.Rise - kept.Rise <= tolerance)
            {
                found.Add((next.Number, kept.Number));
                candidates[k] = kept;
            }
        }

        return found;
    }

    /// <summary>How far the curve rises over its chord, to the right of the way from the first of its nodes to the other.</summary>
    private static double Rise(Edge edge, bool isForward)
    {
        var sag = edge.Sag;
        var isOnRight = sag > 0 && edge.Chord.Cross(edge.PointAt(0.5) - edge.Start) < 0;
        return sag > 0 && isOnRight != isForward ? -sag : sag;
    }

    private readonly record struct Candidate(int From, int To, double Rise, int Number) : IComparable<Candidate>
    {
        public int CompareTo(Candidate other) =>
            From != other.From ? From.CompareTo(other.From)
            : To != other.To ? To.CompareTo(other.To)
            : Rise != other.Rise ? Rise.CompareTo(other.Rise)
            : Number.CompareTo(other.Number);
    }
}
