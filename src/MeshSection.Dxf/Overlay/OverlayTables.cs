namespace MeshSection.Dxf.Overlay;

/// <summary>Writes the tables that a drawing of release 2000 must have.</summary>
internal static class OverlayTables
{
    public static void Write(TagWriter tags, OverlayDrawing overlay, string modelRecord, string paperRecord)
    {
        var centre = overlay.Marks.OfType<OverlayCircle>().Select(c => c.Centre).FirstOrDefault();
        Table(tags, "VPORT", 1, owner => Entry(tags, "VPORT", owner, "AcDbViewportTableRecord", "*Active")
            .Tag(10, 0.0).Tag(20, 0.0).Tag(11, 1.0).Tag(21, 1.0).Tag(12, centre.X).Tag(22, centre.Y)
            .Tag(16, 0.0).Tag(26, 0.0).Tag(36, 1.0).Tag(17, 0.0).Tag(27, 0.0).Tag(37, 0.0).Tag(40, 1.5 * overlay.Size).Tag(41, 1.5));
        Table(tags, "LTYPE", 5, owner => LineTypes(tags, owner, overlay.Size));
        Table(tags, "LAYER", overlay.Layers.Length + 1, owner =>
        {
            Layer(tags, owner, new OverlayLayer("0", 7));
            foreach (var layer in overlay.Layers)
            {
                Layer(tags, owner, layer);
            }
        });
        Table(tags, "STYLE", 1, owner => Entry(tags, "STYLE", owner, "AcDbTextStyleTableRecord", "Standard")
            .Tag(40, 0.0).Tag(41, 1.0).Tag(50, 0.0).Tag(71, 0).Tag(42, 2.5).Tag(3, "txt").Tag(4, ""));
        Table(tags, "VIEW", 0, _ => { });
        Table(tags, "UCS", 0, _ => { });
        Table(tags, "APPID", 1, owner => Entry(tags, "APPID", owner, "AcDbRegAppTableRecord", "ACAD"));
        Table(tags, "DIMSTYLE", 1, owner => DimensionStyle(tags, owner));
        Table(tags, "BLOCK_RECORD", 2, owner =>
        {
            Record(tags, owner, modelRecord, "*Model_Space");
            Record(tags, owner, paperRecord, "*Paper_Space");
        });
    }

    private static void Table(TagWriter tags, string name, int count, Action<string> write)
    {
        var handle = tags.NewHandle();
        tags.Tag(0, "TABLE").Tag(2, name).Tag(5, handle).Tag(330, "0").Tag(100, "AcDbSymbolTable").Tag(70, count);
        if (name == "DIMSTYLE")
        {
            tags.Tag(100, "AcDbDimStyleTable");
        }

        write(handle);
        tags.Tag(0, "ENDTAB");
    }

    private static TagWriter Entry(TagWriter tags, string kind, string owner, string subclass, string name) => tags
        .Tag(0, kind).Tag(5, tags.NewHandle()).Tag(330, owner).Tag(100, "AcDbSymbolTableRecord").Tag(100, subclass).Words(2, name).Tag(70, 0);

    private static void LineTypes(TagWriter tags, string owner, double size)
    {
        LineType(tags, owner, "ByBlock", "", []);
        LineType(tags, owner, "ByLayer", "", []);
        LineType(tags, owner, NameOf(OverlayLine.Continuous), "Solid line", []);
        LineType(tags, owner, NameOf(OverlayLine.Dashed), "Dashed", [0.03 * size, -0.015 * size]);
        LineType(tags, owner, NameOf(OverlayLine.DashDot), "Dash dot", [0.06 * size, -0.012 * size, 0, -0.012 * size]);
    }

    private static void LineType(TagWriter tags, string owner, string name, string words, double[] dashes)
    {
        Entry(tags, "LTYPE", owner, "AcDbLinetypeTableRecord", name).Tag(3, words).Tag(72, 65).Tag(73, dashes.Length).Tag(40, dashes.Sum(Math.Abs));
        foreach (var dash in dashes)
        {
            tags.Tag(49, dash).Tag(74, 0);
        }
    }

    private static void Layer(TagWriter tags, string owner, OverlayLayer layer) =>
        Entry(tags, "LAYER", owner, "AcDbLayerTableRecord", layer.Name).Tag(62, layer.Colour).Words(6, NameOf(layer.Line));

    private static void DimensionStyle(TagWriter tags, string owner) => tags
        .Tag(0, "DIMSTYLE").Tag(105, tags.NewHandle()).Tag(330, owner).Tag(100, "AcDbSymbolTableRecord")
        .Tag(100, "AcDbDimStyleTableRecord").Tag(2, "Standard").Tag(70, 0);

    private static void Record(TagWriter tags, string owner, string handle, string name) => tags
        .Tag(0, "BLOCK_RECORD").Tag(5, handle).Tag(330, owner).Tag(100, "AcDbSymbolTableRecord").Tag(100, "AcDbBlockTableRecord").Tag(2, name);

    private static string NameOf(OverlayLine line) => line switch
    {
        OverlayLine.Dashed => "MS-DASHED",
        OverlayLine.DashDot => "MS-DASHDOT",
        _ => "Continuous",
    };
}
