using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>What the triangles of one region come to.</summary>
/// <param name="Triangles">How many there are.</param>
/// <param name="Area">Their area, mm².</param>
/// <param name="Centroid">Its centroid, mm; NaN without triangles.</param>
public readonly record struct MeshRegion(int Triangles, double Area, Point Centroid)
{
    /// <summary>Each region of a mesh, by its number.</summary>
    /// <param name="mesh">The mesh.</param>
    public static ImmutableArray<MeshRegion> Of(Mesh mesh)
    {
        ArgumentNullException.ThrowIfNull(mesh);
        int count = mesh.Regions.IsEmpty ? 0 : mesh.Regions.Max() + 1;
        var triangles = new int[count];
        var areas = new double[count];
        var moments = new Point[count];
        for (int t = 0; t < mesh.TriangleCount; t++)
        {
            Point a = mesh.Nodes[mesh.Corners[3 * t]];
            Point b = mesh.Nodes[mesh.Corners[3 * t + 1]];
            Point c = mesh.Nodes[mesh.Corners[3 * t + 2]];
            int region = mesh.Regions[t];
            double area = TriangleShape.Area(a, b, c);
            triangles[region]++;
            areas[region] += area;
            moments[region] += area / 3 * (a + b + c);
        }
        return [.. Enumerable.Range(0, count).Select(r => new MeshRegion(triangles[r], areas[r], moments[r] / areas[r]))];
    }
}
