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
/// <param name="Faces">
/// The faces of the drawing that make the section, if points, layers of regions or fills chose them; empty if nesting did.
/// </param>
/// <param name="Bars">The bars on layers of bars.</param>
/// <param name="LeftOut">The lines and curves that took no part although a person sees them in the drawing.</param>
public sealed record DrawingOutline(
    Outline Outline,
    DrawingReport Report,
    ImmutableArray<ImmutableArray<EntitySource>> Sources,
    ImmutableArray<DrawnFace> Faces,
    ImmutableArray<DrawnBar> Bars,
    ImmutableArray<LeftOutEdge> LeftOut);
