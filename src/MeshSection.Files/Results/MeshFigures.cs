using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Meshing;

namespace MeshSection.Files.Results;

/// <summary>What a reader wants to know of a mesh at a glance.</summary>
/// <param name="MinAngle">The smallest angle of any triangle, degrees.</param>
/// <param name="MaxAngle">The greatest angle of any triangle, degrees.</param>
/// <param name="LargestTriangle">The largest area of any triangle, mm².</param>
/// <param name="RegionAreas">The area of each region's triangles, mm².</param>
internal sealed record MeshFigures(
    double MinAngle, double MaxAngle, double LargestTriangle, ImmutableArray<double> RegionAreas)
{
    public static MeshFigures Of(Mesh mesh)
    {
        var (minAngle, maxAngle, largest) = (180.0, 0.0, 0.0);
        var regions = new double[mesh.Regions.IsEmpty ? 0 : mesh.Regions.Max() + 1];
        for (var t = 0; t < mesh.TriangleCount; t++)
        {
            for (var k = 0; k < 3; k++)
            {
                var (to, from) = Sides(mesh, t, k);
                var angle = double.RadiansToDegrees(Math.Atan2(to.Cross(from), to.Dot(from)));
                minAngle = Math.Min(minAngle, angle);
                maxAngle = Math.Max(maxAngle, angle);
            }

            var (a, b) = Sides(mesh, t, 0);
            var area = 0.5 * a.Cross(b);
            largest = Math.Max(largest, area);
            regions[mesh.Regions[t]] += area;
        }

        return new MeshFigures(minAngle, maxAngle, largest, [.. regions]);
    }

    /// <summary>The two sides that leave a corner, to the next and to the one before.</summary>
    private static (Point Next, Point Before) Sides(Mesh mesh, int triangle, int corner)
    {
        Point Node(int k) => mesh.Nodes[mesh.Corners[3 * triangle + k % 3]];
        return (Node(corner + 1) - Node(corner), Node(corner + 2) - Node(corner));
    }
}
