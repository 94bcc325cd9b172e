using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using MeshSection.Plots.Layout;
using MeshSection.Units;
using OxyPlot;

namespace MeshSection.Plots;

/// <summary>
/// The picture of what was found in a drawing: every boundary with its number, role, joints, arcs and starting point.
/// </summary>
public static class OutlineFigure
{
    private const int MostListed = 12;
    private static readonly Stroke Pointed = new(Palette.Orange, 3);
    private static readonly Stroke InnerLine = new(Palette.Quiet, 1.6);

    /// <summary>Lays the picture out.</summary>
    /// <param name="outline">The outline; boundary i carries the number i + 1.</param>
    /// <param name="title">The heading; may be empty.</param>
    /// <param name="unit">The unit for every number on the picture.</param>
    /// <param name="findings">
    /// What to show beside the boundaries. What lies farther from the outline than half its size is left out, lest it shrink.
    /// </param>
    /// <param name="size">Pixels; <see cref="PictureSize.Standard"/> if null.</param>
    /// <exception cref="ArgumentOutOfRangeException">The size is out of its range.</exception>
    public static Figure Of(
        Outline outline, string title, LengthUnit unit, OutlineFindings findings, PictureSize? size = null)
    {
        ArgumentNullException.ThrowIfNull(outline);
        ArgumentNullException.ThrowIfNull(title);
        ArgumentNullException.ThrowIfNull(unit);
        ArgumentNullException.ThrowIfNull(findings);
        var reach = outline.Bounds.Grown(0.5 * outline.Bounds.Diagonal);
        OutlineMark[] near = [.. findings.Marks.Where(m => reach.Contains(m.Place - outline.Origin))];
        OutlinePiece[] pieces = [.. findings.Pieces.Where(p => p.Edge.Bounds is var box && Holds(reach, box))];
        var bounds = near.Aggregate(outline.Bounds, (box, m) => box.With(m.Place - outline.Origin));
        bounds = pieces.Aggregate(bounds, (box, p) => box.With(p.Edge.Bounds));

        var sheet = new Sheet(size ?? PictureSize.Standard);
        Heading.Add(sheet, title);
        new Panel(Rows(outline, near, pieces, findings)).Add(sheet, area => View.ScaleFor(bounds, Inner(area)));
        var view = View.Fit(bounds, Inner(sheet.Free));
        var lengths = new LengthScale(unit, Math.Max(outline.Bounds.Width, outline.Bounds.Height));
        ScaleBar.Add(sheet, view.Scale, unit, lengths.NoteOn(outline.Bounds));

        OutlineMarks.AddRegions(sheet, outline, view);
        var layers = findings.Faces.Select(f => f.Layer).Distinct(StringComparer.Ordinal).ToList();
        foreach (var face in findings.Faces)
        {
            sheet.Add(new Area([.. face.Boundaries.Select(view.Of)], Palette.Tint(layers.IndexOf(face.Layer)), InnerLine));
        }

        foreach (var piece in pieces)
        {
            sheet.Add(new Polyline(view.Of(piece.Edge), StrokeOf(piece.Role)));
        }

        foreach (var boundary in outline.Boundaries)
        {
            BoundaryMarks.AddEdges(sheet, boundary, view);
        }

        foreach (var bar in findings.Bars)
        {
            sheet.Add(Bar(view.Of(bar.Place), 0.5 * view.Scale * (bar.Diameter ?? 0)));
        }

        AddMarks(sheet, outline, near, view);
        foreach (var boundary in outline.Boundaries)
        {
            BoundaryMarks.AddStart(sheet, boundary, view);
        }

        BoundaryNumbers.Add(sheet, outline, view);
        return sheet.ToFigure();
    }

    private static Box Inner(Box area) => ScaleBar.Above(area).Grown(-50);

    private static ImmutableArray<PanelRow> Rows(
        Outline outline, OutlineMark[] marks, OutlinePiece[] pieces, OutlineFindings findings)
    {
        var rows = ImmutableArray.CreateBuilder<PanelRow>();
        var count = outline.Boundaries.Length;
        for (var i = 0; i < Math.Min(count, MostListed); i++)
        {
            var (boundary, role, _, _) = outline.Boundaries[i];
            rows.Add(new ValueRow(Numbers.Count(i + 1), "", Words(role), Edges(boundary)));
        }

        if (count > MostListed)
        {
            rows.Add(new ValueRow("…", "", $"{Numbers.Count(count - MostListed)} more", ""));
        }

        foreach (var role in outline.Boundaries.Select(b => b.Role).Distinct().Order())
        {
            rows.Add(LegendRow.OfLine(BoundaryMarks.StrokeOf(role), Words(role)));
        }

        if (outline.Boundaries.Any(b => b.Boundary.Edges.Any(e => e is not LineEdge)))
        {
            var hasCurves = outline.Boundaries.Any(b => b.Boundary.Edges.Any(e => e is BezierEdge));
            rows.Add(LegendRow.OfLine(BoundaryMarks.ArcBand, hasCurves ? "arc or curve" : "arc"));
        }

        rows.Add(new LegendRow(p => [BoundaryMarks.Joint(p, 1)], "joint of two edges"));
        rows.Add(new LegendRow(p => [BoundaryMarks.Arrow(p, new Point(1, 0), Palette.Ink, 1)], "start, material on the left"));
        var layers = findings.Faces.Select(f => f.Layer).Distinct(StringComparer.Ordinal).ToArray();
        for (var i = 0; i < Math.Min(layers.Length, MostListed); i++)
        {
            var tint = Palette.Tint(i);
            rows.Add(new LegendRow(p => [new Disc(p, 9, tint, InnerLine)], "layer " + layers[i]));
        }

        foreach (var role in pieces.Select(p => p.Role).Distinct().Order())
        {
            rows.Add(LegendRow.OfLine(StrokeOf(role), role == PieceRole.LeadsNowhere ? "bounds nothing, left out" : "not chosen, left out"));
        }

        if (findings.Pieces.Length > pieces.Length)
        {
            rows.Add(new ValueRow("…", "", $"{Numbers.Count(findings.Pieces.Length - pieces.Length)} left out farther away", ""));
        }

        if (findings.Bars.Length > 0)
        {
            rows.Add(new LegendRow(p => [Bar(p, 6)], $"{Counted(findings.Bars.Length, "bar")}"));
        }

        if (marks.Length > 0)
        {
            rows.Add(new LegendRow(p => [new Disc(p, 13, OxyColors.Undefined, Pointed)], "repaired, or to be checked"));
        }

        return rows.ToImmutable();
    }

    private static void AddMarks(Sheet sheet, Outline outline, OutlineMark[] marks, View view)
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

                // Away from the outline if there is room.
                var label = place.X < view.Target.X ? sheet.Find(left, right) : sheet.Find(right, left);
                if (label is not null)
                {
                    sheet.AddOnPaper(label);
                }
            }
        }
    }

    private static bool Holds(Box outer, Box inner) =>
        outer.Contains(new Point(inner.MinX, inner.MinY)) && outer.Contains(new Point(inner.MaxX, inner.MaxY));

    private static Stroke StrokeOf(PieceRole role) => role == PieceRole.LeadsNowhere
        ? new Stroke(Palette.Orange, 2.2, 3, 5)
        : new Stroke(Palette.Quiet, 1.4, 8, 6);

    /// <summary>A bar to scale, but never too small to be seen.</summary>
    private static Disc Bar(ScreenPoint place, double radius) => new(place, Math.Max(3, radius), Palette.Blue, new Stroke(Palette.Paper, 1));

    private static string Edges(Boundary boundary)
    {
        var lines = boundary.Edges.Count(e => e is LineEdge);
        var arcs = boundary.Edges.Count(e => e is ArcEdge);
        var curves = boundary.Edges.Length - lines - arcs;
        return $"{Counted(lines, "line")}, {Counted(arcs, "arc")}" + (curves > 0 ? $", {Counted(curves, "curve")}" : "");
    }

    private static string Words(BoundaryRole role) => role switch
    {
        BoundaryRole.Outer => "outer boundary",
        BoundaryRole.Hole => "hole",
        BoundaryRole.Island => "island",
        _ => throw new ArgumentOutOfRangeException(nameof(role), role, null),
    };

    private static string Counted(int count, string noun) => $"{Numbers.Count(count)} {noun}{(count == 1 ? "" : "s")}";
}
