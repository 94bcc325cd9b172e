using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;
using MeshSection.Properties;
using MeshSection.Sections;

namespace MeshSection.Tests;

/// <summary>The way from an outline to its properties, as the command goes it.</summary>
internal static class Pipeline
{
    public static SectionProperties Properties(Outline outline, double triangles = 400)
    {
        var (flat, mesh) = Mesh(outline, triangles);
        return PropertiesAnalysis.Of(new Section(outline), flat, mesh);
    }

    public static (FlatOutline Flat, Mesh Mesh) Mesh(Outline outline, double triangles = 400)
    {
        var flat = Flattening.For(outline).Apply(outline);
        var area = new BoundaryIntegrator(outline).Moments(outline.Bounds.Centre).Area;
        return (flat, new DelaunayMesher().Triangulate(flat.Graph, new MeshSettings { MaxArea = area / triangles }));
    }
}
