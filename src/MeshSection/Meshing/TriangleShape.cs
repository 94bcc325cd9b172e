using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>Angles and area of a triangle with its corners counter-clockwise.</summary>
internal static class TriangleShape
{
    public static double Area(Point a, Point b, Point c) => 0.5 * (b - a).Cross(c - a);

    /// <summary>The angle at a, degrees.</summary>
    public static double AngleAt(Point a, Point b, Point c) =>
        Math.Atan2((b - a).Cross(c - a), (b - a).Dot(c - a)) * (180 / Math.PI);

    /// <summary>The smallest angle, degrees.</summary>
    public static double SmallestAngle(Point a, Point b, Point c) =>
        Math.Min(AngleAt(a, b, c), Math.Min(AngleAt(b, c, a), AngleAt(c, a, b)));

    /// <summary>The longest side, in the unit of the corners.</summary>
    public static double LongestSide(Point a, Point b, Point c) =>
        Math.Max(a.DistanceTo(b), Math.Max(b.DistanceTo(c), c.DistanceTo(a)));
}
