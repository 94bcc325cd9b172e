using MeshSection.Dxf.Entities;
using MeshSection.Geometry;

namespace MeshSection.Dxf;

/// <summary>A line or curve of the drawing that took no part, for a picture of what was understood.</summary>
/// <param name="Edge">The curve, in the outline's local axes, mm.</param>
/// <param name="Source">The entity that it came from.</param>
/// <param name="LeadsNowhere">True if it was read and bounds nothing; false if it was not chosen.</param>
public sealed record LeftOutEdge(Edge Edge, EntitySource Source, bool LeadsNowhere);
