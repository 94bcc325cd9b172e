using System.Collections.Immutable;
using MeshSection.Dxf.Space;
using MeshSection.Dxf.Tags;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Entities;

/// <summary>
/// Reads the paths that bound a HATCH. What a number means there depends on the counts and kinds before it, so the fields
/// are taken one after the other.
/// </summary>
internal sealed class HatchReader(EntityFields fields)
{
    // Bits of group 92 of a path.
    private const int IsPolyline = 2;
    private const int IsTextBox = 8;

    private readonly EntitySource _source = fields.Source;
    private readonly SpacePoint _normal = fields.Normal;
    private readonly double _elevation = fields.Number(30) ?? 0;
    private readonly List<Entity> _entities = [];
    private int _next;

    public FillEntity Read()
    {
        SkipTo(91);
        var paths = Count(91, "number of paths");
        for (var i = 0; i < paths; i++)
        {
            SkipTo(92);
            ReadPath((int)Take(92, "kind of path"));
        }

        return new FillEntity(_source, [.. _entities]);
    }

    private void ReadPath(int kind)
    {
        var before = _entities.Count;
        if ((kind & IsPolyline) != 0)
        {
            ReadPolyline();
        }
        else
        {
            var edges = Count(93, "number of edges");
            for (var i = 0; i < edges; i++)
            {
                ReadEdge(isLast: i == edges - 1);
            }
        }

        if ((kind & IsTextBox) != 0)
        {
            _entities.RemoveRange(before, _entities.Count - before);
        }
    }

    private void ReadPolyline()
    {
        var hasBulges = TryTake(72) is not (null or 0);
        var isClosed = TryTake(73) is not 0;
        var count = Count(93, "number of vertices");
        var vertices = ImmutableArray.CreateBuilder<PolylineVertex>();
        for (var i = 0; i < count; i++)
        {
            vertices.Add(new PolylineVertex(TakePoint(10), (hasBulges ? TryTake(42) : null) ?? 0));
        }

        _entities.Add(new PolylineEntity(_source, _normal, _elevation, vertices.ToImmutable(), isClosed));
    }

    private void ReadEdge(bool isLast)
    {
        var kind = (int)Take(72, "kind of edge");
        switch (kind)
        {
            case 1:
                ImmutableArray<PolylineVertex> ends = [new(TakePoint(10), 0), new(TakePoint(11), 0)];
                _entities.Add(new PolylineEntity(_source, _normal, _elevation, ends, IsClosed: false));
                break;
            case 2:
                ReadArc();
                break;
            case 3:
                ReadEllipse();
                break;
            case 4:
                ReadSpline(isLast);
                break;
            default:
                throw ReadingFaults.BadValue(_source, 72, $"an edge of the kind {kind}, which is none of 1 to 4");
        }
    }

    private void ReadArc()
    {
        var centre = TakePoint(10);
        var radius = Take(40, "radius");
        if (radius < 0)
        {
            throw ReadingFaults.NegativeRadius(_source);
        }

        var (start, end) = TakeAngles();
        _entities.Add(Math.Abs(end - start) >= 360 * (1 - 1e-12)
            ? new CircleEntity(_source, _normal, _elevation, centre, radius)
            : new ArcEntity(_source, _normal, _elevation, centre, radius, start, end));
    }

    private void ReadEllipse()
    {
        var centre = TakePoint(10);
        var major = TakePoint(11);
        var ratio = Take(40, "ratio of the axes");
        if (!(ratio > 0))
        {
            throw ReadingFaults.BadValue(_source, 40, "a ratio of the axes that is not above zero");
        }

        var (start, end) = TakeAngles();
        var plane = SpaceMap.OfPlane(_normal);
        _entities.Add(new EllipseEntity(
            _source,
            plane.Apply(new SpacePoint(centre.X, centre.Y, _elevation)),
            plane.Turn(new SpacePoint(major.X, major.Y, 0)),
            plane.Turn(new SpacePoint(-ratio * major.Y, ratio * major.X, 0)),
            Parameter(start, ratio),
            Parameter(end, ratio)));
    }

    /// <summary>Hatches state where an ellipse begins and ends by the angle at its centre, ellipses by the parameter.</summary>
    private static double Parameter(double angle, double ratio)
    {
        var turns = Math.Round(angle / 360);
        var (sin, cos) = Math.SinCos((angle - 360 * turns) * (Math.PI / 180));
        return 360 * turns + Math.Atan2(sin / ratio, cos) * (180 / Math.PI);
    }

    private void ReadSpline(bool isLast)
    {
        var degree = (int)Take(94, "degree");
        var isRational = TryTake(73) is not (null or 0);
        var isPeriodic = TryTake(74) is not (null or 0);
        var knotCount = Count(95, "number of knots");
        var controlCount = Count(96, "number of control points");
        var knots = new List<double>();
        for (var i = 0; i < knotCount; i++)
        {
            knots.Add(Take(40, "knot"));
        }

        var plane = SpaceMap.OfPlane(_normal);
        var (controls, weights) = (new List<SpacePoint>(), new List<double>());
        for (var i = 0; i < controlCount; i++)
        {
            var control = TakePoint(10);
            controls.Add(plane.Apply(new SpacePoint(control.X, control.Y, _elevation)));
            if (TryTake(42) is { } weight && isRational)
            {
                weights.Add(weight);
            }
        }

        SkipFitPoints(isLast);
        _entities.Add(new SplineEntity(_source, SplineCheck.Mended(
            _source, degree, knots, controls, weights, [], null, null, isPeriodic, fields.IsLast)));
    }

    /// <summary>
    /// Newer releases add the fit points of the edge; the path's own list of sources, under the same group, follows the
    /// last edge.
    /// </summary>
    private void SkipFitPoints(bool isLast)
    {
        var all = fields.All;
        var hasFitPoints = _next < all.Length && all[_next].Code == 97 &&
            (!isLast || (_next + 1 < all.Length && all[_next + 1].Code is 11 or 97));
        if (!hasFitPoints)
        {
            return;
        }

        _next++;
        while (_next < all.Length && all[_next].Code is 11 or 21 or 12 or 22 or 13 or 23)
        {
            _next++;
        }
    }

    /// <summary>Where an arc begins and ends; clockwise edges count their angles clockwise.</summary>
    private (double Start, double End) TakeAngles()
    {
        var (start, end) = (Take(50, "start angle"), Take(51, "end angle"));
        return TryTake(73) is 0 ? (-end, -start) : (start, end);
    }

    private Point TakePoint(int code) => new(Take(code, "coordinate x"), Take(code + 10, "coordinate y"));

    private int Count(int code, string what)
    {
        var count = Take(code, what);
        return count >= 0 ? (int)count : throw ReadingFaults.BadValue(_source, code, $"a negative {what}");
    }

    private double Take(int code, string what) => TryTake(code) ?? throw fields.Missing(code, what);

    private double? TryTake(int code)
    {
        var all = fields.All;
        return _next < all.Length && all[_next].Code == code ? all[_next++].Value : null;
    }

    private void SkipTo(int code)
    {
        var all = fields.All;
        while (_next < all.Length && all[_next].Code != code)
        {
            _next++;
        }
    }
}
