using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>How finely the coordinates of a graph can place a point.</summary>
internal static class Digits
{
    /// <summary>
    /// How far rounding may put a node off the segment it was computed on: four units in the last place of the largest
    /// coordinate, mm.
    /// </summary>
    public static double Resolution(PlanarGraph graph)
    {
        double largest = 0;
        foreach (Point p in graph.Points) largest = Math.Max(largest, Math.Max(Math.Abs(p.X), Math.Abs(p.Y)));
        return 4 * (Math.BitIncrement(largest) - largest);
    }
}
