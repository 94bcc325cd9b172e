using BenchmarkDotNet.Attributes;
using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;
using MeshSection.Properties;
using MeshSection.Sections;
using MeshSection.Sections.Shapes;
using MeshSection.Torsion;

namespace MeshSection.Benchmarks;

/// <summary>
/// The integrators on a box girder's 200-edge outline with fillets, as ratios to a plain pass over the same triangles
/// that only adds up their areas.
/// </summary>
[MemoryDiagnoser]
public class IntegrationBenchmarks
{
    private Section _section = null!;
    private FlatOutline _flat = null!;
    private Mesh _mesh = null!;
    private FiberIntegrator _fibers = null!;
    private BoundaryIntegrator _boundary = null!;

    /// <summary>How many triangles.</summary>
    [Params(10_000, 100_000)]
    public int Triangles { get; set; }

    /// <summary>Meshes the section.</summary>
    [GlobalSetup]
    public void Setup()
    {
        // An outer box and 24 cells, eight edges each.
        List<Boundary> loops = [.. new Rectangle(650, 120, 8).Boundaries()];
        for (var cell = 0; cell < 24; cell++)
        {
            loops.AddRange(new Rectangle(22, 100, 4).Boundaries().Select(b => b.Placed(Placement.Moved(26 * (cell - 11.5), 10))));
        }

        _section = new Section(Outline.Create(loops));
        _boundary = new BoundaryIntegrator(_section.Outline);
        _flat = Flattening.For(_section.Outline).Apply(_section.Outline);
        var area = _boundary.Moments(default).Area;
        _mesh = new DelaunayMesher().Triangulate(_flat.Graph, new MeshSettings { MaxArea = area / (0.65 * Triangles) });
        _fibers = new FiberIntegrator(_mesh, _flat);
    }

    /// <summary>The reference: one pass that adds up areas.</summary>
    [Benchmark(Baseline = true)]
    public double AreasOnly()
    {
        var nodes = _mesh.Nodes.AsSpan();
        var corners = _mesh.Corners.AsSpan();
        var sum = 0.0;
        for (var i = 0; i < corners.Length; i += 3)
        {
            var a = nodes[corners[i]];
            sum += (nodes[corners[i + 1]] - a).Cross(nodes[corners[i + 2]] - a);
        }

        return sum / 2;
    }

    /// <summary>All moments over the fibers.</summary>
    [Benchmark]
    public AreaMoments FiberMoments() => _fibers.Moments(new Point(1, 2));

    /// <summary>The part beyond a line over the fibers.</summary>
    [Benchmark]
    public PartBeyond FiberBeyond() => _fibers.Beyond(Point.Direction(1), 60);

    /// <summary>All moments around the boundary.</summary>
    [Benchmark]
    public AreaMoments BoundaryMoments() => _boundary.Moments(new Point(1, 2));

    /// <summary>The part beyond a line around the boundary.</summary>
    [Benchmark]
    public PartBeyond BoundaryBeyond() => _boundary.Beyond(Point.Direction(1), 60);

    /// <summary>Every area property by both.</summary>
    [Benchmark]
    public SectionProperties AllAreaProperties() => PropertiesAnalysis.Of(_section, _flat, _mesh);

    /// <summary>Torsion, warping and shear.</summary>
    [Benchmark]
    public TorsionProperties TorsionAndShear() => TorsionAnalysis.Of(_flat, _mesh);
}
