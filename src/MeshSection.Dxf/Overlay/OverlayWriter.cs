using System.Globalization;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Overlay;

/// <summary>
/// Writes an overlay as an ASCII DXF of release 2000, the oldest that states its unit: with every table and object that
/// programs demand [Dxf2012], and nothing else. The same overlay gives the same bytes.
/// </summary>
public static class OverlayWriter
{
    // Handles that objects refer to before they are written.
    private const string ModelRecord = "F001";
    private const string PaperRecord = "F002";
    private const string Dictionary = "F003";

    /// <summary>Writes the drawing.</summary>
    /// <param name="stream">Where to; left open.</param>
    /// <param name="overlay">The drawing.</param>
    public static void Write(Stream stream, OverlayDrawing overlay)
    {
        ArgumentNullException.ThrowIfNull(stream);
        ArgumentNullException.ThrowIfNull(overlay);
        using var tags = new TagWriter(stream);
        Header(tags, overlay);
        Section(tags, "CLASSES", () => { });
        Section(tags, "TABLES", () => OverlayTables.Write(tags, overlay, ModelRecord, PaperRecord));
        Section(tags, "BLOCKS", () =>
        {
            Block(tags, "*Model_Space", ModelRecord);
            Block(tags, "*Paper_Space", PaperRecord);
        });
        Section(tags, "ENTITIES", () =>
        {
            foreach (var mark in overlay.Marks)
            {
                Entity(tags, mark);
            }
        });
        Section(tags, "OBJECTS", () => Objects(tags));
        tags.Tag(0, "EOF");
    }

    private static void Header(TagWriter tags, OverlayDrawing overlay) => Section(tags, "HEADER", () =>
    {
        var box = overlay.Marks.Aggregate(Box.Empty, (all, mark) => Places(mark).Aggregate(all, (b, p) => b.With(p)));
        tags.Tag(9, "$ACADVER").Tag(1, "AC1015");
        tags.Tag(9, "$DWGCODEPAGE").Tag(3, "ANSI_1252");
        tags.Tag(9, "$INSUNITS").Tag(70, overlay.Unit.DrawingCode);
        tags.Tag(9, "$MEASUREMENT").Tag(70, overlay.Unit.Symbol is "in" or "ft" or "yd" or "mi" or "mil" or "µin" ? 0 : 1);
        tags.Tag(9, "$EXTMIN").Place(10, box.MinX, box.MinY);
        tags.Tag(9, "$EXTMAX").Place(10, box.MaxX, box.MaxY);
        tags.Tag(9, "$PDMODE").Tag(70, 3);
        tags.Tag(9, "$PDSIZE").Tag(40, 0.01 * overlay.Size);
        tags.Tag(9, "$HANDSEED").Tag(5, "FFFF");
    });

    private static IEnumerable<Point> Places(OverlayMark mark) => mark switch
    {
        OverlayStroke stroke => [stroke.Start, stroke.End],
        OverlayCircle circle => [circle.Centre - new Point(circle.Radius, circle.Radius), circle.Centre + new Point(circle.Radius, circle.Radius)],
        OverlayPoint point => [point.Place],
        OverlayText text => [text.Place],
        _ => [],
    };

    private static void Section(TagWriter tags, string name, Action write)
    {
        tags.Tag(0, "SECTION").Tag(2, name);
        write();
        tags.Tag(0, "ENDSEC");
    }

    private static void Block(TagWriter tags, string name, string record)
    {
        tags.Tag(0, "BLOCK").Tag(5, tags.NewHandle()).Tag(330, record).Tag(100, "AcDbEntity").Tag(8, "0");
        tags.Tag(100, "AcDbBlockBegin").Tag(2, name).Tag(70, 0).Place(10, 0, 0).Tag(3, name).Tag(1, "");
        tags.Tag(0, "ENDBLK").Tag(5, tags.NewHandle()).Tag(330, record).Tag(100, "AcDbEntity").Tag(8, "0").Tag(100, "AcDbBlockEnd");
    }

    private static void Entity(TagWriter tags, OverlayMark mark)
    {
        switch (mark)
        {
            case OverlayStroke stroke:
                Head(tags, "LINE", mark.Layer).Tag(100, "AcDbLine").Place(10, stroke.Start.X, stroke.Start.Y).Place(11, stroke.End.X, stroke.End.Y);
                break;
            case OverlayCircle circle:
                Head(tags, "CIRCLE", mark.Layer).Tag(100, "AcDbCircle").Place(10, circle.Centre.X, circle.Centre.Y).Tag(40, circle.Radius);
                break;
            case OverlayPoint point:
                Head(tags, "POINT", mark.Layer).Tag(100, "AcDbPoint").Place(10, point.Place.X, point.Place.Y);
                break;
            case OverlayText text:
                Head(tags, "TEXT", mark.Layer).Tag(100, "AcDbText").Place(10, text.Place.X, text.Place.Y).Tag(40, text.Height).Words(1, text.Words);
                if (text.IsCentred)
                {
                    // Middle centre: the second point then is the one that counts.
                    tags.Tag(72, 1).Place(11, text.Place.X, text.Place.Y);
                }

                tags.Tag(100, "AcDbText");
                if (text.IsCentred)
                {
                    tags.Tag(73, 2);
                }

                break;
            default:
                throw new NotSupportedException(string.Create(CultureInfo.InvariantCulture, $"{mark}"));
        }
    }

    private static TagWriter Head(TagWriter tags, string kind, string layer) => tags
        .Tag(0, kind).Tag(5, tags.NewHandle()).Tag(330, ModelRecord).Tag(100, "AcDbEntity").Words(8, layer);

    private static void Objects(TagWriter tags)
    {
        var group = tags.NewHandle();
        tags.Tag(0, "DICTIONARY").Tag(5, Dictionary).Tag(330, "0").Tag(100, "AcDbDictionary").Tag(281, 1).Tag(3, "ACAD_GROUP").Tag(350, group);
        tags.Tag(0, "DICTIONARY").Tag(5, group).Tag(330, Dictionary).Tag(100, "AcDbDictionary").Tag(281, 1);
    }
}
