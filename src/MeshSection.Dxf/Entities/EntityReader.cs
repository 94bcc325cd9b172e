using System.Collections.Immutable;
using MeshSection.Dxf.Space;
using MeshSection.Dxf.Tags;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Entities;

/// <summary>Makes an entity of each run of tags in the entities section or in a block.</summary>
internal sealed class EntityReader(TagReader tags, TagText text, List<DrawingNote> notes)
{
    // Vertices that a fitted polyline keeps beside the curve.
    private const int FrameVertex = 16;

    private readonly EntityFields _fields = new(tags, text);

    /// <summary>
    /// Reads the entity whose first tag is current; afterwards the first tag of the next one is.
    /// </summary>
    /// <returns>The entity; null for the end mark of a sequence.</returns>
    public Entity? Read()
    {
        var kind = KnownKind(tags.Value);
        _fields.Read(kind ?? text.Decode(tags.Value), hasShape: kind is not null);
        return kind switch
        {
            "LINE" => new LineEntity(_fields.Source, _fields.SpacePoint(10, "start point"), _fields.SpacePoint(11, "end point")),
            "ARC" or "CIRCLE" => Round(kind),
            "LWPOLYLINE" => LightPolyline(),
            "POLYLINE" => new PolylineReader(tags, _fields, notes).Read(),
            "ELLIPSE" => Ellipse(),
            "SPLINE" => new SplineEntity(_fields.Source, SplineReader.Read(_fields)),
            "SOLID" or "TRACE" => Quadrilateral(),
            "3DFACE" => Face(),
            "HATCH" => new HatchReader(_fields).Read(),
            "POINT" => new PointEntity(_fields.Source, _fields.SpacePoint(10, "place")),
            "INSERT" => Insert(),
            _ when _fields.Source.Kind == "SEQEND" => null,
            _ => new UnreadEntity(_fields.Source),
        };
    }

    private static string? KnownKind(ReadOnlySpan<byte> value) =>
        value.SequenceEqual("LINE"u8) ? "LINE"
        : value.SequenceEqual("ARC"u8) ? "ARC"
        : value.SequenceEqual("LWPOLYLINE"u8) ? "LWPOLYLINE"
        : value.SequenceEqual("CIRCLE"u8) ? "CIRCLE"
        : value.SequenceEqual("POLYLINE"u8) ? "POLYLINE"
        : value.SequenceEqual("ELLIPSE"u8) ? "ELLIPSE"
        : value.SequenceEqual("SPLINE"u8) ? "SPLINE"
        : value.SequenceEqual("INSERT"u8) ? "INSERT"
        : value.SequenceEqual("HATCH"u8) ? "HATCH"
        : value.SequenceEqual("SOLID"u8) ? "SOLID"
        : value.SequenceEqual("TRACE"u8) ? "TRACE"
        : value.SequenceEqual("3DFACE"u8) ? "3DFACE"
        : value.SequenceEqual("POINT"u8) ? "POINT"
        : null;

    private FlatEntity Round(string kind)
    {
        var source = _fields.Source;
        var centre = _fields.Point(10, "centre");
        var elevation = _fields.Number(30) ?? 0;
        var radius = _fields.Number(40, "radius");
        if (radius < 0)
        {
            throw ReadingFaults.NegativeRadius(source);
        }

        return kind == "CIRCLE"
            ? new CircleEntity(source, _fields.Normal, elevation, centre, radius)
            : new ArcEntity(
                source, _fields.Normal, elevation, centre, radius, _fields.Number(50, "start angle"), _fields.Number(51, "end angle"));
    }

    private PolylineEntity LightPolyline()
    {
        var source = _fields.Source;
        var vertices = ImmutableArray.CreateBuilder<PolylineVertex>();
        var (isFrame, count) = (false, 0);
        foreach (var (code, value) in _fields.All)
        {
            if (code == 10)
            {
                count++;
                isFrame = false;
                vertices.Add(new PolylineVertex(new Point(value, double.NaN), 0));
            }
            else if (code == 70 && vertices.Count > 0 && ((int)value & FrameVertex) != 0 && !isFrame)
            {
                isFrame = true;
                vertices.RemoveAt(vertices.Count - 1);
            }
            else if (vertices.Count > 0 && !isFrame && code is 20 or 42)
            {
                var last = vertices[^1];
                vertices[^1] = code == 20 ? last with { Point = last.Point with { Y = value } } : last with { Bulge = value };
            }
        }

        foreach (var vertex in vertices)
        {
            if (double.IsNaN(vertex.Point.Y))
            {
                throw _fields.Missing(20, "vertex coordinate y");
            }
        }

        if (_fields.Number(90) is { } stated && stated != count)
        {
            if (_fields.IsLast)
            {
                throw _fields.Cut($"{stated - count} of its {stated} vertices");
            }

            notes.Add(DrawingNote.About(
                NoteCode.PolylineMended, $"{source} says {stated} vertices and has {count}.", source));
        }

        return new PolylineEntity(
            source, _fields.Normal, _fields.Number(38) ?? 0, vertices.ToImmutable(), (_fields.Flags & 1) != 0);
    }

    private EllipseEntity Ellipse()
    {
        var source = _fields.Source;
        var centre = _fields.SpacePoint(10, "centre");
        var major = _fields.SpacePoint(11, "longer axis");
        var ratio = _fields.Number(40, "ratio of the axes");
        if (!(ratio > 0))
        {
            throw ReadingFaults.BadValue(source, 40, "a ratio of the axes that is not above zero");
        }

        var plane = SpaceMap.OfPlane(_fields.Normal);
        return new EllipseEntity(
            source,
            centre,
            major,
            ratio * plane.Z.Cross(major),
            Degrees(_fields.Number(41) ?? 0),
            Degrees(_fields.Number(42) ?? Math.Tau));
    }

    private FillEntity Quadrilateral()
    {
        var source = _fields.Source;
        var corners = Enumerable.Range(10, 4)
            .Where(code => code < 13 || _fields.Number(13) is not null)
            .Select(code => new PolylineVertex(_fields.Point(code, "corner"), 0))
            .ToList();
        if (corners.Count == 4)
        {
            // The third and the fourth corner lie across from each other.
            (corners[2], corners[3]) = (corners[3], corners[2]);
        }

        // A triangle repeats a corner.
        ImmutableArray<PolylineVertex> distinct = [.. corners.Where((c, i) => c != corners[(i + 1) % corners.Count])];
        return new FillEntity(
            source, [new PolylineEntity(source, _fields.Normal, _fields.Number(30) ?? 0, distinct, IsClosed: true)]);
    }

    private FillEntity Face()
    {
        var source = _fields.Source;
        var corners = Enumerable.Range(10, 4)
            .Where(code => code < 13 || _fields.Number(13) is not null)
            .Select(code => _fields.SpacePoint(code, "corner"))
            .ToList();
        ImmutableArray<SpacePoint> distinct = [.. corners.Where((c, i) => c != corners[(i + 1) % corners.Count])];
        return new FillEntity(source, [new SpatialPolylineEntity(source, distinct, IsClosed: true)]);
    }

    private InsertEntity Insert()
    {
        var source = _fields.Source;
        var name = _fields.Name ?? throw _fields.Missing(2, "block name");
        return new InsertEntity(
            source,
            name,
            _fields.Normal,
            _fields.SpacePoint(10, "place"),
            new SpacePoint(_fields.Number(41) ?? 1, _fields.Number(42) ?? 1, _fields.Number(43) ?? 1),
            _fields.Number(50) ?? 0,
            new InsertArray(
                (int)Math.Max(1, _fields.Number(70) ?? 1),
                (int)Math.Max(1, _fields.Number(71) ?? 1),
                _fields.Number(44) ?? 0,
                _fields.Number(45) ?? 0));
    }

    private static double Degrees(double radians) => radians * (180 / Math.PI);
}
