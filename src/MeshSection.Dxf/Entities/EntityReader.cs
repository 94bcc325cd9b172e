using MeshSection.Dxf.Tags;

namespace MeshSection.Dxf.Entities;

/// <summary>Makes an entity of each run of tags in the entities section.</summary>
internal sealed class EntityReader(TagReader tags, TagText text, List<DrawingNote> notes)
{
    private readonly EntityFields _fields = new(tags, text);

    /// <summary>Reads the entity whose first tag is current; afterwards the first tag of the next one is.</summary>
    public Entity Read()
    {
        var kind = KnownKind(tags.Value);
        _fields.Read(kind ?? text.Decode(tags.Value), hasShape: kind is not null);
        return kind switch
        {
            "LINE" => Line(),
            "ARC" or "CIRCLE" => Round(kind),
            "LWPOLYLINE" => LightPolyline(),
            "POLYLINE" => new PolylineReader(tags, _fields, notes).Read(),
            _ => new UnreadEntity(_fields.Source),
        };
    }

    private static string? KnownKind(ReadOnlySpan<byte> value) =>
        value.SequenceEqual("LINE"u8) ? "LINE"
        : value.SequenceEqual("ARC"u8) ? "ARC"
        : value.SequenceEqual("LWPOLYLINE"u8) ? "LWPOLYLINE"
        : value.SequenceEqual("CIRCLE"u8) ? "CIRCLE"
        : value.SequenceEqual("POLYLINE"u8) ? "POLYLINE"
        : null;

    private Entity Line()
    {
        // The ends of a line are in world axes; its extrusion only says which way a thickness goes.
        var start = _fields.Point(10, "start point");
        var end = _fields.Point(11, "end point");
        var height = _fields.Number(30) ?? 0;
        var rise = Math.Abs((_fields.Number(31) ?? 0) - height);
        return rise > Plane.Flatness * start.DistanceTo(end)
            ? new TiltedEntity(_fields.Source)
            : new LineEntity(_fields.Source, height, start, end);
    }

    private Entity Round(string kind)
    {
        var source = _fields.Source;
        var centre = _fields.Point(10, "centre");
        var radius = _fields.Number(40, "radius");
        if (radius < 0)
        {
            throw ReadingFaults.NegativeRadius(source);
        }

        var isArc = kind == "ARC";
        var start = isArc ? _fields.Number(50, "start angle") : 0;
        var end = isArc ? _fields.Number(51, "end angle") : 0;
        if (Plane.Of(_fields.Normal) is not { } plane)
        {
            return new TiltedEntity(source);
        }

        var height = plane.Height(_fields.Number(30) ?? 0);
        return isArc
            ? plane.Arc(source, height, centre, radius, start, end)
            : new CircleEntity(source, height, plane.Map(centre), radius);
    }

    private Entity LightPolyline()
    {
        var source = _fields.Source;
        var vertices = _fields.Vertices;
        foreach (var vertex in vertices)
        {
            if (double.IsNaN(vertex.Point.Y))
            {
                throw _fields.Missing(20, "vertex coordinate y");
            }
        }

        if (_fields.Count >= 0 && _fields.Count != vertices.Count)
        {
            if (!tags.HasTag)
            {
                throw ReadingFaults.CutEntity(
                    tags.Line, source, $"{_fields.Count - vertices.Count} of its {_fields.Count} vertices");
            }

            notes.Add(DrawingNote.About(
                NoteCode.PolylineMended, $"{source} says {_fields.Count} vertices and has {vertices.Count}.", source));
        }

        return Plane.Of(_fields.Normal) is { } plane
            ? plane.Polyline(source, plane.Height(_fields.Number(38) ?? 0), vertices, (_fields.Flags & 1) != 0)
            : new TiltedEntity(source);
    }
}
