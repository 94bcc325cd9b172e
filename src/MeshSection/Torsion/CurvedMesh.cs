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
    private CurvedMesh(Mesh mesh, Point[] corners, Edge?[] curves, int[] boundaries, double deviation)
    {
        Mesh = mesh;
        Corners = corners;
        Curves = curves;
        Boundaries = boundaries;
        Deviation = deviation;
    }

    /// <summary>The mesh that was fitted; it numbers corners, triangles and edges.</summary>
    public Mesh Mesh { get; }

    /// <summary>Where each corner lies, mm.</summary>
    public Point[] Corners { get; }

    /// <summary>At 3t + k the curve that is the edge opposite corner k of triangle t, or null if it is straight.</summary>
    public Edge?[] Curves { get; }

    /// <summary>At 3t + k the boundary of the outline on which that edge lies, or -1 for an edge inside.</summary>
    public int[] Boundaries { get; }

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

        // Each round straightens at least one more chord.
        while (true)
        {
            var fitted = Fit(flat, mesh, isCurved);
            if (!FoldedTriangles.Straighten(fitted, isCurved))
            {
                return fitted;
            }
        }
    }

    /// <summary>The same mesh with another point as its origin.</summary>
    /// <param name="origin">The point, mm.</param>
    public CurvedMesh About(Point origin)
    {
        var corners = new Point[Corners.Length];
        for (var i = 0; i < corners.Length; i++)
        {
            corners[i] = Corners[i] - origin;
        }

        var curves = new Edge?[Curves.Length];
        for (var e = 0; e < curves.Length; e++)
        {
            curves[e] = Curves[e]?.Placed(Placement.Moved(-origin.X, -origin.Y));
        }

        return new CurvedMesh(Mesh, corners, curves, Boundaries, Deviation);
    }

    /// <summary>The area inside each boundary of the outline, mm²; negative for a hole, which runs clockwise.</summary>
    public double[] EnclosedAreas()
    {
        var areas = new double[Boundaries.Max() + 1];
        for (var e = 0; e < Boundaries.Length; e++)
        {
            if (Boundaries[e] < 0)
            {
                continue;
            }

            var area = 0.5 * Corners[MeshEdge.From(Mesh, e)].Cross(Corners[MeshEdge.To(Mesh, e)]);
            areas[Boundaries[e]] += Curves[e] is Edge curve ? area + CapQuadrature.Moments(curve, Point.Origin).Area : area;
        }

        return areas;
    }

    private static CurvedMesh Fit(FlatOutline flat, Mesh mesh, bool[] isCurved)
    {
        var corners = mesh.Nodes.ToArray();
        var boundaries = new int[mesh.Segments.Length];
        var parts = new Edge?[mesh.Segments.Length];
        for (var e = 0; e < parts.Length; e++)
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
            parts[e] = part;
            (corners[from], corners[to]) = (part.Start, part.End);
        }

        var deviation = 0.0;
        for (var s = 0; s < isCurved.Length; s++)
        {
            deviation = Math.Max(deviation, isCurved[s] ? 0 : flat.Chords[s].Curve.Sag);
        }

        return new CurvedMesh(mesh, corners, parts, boundaries, deviation);
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
