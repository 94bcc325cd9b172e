using MeshSection.Dxf.Placing;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>Walks along strands that close.</summary>
internal static class LoopWalk
{
    /// <summary>The loops of linework in which two strands end at every node.</summary>
    public static List<Loop> Of(Linework linework)
    {
        var loops = new List<Loop>();
        var strands = linework.Strands;
        var ends = linework.Ends();
        var isTaken = new bool[strands.Count];
        for (var first = 0; first < strands.Count; first++)
        {
            var chain = new List<Strand>();
            var from = strands[first].From;
            for (var s = first; !isTaken[s]; s = ends[from][0] == s ? ends[from][1] : ends[from][0])
            {
                isTaken[s] = true;
                var strand = strands[s].From == from ? strands[s] : strands[s].Reversed();
                chain.Add(strand);
                from = strand.To;
            }

            if (chain.Count > 0)
            {
                loops.Add(Loop(chain));
            }
        }

        loops.Sort((a, b) => Loops.Loop.Compare(a.Edges[0], b.Edges[0]));
        return loops;
    }

    /// <summary>The boundary of chosen faces of a map of strands.</summary>
    public static List<Loop> Of(PlanarMap map, IReadOnlyList<Strand> strands, IReadOnlyList<bool> isChosen)
    {
        var loops = map.Border(isChosen)
            .ConvertAll(border => Loop(border.ConvertAll(d => d.IsForward ? strands[d.Edge] : strands[d.Edge].Reversed())));
        loops.Sort((a, b) => Loops.Loop.Compare(a.Edges[0], b.Edges[0]));
        return loops;
    }

    /// <summary>
    /// A loop of strands; parts of one piece that follow each other are one edge again, as if it had not been cut.
    /// </summary>
    private static Loop Loop(List<Strand> chain)
    {
        // Begun where a whole piece begins, so that no parts of one lie at both ends of the chain.
        var start = Math.Max(0, Enumerable.Range(0, chain.Count).FirstOrDefault(i => !chain[(i + chain.Count - 1) % chain.Count].IsContinuedBy(chain[i])));
        var (edges, entities) = (new List<Edge>(chain.Count), new List<PlacedEntity>(chain.Count));
        for (var i = 0; i < chain.Count;)
        {
            var strand = chain[(start + i) % chain.Count];
            var last = strand;
            for (i++; i < chain.Count && last.IsContinuedBy(chain[(start + i) % chain.Count]); i++)
            {
                last = chain[(start + i) % chain.Count];
            }

            var isCut = strand.Stop != last.Stop;
            edges.Add(isCut ? strand.Whole.Part(strand.Begin, last.Stop).Between(strand.Edge.Start, last.Edge.End) : strand.Edge);
            entities.Add(strand.Entity);
        }

        return new Loop(edges, entities).FromLeftmostCorner();
    }
}
