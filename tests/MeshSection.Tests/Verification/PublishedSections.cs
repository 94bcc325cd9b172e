using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Sections.Shapes;

namespace MeshSection.Tests.Verification;

/// <summary>The sections of the published values, by the id of the case; dimensions in mm.</summary>
internal static class PublishedSections
{
    private const double Inch = 25.4;

    public static Outline Outline(string id) => MeshSection.Geometry.Outline.Create(Boundaries(id));

    private static ImmutableArray<Boundary> Boundaries(string id) => id switch
    {
        "geo-circle" or "pl-circle" => new Circle(100).Boundaries(),
        "geo-hollow-circle" => new Tube(100, 20).Boundaries(),
        "geo-semicircle" => [Sector(50, 0, 180, throughCentre: false)],
        "geo-quarter-circle" => [Sector(50, 0, 90, throughCentre: true)],
        "geo-circular-segment" => [Sector(50, 40, 140, throughCentre: false)],
        "geo-circular-sector" => [Sector(50, 40, 140, throughCentre: true)],
        "geo-ellipse" or "pl-ellipse" => [Ellipse(60, 40)],
        "geo-parabolic-segment" => [Parabola(new(50, 0), new(0, 120), new(-50, 0))],
        "geo-parabolic-spandrel" => [Parabola(new(100, 60), new(50, 0), new(0, 0), new LineEdge(new(0, 0), new(100, 0)), new LineEdge(new(100, 0), new(100, 60)))],
        "geo-hexagon" or "pl-hexagon" => new RegularPolygon(6, 50 * Math.Sqrt(3)).Boundaries(),
        "geo-triangle" => Polygon((0, 0), (120, 0), (40, 90)),
        "geo-right-triangle" => Polygon((0, 0), (120, 0), (0, 90)),
        "geo-trapezium" => Polygon((-60, 0), (60, 0), (40, 60), (-40, 60)),
        "geo-fillet" => [Fillet(20)],
        "geo-rotated-rectangle" =>
            [new Rectangle(60, 100).Boundaries()[0].Placed(new Placement(default, Math.PI / 6))],
        "geo-sharp-angle-150x90x10" => new Angle(150, 90, 10).Boundaries(),
        "geo-rounded-rectangle" => new Rectangle(100, 60, 15).Boundaries(),
        "pl-rectangle" => new Rectangle(60, 100).Boundaries(),
        "pl-hollow-circle" => new Tube(100, 10).Boundaries(),
        "pl-diamond" => Polygon((40, 0), (0, 50), (-40, 0), (0, -50)),
        "pl-triangle" => Polygon((-40, 0), (40, 0), (0, 100)),
        "pl-i-section" => new IBeam(200, 100, 10, 6).Boundaries(),
        "pl-tee" => new Tee(140, 120, 12, 10).Boundaries(),
        "rs-ipe200" => new IBeam(200, 100, 8.5, 5.6, 12).Boundaries(),
        "rs-ipe300" => new IBeam(300, 150, 10.7, 7.1, 15).Boundaries(),
        "rs-hea200" => new IBeam(190, 200, 10, 6.5, 18).Boundaries(),
        "rs-heb300" => new IBeam(300, 300, 19, 11, 27).Boundaries(),
        "rs-upe200" => new Channel(200, 80, 11, 6, 13).Boundaries(),
        "rs-l100x100x10" => new Angle(100, 100, 10, 12, 6).Boundaries(),
        "rs-l150x90x10" => new Angle(150, 90, 10, 12, 6).Boundaries(),
        "rs-rhs200x100x8" => new HollowBox(100, 200, 8, OuterRadius: 12, InnerRadius: 8).Boundaries(),
        "rs-chs168.3x6.3" => new Tube(168.3, 6.3).Boundaries(),
        "rs-w12x26" => Inches(new IBeam(12.2, 6.49, 0.38, 0.23, 0.68 - 0.38)),
        "rs-w18x50" => Inches(new IBeam(18, 7.5, 0.57, 0.355, 0.972 - 0.57)),
        "rs-l6x4x1-2" => Inches(new Angle(6, 4, 0.5)),
        "rs-hss6x4x1-4" => Inches(new HollowBox(4, 6, 0.233, OuterRadius: 0.466, InnerRadius: 0.233)),
        "rs-c10x20" => Inches(new Channel(10, 2.74, 0.436, 0.379, FlangeSlope: 1.0 / 6)),
        _ => throw new ArgumentOutOfRangeException(nameof(id), id, "No section is known for this case."),
    };

    /// <summary>An ellipse as four quarters, each exactly a rational curve of degree 2.</summary>
    private static Boundary Ellipse(double a, double b) => Boundary.Create(Enumerable.Range(0, 4).Select(q =>
    {
        var (c, s) = (Math.Round(Math.Cos(q * Math.PI / 2)), Math.Round(Math.Sin(q * Math.PI / 2)));
        Point At(double x, double y) => new(a * (c * x - s * y), b * (s * x + c * y));
        return new BezierEdge([At(1, 0), At(1, 1), At(0, 1)], [1, Math.Sqrt(0.5), 1]);
    }));

    /// <summary>A parabola of one control point, closed by lines: by its chord if none are given.</summary>
    private static Boundary Parabola(Point start, Point control, Point end, params ReadOnlySpan<Edge> lines) => Boundary.Create(
        [.. BezierPieces.Of([start, control, end], [1, 1, 1], 0), .. lines.IsEmpty ? [new LineEdge(end, start)] : lines.ToArray()]);

    private static ImmutableArray<Boundary> Polygon(params ReadOnlySpan<(double X, double Y)> corners)
    {
        var points = ImmutableArray.CreateBuilder<Point>(corners.Length);
        foreach (var (x, y) in corners)
        {
            points.Add(new Point(x, y));
        }

        return new Polygon(points.ToImmutable()).Boundaries();
    }

    private static ImmutableArray<Boundary> Inches(Shape shape) =>
        [.. shape.Boundaries().Select(b => b.Placed(new Placement(default, Scale: Inch)))];

    private static Boundary Sector(double radius, double from, double to, bool throughCentre)
    {
        var start = radius * Point.Direction(from * Math.PI / 180);
        var end = radius * Point.Direction(to * Math.PI / 180);
        var arc = new ArcEdge(start, end, Math.Tan((to - from) * Math.PI / 720));
        return Boundary.Create(throughCentre
            ? [arc, new LineEdge(end, default), new LineEdge(default, start)]
            : [arc, new LineEdge(end, start)]);
    }

    private static Boundary Fillet(double radius)
    {
        var (right, top) = (new Point(radius, 0), new Point(0, radius));
        return Boundary.Create(
        [
            new LineEdge(default, right),
            new ArcEdge(right, top, -Math.Tan(Math.PI / 8)),
            new LineEdge(top, default),
        ]);
    }
}
