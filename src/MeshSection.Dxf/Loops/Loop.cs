using MeshSection.Dxf.Entities;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>A closed chain of edges and the entity that each came from.</summary>
/// <param name="Edges">The edges in running order.</param>
/// <param name="Entities">The entity of each edge.</param>
internal sealed record Loop(IReadOnlyList<Edge> Edges, IReadOnlyList<Entity> Entities)
{
    /// <summary>
    /// The same loop begun at its leftmost corner (the lowest of those) and run in the direction whose first edge comes
    /// first by end and bulge, so that neither the order nor the direction of what was drawn shows.
    /// </summary>
    public Loop Canonical()
    {
        var first = 0;
        for (var i = 1; i < Edges.Count; i++)
        {
            if (Compare(Edges[i].Start, Edges[first].Start) < 0)
            {
                first = i;
            }
        }

        var edges = new List<Edge>(Edges.Count);
        var entities = new List<Entity>(Edges.Count);
        var backwards = Edges[(first + Edges.Count - 1) % Edges.Count].Reversed();
        var isForward = Compare(Edges[first], backwards) <= 0;
        for (var k = 0; k < Edges.Count; k++)
        {
            var i = (isForward ? first + k : first + 2 * Edges.Count - 1 - k) % Edges.Count;
            edges.Add(isForward ? Edges[i] : Edges[i].Reversed());
            entities.Add(Entities[i]);
        }

        return new Loop(edges, entities);
    }

    /// <summary>Orders edges by start, end and bulge.</summary>
    public static int Compare(Edge a, Edge b)
    {
        var byStart = Compare(a.Start, b.Start);
        var byEnd = byStart != 0 ? byStart : Compare(a.End, b.End);
        return byEnd != 0 ? byEnd : Bulge(a).CompareTo(Bulge(b));
    }

    private static int Compare(Point a, Point b) => a.X != b.X ? a.X.CompareTo(b.X) : a.Y.CompareTo(b.Y);

    private static double Bulge(Edge edge) => edge is ArcEdge arc ? arc.Bulge : 0;
}
