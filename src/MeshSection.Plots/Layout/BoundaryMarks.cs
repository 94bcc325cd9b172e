using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>The line of a boundary in the style of its role, its arcs on a band, its joints and its start.</summary>
internal static class BoundaryMarks
{
    /// <summary>What lies under every arc.</summary>
    public static readonly Stroke ArcBand = new(OxyColor.FromRgb(0xA9, 0xC8, 0xE0), 13);

    public static void AddEdges(Sheet sheet, NestedBoundary nested, View view)
    {
        var (boundary, role, _, _) = nested;
        var scale = SignScale(boundary, view);
        foreach (var arc in boundary.Edges.Where(e => e is not LineEdge))
        {
            sheet.Add(new Polyline(view.Of(arc), ArcBand with { Thickness = ArcBand.Thickness * scale }));
        }

        sheet.Add(new Area([view.Of(boundary)], OxyColors.Undefined, StrokeOf(role)));
        foreach (var edge in boundary.Edges)
        {
            // Joints at both ends of a short edge stay apart.
            var room = view.Scale * edge.Length / 24;
            sheet.Add(Joint(view.Of(edge.Start), Math.Clamp(room, 0.25, scale)));
        }
    }

    /// <summary>An arrow on the start, along the first edge.</summary>
    public static void AddStart(Sheet sheet, NestedBoundary nested, View view)
    {
        var first = nested.Boundary.Edges[0];
        var colour = StrokeOf(nested.Role).Colour;
        sheet.Add(Arrow(view.Of(first.Start), first.TangentAt(0), colour, SignScale(nested.Boundary, view)));
    }

    public static Stroke StrokeOf(BoundaryRole role) => role switch
    {
        BoundaryRole.Outer => new Stroke(Palette.Ink, 3.4),
        BoundaryRole.Hole => new Stroke(Palette.Orange, 3.4, 16, 6),
        BoundaryRole.Island => new Stroke(Palette.Green, 3.4, 22, 6, 4, 6),
        _ => throw new ArgumentOutOfRangeException(nameof(role), role, null),
    };

    /// <summary>Smaller signs on a boundary that is small on the sheet.</summary>
    public static double SignScale(Boundary boundary, View view) =>
        Math.Clamp(view.Scale * boundary.Bounds.Diagonal / 100, 0.25, 1);

    public static Disc Joint(ScreenPoint p, double scale) =>
        new(p, 4.5 * scale, Palette.Paper, new Stroke(Palette.Ink, 1.8 * scale));

    public static Area Arrow(ScreenPoint tail, Point along, OxyColor colour, double scale)
    {
        var left = along.Left();
        ScreenPoint At(double ahead, double aside)
        {
            var p = scale * (ahead * along + aside * left);
            return new ScreenPoint(tail.X + p.X, tail.Y - p.Y);
        }

        return new Area([[At(-4, 11), At(22, 0), At(-4, -11)]], colour, new Stroke(Palette.Paper, 1.5));
    }
}
