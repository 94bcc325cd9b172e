using System.Collections.Immutable;
using System.Runtime.InteropServices;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// A mesh fitted to the true outline, of second-order triangles: nodes that lie on the chord of a curve are moved onto
/// the curve, and every edge has a node of its own in its middle, which along the outline lies on the curve too.
/// </summary>
/// <remarks>
/// No triangle is turned inside out, neither with its curves themselves as edges nor with the parabolas through their
/// nodes. Nodes inside follow where that takes it; a curve so close to another boundary that even this does not help
/// keeps its chord, and <see cref="Deviation"/> says so.
/// </remarks>
public sealed class CurvedMesh
{
    /// <summary>Nodes of one triangle.</summary>
    public const int NodesPerTriangle = 6;

    private CurvedMesh(
        Mesh mesh, ImmutableArray<Point> nodes, ImmutableArray<int> elements, ImmutableArray<Edge?> curves, double deviation)
    {
        Mesh = mesh;
        Nodes = nodes;
        Elements = elements;
        Curves = curves;
        Deviation = deviation;
    }

    /// <summary>The mesh that was fitted; triangles and corners keep their numbers.</summary>
    public Mesh Mesh { get; }

    /// <summary>Where each node lies, mm: those of the mesh, then one for each edge.</summary>
    public ImmutableArray<Point> Nodes { get; }

    /// <summary>
    /// Node i of triangle t at 6t + i: its corners, then the nodes in the middle of the edges opposite each of them;
    /// length 6 · TriangleCount.
    /// </summary>
    public ImmutableArray<int> Elements { get; }

    /// <summary>
    /// At 3t + k the curve that the edge opposite corner k of triangle t is, run through with t on its left; null if it
    /// is straight; length 3 · TriangleCount.
    /// </summary>
    public ImmutableArray<Edge?> Curves { get; }

    /// <summary>
    /// Greatest distance of the covered region from the true outline, mm: 0 unless a curve had to keep its chord.
    /// </summary>
    public double Deviation { get; }

    /// <summary>Fits a mesh to the outline.</summary>
    /// <param name="flat">The flattened outline.</param>
    /// <param name="mesh">A mesh of its graph.</param>
    public static CurvedMesh Fit(FlatOutline flat, Mesh mesh)
    {
        ArgumentNullException.ThrowIfNull(flat);
        ArgumentNullException.ThrowIfNull(mesh);
        var isCurved = new bool[flat.Graph.Segments.Length];
        for (var s = 0; s < flat.Chords.Length; s++)
        {
            isCurved[s] = flat.Chords[s].Curve.Sag > 0;
        }

        // First only nodes on the outline move; if that folds triangles, those inside follow; then, round by round,
        // curves are given up where that does not help.
        var (elements, count) = NumberNodes(mesh);
        var fitted = Fit(flat, mesh, elements, count, isCurved, isRelaxed: false);
        if (!FoldedTriangles.Exist(fitted))
        {
            return fitted;
        }

        do
        {
            fitted = Fit(flat, mesh, elements, count, isCurved, isRelaxed: true);
        }
        while (FoldedTriangles.Straighten(fitted, isCurved));

        return fitted;
    }

    private static CurvedMesh Fit(
        FlatOutline flat, Mesh mesh, ImmutableArray<int> elements, int count, bool[] isCurved, bool isRelaxed)
    {
        var nodes = new Point[count];
        var corners = nodes.AsSpan(0, mesh.Nodes.Length);
        mesh.Nodes.CopyTo(corners);
        var curves = new Edge?[mesh.Segments.Length];
        for (var e = 0; e < curves.Length; e++)
        {
            var s = mesh.Segments[e];
            if (s < 0 || !isCurved[s])
            {
                continue;
            }

            var (from, to) = (MeshEdge.From(mesh, e), MeshEdge.To(mesh, e));
            var segment = flat.Graph.Segments[s];
            var (t0, t1) = (Fraction(mesh, segment, from), Fraction(mesh, segment, to));
            var curve = flat.Chords[s].Curve;
            var part = t0 == 0 && t1 == 1 ? curve
                : t0 < t1 ? curve.Part(t0, t1)
                : curve.Part(t1, t0).Reversed();
            curves[e] = part;
            (corners[from], corners[to]) = (part.Start, part.End);
        }

        if (isRelaxed)
        {
            NodeRelaxation.Run(mesh, corners);
        }

        PlaceMiddles(mesh, elements, curves, nodes);
        var deviation = 0.0;
        for (var s = 0; s < flat.Chords.Length; s++)
        {
            deviation = Math.Max(deviation, isCurved[s] ? 0 : flat.Chords[s].Curve.Sag);
        }

        return new CurvedMesh(
            mesh,
            ImmutableCollectionsMarshal.AsImmutableArray(nodes),
            elements,
            ImmutableCollectionsMarshal.AsImmutableArray(curves),
            deviation);
    }

    private static (ImmutableArray<int> Elements, int Count) NumberNodes(Mesh mesh)
    {
        var count = mesh.Nodes.Length;
        var elements = new int[NodesPerTriangle * mesh.TriangleCount];
        for (var t = 0; t < mesh.TriangleCount; t++)
        {
            for (var k = 0; k < 3; k++)
            {
                elements[6 * t + k] = mesh.Corners[3 * t + k];
                var neighbour = mesh.Neighbours[3 * t + k];
                elements[6 * t + 3 + k] = neighbour >= 0 && neighbour < t
                    ? elements[6 * neighbour + 3 + MeshEdge.SideTo(mesh, neighbour, t, MeshEdge.To(mesh, 3 * t + k))]
                    : count++;
            }
        }

        return (ImmutableCollectionsMarshal.AsImmutableArray(elements), count);
    }

    private static void PlaceMiddles(Mesh mesh, ImmutableArray<int> elements, Edge?[] curves, Point[] nodes)
    {
        for (var e = 0; e < curves.Length; e++)
        {
            nodes[elements[6 * (e / 3) + 3 + e % 3]] = curves[e] is Edge curve
                ? curve.PointAt(0.5)
                : 0.5 * (nodes[MeshEdge.From(mesh, e)] + nodes[MeshEdge.To(mesh, e)]);
        }
    }

    /// <summary>Where a node lies on its segment: exactly 0 and 1 at the ends.</summary>
    private static double Fraction(Mesh mesh, Segment segment, int node)
    {
        if (node == segment.From || node == segment.To)
        {
            return node == segment.From ? 0 : 1;
        }

        var chord = mesh.Nodes[segment.To] - mesh.Nodes[segment.From];
        return (mesh.Nodes[node] - mesh.Nodes[segment.From]).Dot(chord) / chord.Dot(chord);
    }
}
