using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>Strands between nodes: what the pieces of a drawing are once their ends are joined.</summary>
/// <param name="nodes">The place of each node.</param>
/// <param name="strands">The strands.</param>
internal sealed class Linework(List<Point> nodes, List<Strand> strands)
{
    public IReadOnlyList<Point> Nodes => nodes;

    public IReadOnlyList<Strand> Strands => strands;

    /// <summary>The linework that closed loops make together.</summary>
    public static Linework Of(IEnumerable<Loop> loops)
    {
        var numbers = new Dictionary<Point, int>();
        var (places, all) = (new List<Point>(), new List<Strand>());
        foreach (var loop in loops)
        {
            for (var i = 0; i < loop.Edges.Count; i++)
            {
                all.Add(Strand.Of(Number(loop.Edges[i].Start), Number(loop.Edges[i].End), loop.Edges[i], loop.Entities[i]));
            }
        }

        return new Linework(places, all);

        int Number(Point place)
        {
            if (!numbers.TryGetValue(place, out var number))
            {
                numbers.Add(place, number = places.Count);
                places.Add(place);
            }

            return number;
        }
    }

    /// <summary>True if two strands end at every node, so that they make closed loops.</summary>
    public bool IsClosed => strands.Count > 0 && Array.TrueForAll(Degrees(), d => d is 0 or 2) && strands.TrueForAll(s => s.From != s.To);

    /// <summary>The number of ends at each node.</summary>
    public int[] Degrees()
    {
        var degrees = new int[nodes.Count];
        foreach (var strand in strands)
        {
            degrees[strand.From]++;
            degrees[strand.To]++;
        }

        return degrees;
    }

    /// <summary>The strands that end at each node.</summary>
    public NodeEnds Ends() => new(nodes.Count, strands);

    /// <summary>The same nodes with other strands.</summary>
    public Linework With(List<Strand> others) => new(nodes, others);

    /// <summary>Cuts strands at nodes that lie on them.</summary>
    /// <param name="places">The place of each node, those that are new included.</param>
    /// <param name="cuts">Where the strands are cut.</param>
    public Linework Cut(List<Point> places, StrandCuts cuts)
    {
        var pieces = new List<Strand>(strands.Count + cuts.Count);
        for (var s = 0; s < strands.Count; s++)
        {
            Append(strands[s], cuts.Of(s), places, pieces);
        }

        return new Linework(places, pieces);
    }

    private static void Append(Strand strand, IEnumerable<(double At, int Node)> cuts, List<Point> places, List<Strand> pieces)
    {
        var (from, begin) = (strand.From, 0.0);
        foreach (var (at, node) in cuts.Append((1, strand.To)))
        {
            if (node == from)
            {
                continue;
            }

            pieces.Add(begin == 0 && at == 1 ? strand : strand with
            {
                From = from,
                To = node,
                Edge = strand.Edge.Part(begin, at).Between(places[from], places[node]),
                Begin = OnWhole(strand, begin),
                Stop = OnWhole(strand, at),
            });
            (from, begin) = (node, at);
        }
    }

    private static double OnWhole(Strand strand, double at) =>
        at == 0 ? strand.Begin : at == 1 ? strand.Stop : strand.Begin + at * (strand.Stop - strand.Begin);
}
