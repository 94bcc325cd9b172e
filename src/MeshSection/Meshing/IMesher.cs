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
}
