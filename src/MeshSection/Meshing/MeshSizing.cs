using System.Collections.Immutable;

namespace MeshSection.Meshing;

/// <summary>Meshes by what a person wants to say of their size: how many elements in all, and across a wall.</summary>
public static class MeshSizing
{
    /// <summary>
    /// A mesh is about as many elements as wanted if it misses by no more than this part of it; no finer aim is worth
    /// another mesh.
    /// </summary>
    public const double CountTolerance = 0.02;

    /// <summary>Rounds of refinement after which walls have the elements wanted, whatever the mesh was before.</summary>
    private const int MaxRounds = 40;

    /// <summary>Meshes to make at most in search of the number of elements.</summary>
    private const int MaxTries = 4;

    /// <summary>Triangles in a refined mesh for each time that the largest one would fit into the area, about.</summary>
    private const double TrianglesPerFit = 1.57;

    /// <summary>The largest area of a triangle, mm², with which a mesh comes out at about a number of triangles.</summary>
    /// <param name="area">The area of the graph's regions, mm².</param>
    /// <param name="count">How many triangles are wanted, positive.</param>
    public static double LargestAreaFor(double area, int count) => TrianglesPerFit * area / count;

    /// <summary>
    /// Makes a mesh of as many triangles as wanted, to <see cref="CountTolerance"/>, all of about one size; of more only
    /// where the outline and the smallest angle need them.
    /// </summary>
    /// <param name="mesher">What makes the meshes.</param>
    /// <param name="graph">The graph.</param>
    /// <param name="settings">What else is asked of the mesh; its largest area is left aside.</param>
    /// <param name="area">The area of the graph's regions, mm².</param>
    /// <param name="count">How many triangles are wanted, positive.</param>
    /// <param name="cancellation">Ends the work early.</param>
    public static Mesh ForCount(
        IMesher mesher,
        PlanarGraph graph,
        MeshSettings settings,
        double area,
        int count,
        CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(mesher);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentOutOfRangeException.ThrowIfLessThan(count, 1);
        (double fits, Mesh best) = (count / TrianglesPerFit, Tried(count / TrianglesPerFit));
        (double otherFits, int otherCount) = (0, 0);
        for (int i = 1; i < MaxTries && Miss(best, count) > CountTolerance; i++)
        {
            // The count grows nearly in a straight line with how often the largest triangle fits; at first, from nothing.
            double next = fits + (count - best.TriangleCount) * (fits - otherFits) / (best.TriangleCount - otherCount);

            // Where the outline needs more than are wanted, no area is large enough.
            next = next > 1 ? next : 1;
            if (next == fits) break;
            Mesh mesh = Tried(next);
            bool isBetter = Miss(mesh, count) < Miss(best, count);
            (otherFits, otherCount) = isBetter ? (fits, best.TriangleCount) : (next, mesh.TriangleCount);
            (fits, best) = isBetter ? (next, mesh) : (fits, best);
            if (otherCount == best.TriangleCount) break;
        }
        return best;

        Mesh Tried(double fit) => mesher.Triangulate(graph, settings with { MaxArea = area / fit }, cancellation);
    }

    /// <summary>
    /// Refines a mesh until from face to face of every wall it takes a number of sides at least; see
    /// <see cref="WallSurvey.SidesFor"/>.
    /// </summary>
    /// <param name="mesher">What refines it.</param>
    /// <param name="mesh">The mesh.</param>
    /// <param name="graph">The graph that it covers.</param>
    /// <param name="settings">What else is asked of the mesh.</param>
    /// <param name="count">How many elements are wanted across every wall, positive.</param>
    /// <param name="cancellation">Ends the work early.</param>
    /// <returns>The mesh; short of what is wanted only where it could not be refined, which it lists.</returns>
    public static Mesh AcrossWalls(
        IMesher mesher,
        Mesh mesh,
        PlanarGraph graph,
        MeshSettings settings,
        int count,
        CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(mesher);
        ArgumentNullException.ThrowIfNull(mesh);
        ArgumentNullException.ThrowIfNull(graph);
        ArgumentNullException.ThrowIfNull(settings);
        for (int round = 0; round < MaxRounds; round++)
        {
            ImmutableArray<double> sides = WallSurvey.Of(mesh, graph).SidesFor(count);
            if (sides.IsEmpty) break;
            int before = mesh.TriangleCount;
            mesh = mesher.Refine(mesh, graph, sides, settings, cancellation);
            if (mesh.TriangleCount == before) break;
        }
        return mesh;
    }

    private static double Miss(Mesh mesh, int count) => Math.Abs((double)mesh.TriangleCount / count - 1);
}
