using MeshSection.Dxf.Entities;
using MeshSection.Geometry;

namespace MeshSection.Dxf;

/// <summary>A bar of the drawing.</summary>
/// <param name="Source">The circle or the point that shows it.</param>
/// <param name="Place">Its centre, in the outline's local axes, mm.</param>
/// <param name="Diameter">Its diameter, mm; null for a point on a layer for which none was given.</param>
public sealed record DrawnBar(EntitySource Source, Point Place, double? Diameter);
