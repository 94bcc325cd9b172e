using System.Text;
using System.Text.Json;
using System.Text.RegularExpressions;
using MeshSection.Dxf.Overlay;
using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Properties;
using MeshSection.Sections;
using MeshSection.Torsion;
using MeshSection.Units;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Overlay;

/// <summary>Overlays, read back by ourselves and by a library that we did not write.</summary>
public class OverlayTest
{
    private const string Script =
        """
        import json, sys, ezdxf
        doc = ezdxf.readfile(sys.argv[1])
        found = doc.audit()
        def xy(p): return [p.x, p.y]
        def place(e):
            if e.dxftype() == "LINE": return xy(e.dxf.start) + xy(e.dxf.end)
            if e.dxftype() == "CIRCLE": return xy(e.dxf.center) + [e.dxf.radius]
            if e.dxftype() == "POINT": return xy(e.dxf.location)
            return xy(e.dxf.align_point if e.dxf.halign else e.dxf.insert) + [e.dxf.height]
        json.dump({
            "errors": [e.message for e in found.errors] + [e.message for e in found.fixes],
            "unit": doc.header["$INSUNITS"],
            "layers": [l.dxf.name for l in doc.layers],
            "marks": [{"kind": e.dxftype(), "layer": e.dxf.layer, "place": place(e), "text": e.dxf.text if e.dxftype() == "TEXT" else ""} for e in doc.modelspace()],
        }, sys.stdout)
        """;

    /// <summary>An angle of unequal legs: unit, where it lies, title.</summary>
    public static TheoryData<int, double, double, string> Places => new()
    {
        { 4, 0, 0, "angle" },
        { 1, 0, 0, "angle" },
        { 6, 5e5, 5e6, "Träger 断面 Ø" },
    };

    [Theory]
    [MemberData(nameof(Places))]
    public void Another_library_opens_it_without_a_repair_and_finds_the_results_in_their_places(int code, double x, double y, string title)
    {
        OutsidePython.SkipWithout("ezdxf");
        var (outline, properties, torsion, unit) = Angle(code, x, y);
        var path = Path.Combine(Path.GetTempPath(), Path.GetRandomFileName() + ".dxf");
        try
        {
            File.WriteAllBytes(path, Written(SectionOverlay.Of(outline, properties, torsion, unit, title)));
            using var read = JsonDocument.Parse(OutsidePython.Run(Script, path));
            var root = read.RootElement;
            Assert.Empty(root.GetProperty("errors").EnumerateArray());
            Assert.Equal(code, root.GetProperty("unit").GetInt32());
            Assert.Contains("MS-SHEAR-CENTRE", root.GetProperty("layers").EnumerateArray().Select(l => l.GetString()));
            AssertAt(properties.Centroid / unit.Millimetres, Place(root, "CIRCLE", "MS-CENTROID"));
            AssertAt(torsion.ShearCentre / unit.Millimetres, Place(root, "CIRCLE", "MS-SHEAR-CENTRE"));
            Assert.Equal(properties.PlasticX.NeutralAxis / unit.Millimetres, Place(root, "LINE", "MS-PLASTIC-NEUTRAL-AXES")[1]);
            var extremes = root.GetProperty("marks").EnumerateArray().Where(m => m.GetProperty("kind").GetString() == "POINT").ToArray();
            AssertAt(properties.ElasticX.Positive.Point / unit.Millimetres, Numbers(extremes[0]));
            AssertAt(properties.ElasticY.Negative.Point / unit.Millimetres, Numbers(extremes[3]));

            // That library leaves \U+ and four digits as they stand, which programs show as the letter.
            var texts = root.GetProperty("marks").EnumerateArray().Select(m => m.GetProperty("text").GetString()!);
            Assert.Contains(title, texts.Select(t => Regex.Replace(t, @"\\U\+([0-9A-F]{4})", m => ((char)Convert.ToInt32(m.Groups[1].Value, 16)).ToString())));
        }
        finally
        {
            File.Delete(path);
        }
    }

    [Fact]
    public void Principal_axes_run_along_the_principal_directions_through_the_centroid()
    {
        var (outline, properties, torsion, unit) = Angle(4, 0, 0);
        var overlay = SectionOverlay.Of(outline, properties, torsion, unit, "");
        var axes = overlay.Marks.OfType<OverlayStroke>().Where(s => s.Layer == "MS-PRINCIPAL-AXES").ToArray();
        var along = Point.Direction(properties.Principal.Angle * Math.PI / 180);
        Assert.Equal(0, (axes[0].End - axes[0].Start).Cross(along), 1e-9);
        Assert.Equal(0, (axes[1].End - axes[1].Start).Dot(along), 1e-9);
        Assert.All(axes, a => Assert.Equal(0, (a.End - a.Start).Cross(properties.Centroid - a.Start), 1e-7));
    }

    [Fact]
    public void Our_own_reader_finds_the_unit_and_every_line()
    {
        var (outline, properties, torsion, unit) = Angle(1, 0, 0);
        var overlay = SectionOverlay.Of(outline, properties, torsion, unit, "angle");
        var drawing = Read(Written(overlay));
        Assert.Equal(LengthUnit.Inch, drawing.Unit);
        Assert.Equal("AC1015", drawing.Release);
        Assert.Empty(drawing.Notes);
        Assert.Equal(overlay.Marks.Length, drawing.Entities.Length);
        Assert.Equal(overlay.Layers.Select(l => l.Name).Prepend("0"), drawing.Layers.Select(l => l.Name));
    }

    [Fact]
    public void Every_handle_is_there_once_and_the_bytes_are_the_same_each_time()
    {
        var (outline, properties, torsion, unit) = Angle(4, 0, 0);
        var bytes = Written(SectionOverlay.Of(outline, properties, torsion, unit, "angle"));
        Assert.Equal(bytes, Written(SectionOverlay.Of(outline, properties, torsion, unit, "angle")));
        var lines = Encoding.ASCII.GetString(bytes).Split('\n');
        var handles = Enumerable.Range(0, lines.Length / 2).Where(i => lines[2 * i] is "5" or "105").Select(i => lines[2 * i + 1]).Skip(1).ToArray();
        Assert.Equal(handles.Length, handles.Distinct().Count());
        Assert.All(bytes, b => Assert.InRange(b, (byte)'\n', (byte)'~'));
    }

    [Fact]
    public void A_section_of_separate_pieces_has_no_shear_centre()
    {
        var (outline, properties, _, unit) = Angle(4, 0, 0);
        Assert.DoesNotContain(SectionOverlay.Of(outline, properties, null, unit, "").Marks, m => m.Layer == "MS-SHEAR-CENTRE");
    }

    private static (Outline Outline, SectionProperties Properties, TorsionProperties Torsion, LengthUnit Unit) Angle(int code, double x, double y)
    {
        var text = Drawing(
            [LwPolyline([(x, y, 0), (x + 80, y, 0), (x + 80, y + 9, 0), (x + 15, y + 9, -0.4142135623730951), (x + 9, y + 15, 0), (x + 9, y + 120, 0), (x, y + 120, 0)])], code);
        var drawn = Outline(text);
        var flat = Flattening.For(drawn.Outline).Apply(drawn.Outline);
        var unit = drawn.Report.Unit;
        var mesh = new DelaunayMesher().Triangulate(flat.Graph, new MeshSettings { MaxArea = 20 * unit.Millimetres * unit.Millimetres });
        return (drawn.Outline, PropertiesAnalysis.Of(new Section(drawn.Outline), flat, mesh), TorsionAnalysis.Of(flat, mesh), unit);
    }

    private static byte[] Written(OverlayDrawing overlay)
    {
        using var stream = new MemoryStream();
        OverlayWriter.Write(stream, overlay);
        return stream.ToArray();
    }

    private static double[] Place(JsonElement root, string kind, string layer) => Numbers(root.GetProperty("marks").EnumerateArray()
        .First(m => m.GetProperty("kind").GetString() == kind && m.GetProperty("layer").GetString() == layer));

    private static double[] Numbers(JsonElement mark) => [.. mark.GetProperty("place").EnumerateArray().Select(n => n.GetDouble())];

    private static void AssertAt(Point expected, double[] actual) => Assert.Equal((expected.X, expected.Y), (actual[0], actual[1]));
}
