using MeshSection.Dxf.Space;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>An affine map from the plane of an entity to the plane of the drawing.</summary>
/// <param name="U">Where the vector along x goes.</param>
/// <param name="V">Where the vector along y goes.</param>
/// <param name="Shift">Where the origin goes.</param>
internal readonly record struct PlaneMap(Point U, Point V, Point Shift)
{
    // How far it may be from turning and scaling alone, so that circles stay circles: rounding only.
    private const double Roundness = 1e-9;

    /// <summary>From a plane at an elevation, through a map of space, to the drawing's plane.</summary>
    public static PlaneMap Of(SpaceMap map, double elevation, DrawingPlane plane) => new(
        plane.Project(map.X), plane.Project(map.Y), plane.Project(map.Apply(new SpacePoint(0, 0, elevation))));

    /// <summary>True if circles stay circles.</summary>
    public bool KeepsCircles =>
        Math.Abs(U.Length - V.Length) <= Roundness * U.Length && Math.Abs(U.Dot(V)) <= Roundness * U.Dot(U);

    /// <summary>True if left and right are exchanged.</summary>
    public bool Mirrors => U.Cross(V) < 0;

    public Point Apply(Point p) => p.X * U + p.Y * V + Shift;
}
