using System.Collections.Immutable;
using System.Globalization;
using MeshSection.Geometry;
using MeshSection.Properties;
using MeshSection.Torsion;
using MeshSection.Units;

namespace MeshSection.Dxf.Overlay;

/// <summary>
/// The results of a section as an overlay in the axes and the unit of its drawing: each kind on a layer of its own, so that
/// any can be switched off.
/// </summary>
public sealed class SectionOverlay
{
    private const string Prefix = "MS-";

    private static readonly OverlayLayer CentroidLayer = new(Prefix + "CENTROID", 1);
    private static readonly OverlayLayer AxesLayer = new(Prefix + "CENTROIDAL-AXES", 8, OverlayLine.DashDot);
    private static readonly OverlayLayer PrincipalLayer = new(Prefix + "PRINCIPAL-AXES", 5, OverlayLine.DashDot);
    private static readonly OverlayLayer PlasticLayer = new(Prefix + "PLASTIC-NEUTRAL-AXES", 3, OverlayLine.Dashed);
    private static readonly OverlayLayer ShearLayer = new(Prefix + "SHEAR-CENTRE", 6);
    private static readonly OverlayLayer ExtremeLayer = new(Prefix + "EXTREME-POINTS", 30);
    private static readonly OverlayLayer NumberLayer = new(Prefix + "BOUNDARY-NUMBERS", 4);
    private static readonly OverlayLayer NoteLayer = new(Prefix + "NOTES", 7);

    // Parts of the section's diagonal: the height of letters, the size of marks, how far axes reach beyond the section.
    private const double Letter = 0.02;
    private const double Sign = 0.012;
    private const double Beyond = 0.08;

    // The names of plastic axes stand this much farther out than those of centroidal ones, in letters.
    private const double PlasticShift = 2;

    // A product of inertia below this part of the moments is nothing but rounding.
    private const double NoProduct = 1e-12;

    private readonly LengthUnit _unit;
    private readonly Box _box;
    private readonly double _size;
    private readonly ImmutableArray<OverlayMark>.Builder _marks = ImmutableArray.CreateBuilder<OverlayMark>();

    private SectionOverlay(Outline outline, LengthUnit unit)
    {
        _unit = unit;
        var (low, high) = (
            Of(outline.Origin + new Point(outline.Bounds.MinX, outline.Bounds.MinY)),
            Of(outline.Origin + new Point(outline.Bounds.MaxX, outline.Bounds.MaxY)));
        _box = Box.Of(low, high);
        _size = _box.Diagonal;
    }

    /// <summary>Draws the results.</summary>
    /// <param name="outline">The section's outline.</param>
    /// <param name="properties">Its area properties.</param>
    /// <param name="torsion">Its torsion properties; null for a section of separate pieces.</param>
    /// <param name="unit">The unit of the drawing.</param>
    /// <param name="title">What the section is called; may be empty.</param>
    public static OverlayDrawing Of(
        Outline outline, SectionProperties properties, TorsionProperties? torsion, LengthUnit unit, string title)
    {
        ArgumentNullException.ThrowIfNull(outline);
        ArgumentNullException.ThrowIfNull(properties);
        ArgumentNullException.ThrowIfNull(unit);
        ArgumentNullException.ThrowIfNull(title);
        var overlay = new SectionOverlay(outline, unit);
        overlay.AddAxes(properties);
        overlay.AddPoint(CentroidLayer, properties.Centroid, "C", new Point(1, 1));
        if (torsion is not null)
        {
            overlay.AddPoint(ShearLayer, torsion.ShearCentre, "S", new Point(1, -2));
        }

        overlay.AddPlastic(properties);
        overlay.AddExtremes(properties);
        overlay.AddNumbers(outline);
        overlay.AddNotes(properties, torsion, title);
        return new OverlayDrawing(
            unit,
            overlay._size,
            [CentroidLayer, AxesLayer, PrincipalLayer, PlasticLayer, ShearLayer, ExtremeLayer, NumberLayer, NoteLayer],
            overlay._marks.ToImmutable());
    }

    private Point Of(Point millimetres) => millimetres / _unit.Millimetres;

    private void AddPoint(OverlayLayer layer, Point place, string name, Point side)
    {
        var at = Of(place);
        var arm = 1.5 * Sign * _size;
        _marks.Add(new OverlayCircle(layer.Name, at, Sign * _size));
        _marks.Add(new OverlayStroke(layer.Name, at - new Point(arm, 0), at + new Point(arm, 0)));
        _marks.Add(new OverlayStroke(layer.Name, at - new Point(0, arm), at + new Point(0, arm)));
        _marks.Add(new OverlayText(layer.Name, at + Letter * _size * side, Letter * _size, name));
    }

    private void AddAxes(SectionProperties p)
    {
        var centroid = Of(p.Centroid);
        AddAxis(AxesLayer, centroid, Point.AlongX, "x", 0);
        AddAxis(AxesLayer, centroid, Point.AlongY, "y", 0);
        var along = Point.Direction(p.Principal.Angle * Math.PI / 180);
        AddAxis(PrincipalLayer, centroid, -along, "1", 0);
        AddAxis(PrincipalLayer, centroid, -along.Left(), "2", 0);
    }

    private void AddPlastic(SectionProperties p)
    {
        var centroid = Of(p.Centroid);
        AddAxis(PlasticLayer, centroid with { Y = p.PlasticX.NeutralAxis / _unit.Millimetres }, Point.AlongX, "px", PlasticShift);
        AddAxis(PlasticLayer, centroid with { X = p.PlasticY.NeutralAxis / _unit.Millimetres }, Point.AlongY, "py", PlasticShift);
    }

    /// <summary>A line through a point across the section and a little beyond, named at its far end.</summary>
    /// <param name="layer">The layer.</param>
    /// <param name="through">The point.</param>
    /// <param name="along">The direction towards the far end.</param>
    /// <param name="name">The name.</param>
    /// <param name="shift">How much farther the name stands, in letters, so that names of axes that coincide stay apart.</param>
    private void AddAxis(OverlayLayer layer, Point through, Point along, string name, double shift)
    {
        var reach = Beyond * _size;
        var corners = new[]
        {
            new Point(_box.MinX, _box.MinY), new Point(_box.MaxX, _box.MinY), new Point(_box.MaxX, _box.MaxY), new Point(_box.MinX, _box.MaxY),
        };
        var (back, ahead) = (corners.Min(c => along.Dot(c - through)) - reach, corners.Max(c => along.Dot(c - through)) + reach);
        _marks.Add(new OverlayStroke(layer.Name, through + back * along, through + ahead * along));
        _marks.Add(new OverlayText(
            layer.Name, through + (ahead + (1.2 + shift) * Letter * _size) * along, Letter * _size, name, IsCentred: true));
    }

    private void AddExtremes(SectionProperties p)
    {
        (ExtremeFibre Fibre, string Name, Point Way)[] extremes =
        [
            (p.ElasticX.Positive, "top", new(0, 1)), (p.ElasticX.Negative, "bottom", new(0, -1)),
            (p.ElasticY.Positive, "right", new(1, 0)), (p.ElasticY.Negative, "left", new(-1, 0)),
        ];
        foreach (var (fibre, name, way) in extremes)
        {
            var at = Of(fibre.Point);
            _marks.Add(new OverlayPoint(ExtremeLayer.Name, at));
            _marks.Add(new OverlayCircle(ExtremeLayer.Name, at, 0.5 * Sign * _size));
            var words = $"{name}: W = {Quantity(fibre.Modulus, 3)}";
            var place = at + 1.6 * Letter * _size * way + (way.X == 0 ? default : 0.3 * words.Length * Letter * _size * way);
            _marks.Add(new OverlayText(ExtremeLayer.Name, place, 0.8 * Letter * _size, words, IsCentred: true));
        }
    }

    private void AddNumbers(Outline outline)
    {
        for (var i = 0; i < outline.Boundaries.Length; i++)
        {
            var edge = outline.Boundaries[i].Boundary.Edges[0];
            var inwards = edge.TangentAt(0.5).Left();
            var at = Of(outline.Origin + edge.PointAt(0.5)) - 1.2 * Letter * _size * inwards;
            _marks.Add(new OverlayText(
                NumberLayer.Name, at, Letter * _size, (i + 1).ToString(CultureInfo.InvariantCulture), IsCentred: true));
        }
    }

    private void AddNotes(SectionProperties p, TorsionProperties? torsion, string title)
    {
        List<string> lines =
        [
            .. title.Length > 0 ? new[] { title } : [],
            $"A = {Quantity(p.Area, 2)}",
            $"Ix = {Quantity(p.SecondMoment.X, 4)}",
            $"Iy = {Quantity(p.SecondMoment.Y, 4)}",
            $"Ixy = {Quantity(Math.Abs(p.SecondMoment.XY) > NoProduct * p.SecondMoment.Polar ? p.SecondMoment.XY : 0, 4)}",
        ];
        if (torsion is not null)
        {
            lines.Add($"J = {Quantity(torsion.TorsionConstant.Value, 4)}");
        }

        var top = new Point(_box.MinX, _box.MinY - (2 * Beyond + 2 * Letter) * _size);
        for (var i = 0; i < lines.Count; i++)
        {
            _marks.Add(new OverlayText(
                NoteLayer.Name, top - new Point(0, 1.8 * i * Letter * _size), Letter * _size, lines[i]));
        }
    }

    /// <summary>A value with its unit in letters that every font of a CAD program has.</summary>
    private string Quantity(double value, int power) =>
        string.Create(CultureInfo.InvariantCulture, $"{_unit.FromMillimetres(value, power):G6} {_unit.Symbol}^{power}");
}
