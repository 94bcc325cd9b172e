using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>An angle of a region that its own segments make: no mesh can have a larger one in its place.</summary>
/// <param name="Node">The point of the graph at which it is.</param>
/// <param name="Place">Where that is, mm.</param>
/// <param name="Degrees">The angle, degrees.</param>
/// <param name="First">The segment on its clockwise side.</param>
/// <param name="Second">The segment on its counter-clockwise side.</param>
public readonly record struct InputAngle(int Node, Point Place, double Degrees, int First, int Second);
