using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>Figures that tell how good a mesh is.</summary>
/// <param name="Nodes">How many nodes there are.</param>
/// <param name="Triangles">How many triangles there are.</param>
/// <param name="SmallestAngle">The smallest angle of any triangle, degrees; NaN without triangles.</param>
/// <param name="SmallestAngleTriangle">The triangle that has it, the first of equals; -1 without triangles.</param>
/// <param name="SmallestAnglePlace">The corner where it is, mm.</param>
/// <param name="LargestAngle">The largest angle of any triangle, degrees; NaN without triangles.</param>
/// <param name="LargestArea">The largest area of any triangle, mm².</param>
/// <param name="AngleHistogram">
/// How many angles lie in each ten degrees from 0 to 180; length 18, three angles a triangle.
/// </param>
public sealed record MeshQuality(
    int Nodes,
    int Triangles,
    double SmallestAngle,
    int SmallestAngleTriangle,
    Point SmallestAnglePlace,
    double LargestAngle,
    double LargestArea,
    ImmutableArray<int> AngleHistogram)
{
    private const int BinCount = 18;

    /// <summary>Measures a mesh.</summary>
    /// <param name="mesh">The mesh.</param>
    public static MeshQuality Of(Mesh mesh)
    {
        ArgumentNullException.ThrowIfNull(mesh);
        var bins = new int[BinCount];
        double smallest = double.PositiveInfinity;
        double largest = 0;
        double largestArea = 0;
        int smallestTriangle = -1;
        Point smallestPlace = Point.Origin;
        for (int e = 0; e < mesh.Corners.Length; e++)
        {
            Point a = mesh.Nodes[mesh.Corners[e]];
            Point b = mesh.Nodes[MeshEdge.From(mesh, e)];
            Point c = mesh.Nodes[MeshEdge.To(mesh, e)];
            double angle = TriangleShape.AngleAt(a, b, c);
            bins[Math.Clamp((int)(angle / 10), 0, BinCount - 1)]++;
            largest = Math.Max(largest, angle);
            if (e % 3 == 0) largestArea = Math.Max(largestArea, TriangleShape.Area(a, b, c));
            if (angle >= smallest) continue;
            smallest = angle;
            smallestTriangle = e / 3;
            smallestPlace = a;
        }
        bool isEmpty = smallestTriangle < 0;
        return new MeshQuality(
            mesh.Nodes.Length,
            mesh.TriangleCount,
            isEmpty ? double.NaN : smallest,
            smallestTriangle,
            smallestPlace,
            isEmpty ? double.NaN : largest,
            largestArea,
            [.. bins]);
    }
}
