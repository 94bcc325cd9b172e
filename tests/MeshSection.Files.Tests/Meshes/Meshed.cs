using MeshSection.Files.Meshes;
using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Units;

namespace MeshSection.Files.Tests.Meshes;

/// <summary>A tube far from the origin, with a line and a point to keep, as a mesh of either order.</summary>
internal sealed class Meshed
{
    private Meshed()
    {
        var outline = Outline.Create([Boundary.Circle(default, 50), Boundary.Circle(new(5, 0), 30)], new Point(2540, -254));
        Flat = new Flattening(1, 20).Apply(outline, new MeshConstraints([new(-40, 5)], [new(new(-45, 0), new(-30, 0))]));
        Mesh = new DelaunayMesher().Triangulate(Flat.Graph, new MeshSettings { MaxSide = 15 });
        Curved = CurvedMesh.Fit(Flat, Mesh);
    }

    public static Meshed Tube { get; } = new();

    public FlatOutline Flat { get; }

    public Mesh Mesh { get; }

    public CurvedMesh Curved { get; }

    public MeshFile Of(int order) => order == 1
        ? MeshFile.OfFirstOrder(Flat, Mesh, LengthUnit.Inch)
        : MeshFile.OfSecondOrder(Flat, Curved, LengthUnit.Inch);

    /// <summary>Area of the triangles, each with its sides as parabolas, by Green's theorem: in the square of the unit.</summary>
    public static double Area(IReadOnlyList<Point> nodes, IReadOnlyList<int[]> elements)
    {
        var area = 0.0;
        foreach (var e in elements)
        {
            for (var k = 0; k < 3; k++)
            {
                var (a, b) = (nodes[e[k]], nodes[e[(k + 1) % 3]]);
                area += 0.5 * (a - nodes[0]).Cross(b - nodes[0]);
                if (e.Length == 6)
                {
                    area += 2.0 / 3 * (nodes[e[3 + k]] - a).Cross(b - nodes[e[3 + k]]);
                }
            }
        }

        return area;
    }
}
