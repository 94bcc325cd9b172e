using MeshSection.Dxf.Tags;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Entities;

/// <summary>The values of one entity as they stand in the file; the same object is filled again for the next.</summary>
internal sealed class EntityFields(TagReader tags, TagText text)
{
    // The group codes 10 to 59 are numbers by definition of the format.
    private readonly double[] _numbers = new double[60];
    private readonly List<PolylineVertex> _vertices = [];
    private string _kind = "";
    private string? _handle;
    private string? _layer;
    private int _line;
    private bool _isOnPaper;
    private bool _isInvisible;

    /// <summary>Group 70.</summary>
    public int Flags { get; private set; }

    /// <summary>Group 90; -1 if it is missing.</summary>
    public int Count { get; private set; }

    /// <summary>The direction of the plane that the entity lies in; not always of unit length.</summary>
    public (double X, double Y, double Z) Normal { get; private set; }

    /// <summary>The vertices of a lightweight polyline.</summary>
    public List<PolylineVertex> Vertices => _vertices;

    public EntitySource Source => new(_kind, _handle, _layer ?? "0", _line) { IsOnPaper = _isOnPaper, IsInvisible = _isInvisible };

    /// <summary>Reads the tags of the entity whose first tag is current, up to the next entity.</summary>
    /// <param name="kind">The kind of the entity.</param>
    /// <param name="hasShape">False if only its place in the drawing is wanted.</param>
    public void Read(string kind, bool hasShape)
    {
        Reset(kind);
        while (tags.Read() && tags.Code != 0)
        {
            var code = tags.Code;
            switch (code)
            {
                case 5:
                    _handle ??= System.Text.Encoding.Latin1.GetString(tags.Value);
                    break;
                case 8:
                    _layer ??= text.Decode(tags.Value);
                    break;
                case 60:
                    _isInvisible |= tags.TryInteger(out var invisible) && invisible == 1;
                    break;
                case 67:
                    _isOnPaper |= tags.TryInteger(out var paper) && paper == 1;
                    break;
                default:
                    if (hasShape)
                    {
                        ReadShape(code);
                    }

                    break;
            }
        }
    }

    /// <summary>The number of a group; null if the entity does not have it.</summary>
    public double? Number(int code) => double.IsNaN(_numbers[code]) ? null : _numbers[code];

    /// <summary>The number of a group that the entity cannot do without.</summary>
    public double Number(int code, string what) => Number(code) ?? throw Missing(code, what);

    /// <summary>A point that the entity cannot do without.</summary>
    public Point Point(int code, string what) => new(Number(code, what), Number(code + 10, what));

    public DrawingException Missing(int code, string what) => tags.HasTag
        ? ReadingFaults.Missing(Source, code, what)
        : ReadingFaults.CutEntity(tags.Line, Source, $"its {what} (group {code})");

    private void Reset(string kind)
    {
        Array.Fill(_numbers, double.NaN);
        _vertices.Clear();
        _kind = kind;
        _handle = null;
        _layer = null;
        _line = tags.Line;
        _isOnPaper = false;
        _isInvisible = false;
        Flags = 0;
        Count = -1;
        Normal = (0, 0, 1);
    }

    private void ReadShape(int code)
    {
        switch (code)
        {
            case >= 10 and < 60:
                _numbers[code] = Number();
                if (_kind == "LWPOLYLINE")
                {
                    ReadVertex(code, _numbers[code]);
                }

                break;
            case 70:
                Flags = Integer();
                break;
            case 90:
                Count = Integer();
                break;
            case 210:
                Normal = Normal with { X = Number() };
                break;
            case 220:
                Normal = Normal with { Y = Number() };
                break;
            case 230:
                Normal = Normal with { Z = Number() };
                break;
        }
    }

    private void ReadVertex(int code, double number)
    {
        if (code == 10)
        {
            _vertices.Add(new PolylineVertex(new Point(number, double.NaN), 0));
        }
        else if (_vertices.Count > 0 && code is 20 or 42)
        {
            var last = _vertices[^1];
            _vertices[^1] = code == 20 ? last with { Point = last.Point with { Y = number } } : last with { Bulge = number };
        }
    }

    private double Number() => tags.TryNumber(out var number) ? number : throw BadNumber();

    private int Integer() => tags.TryInteger(out var number) ? number : throw BadNumber();

    private DrawingException BadNumber()
    {
        var source = Source;
        return ReadingFaults.Number(tags, source.ToString(), source);
    }
}
