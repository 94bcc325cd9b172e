using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;

namespace MeshSection.Torsion;

/// <summary>
/// A mesh fitted to the true outline, with coordinates about a point of choice and its curves sampled for integration.
/// The edges of triangles along the outline are the curve itself, not an approximation of it [Zlamal1973].
/// </summary>
internal sealed class CentredMesh
{
    private CentredMesh(CurvedMesh curved, Point[] corners, ImmutableArray<EdgeBow?> bows, ImmutableArray<int> boundaries, Point origin)
    {
        Curved = curved;
        Corners = corners;
        Bows = bows;
        Boundaries = boundaries;
        Origin = origin;
    }

    /// <summary>The mesh; it numbers nodes, triangles and edges.</summary>
    public CurvedMesh Curved { get; }

    /// <summary>The corners and how they hang together.</summary>
    public Mesh Mesh => Curved.Mesh;

    /// <summary>Where each corner lies, about <see cref="Origin"/>, mm.</summary>
    public Point[] Corners { get; }

    /// <summary>At 3t + k how the edge opposite corner k of triangle t bows, or null if it is straight.</summary>
    public ImmutableArray<EdgeBow?> Bows { get; }

    /// <summary>At 3t + k the boundary of the outline on which that edge lies, or -1 for an edge inside.</summary>
    public ImmutableArray<int> Boundaries { get; }

    /// <summary>The origin of the coordinates, in the outline's own.</summary>
    public Point Origin { get; }

    /// <summary>Takes over a fitted mesh, with the outline's own origin.</summary>
    /// <param name="flat">The flattened outline.</param>
    /// <param name="curved">A mesh fitted to it.</param>
    public static CentredMesh Of(FlatOutline flat, CurvedMesh curved)
    {
        var mesh = curved.Mesh;
        var corners = curved.Nodes.AsSpan()[..mesh.Nodes.Length].ToArray();
        var bows = curved.Curves.Select((curve, e) => curve is null ? null : new EdgeBow(curve, e % 3));
        var boundaries = mesh.Segments.Select(
            s => s >= 0 && s < flat.Chords.Length ? flat.Chords[s].Place.Boundary : -1);
        return new CentredMesh(curved, corners, [.. bows], [.. boundaries], Point.Origin);
    }

    /// <summary>The same mesh with another point as its origin.</summary>
    /// <param name="origin">The point, in the outline's coordinates, mm.</param>
    public CentredMesh About(Point origin)
    {
        var corners = new Point[Corners.Length];
        for (var i = 0; i < corners.Length; i++)
        {
            corners[i] = Corners[i] + (Origin - origin);
        }

        return new CentredMesh(Curved, corners, Bows, Boundaries, origin);
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
}
