using System.Collections.Immutable;

namespace MeshSection.Meshing;

/// <summary>
/// The walls of a mesh, found from its geometry alone. Every edge on the boundary of a region looks straight into the
/// region; where a boundary that faces it, turned by at least 150 degrees against it, comes first, there is a wall. Two
/// segments that meet in a corner are no wall, for their distance comes down to nothing.
/// </summary>
public sealed class WallSurvey
{
    /// <summary>
    /// Triangles that fill half of a square of the longest side: found by meshing, for sides come out at 0.7 of the longest.
    /// </summary>
    private const double TrianglesPerSquare = 2.5;

    private readonly Mesh mesh;
    private readonly PlanarGraph graph;
    private readonly ImmutableArray<int> edges;
    private readonly ImmutableArray<double> thicknesses;

    private WallSurvey(Mesh mesh, PlanarGraph graph, ImmutableArray<int> edges, ImmutableArray<double> thicknesses)
    {
        this.mesh = mesh;
        this.graph = graph;
        this.edges = edges;
        this.thicknesses = thicknesses;
    }

    /// <summary>The thinnest wall of a mesh, the first of equals; null if no boundaries face each other.</summary>
    /// <param name="mesh">The mesh.</param>
    /// <param name="graph">The graph that it covers.</param>
    public static Wall? Thinnest(Mesh mesh, PlanarGraph graph)
    {
        ArgumentNullException.ThrowIfNull(mesh);
        ArgumentNullException.ThrowIfNull(graph);
        var strip = new WallStrip(mesh, graph);
        double least = double.PositiveInfinity;
        int thinnest = -1;
        for (int e = 0; e < mesh.Segments.Length; e++)
        {
            if (!strip.IsFace(e)) continue;
            double thickness = strip.Thickness(e, least);
            if (thickness >= least) continue;
            (least, thinnest) = (thickness, e);
        }
        return thinnest < 0 ? null : strip.WallAt(thinnest);
    }

    /// <summary>Surveys every wall of a mesh.</summary>
    /// <param name="mesh">The mesh.</param>
    /// <param name="graph">The graph that it covers.</param>
    public static WallSurvey Of(Mesh mesh, PlanarGraph graph)
    {
        ArgumentNullException.ThrowIfNull(mesh);
        ArgumentNullException.ThrowIfNull(graph);
        var strip = new WallStrip(mesh, graph);
        var edges = ImmutableArray.CreateBuilder<int>();
        var thicknesses = ImmutableArray.CreateBuilder<double>();
        for (int e = 0; e < mesh.Segments.Length; e++)
        {
            if (!strip.IsFace(e)) continue;
            double thickness = strip.Thickness(e);
            if (double.IsPositiveInfinity(thickness)) continue;
            edges.Add(e);
            thicknesses.Add(thickness);
        }
        return new WallSurvey(mesh, graph, edges.ToImmutable(), thicknesses.ToImmutable());
    }

    /// <summary>About how many triangles the walls take for a number of elements across every one.</summary>
    /// <param name="count">How many elements are wanted across.</param>
    public double Estimate(int count)
    {
        double sum = 0;
        for (int i = 0; i < edges.Length; i++)
        {
            double length = mesh.Nodes[MeshEdge.From(mesh, edges[i])].DistanceTo(mesh.Nodes[MeshEdge.To(mesh, edges[i])]);
            sum += TrianglesPerSquare * length / thicknesses[i] * count * count;
        }
        return sum;
    }

    /// <summary>
    /// The longest side that each triangle may have for a number of elements across every wall: the thickness divided by
    /// it. From face to face it then takes that many sides at least, and every straight way across runs through that many
    /// triangles at least, for none is longer in a triangle than the triangle's longest side.
    /// </summary>
    /// <param name="count">How many elements are wanted across every wall, positive.</param>
    /// <returns>
    /// The sides, mm, infinite where a triangle is in no wall or small enough, length TriangleCount; an empty array if
    /// all are.
    /// </returns>
    public ImmutableArray<double> SidesFor(int count)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(count, 1);
        var sides = new double[mesh.TriangleCount];
        Array.Fill(sides, double.PositiveInfinity);
        var strip = new WallStrip(mesh, graph);
        bool isAny = false;
        for (int i = 0; i < edges.Length; i++)
        {
            double side = thicknesses[i] / count;
            foreach (int t in strip.Triangles(edges[i], thicknesses[i]))
            {
                if (strip.LongestSide(t) <= side) continue;
                sides[t] = Math.Min(sides[t], side);
                isAny = true;
            }
        }
        return isAny ? [.. sides] : [];
    }
}
