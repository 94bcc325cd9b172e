using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>An edge of a map, run through one way or the other.</summary>
/// <param name="Edge">Its index.</param>
/// <param name="IsForward">True from its start to its end.</param>
public readonly record struct DirectedEdge(int Edge, bool IsForward);

/// <summary>A bounded face of a map: what no edge divides.</summary>
/// <param name="Loops">
/// Its boundary with the face on the left: first the outer one, counter-clockwise, then those of what lies within.
/// </param>
/// <param name="Area">Its area without what lies within, mm².</param>
/// <param name="Inside">A point in it, well away from its edges.</param>
public sealed record MapFace(ImmutableArray<ImmutableArray<DirectedEdge>> Loops, double Area, Point Inside);

/// <summary>
/// The plane as edges divide it that meet only at their ends: its faces, so that each can be given a material, and the
/// common boundary of any of them.
/// </summary>
public sealed class PlanarMap
{
    private readonly int[] _faceOfHalf;
    private readonly int[] _next;

    private PlanarMap(ImmutableArray<Edge> edges, ImmutableArray<MapFace> faces, int[] faceOfHalf, int[] next)
    {
        Edges = edges;
        Faces = faces;
        _faceOfHalf = faceOfHalf;
        _next = next;
    }

    /// <summary>The face outside of everything.</summary>
    public const int Outside = -1;

    /// <summary>The edges.</summary>
    public ImmutableArray<Edge> Edges { get; }

    /// <summary>The bounded faces, in the order of the least edge on each.</summary>
    public ImmutableArray<MapFace> Faces { get; }

    /// <summary>Finds the faces.</summary>
    /// <param name="edges">Edges that cross and touch each other nowhere but at common ends, which are the same bits.</param>
    public static PlanarMap Of(ImmutableArray<Edge> edges)
    {
        var next = MapTurns.Next(edges);
        var (faces, faceOfHalf) = MapFaces.Of(edges, next);
        return new PlanarMap(edges, faces, faceOfHalf, next);
    }

    /// <summary>The faces on the left and on the right of an edge; <see cref="Outside"/> for none.</summary>
    public (int Left, int Right) FacesBeside(int edge) => (_faceOfHalf[2 * edge], _faceOfHalf[2 * edge + 1]);

    /// <summary>
    /// The boundary of chosen faces together, with them on the left; edges between two of them are no part of it.
    /// </summary>
    /// <param name="isChosen">For each face whether it is chosen.</param>
    public List<List<DirectedEdge>> Border(IReadOnlyList<bool> isChosen)
    {
        var loops = new List<List<DirectedEdge>>();
        var taken = new bool[_next.Length];
        for (var first = 0; first < taken.Length; first++)
        {
            if (taken[first] || !IsBorder(first))
            {
                continue;
            }

            var loop = new List<DirectedEdge>();
            for (var half = first; !taken[half]; half = After(half))
            {
                taken[half] = true;
                loop.Add(new DirectedEdge(half / 2, half % 2 == 0));
            }

            loops.Add(loop);
        }

        return loops;

        bool IsBorder(int half) => Holds(half) && !Holds(half ^ 1);

        bool Holds(int half) => _faceOfHalf[half] != Outside && isChosen[_faceOfHalf[half]];

        // Around the node, across edges that lie between chosen faces.
        int After(int half)
        {
            var next = _next[half];
            while (!IsBorder(next))
            {
                next = _next[next ^ 1];
            }

            return next;
        }
    }
}
