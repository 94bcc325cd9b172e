using System.Collections.Immutable;
using MeshSection.Dxf.Entities;
using MeshSection.Geometry;

namespace MeshSection.Dxf;

/// <summary>The outline of a drawing, and how it came about.</summary>
/// <param name="Outline">The boundaries, mm, about a local origin.</param>
/// <param name="Report">What was read, joined, mended and left out.</param>
/// <param name="Sources">
/// The entity that edge e of boundary b came from, at [b][e], for the boundaries and edges of <paramref name="Outline"/>.
/// </param>
public sealed record DrawingOutline(
    Outline Outline, DrawingReport Report, ImmutableArray<ImmutableArray<EntitySource>> Sources);
