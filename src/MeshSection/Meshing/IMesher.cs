using System.Collections.Immutable;

namespace MeshSection.Meshing;

/// <summary>Makes a mesh of a planar straight-line graph: the seam at which another mesher could take the place of ours.</summary>
public interface IMesher
{
    /// <summary>Triangulates the regions of the graph.</summary>
    /// <param name="graph">Distinct points, and segments that meet only in them.</param>
    /// <param name="settings">Quality and size asked for.</param>
    /// <param name="cancellation">Ends the work early, with an <see cref="OperationCanceledException"/>.</param>
    /// <exception cref="MeshingException">Two segments cross, or a point lies on a segment it does not belong to.</exception>
    Mesh Triangulate(PlanarGraph graph, MeshSettings settings, CancellationToken cancellation = default);

    /// <summary>
    /// Refines a mesh where that is asked for, and keeps the rest: its nodes keep their numbers, and so do their places.
    /// Triangles next to those refined change only as far as the smallest angle asks for it.
    /// </summary>
    /// <param name="mesh">A mesh of the graph.</param>
    /// <param name="graph">The graph.</param>
    /// <param name="sides">
    /// The longest side wanted within each triangle of the mesh, mm, positive; infinite to keep it; length TriangleCount.
    /// A new triangle is held to what the triangle around its centroid asks for.
    /// </param>
    /// <param name="settings">Quality and size asked for everywhere, as when the mesh was made.</param>
    /// <param name="cancellation">Ends the work early, with an <see cref="OperationCanceledException"/>.</param>
    Mesh Refine(
        Mesh mesh,
        PlanarGraph graph,
        ImmutableArray<double> sides,
        MeshSettings settings,
        CancellationToken cancellation = default);
}
