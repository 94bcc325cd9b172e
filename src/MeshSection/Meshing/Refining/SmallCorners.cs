using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// The corners of under 60 degrees between two segments. Near them segments are split on concentric circles whose radii
/// are powers of two, so that the pieces on either side match, and triangles across from the corner are spared
/// [Ruppert1995, MillerPavWalkington2003].
/// </summary>
internal sealed class SmallCorners
{
    /// <summary>The largest small corner, degrees, and what rounding may add.</summary>
    private const double SmallAngle = 60 + 1e-7;

    /// <summary>Circles differ by far more than this part of their radius, rounding by far less.</summary>
    private const double SameCircle = 1e-3;

    private readonly Triangulation mesh;
    private readonly ImmutableArray<Segment> segments;

    /// <summary>For segment s at 2s whether it leaves a small corner, at 2s + 1 whether it ends in one.</summary>
    private readonly bool[] isSmall;

    public SmallCorners(Triangulation mesh, PlanarGraph graph)
    {
        this.mesh = mesh;
        segments = graph.Segments;
        isSmall = new bool[2 * segments.Length];
        foreach (InputAngle angle in InputAngles.Below(graph, SmallAngle))
        {
            Mark(angle.First, angle.Node);
            Mark(angle.Second, angle.Node);
        }
    }

    /// <summary>Whether segment s has a small corner at vertex v.</summary>
    public bool Has(int s, int v) =>
        (v == segments[s].From && isSmall[2 * s]) || (v == segments[s].To && isSmall[2 * s + 1]);

    /// <summary>Whether an edge joins two segments of one small corner at the same distance from it.</summary>
    public bool Spans(int u, int v)
    {
        int s = mesh.Home[u];
        int other = mesh.Home[v];
        if (s < 0 || other < 0 || s == other) return false;
        Segment first = segments[s];
        Segment second = segments[other];
        int corner = first.From == second.From || first.From == second.To ? first.From
            : first.To == second.From || first.To == second.To ? first.To : -1;
        if (corner < 0) return false;
        Point toU = mesh.PointAt(u) - mesh.PointAt(corner);
        Point toV = mesh.PointAt(v) - mesh.PointAt(corner);
        double uu = toU.Dot(toU);
        double vv = toV.Dot(toV);
        return Math.Abs(uu - vv) <= 2 * SameCircle * uu && toU.Dot(toV) > 0.499 * uu;
    }

    /// <summary>
    /// The radius, a power of two, at which a piece of the given length is split: a third to two thirds of it.
    /// </summary>
    public static double Radius(double length) => Math.ScaleB(1, Math.ILogB(2 * length / 3));

    private void Mark(int s, int v) => isSmall[segments[s].From == v ? 2 * s : 2 * s + 1] = true;
}
