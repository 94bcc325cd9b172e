using System.Collections.Immutable;
using MeshSection.Files.Tree;
using MeshSection.Geometry;

namespace MeshSection.Files.Shapes;

/// <summary>A shape in its place, with the node that it was read from.</summary>
/// <param name="Type">Its kind.</param>
/// <param name="Placement">Where its own axes lie in the section's.</param>
/// <param name="IsHole">True if it is cut out of another shape.</param>
/// <param name="Node">Where it stands in the file.</param>
/// <param name="Boundaries">Its boundaries in its own axes, the outer one first.</param>
internal sealed record PlacedShape(
    ShapeType Type, Placement Placement, bool IsHole, Node Node, ImmutableArray<Boundary> Boundaries)
{
    /// <summary>How messages call it.</summary>
    public string Name => $"{Node.Path} ({Type.Name})";
}
