using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Sections.Shapes;

namespace MeshSection.Tests.Torsion;

/// <summary>Sections given by the middle lines of their walls, the walls as thin as wanted.</summary>
internal static class ThinWalls
{
    /// <summary>A channel; the middle line of its web is x = 0, that of its lower flange y = 0.</summary>
    public static ImmutableArray<Boundary> Channel(double flange, double depth, double flangeThickness, double webThickness) =>
        Moved(new Channel(depth + flangeThickness, flange + webThickness / 2, flangeThickness, webThickness), -webThickness / 2, -flangeThickness / 2);

    /// <summary>A zed; its middle lines cross the web's at y = 0 and y = depth.</summary>
    public static ImmutableArray<Boundary> Zed(double flange, double depth, double flangeThickness, double webThickness) =>
        Moved(new Zed(depth + flangeThickness, flange + webThickness / 2, flangeThickness, webThickness), 0, -flangeThickness / 2);

    /// <summary>An I; the middle line of its bottom flange is y = 0.</summary>
    public static ImmutableArray<Boundary> MonoI(double top, double topThickness, double bottom, double bottomThickness, double depth, double web) =>
        Moved(
            new IBeam(
                depth + 0.5 * (topThickness + bottomThickness), top, topThickness, web,
                BottomWidth: bottom, BottomFlangeThickness: bottomThickness),
            0,
            -bottomThickness / 2);

    /// <summary>A round tube with a slit at the right, open over an angle in radians; centred on the origin.</summary>
    public static Boundary SlitTube(double radius, double thickness, double opening) =>
        Arc(radius, thickness, opening / 2, 2 * Math.PI - opening / 2);

    /// <summary>A strip bent along an arc about the origin, between two angles in radians.</summary>
    public static Boundary Arc(double radius, double thickness, double from, double to)
    {
        var (outer, inner) = (radius + thickness / 2, radius - thickness / 2);
        var middle = 0.5 * (from + to);
        var half = Math.Tan((to - from) / 8);
        return Boundary.Create(
        [
            new ArcEdge(outer * Point.Direction(from), outer * Point.Direction(middle), half),
            new ArcEdge(outer * Point.Direction(middle), outer * Point.Direction(to), half),
            new LineEdge(outer * Point.Direction(to), inner * Point.Direction(to)),
            new ArcEdge(inner * Point.Direction(to), inner * Point.Direction(middle), -half),
            new ArcEdge(inner * Point.Direction(middle), inner * Point.Direction(from), -half),
            new LineEdge(inner * Point.Direction(from), outer * Point.Direction(from)),
        ]);
    }

    /// <summary>Cells side by side: middle lines of the given widths, all of one depth, all walls alike.</summary>
    public static ImmutableArray<Boundary> Cells(double depth, double thickness, params ReadOnlySpan<double> widths)
    {
        var boundaries = ImmutableArray.CreateBuilder<Boundary>();
        var (x, t) = (0.0, thickness / 2);
        foreach (var width in widths)
        {
            boundaries.Add(Box(x + t, t, x + width - t, depth - t));
            x += width;
        }

        boundaries.Add(Box(-t, -t, x + t, depth + t));
        return boundaries.ToImmutable();
    }

    private static Boundary Box(double left, double bottom, double right, double top) =>
        Boundary.Polygon(new(left, bottom), new(right, bottom), new(right, top), new(left, top));

    private static ImmutableArray<Boundary> Moved(Shape shape, double x, double y) =>
        [.. shape.Boundaries().Select(b => b.Placed(Placement.Moved(x, y)))];
}
