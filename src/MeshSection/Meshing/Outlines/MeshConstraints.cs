using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Points and straight lines that a mesh must keep besides the outline: where a bar or a load sits, where results are
/// wanted. Each point becomes a node, each line a chain of edges.
/// </summary>
/// <param name="Points">The points, in the outline's coordinates, mm.</param>
/// <param name="Lines">The lines.</param>
public sealed record MeshConstraints(ImmutableArray<Point> Points, ImmutableArray<ConstraintLine> Lines)
{
    /// <summary>Nothing to keep but the outline.</summary>
    public static MeshConstraints None { get; } = new([], []);
}

/// <summary>A straight line that a mesh must keep.</summary>
/// <param name="From">Where it begins, in the outline's coordinates, mm.</param>
/// <param name="To">Where it ends; not where it begins.</param>
public readonly record struct ConstraintLine(Point From, Point To);
