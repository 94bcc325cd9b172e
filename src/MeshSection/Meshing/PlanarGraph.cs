using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>A straight piece of an outline that the mesh must keep, with what lies on either side of it.</summary>
/// <param name="From">Index of the point where it begins.</param>
/// <param name="To">Index of the point where it ends.</param>
/// <param name="Left">Region on its left, or -1 for nothing.</param>
/// <param name="Right">Region on its right, or -1 for nothing.</param>
public readonly record struct Segment(int From, int To, int Left, int Right);

/// <summary>
/// The mesher's input, a planar straight-line graph: distinct points, and segments that meet only in those points.
/// </summary>
/// <param name="Points">The points, mm; no two alike.</param>
/// <param name="Segments">The segments; every change of region is one of them.</param>
public sealed record PlanarGraph(ImmutableArray<Point> Points, ImmutableArray<Segment> Segments);
