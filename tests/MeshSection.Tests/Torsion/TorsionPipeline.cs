using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;
using MeshSection.Torsion;

namespace MeshSection.Tests.Torsion;

/// <summary>The way from boundaries to torsion properties.</summary>
internal static class TorsionPipeline
{
    public static TorsionProperties Of(ImmutableArray<Boundary> boundaries, double triangles = 400, double poissonRatio = 0) =>
        Of(Outline.Create(boundaries), triangles, poissonRatio);

    public static TorsionProperties Of(Outline outline, double triangles = 400, double poissonRatio = 0)
    {
        var (flat, mesh) = Pipeline.Mesh(outline, triangles);
        return TorsionAnalysis.Of(flat, mesh, poissonRatio);
    }

    /// <summary>
    /// The same on a mesh of few chords and triangles, each then cut into four, several times over: the curves are
    /// followed however coarse the chords.
    /// </summary>
    public static List<TorsionProperties> Refined(
        ImmutableArray<Boundary> boundaries, int rounds, double triangles = 20, double poissonRatio = 0)
    {
        var outline = Outline.Create(boundaries);
        var flat = new Flattening(0.02 * outline.Bounds.Diagonal, 30).Apply(outline);
        var area = new BoundaryIntegrator(outline).Moments(outline.Bounds.Centre).Area;
        var mesh = new DelaunayMesher().Triangulate(flat.Graph, new MeshSettings { MaxArea = area / triangles });
        var results = new List<TorsionProperties>();
        for (var round = 0; round <= rounds; round++)
        {
            results.Add(TorsionAnalysis.Of(flat, mesh, poissonRatio));
            mesh = NestedRefinement.Of(mesh);
        }

        return results;
    }
}
