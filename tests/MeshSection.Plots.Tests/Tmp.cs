using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Plots.Tests.Samples;
namespace MeshSection.Plots.Tests;
public class Tmp
{
    [Fact]
    public void Render()
    {
        Directory.CreateDirectory("/tmp/h/plots-out");
        foreach (var (name, s) in Hostile.All)
        {
            PngWriter.Save(s.Figure(), $"/tmp/h/plots-out/section-{name.Replace(' ', '-')}.png");
        }
        var a = Sample.Tube("Tube 168.3 × 20, mesh", 64.15, 84.15, 60, 4);
        PngWriter.Save(MeshFigure.Of(a.Section, a.Mesh, DisplayUnit.Millimetre), "/tmp/h/plots-out/mesh-tube.png");
        a = Sample.Angle();
        var m = a.Mesh;
        m = new Mesh(m.Nodes, m.Corners, m.Neighbours, m.Regions, m.Segments, [new(5, default, 12, UnrefinedCause.InputAngle), new(80, default, 12, UnrefinedCause.NodeLimit)]);
        PngWriter.Save(MeshFigure.Of(a.Section, m, DisplayUnit.Millimetre), "/tmp/h/plots-out/mesh-angle.png");
        double b = Math.Tan(Math.PI / 8);
        Edge[] plate = [
            new LineEdge(new(20, 0), new(180, 0)), new ArcEdge(new(180, 0), new(200, 20), b),
            new LineEdge(new(200, 20), new(200, 100)), new ArcEdge(new(200, 100), new(180, 120), b),
            new LineEdge(new(180, 120), new(20, 120)), new ArcEdge(new(20, 120), new(0, 100), b),
            new LineEdge(new(0, 100), new(0, 20)), new ArcEdge(new(0, 20), new(20, 0), b)];
        var outline = Outline.Create([Boundary.Create(plate), Boundary.Circle(new(60, 60), 35), Boundary.Circle(new(60, 60), 15), Boundary.Polygon([new(120, 30), new(180, 30), new(180, 90), new(120, 90)])]);
        PngWriter.Save(OutlineFigure.Of(outline, "Plate with holes", DisplayUnit.Millimetre, [new(new(180, 60), "gap 0.02 bridged"), new(new(100, 120), "duplicate left out")]), "/tmp/h/plots-out/outline-plate.png");
        var many = Outline.Create([Boundary.Polygon([new(0, 0), new(410, 0), new(410, 210), new(0, 210)]), .. Enumerable.Range(0, 800).Select(i => Boundary.Circle(new(10 + 10 * (i % 40), 10 + 10 * (i / 40)), 3))]);
        PngWriter.Save(OutlineFigure.Of(many, "Perforated plate", DisplayUnit.Millimetre, []), "/tmp/h/plots-out/outline-many.png");
        var big = Sample.Rectangle(200, 100, 2, "Ten thousand triangles");
        var w = System.Diagnostics.Stopwatch.StartNew();
        PngWriter.Save(big.Figure(), "/tmp/h/plots-out/section-10000.png");
        TestContext.Current.TestOutputHelper!.WriteLine($"{big.Mesh.TriangleCount} {w.ElapsedMilliseconds} ms");
        w.Restart(); var f = big.Figure(); TestContext.Current.TestOutputHelper!.WriteLine($"layout {w.ElapsedMilliseconds} ms");
        w.Restart(); PngWriter.Encode(f); TestContext.Current.TestOutputHelper!.WriteLine($"encode {w.ElapsedMilliseconds} ms");
    }
}
