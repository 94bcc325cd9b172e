using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Triangles that cover the regions of a <see cref="PlanarGraph"/> exactly: no gap, no overlap, holes empty, every
/// segment of the graph a chain of edges. Flat arrays; nothing here changes.
/// </summary>
public sealed class Mesh
{
    /// <summary>Wraps the arrays of a finished mesh.</summary>
    /// <param name="nodes">See <see cref="Nodes"/>.</param>
    /// <param name="corners">See <see cref="Corners"/>.</param>
    /// <param name="neighbours">See <see cref="Neighbours"/>.</param>
    /// <param name="regions">See <see cref="Regions"/>.</param>
    /// <param name="segments">See <see cref="Segments"/>.</param>
    /// <param name="unrefined">See <see cref="Unrefined"/>.</param>
    public Mesh(
        ImmutableArray<Point> nodes,
        ImmutableArray<int> corners,
        ImmutableArray<int> neighbours,
        ImmutableArray<int> regions,
        ImmutableArray<int> segments,
        ImmutableArray<UnrefinedTriangle> unrefined)
    {
        Nodes = nodes;
        Corners = corners;
        Neighbours = neighbours;
        Regions = regions;
        Segments = segments;
        Unrefined = unrefined;
    }

    /// <summary>The nodes, mm. The points of the graph come first, in their order.</summary>
    public ImmutableArray<Point> Nodes { get; }

    /// <summary>Corner k of triangle t at 3t + k, counter-clockwise; length 3 · TriangleCount.</summary>
    public ImmutableArray<int> Corners { get; }

    /// <summary>At 3t + k the triangle across the edge opposite corner k of triangle t, or -1; length 3 · TriangleCount.</summary>
    public ImmutableArray<int> Neighbours { get; }

    /// <summary>The region of each triangle; length TriangleCount.</summary>
    public ImmutableArray<int> Regions { get; }

    /// <summary>
    /// At 3t + k the segment of the graph on which the edge opposite corner k of triangle t lies, or -1 for an edge
    /// inside a region; length 3 · TriangleCount.
    /// </summary>
    public ImmutableArray<int> Segments { get; }

    /// <summary>The triangles that could not be given the quality asked for, with the cause; most often none.</summary>
    public ImmutableArray<UnrefinedTriangle> Unrefined { get; }

    /// <summary>How many triangles there are.</summary>
    public int TriangleCount => Regions.Length;
}

/// <summary>Why a triangle keeps an angle below, or an area above, what was asked for.</summary>
public enum UnrefinedCause
{
    /// <summary>It stands at, or across from, a small angle of the outline itself.</summary>
    InputAngle,

    /// <summary>The limit on the number of nodes was reached first.</summary>
    NodeLimit,

    /// <summary>Smaller edges would no longer be resolved by the coordinates' digits.</summary>
    LeastEdge,
}

/// <summary>A triangle that could not be given the quality asked for.</summary>
/// <param name="Triangle">Its index.</param>
/// <param name="Place">Its centroid, mm.</param>
/// <param name="Angle">Its smallest angle, degrees.</param>
/// <param name="Cause">Why it was left as it is.</param>
public readonly record struct UnrefinedTriangle(int Triangle, Point Place, double Angle, UnrefinedCause Cause);
