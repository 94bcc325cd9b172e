using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;

namespace MeshSection.Torsion;

/// <summary>
/// A mesh fitted to the true outline: nodes that lie on the chord of a curve are moved onto the curve, and the edges of
/// triangles along the outline are the curve itself, not an approximation of it [Zlamal1973]. Coordinates are about a
/// point of choice, at first the outline's own origin.
/// </summary>
internal sealed class CurvedMesh
{
    private CurvedMesh(Mesh mesh, Point[] corners, EdgeBow?[] bows, int[] boundaries, Point origin, double deviation)
    {
        Mesh = mesh;
        Corners = corners;
        Bows = bows;
        Boundaries = boundaries;
        Origin = origin;
        Deviation = deviation;
    }

    /// <summary>The mesh that was fitted; it numbers corners, triangles and edges.</summary>
    public Mesh Mesh { get; }

    /// <summary>Where each corner lies, about <see cref="Origin"/>, mm.</summary>
    public Point[] Corners { get; }

    /// <summary>At 3t + k how the edge opposite corner k of triangle t bows, or null if it is straight.</summary>
    public EdgeBow?[] Bows { get; }

    /// <summary>At 3t + k the boundary of the outline on which that edge lies, or -1 for an edge inside.</summary>
    public int[] Boundaries { get; }

    /// <summary>The origin of the coordinates, in the outline's own.</summary>
    public Point Origin { get; }

    /// <summary>
    /// Greatest distance of the covered region from the true outline, mm: 0 unless a curve comes so close to another
    /// boundary that its triangles would be turned inside out; such curves keep their chords.
    /// </summary>
    public double Deviation { get; }

    /// <summary>Fits a mesh to the outline.</summary>
    /// <param name="flat">The flattened outline.</param>
    /// <param name="mesh">A mesh of its graph.</param>
    public static CurvedMesh Fit(FlatOutline flat, Mesh mesh)
    {
        var isCurved = new bool[flat.Chords.Length];
        for (var s = 0; s < isCurved.Length; s++)
        {
            isCurved[s] = flat.Chords[s].Curve.Sag > 0;
        }

        // First only nodes on the outline move; if that folds triangles, those inside follow; then, round by round,
        // curves are given up where that does not help.
        var fitted = Fit(flat, mesh, isCurved, isRelaxed: false);
        if (!FoldedTriangles.Exist(fitted))
        {
            return fitted;
        }

        do
        {
            fitted = Fit(flat, mesh, isCurved, isRelaxed: true);
        }
        while (FoldedTriangles.Straighten(fitted, isCurved));

        return fitted;
    }

    /// <summary>The same mesh with another point as its origin.</summary>
    /// <param name="origin">The point, in the outline's coordinates, mm.</param>
    public CurvedMesh About(Point origin)
    {
        var corners = new Point[Corners.Length];
        for (var i = 0; i < corners.Length; i++)
        {
            corners[i] = Corners[i] + (Origin - origin);
        }

        return new CurvedMesh(Mesh, corners, Bows, Boundaries, origin, Deviation);
    }

    /// <summary>
    /// The moments of the region inside each boundary of the outline, about the origin, by Green's theorem; negative for
    /// a hole, which runs clockwise.
    /// </summary>
    public AreaMoments[] EnclosedMoments()
    {
        var moments = new AreaMoments[Boundaries.Max() + 1];
        for (var e = 0; e < Boundaries.Length; e++)
        {
            if (Boundaries[e] < 0)
            {
                continue;
            }

            // The triangle from the origin to the edge, and what lies between the edge and its curve.
            var (a, b) = (Corners[MeshEdge.From(Mesh, e)], Corners[MeshEdge.To(Mesh, e)]);
            var t = 0.5 * a.Cross(b);
            var sum = a + b;
            moments[Boundaries[e]] += new AreaMoments(
                t,
                t * sum.X / 3,
                t * sum.Y / 3,
                t * (a.X * a.X + a.X * b.X + b.X * b.X) / 6,
                t * (a.Y * a.Y + a.Y * b.Y + b.Y * b.Y) / 6,
                t * (a.X * a.Y + b.X * b.Y + sum.X * sum.Y) / 12);
            if (Bows[e] is EdgeBow bow)
            {
                moments[Boundaries[e]] += CapQuadrature.Moments(bow.Curve, Origin);
            }
        }

        return moments;
    }

    private static CurvedMesh Fit(FlatOutline flat, Mesh mesh, bool[] isCurved, bool isRelaxed)
    {
        var corners = mesh.Nodes.ToArray();
        var boundaries = new int[mesh.Segments.Length];
        var bows = new EdgeBow?[mesh.Segments.Length];
        for (var e = 0; e < bows.Length; e++)
        {
            var s = mesh.Segments[e];
            boundaries[e] = s < 0 ? -1 : flat.Chords[s].Place.Boundary;
            if (s < 0 || !isCurved[s])
            {
                continue;
            }

            var (from, to) = (MeshEdge.From(mesh, e), MeshEdge.To(mesh, e));
            var segment = flat.Graph.Segments[s];
            var (t0, t1) = (Fraction(mesh, segment, from), Fraction(mesh, segment, to));
            var curve = flat.Chords[s].Curve;
            var part = t0 == 0 && t1 == 1 ? curve : curve.Part(t0, t1);
            bows[e] = new EdgeBow(part, e % 3);
            (corners[from], corners[to]) = (part.Start, part.End);
        }

        if (isRelaxed)
        {
            NodeRelaxation.Run(mesh, corners);
        }

        var deviation = 0.0;
        for (var s = 0; s < isCurved.Length; s++)
        {
            deviation = Math.Max(deviation, isCurved[s] ? 0 : flat.Chords[s].Curve.Sag);
        }

        return new CurvedMesh(mesh, corners, bows, boundaries, Point.Origin, deviation);
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
