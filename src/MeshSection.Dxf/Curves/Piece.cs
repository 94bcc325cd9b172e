using MeshSection.Dxf.Placing;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>A line, an arc or a free curve of the drawing, in local axes, mm.</summary>
/// <param name="Edge">The curve.</param>
/// <param name="Entity">The entity that it came from.</param>
internal readonly record struct Piece(Edge Edge, PlacedEntity Entity);
