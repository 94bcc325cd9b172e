using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using MeshSection.Plots.Layout;
using OxyPlot;

namespace MeshSection.Plots;

/// <summary>
/// The picture of what was found in a drawing: every boundary with its number, role, joints, arcs and starting point.
/// </summary>
public static class OutlineFigure
{
    private const int MostListed = 12;
    private static readonly Stroke ArcBand = new(OxyColor.FromRgb(0xA9, 0xC8, 0xE0), 13);
    private static readonly Stroke Pointed = new(Palette.Orange, 3);

    /// <summary>Lays the picture out.</summary>
    /// <param name="outline">The outline; boundary i carries the number i + 1.</param>
    /// <param name="title">The heading; may be empty.</param>
    /// <param name="unit">The unit for every number on the picture.</param>
    /// <param name="marks">Places to point out; may be empty.</param>
    /// <param name="size">Pixels; <see cref="PictureSize.Standard"/> if null.</param>
    /// <exception cref="ArgumentOutOfRangeException">The size is out of its range.</exception>
    public static Figure Of(
        Outline outline, string title, DisplayUnit unit, IReadOnlyList<OutlineMark> marks, PictureSize? size = null)
    {
        ArgumentNullException.ThrowIfNull(outline);
        ArgumentNullException.ThrowIfNull(title);
        ArgumentNullException.ThrowIfNull(unit);
        ArgumentNullException.ThrowIfNull(marks);
        var sheet = new Sheet(size ?? PictureSize.Standard);
        Heading.Add(sheet, title);
        new Panel(Rows(outline, marks)).Add(sheet, area => View.ScaleFor(outline.Bounds, Inner(area)));
        var view = View.Fit(outline.Bounds, Inner(sheet.Free));
        var lengths = new LengthScale(unit, Math.Max(outline.Bounds.Width, outline.Bounds.Height));
        ScaleBar.Add(
            sheet, view.Scale, unit, $"{lengths.Format(outline.Bounds.Width)} × {lengths.Format(outline.Bounds.Height)}, {lengths.Note}");

        OutlineMarks.AddRegions(sheet, outline, view);
        foreach (var boundary in outline.Boundaries)
        {
            AddEdges(sheet, boundary, view);
        }

        AddMarks(sheet, outline, marks, view);
        for (var i = 0; i < outline.Boundaries.Length; i++)
        {
            AddStart(sheet, outline.Boundaries[i], i + 1, view);
        }

        return sheet.ToFigure();
    }

    private static Box Inner(Box area) => ScaleBar.Above(area).Grown(-50);

    private static ImmutableArray<PanelRow> Rows(Outline outline, IReadOnlyList<OutlineMark> marks)
    {
        var rows = ImmutableArray.CreateBuilder<PanelRow>();
        var count = outline.Boundaries.Length;
        for (var i = 0; i < Math.Min(count, MostListed); i++)
        {
            var (boundary, role, _, _) = outline.Boundaries[i];
            var lines = boundary.Edges.Count(e => e is LineEdge);
            var arcs = boundary.Edges.Length - lines;
            rows.Add(new ValueRow(Numbers.Count(i + 1), "", Words(role), $"{Counted(lines, "line")}, {Counted(arcs, "arc")}"));
        }

        if (count > MostListed)
        {
            rows.Add(new ValueRow("…", "", $"{Numbers.Count(count - MostListed)} more", ""));
        }

        foreach (var role in outline.Boundaries.Select(b => b.Role).Distinct().Order())
        {
            rows.Add(LegendRow.OfLine(StrokeOf(role), Words(role)));
        }

        if (outline.Boundaries.Any(b => b.Boundary.Edges.Any(e => e is not LineEdge)))
        {
            rows.Add(LegendRow.OfLine(ArcBand, "arc"));
        }

        rows.Add(new LegendRow(p => [Joint(p)], "joint of two edges"));
        rows.Add(new LegendRow(p => [Arrow(p, new Point(1, 0), Palette.Ink)], "start, material on the left"));
        if (marks.Count > 0)
        {
            rows.Add(new LegendRow(p => [new Disc(p, 13, OxyColors.Undefined, Pointed)], "repaired or left out"));
        }

        return rows.ToImmutable();
    }

    private static void AddEdges(Sheet sheet, NestedBoundary nested, View view)
    {
        var (boundary, role, _, _) = nested;
        foreach (var arc in boundary.Edges.Where(e => e is not LineEdge))
        {
            sheet.Add(new Polyline(view.Of(arc), ArcBand));
        }

        sheet.Add(new Area([view.Of(boundary)], OxyColors.Undefined, StrokeOf(role)));
        foreach (var edge in boundary.Edges)
        {
            sheet.Add(Joint(view.Of(edge.Start)));
        }
    }

    private static void AddStart(Sheet sheet, NestedBoundary nested, int number, View view)
    {
        var first = nested.Boundary.Edges[0];
        var start = view.Of(first.Start);
        var along = first.TangentAt(0);
        var colour = StrokeOf(nested.Role).Colour;
        sheet.Add(Arrow(start, along, colour));

        // The number stands off the material, on the right of the way, or else on the left.
        var lettering = Lettering.Strong with { Colour = colour };
        var text = Numbers.Count(number);
        if (sheet.Find(At(-34), At(34), At(-70), At(70)) is { } label)
        {
            var radius = 0.5 * Math.Max(label.Box.Width, label.Box.Height) + 3;
            sheet.Add(new Disc(label.Centre, radius, Palette.Paper, new Stroke(colour, 2.4)));
            sheet.Add(label);
        }

        Label At(double distance)
        {
            var away = distance * along.Left() + 8 * along;
            return new(text, new ScreenPoint(start.X + away.X, start.Y - away.Y), lettering);
        }
    }

    private static void AddMarks(Sheet sheet, Outline outline, IReadOnlyList<OutlineMark> marks, View view)
    {
        foreach (var mark in marks)
        {
            var place = view.Of(mark.Place - outline.Origin);
            sheet.Add(new Disc(place, 16, OxyColors.Undefined, Pointed));
            if (mark.Text.Length > 0)
            {
                var lettering = Lettering.Strong with { Size = Lettering.Small.Size, Colour = Palette.Orange };
                var right = Label.LeftAt(mark.Text, place.X + 24, place.Y, lettering);
                var left = Label.RightAt(mark.Text, place.X - 24, place.Y, lettering);
                if (sheet.Find(right, left) is { } label)
                {
                    sheet.AddOnPaper(label);
                }
            }
        }
    }

    private static Stroke StrokeOf(BoundaryRole role) => role switch
    {
        BoundaryRole.Outer => new Stroke(Palette.Ink, 3.4),
        BoundaryRole.Hole => new Stroke(Palette.Orange, 3.4, 16, 6),
        BoundaryRole.Island => new Stroke(Palette.Green, 3.4, 22, 6, 4, 6),
        _ => throw new ArgumentOutOfRangeException(nameof(role), role, null),
    };

    private static string Words(BoundaryRole role) => role switch
    {
        BoundaryRole.Outer => "outer boundary",
        BoundaryRole.Hole => "hole",
        BoundaryRole.Island => "island",
        _ => throw new ArgumentOutOfRangeException(nameof(role), role, null),
    };

    private static string Counted(int count, string noun) => $"{Numbers.Count(count)} {noun}{(count == 1 ? "" : "s")}";

    private static Disc Joint(ScreenPoint p) => new(p, 4.5, Palette.Paper, new Stroke(Palette.Ink, 1.8));

    private static Area Arrow(ScreenPoint tail, Point along, OxyColor colour)
    {
        var left = along.Left();
        ScreenPoint At(double ahead, double aside)
        {
            var p = ahead * along + aside * left;
            return new ScreenPoint(tail.X + p.X, tail.Y - p.Y);
        }

        return new Area([[At(-4, 11), At(22, 0), At(-4, -11)]], colour, new Stroke(Palette.Paper, 1.5));
    }
}
