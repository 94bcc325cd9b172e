using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>A chord of a flattened outline: a straight edge as it was, or one step along a curved one.</summary>
/// <param name="Curve">The piece of the outline's edge that the chord stands for; same start and end as the chord.</param>
/// <param name="Place">The edge of the outline that it is a piece of.</param>
public sealed record Chord(Edge Curve, EdgePlace Place);

/// <summary>An outline with its curves replaced by chords, ready to be meshed.</summary>
/// <param name="Outline">The outline that was flattened.</param>
/// <param name="Chords">Every chord of every boundary, boundary by boundary, in running order: chord i is segment i of the graph, and lines to keep follow.</param>
/// <param name="Graph">The chords, and what else the mesh is to keep, as points and segments.</param>
/// <param name="MaxSag">The greatest distance of any chord from its curve, mm.</param>
public sealed record FlatOutline(Outline Outline, ImmutableArray<Chord> Chords, PlanarGraph Graph, double MaxSag);
