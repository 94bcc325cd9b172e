using System.Collections.Immutable;
using System.Runtime.InteropServices;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// Turns a finished triangulation into a mesh: given points keep their numbers, added nodes and triangles are numbered
/// along a Hilbert curve, so that what lies together in the plane does so in memory.
/// </summary>
internal static class MeshNumbering
{
    public static Mesh Run(Triangulation mesh, ImmutableArray<Point> given, Refiner refiner)
    {
        int[] order = HilbertOrder.Along(mesh.Xy, mesh.VertexCount);
        var rank = new int[order.Length];
        for (int i = 0; i < order.Length; i++) rank[order[i]] = i;
        int[] triangles = TrianglesByRank(mesh, rank);

        int[] number = rank;
        var nodes = new Point[order.Length];
        int next = given.Length;
        foreach (int v in order)
        {
            number[v] = v < given.Length ? v : next++;
            nodes[number[v]] = v < given.Length ? given[v] : mesh.PointAt(v);
        }
        return Gather(mesh, number, nodes, triangles, refiner);
    }

    /// <summary>The triangles sorted by the first of their corners along the curve.</summary>
    private static int[] TrianglesByRank(Triangulation mesh, int[] rank)
    {
        var starts = new int[rank.Length + 1];
        for (int t = 0; t < mesh.TriangleCount; t++) starts[FirstRank(mesh, rank, t) + 1]++;
        for (int i = 1; i < starts.Length; i++) starts[i] += starts[i - 1];
        var triangles = new int[mesh.TriangleCount];
        for (int t = 0; t < mesh.TriangleCount; t++) triangles[starts[FirstRank(mesh, rank, t)]++] = t;
        return triangles;
    }

    private static int FirstRank(Triangulation mesh, int[] rank, int t) => Math.Min(
        rank[mesh.Corners[4 * t]],
        Math.Min(rank[mesh.Corners[4 * t + 1]], rank[mesh.Corners[4 * t + 2]]));

    private static Mesh Gather(Triangulation mesh, int[] number, Point[] nodes, int[] triangles, Refiner refiner)
    {
        int count = triangles.Length;
        var place = new int[count];
        for (int i = 0; i < count; i++) place[triangles[i]] = i;
        var corners = new int[3 * count];
        var neighbours = new int[3 * count];
        var segments = new int[3 * count];
        var regions = new int[count];
        var unrefined = ImmutableArray.CreateBuilder<UnrefinedTriangle>();
        for (int i = 0; i < count; i++)
        {
            int t = triangles[i];
            for (int k = 0; k < 3; k++)
            {
                int twin = mesh.Twins[4 * t + k];
                corners[3 * i + k] = number[mesh.Corners[4 * t + k]];
                neighbours[3 * i + k] = twin < 0 ? -1 : place[twin >> 2];
                segments[3 * i + k] = mesh.Segments[4 * t + k];
            }
            regions[i] = mesh.Corners[4 * t + 3];
            if (refiner.Complaint(t) is UnrefinedCause cause)
            {
                Point a = nodes[corners[3 * i]];
                Point b = nodes[corners[3 * i + 1]];
                Point c = nodes[corners[3 * i + 2]];
                unrefined.Add(new UnrefinedTriangle(i, (a + b + c) / 3, TriangleShape.SmallestAngle(a, b, c), cause));
            }
        }
        return new Mesh(
            ImmutableCollectionsMarshal.AsImmutableArray(nodes),
            ImmutableCollectionsMarshal.AsImmutableArray(corners),
            ImmutableCollectionsMarshal.AsImmutableArray(neighbours),
            ImmutableCollectionsMarshal.AsImmutableArray(regions),
            ImmutableCollectionsMarshal.AsImmutableArray(segments),
            unrefined.ToImmutable());
    }
}
