using System.Collections.Immutable;

namespace MeshSection.Meshing;

/// <summary>
/// The constrained Delaunay triangulation of a hollow by itself: its vertices and edges make an outline of their own. That
/// takes about n log n for n vertices, where the search for one apex after the other may take n².
/// </summary>
/// <remarks>
/// An edge of the chain that is not Delaunay here is inserted like any segment, into a hollow of fewer vertices: so this
/// may call itself, and ends.
/// </remarks>
internal sealed class HollowTriangulation
{
    private readonly IReadOnlyList<int> chain;
    private readonly Dictionary<int, int> numbers = [];
    private readonly List<int> vertices = [];
    private readonly List<Segment> segments = [];
    private readonly Dictionary<(int From, int To), int> places = [];

    private HollowTriangulation(Triangulation mesh, IReadOnlyList<int> chain)
    {
        this.chain = chain;
        foreach (int v in chain)
        {
            if (numbers.TryAdd(v, vertices.Count)) vertices.Add(v);
        }
        for (int i = 0; i + 1 < chain.Count; i++) places.Add((numbers[chain[i]], numbers[chain[i + 1]]), i);
        AddSegments();
        Filling = new Triangulation(vertices.Count, 2 * vertices.Count + 16);
        foreach (int v in vertices) Filling.AddGiven(mesh.PointAt(v));
    }

    /// <summary>The triangles of the hollow, and no others.</summary>
    public Triangulation Filling { get; }

    /// <summary>Triangulates a hollow.</summary>
    /// <param name="mesh">The triangulation that it is in.</param>
    /// <param name="chain">Its vertices from one end of the base to the other, with the hollow on the right.</param>
    public static HollowTriangulation Of(Triangulation mesh, IReadOnlyList<int> chain)
    {
        var hollow = new HollowTriangulation(mesh, chain);
        ImmutableArray<Segment> segments = [.. hollow.segments];
        PointInsertion.Run(hollow.Filling, CancellationToken.None);
        SegmentInsertion.Run(hollow.Filling, segments, CancellationToken.None);
        RegionFlood.Run(hollow.Filling, segments);
        return hollow;
    }

    /// <summary>The vertex of the outer triangulation that a vertex of the filling is.</summary>
    public int Vertex(int v) => vertices[v];

    /// <summary>
    /// The place in the chain of the edge that edge e of the filling lies on, seen from its triangle; -1 for the base.
    /// </summary>
    public int Place(int e) => places.GetValueOrDefault((Filling.To(e), Filling.From(e)), -1);

    /// <summary>The base with the hollow on its left, and the chain with it on the right, hanging edges with it on both sides.</summary>
    private void AddSegments()
    {
        segments.Add(new Segment(numbers[chain[0]], numbers[chain[^1]], 0, -1));
        foreach ((int from, int to) in places.Keys)
        {
            bool isHanging = places.ContainsKey((to, from));
            if (!isHanging) segments.Add(new Segment(from, to, -1, 0));
            else if (from < to) segments.Add(new Segment(from, to, 0, 0));
        }
    }
}
