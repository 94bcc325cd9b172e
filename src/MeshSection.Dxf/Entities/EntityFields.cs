using System.Runtime.InteropServices;
using System.Text;
using MeshSection.Dxf.Space;
using MeshSection.Dxf.Tags;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Entities;

/// <summary>A number of an entity under its group code.</summary>
/// <param name="Code">The group code.</param>
/// <param name="Value">The number, finite.</param>
internal readonly record struct Field(int Code, double Value);

/// <summary>The values of one entity as they stand in the file; the same object is filled again for the next.</summary>
internal sealed class EntityFields(TagReader tags, TagText text)
{
    private readonly List<Field> _fields = [];
    private string _kind = "";
    private string? _handle;
    private string? _layer;
    private FilePlace _place;
    private DrawingColour _colour;
    private bool _isOnPaper;
    private bool _isInvisible;

    /// <summary>Group 2.</summary>
    public string? Name { get; private set; }

    /// <summary>Every number of the groups 10 to 59, 70 to 79, 90 to 99 and 210 to 239, in the order of the file.</summary>
    public ReadOnlySpan<Field> All => CollectionsMarshal.AsSpan(_fields);

    /// <summary>Group 70.</summary>
    public int Flags => (int)(Number(70) ?? 0);

    /// <summary>The direction of the plane that the entity lies in; not always of unit length, never zero.</summary>
    public SpacePoint Normal
    {
        get
        {
            var (x, y, z) = (Number(210), Number(220), Number(230));
            var normal = new SpacePoint(x ?? 0, y ?? 0, z ?? (x is null && y is null ? 1 : 0));
            return normal != default ? normal : throw ReadingFaults.BadValue(Source, 210, "an extrusion direction of no length");
        }
    }

    public EntitySource Source => new(_kind, _handle, _layer ?? "0", _place)
    {
        Colour = _colour,
        IsOnPaper = _isOnPaper,
        IsInvisible = _isInvisible,
    };

    /// <summary>Reads the tags of the entity whose first tag is current, up to the next entity.</summary>
    /// <param name="kind">The kind of the entity.</param>
    /// <param name="hasShape">False if only its place in the drawing is wanted.</param>
    public void Read(string kind, bool hasShape)
    {
        _fields.Clear();
        _kind = kind;
        (_handle, _layer, Name) = (null, null, null);
        _place = tags.Place;
        _colour = DrawingColour.ByLayer;
        (_isOnPaper, _isInvisible) = (false, false);
        while (tags.Read() && tags.Code != 0)
        {
            var code = tags.Code;
            switch (code)
            {
                case 2:
                    Name ??= hasShape ? text.Decode(tags.Value) : null;
                    break;
                case 5:
                    _handle ??= Encoding.Latin1.GetString(tags.Value);
                    break;
                case 8:
                    _layer ??= text.Decode(tags.Value);
                    break;
                case 60:
                    _isInvisible |= tags.TryInteger(out var invisible) && invisible == 1;
                    break;
                case 62:
                    _colour = tags.TryInteger(out var index) ? _colour with { Index = index } : _colour;
                    break;
                case 67:
                    _isOnPaper |= tags.TryInteger(out var paper) && paper == 1;
                    break;
                case 420:
                    _colour = tags.TryInteger(out var rgb) ? _colour with { Rgb = rgb & 0xFFFFFF } : _colour;
                    break;
                case (>= 10 and < 60) or (>= 210 and < 240) when hasShape:
                    _fields.Add(new Field(code, tags.TryNumber(out var number) ? number : throw BadNumber()));
                    break;
                case (>= 70 and < 80) or (>= 90 and < 100) when hasShape:
                    _fields.Add(new Field(code, tags.TryInteger(out var whole) ? whole : throw BadNumber()));
                    break;
            }
        }
    }

    /// <summary>The first number of a group; null if the entity does not have it.</summary>
    public double? Number(int code)
    {
        foreach (var field in All)
        {
            if (field.Code == code)
            {
                return field.Value;
            }
        }

        return null;
    }

    /// <summary>The first number of a group that the entity cannot do without.</summary>
    public double Number(int code, string what) => Number(code) ?? throw Missing(code, what);

    /// <summary>A point that the entity cannot do without.</summary>
    public Point Point(int code, string what) => new(Number(code, what), Number(code + 10, what));

    /// <summary>A point in space that the entity cannot do without; its z may be missing.</summary>
    public SpacePoint SpacePoint(int code, string what) =>
        new(Number(code, what), Number(code + 10, what), Number(code + 20) ?? 0);

    /// <summary>Every point in space under a group code, each begun by its x.</summary>
    public List<SpacePoint> SpacePoints(int code)
    {
        var points = new List<SpacePoint>();
        foreach (var field in All)
        {
            if (field.Code == code)
            {
                points.Add(new SpacePoint(field.Value, double.NaN, 0));
            }
            else if (points.Count > 0 && field.Code == code + 10)
            {
                points[^1] = points[^1] with { Y = field.Value };
            }
            else if (points.Count > 0 && field.Code == code + 20)
            {
                points[^1] = points[^1] with { Z = field.Value };
            }
        }

        return points.TrueForAll(p => !double.IsNaN(p.Y)) ? points : throw Missing(code + 10, "coordinate y of a point");
    }

    /// <summary>Every number under a group code.</summary>
    public List<double> Numbers(int code)
    {
        var numbers = new List<double>();
        foreach (var field in All)
        {
            if (field.Code == code)
            {
                numbers.Add(field.Value);
            }
        }

        return numbers;
    }

    public DrawingException Missing(int code, string what) => tags.HasTag
        ? ReadingFaults.Missing(Source, code, what)
        : Cut($"its {what} (group {code})");

    /// <summary>The file ends within the entity.</summary>
    public DrawingException Cut(string missing) => ReadingFaults.CutEntity(tags.Place, Source, missing);

    /// <summary>True if the file ends with the entity, so that it may be cut off.</summary>
    public bool IsLast => !tags.HasTag;

    private DrawingException BadNumber()
    {
        var source = Source;
        return ReadingFaults.Number(tags, source.ToString(), source);
    }
}
