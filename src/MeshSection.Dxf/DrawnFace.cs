using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Dxf;

/// <summary>A face of the drawing that is a part of the section.</summary>
/// <param name="Layer">The layer that made it so: the region's, or that of its boundary.</param>
/// <param name="Inside">A point in it, in the drawing's axes and unit.</param>
/// <param name="Area">Its area, in the drawing's unit, squared.</param>
/// <param name="Boundaries">Its boundaries in the outline's local axes, mm: the outer one, then those of what lies within.</param>
public sealed record DrawnFace(string Layer, Point Inside, double Area, ImmutableArray<Boundary> Boundaries);
