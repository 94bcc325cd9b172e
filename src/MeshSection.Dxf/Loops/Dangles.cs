using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>
/// Leaves out what leads nowhere, from its free end to the next node at which others go on. What looks as though it was
/// meant to close is not left out, but told as an open boundary.
/// </summary>
/// <param name="linework">What was joined and split.</param>
/// <param name="diagonal">The diagonal of what is drawn, mm.</param>
internal sealed class Dangles(Linework linework, double diagonal)
{
    // A chain whose two ends are nearer to each other than this part of its length was meant to close.
    private const double NearlyClosed = 0.5;

    // Free ends of different chains are a gap if they are nearer than this part of the shorter one, and of the diagonal.
    private const double GapOverLength = 0.25;
    private const double GapOverDiagonal = 0.01;

    // An end that stops short of a strand ahead of it was meant to reach it: as parts of its chain and of the diagonal.
    private const double ShortOverLength = 0.05;
    private const double ShortOverDiagonal = 0.005;

    private readonly NodeEnds _ends = linework.Ends();
    private readonly bool[] _isLeft = new bool[linework.Strands.Count];

    /// <summary>The linework without its dangling chains.</summary>
    /// <param name="chains">The chains, each from its free end on.</param>
    public Linework Prune(out List<Chain> chains)
    {
        chains = [];
        var degrees = linework.Degrees();
        var isFree = Array.ConvertAll(degrees, d => d == 1);
        var open = new Queue<int>(Enumerable.Range(0, degrees.Length).Where(n => degrees[n] == 1));
        while (open.TryDequeue(out var free))
        {
            var chain = new List<Strand>();
            for (var node = free; degrees[node] == 1;)
            {
                var s = Next(node);
                _isLeft[s] = true;
                var strand = linework.Strands[s];
                strand = strand.From == node ? strand : strand.Reversed();
                chain.Add(strand);
                degrees[node]--;
                degrees[strand.To]--;
                node = strand.To;
            }

            if (chain.Count > 0)
            {
                chains.Add(new Chain(chain, isFree[chain[^1].To]));
            }
        }

        return linework.With([.. linework.Strands.Where((_, s) => !_isLeft[s])]);
    }

    private int Next(int node)
    {
        foreach (var s in _ends[node])
        {
            if (!_isLeft[s])
            {
                return s;
            }
        }

        throw new InvalidOperationException("A node of degree 1 has a strand.");
    }

    /// <summary>The two places that were meant to be one, if there are such; else null.</summary>
    public (FreeEnd A, FreeEnd B)? Unclosed(List<Chain> chains) => OfOneChain(chains) ?? OfTwoChains(chains) ?? Short(chains);

    private static (FreeEnd, FreeEnd)? OfOneChain(List<Chain> chains)
    {
        foreach (var chain in chains)
        {
            if (chain.FreeEnds().ToArray() is [var a, var b] && a.Place.DistanceTo(b.Place) < NearlyClosed * chain.Length)
            {
                return (a, b);
            }
        }

        return null;
    }

    private (FreeEnd, FreeEnd)? OfTwoChains(List<Chain> chains)
    {
        (FreeEnd End, Chain Chain)[] free = [.. chains.SelectMany(c => c.FreeEnds().Select(e => (e, c)))];
        var tree = new BoxTree([.. free.Select(f => Box.Of(f.End.Place, f.End.Place))]);
        var near = new List<int>();
        foreach (var (end, chain) in free)
        {
            near.Clear();
            tree.Query(Box.Of(end.Place, end.Place).Grown(Gap(chain)), near);
            foreach (var (other, otherChain) in near.Order().Select(j => free[j]))
            {
                if (chain != otherChain && end.Place.DistanceTo(other.Place) < Math.Min(Gap(chain), Gap(otherChain)))
                {
                    return (end, other);
                }
            }
        }

        return null;

        double Gap(Chain chain) => Math.Min(GapOverDiagonal * diagonal, GapOverLength * chain.Length);
    }

    private (FreeEnd, FreeEnd)? Short(List<Chain> chains)
    {
        var strands = linework.Strands;
        var tree = new BoxTree([.. strands.Select(s => s.Edge.Bounds)]);
        var near = new List<int>();
        foreach (var (chain, end) in chains.SelectMany(c => c.FreeEnds().Select(e => (c, e))))
        {
            var way = Math.Min(ShortOverDiagonal * diagonal, ShortOverLength * chain.Length);
            var ahead = new LineEdge(end.Place, end.Place + way * end.Outwards);
            near.Clear();
            tree.Query(ahead.Bounds, near);
            foreach (var other in near.Order().Select(s => strands[s]).Where(s => !chain.Strands.Exists(c => c.Entity == s.Entity)))
            {
                if (EdgeCrossings.Find(ahead, other.Edge, 1e-9 * diagonal) is [var crossing, ..])
                {
                    return (end, new FreeEnd(other.Entity.Source, other.Edge.PointAt(crossing.B), -end.Outwards));
                }
            }
        }

        return null;
    }
}
