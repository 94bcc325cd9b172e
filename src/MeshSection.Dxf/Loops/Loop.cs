using MeshSection.Dxf.Placing;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>A closed chain of edges and the entity that each came from.</summary>
/// <param name="Edges">The edges in running order.</param>
/// <param name="Entities">The entity of each edge.</param>
internal sealed record Loop(IReadOnlyList<Edge> Edges, IReadOnlyList<PlacedEntity> Entities)
{
    /// <summary>
    /// The same loop begun at its leftmost corner (the lowest of those), so that where the drawing began it does not
    /// show. Its direction is left to the nesting.
    /// </summary>
    public Loop FromLeftmostCorner()
    {
        var first = 0;
        for (var i = 1; i < Edges.Count; i++)
        {
            if (Compare(Edges[i], Edges[first]) < 0)
            {
                first = i;
            }
        }

        return new Loop([.. Edges.Skip(first), .. Edges.Take(first)], [.. Entities.Skip(first), .. Entities.Take(first)]);
    }

    /// <summary>Orders edges by the place of their starts, from left to right, then upwards.</summary>
    public static int Compare(Edge a, Edge b) => (a.Start.X, a.Start.Y).CompareTo((b.Start.X, b.Start.Y));
}
