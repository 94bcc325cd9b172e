using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>What can be wrong with a mesh.</summary>
public enum MeshFaultKind
{
    /// <summary>An array has the wrong length, or names a node, triangle or segment that there is not.</summary>
    Structure,

    /// <summary>A point of the graph is not the node of the same number.</summary>
    MovedPoint,

    /// <summary>The corners of a triangle do not turn counter-clockwise.</summary>
    Orientation,

    /// <summary>Two triangles do not agree on the edge that they share, or on the segment it lies on.</summary>
    Neighbour,

    /// <summary>A triangle lies in no region, or in another than the segment at its edge says.</summary>
    Region,

    /// <summary>An edge between a triangle and nothing, or another region, lies on no segment.</summary>
    OpenEdge,

    /// <summary>A segment of the graph is not a chain of edges from its start to its end.</summary>
    BrokenSegment,

    /// <summary>An edge inside a region is not locally Delaunay.</summary>
    NotDelaunay,

    /// <summary>The triangles of a region do not have the area that its segments enclose.</summary>
    Area,

    /// <summary>Nodes, edges and triangles do not add up to the count of parts and holes that the graph has.</summary>
    EulerCount,
}

/// <summary>One thing that is wrong with a mesh.</summary>
/// <param name="Kind">What it is.</param>
/// <param name="Index">
/// The triangle; the point for a moved point, the segment for a broken one, the region for an area, -1 for the Euler count.
/// </param>
/// <param name="Place">Where it is, mm.</param>
public readonly record struct MeshFault(MeshFaultKind Kind, int Index, Point Place);
