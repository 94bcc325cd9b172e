using System.Globalization;
using System.Text;
using MeshSection.Dxf.Entities;

namespace MeshSection.Dxf.Tests;

/// <summary>Writes small drawings for the tests.</summary>
internal static class DxfText
{
    public static string Drawing(IEnumerable<string> entities, int? unit = 4, string release = "AC1015", string layers = "") =>
        Tagged((0, "SECTION"), (2, "HEADER"), (9, "$ACADVER"), (1, release)) +
        (unit is { } code ? Tagged((9, "$INSUNITS"), (70, code)) : "") +
        Tagged((0, "ENDSEC"), (0, "SECTION"), (2, "TABLES"), (0, "TABLE"), (2, "LAYER")) + layers +
        Tagged((0, "ENDTAB"), (0, "ENDSEC"), (0, "SECTION"), (2, "ENTITIES")) + string.Concat(entities) +
        Tagged((0, "ENDSEC"), (0, "EOF"));

    public static string Layer(string name, int colour = 7, int flags = 0) =>
        Tagged((0, "LAYER"), (2, name), (70, flags), (62, colour), (6, "CONTINUOUS"));

    public static string Line(double x1, double y1, double x2, double y2, string handle = "A1", string layer = "0") =>
        Head("LINE", handle, layer) + Tagged((10, x1), (20, y1), (30, 0), (11, x2), (21, y2), (31, 0));

    public static string Arc(
        double x, double y, double r, double from, double to, string handle = "A2", string layer = "0", bool isMirrored = false) =>
        Head("ARC", handle, layer) + Tagged((10, x), (20, y), (30, 0), (40, r), (50, from), (51, to)) + Extrusion(isMirrored);

    public static string Circle(double x, double y, double r, string handle = "A3", string layer = "0") =>
        Head("CIRCLE", handle, layer) + Tagged((10, x), (20, y), (30, 0), (40, r));

    public static string LwPolyline(
        IReadOnlyList<(double X, double Y, double Bulge)> vertices,
        bool isClosed = true,
        string handle = "A4",
        string layer = "0",
        bool isMirrored = false) =>
        Head("LWPOLYLINE", handle, layer) + Tagged((90, vertices.Count), (70, isClosed ? 1 : 0)) +
        string.Concat(vertices.Select(v => Tagged((10, v.X), (20, v.Y)) + (v.Bulge == 0 ? "" : Tagged((42, v.Bulge))))) +
        Extrusion(isMirrored);

    public static string Polyline(
        IReadOnlyList<(double X, double Y, double Bulge)> vertices, bool isClosed = true, string handle = "A5", string layer = "0") =>
        Head("POLYLINE", handle, layer) + Tagged((66, 1), (10, 0), (20, 0), (30, 0), (70, isClosed ? 1 : 0)) +
        string.Concat(vertices.Select((v, i) =>
            Head("VERTEX", $"{handle}{i:X2}", layer) + Tagged((10, v.X), (20, v.Y), (30, 0), (42, v.Bulge), (70, 0)))) +
        Head("SEQEND", handle + "FF", layer);

    public static string Square(double x, double y, double side, string handle = "A6", string layer = "0") =>
        LwPolyline([(x, y, 0), (x + side, y, 0), (x + side, y + side, 0), (x, y + side, 0)], handle: handle, layer: layer);

    public static string Tagged(params (int Code, object Value)[] tags)
    {
        var text = new StringBuilder();
        foreach (var (code, value) in tags)
        {
            text.Append(CultureInfo.InvariantCulture, $"{code,3}\n{(value is double d ? d.ToString("R", CultureInfo.InvariantCulture) : value)}\n");
        }

        return text.ToString();
    }

    public static Drawing Read(string text) => Read(Encoding.Latin1.GetBytes(text));

    public static Drawing Read(byte[] bytes) => new DxfReader().Read(new MemoryStream(bytes));

    public static DrawingOutline Outline(string text, OutlineOptions? options = null) =>
        DrawingOutliner.Outline(Read(text), options ?? new OutlineOptions());

    public static DrawingException Refusal(string text, OutlineOptions? options = null) =>
        Assert.Throws<DrawingException>(() => Outline(text, options));

    private static string Head(string kind, string handle, string layer) => Tagged((0, kind), (5, handle), (8, layer));

    private static string Extrusion(bool isMirrored) => isMirrored ? Tagged((210, 0), (220, 0), (230, -1)) : "";
}
