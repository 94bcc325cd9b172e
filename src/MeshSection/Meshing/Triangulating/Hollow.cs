namespace MeshSection.Meshing;

/// <summary>
/// One side of a segment after the triangles that it crossed were taken out: a chain of edges over the segment as base.
/// The chain may run up one side of a hanging edge and down the other. Every vertex of it sees the base, so that the
/// choice of the vertex whose circle through the base is empty divides the hollow into two smaller ones [Anglada1997].
/// </summary>
internal sealed class Hollow(Triangulation mesh)
{
    /// <summary>Vertices from which on the hollow is triangulated as an outline of its own.</summary>
    private const int LongChain = 200;

    private readonly List<int> vertices = [];
    private readonly List<int> edges = [];
    private readonly List<int> beyond = [];
    private readonly List<int> marks = [];
    private readonly List<int> filled = [];
    private readonly List<(int First, int Last, int Base)> pending = [];

    /// <summary>Begins the chain at one end of the segment.</summary>
    public void Begin(int v)
    {
        vertices.Clear();
        edges.Clear();
        vertices.Add(v);
    }

    /// <summary>Leads the chain on to vertex v along an edge of a triangle that is taken out.</summary>
    public void Add(int v, int edge)
    {
        vertices.Add(v);
        edges.Add(edge);
    }

    /// <summary>Lets the chain run the other way.</summary>
    public void Reverse()
    {
        vertices.Reverse();
        edges.Reverse();
    }

    /// <summary>
    /// Notes what lies beyond each edge of the chain, while the triangles taken out are still there: an edge to link to,
    /// or for a hanging edge ~i, with i the place in the chain where its other side follows.
    /// </summary>
    public void Detach()
    {
        beyond.Clear();
        marks.Clear();
        filled.Clear();
        foreach (int e in edges)
        {
            beyond.Add(mesh.Twins[e]);
            marks.Add(mesh.Segments[e]);
            filled.Add(-1);
        }
        for (int i = 0; i < edges.Count; i++) mesh.Twins[edges[i]] = ~i;
        for (int i = 0; i < edges.Count; i++)
        {
            int other = mesh.Twins[beyond[i]];
            if (other < 0) beyond[i] = other;
        }
    }

    /// <summary>Fills the hollow with triangles from the list, from its end, and returns the edge along the base.</summary>
    public int Fill(List<int> triangles, int[] starts)
    {
        int baseEdge = vertices.Count > LongChain ? FillByItself(triangles, starts) : FillByApexes(triangles, starts);
        for (int i = 0; i < filled.Count; i++)
        {
            mesh.Link(filled[i], beyond[i] >= 0 ? beyond[i] : filled[~beyond[i]]);
            mesh.Segments[filled[i]] = marks[i];
        }
        return baseEdge;
    }

    private int FillByApexes(List<int> triangles, int[] starts)
    {
        int baseEdge = -1;
        pending.Clear();
        pending.Add((0, vertices.Count - 1, -1));
        while (pending.Count > 0)
        {
            (int first, int last, int parent) = pending[^1];
            pending.RemoveAt(pending.Count - 1);
            if (last == first + 1)
            {
                filled[first] = parent;
                continue;
            }
            int apex = Apex(first, last);
            int b = 4 * Take(triangles, vertices[apex], vertices[first], vertices[last], starts);
            if (parent < 0) baseEdge = b;
            else mesh.Link(b, parent);
            pending.Add((first, apex, b + 2));
            pending.Add((apex, last, b + 1));
        }
        return baseEdge;
    }

    private int FillByItself(List<int> triangles, int[] starts)
    {
        HollowTriangulation hollow = HollowTriangulation.Of(mesh, vertices);
        Triangulation filling = hollow.Filling;
        var places = new int[filling.TriangleCount];
        for (int t = 0; t < places.Length; t++)
        {
            places[t] = Take(
                triangles,
                hollow.Vertex(filling.Corners[4 * t]),
                hollow.Vertex(filling.Corners[4 * t + 1]),
                hollow.Vertex(filling.Corners[4 * t + 2]),
                starts);
        }
        int baseEdge = -1;
        for (int t = 0; t < places.Length; t++)
        {
            for (int k = 0; k < 3; k++)
            {
                int e = 4 * t + k;
                int to = 4 * places[t] + k;
                if (filling.Segments[e] < 0) mesh.Twins[to] = 4 * places[filling.Twins[e] >> 2] + (filling.Twins[e] & 3);
                else if (hollow.Place(e) is int place and >= 0) filled[place] = to;
                else baseEdge = to;
            }
        }
        return baseEdge;
    }

    /// <summary>Takes the last triangle of the list for three corners.</summary>
    private int Take(List<int> triangles, int a, int b, int c, int[] starts)
    {
        int t = triangles[^1];
        triangles.RemoveAt(triangles.Count - 1);
        mesh.SetCorners(t, a, b, c);
        for (int e = 4 * t; e < 4 * t + 3; e++)
        {
            mesh.Segments[e] = -1;
            starts[mesh.Corners[e]] = e;
        }
        return t;
    }

    private int Apex(int first, int last)
    {
        int apex = first + 1;
        for (int i = first + 2; i < last; i++)
        {
            if (mesh.InCircle(vertices[first], vertices[last], vertices[apex], vertices[i]) > 0) apex = i;
        }
        return apex;
    }
}
