using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Plots.Drawing;
using MeshSection.Plots.Layout;
using MeshSection.Sections;
using MeshSection.Units;
using OxyPlot;

namespace MeshSection.Plots;

/// <summary>The picture of a mesh: its triangles, the smallest angle, and whatever was left unrefined.</summary>
public static class MeshFigure
{
    private static readonly Stroke Leader = new(Palette.Orange, 2);
    private static readonly Stroke WallStroke = new(Palette.Green, 4);

    /// <summary>Lays the picture out.</summary>
    /// <param name="section">The section that was meshed; its title heads the picture.</param>
    /// <param name="mesh">Its mesh.</param>
    /// <param name="report">The report on the mesh.</param>
    /// <param name="unit">The unit for every number on the picture.</param>
    /// <param name="size">Pixels; <see cref="PictureSize.Standard"/> if null.</param>
    /// <exception cref="ArgumentOutOfRangeException">The size is out of its range.</exception>
    public static Figure Of(Section section, Mesh mesh, MeshReport report, LengthUnit unit, PictureSize? size = null)
    {
        ArgumentNullException.ThrowIfNull(section);
        ArgumentNullException.ThrowIfNull(mesh);
        ArgumentNullException.ThrowIfNull(report);
        ArgumentNullException.ThrowIfNull(unit);
        var outline = section.Outline;
        var quality = report.Quality;

        var sheet = new Sheet(size ?? PictureSize.Standard);
        Heading.Add(sheet, section.Title);
        new Panel(Rows(mesh, report, unit)).Add(sheet, area => View.ScaleFor(outline.Bounds, Inner(area)));
        var view = View.Fit(outline.Bounds, Inner(sheet.Free));
        var lengths = new LengthScale(unit, Math.Max(outline.Bounds.Width, outline.Bounds.Height));
        ScaleBar.Add(sheet, view.Scale, unit, lengths.NoteOn(outline.Bounds));

        OutlineMarks.AddRegions(sheet, outline, view);
        AddUnrefined(sheet, mesh, view);
        sheet.Add(new Area([MeshMarks.Triangle(mesh, view, quality.SmallestAngleTriangle)], Palette.Orange, Stroke.None));
        sheet.Add(MeshMarks.InnerEdges(mesh, view));
        sheet.Add(MeshMarks.OutlineEdges(mesh, view));
        AddKept(sheet, mesh, report, view);
        if (report.ThinnestWall is { } wall)
        {
            AddWall(sheet, view.Of(wall.From), view.Of(wall.To));
        }

        AddSharpest(sheet, outline.Bounds, mesh, view, quality);
        return sheet.ToFigure();
    }

    /// <summary>Room for the mesh, with the angle's text at either side.</summary>
    private static Box Inner(Box area)
    {
        var above = ScaleBar.Above(area);
        return new Box(above.MinX + 130, above.MinY + 10, above.MaxX - 130, above.MaxY - 20);
    }

    private static ImmutableArray<PanelRow> Rows(Mesh mesh, MeshReport report, LengthUnit unit)
    {
        var quality = report.Quality;
        var rows = ImmutableArray.CreateBuilder<PanelRow>();
        rows.Add(new ValueRow("Triangles", "", "", Numbers.Count(quality.Triangles)));
        rows.Add(new ValueRow("Nodes", "", "", Numbers.Count(quality.Nodes)));
        rows.Add(new ValueRow("Smallest angle", "", "", KeyValues.Angle(quality.SmallestAngle)));
        rows.Add(new ValueRow("Largest angle", "", "", KeyValues.Angle(quality.LargestAngle)));
        rows.Add(new ValueRow("Largest triangle", "", "", $"{Numbers.Format(unit.FromMillimetres(quality.LargestArea, 2))} {unit.SymbolOf(2)}"));
        if (report.ThinnestWall is { } wall)
        {
            rows.Add(new ValueRow("Thinnest wall", "", "", $"{Numbers.Format(unit.FromMillimetres(wall.Thickness, 1))} {unit.SymbolOf(1)}"));
            rows.Add(new LegendRow(
                p => [new Polyline(WallStroke, new(p.X - 14, p.Y), new(p.X + 14, p.Y))],
                wall.Elements == 1 ? "thinnest wall, 1 element across" : $"thinnest wall, {wall.Elements} elements across"));
        }

        if (!report.KeptPoints.IsEmpty)
        {
            rows.Add(new LegendRow(p => [new Polyline(MeshMarks.Kept, new(p.X - 20, p.Y), p), KeptSign(p)], "to be kept in the mesh"));
        }

        rows.Add(new LegendRow(p => [new Disc(p, 11, OxyColors.Undefined, Leader)], "smallest angle"));
        foreach (var cause in mesh.Unrefined.GroupBy(u => u.Cause).OrderBy(g => g.Key))
        {
            rows.Add(new LegendRow(p => [UnrefinedSign(p)], $"{Numbers.Count(cause.Count())} unrefined: {Words(cause.Key)}"));
        }

        return rows.ToImmutable();
    }

    private static void AddKept(Sheet sheet, Mesh mesh, MeshReport report, View view)
    {
        sheet.Add(MeshMarks.KeptEdges(mesh, view));
        foreach (var point in report.KeptPoints)
        {
            sheet.Add(KeptSign(view.Of(point)));
        }
    }

    /// <summary>The way across a wall, with a sign that is seen however short it is.</summary>
    private static void AddWall(Sheet sheet, ScreenPoint from, ScreenPoint to)
    {
        sheet.Add(new Polyline(WallStroke, from, to));
        foreach (var end in new[] { from, to })
        {
            sheet.Add(new Disc(end, 5, Palette.Green, Stroke.None));
        }
    }

    private static void AddUnrefined(Sheet sheet, Mesh mesh, View view)
    {
        if (mesh.Unrefined.IsEmpty)
        {
            return;
        }

        ImmutableArray<ScreenPoint[]> triangles = [.. mesh.Unrefined.Select(u => MeshMarks.Triangle(mesh, view, u.Triangle))];
        sheet.Add(new Area(triangles, Palette.Blue, Stroke.None));
        foreach (var triangle in triangles)
        {
            sheet.Add(UnrefinedSign(MeshMarks.Middle(triangle)));
        }
    }

    private static void AddSharpest(Sheet sheet, Box bounds, Mesh mesh, View view, MeshQuality quality)
    {
        var triangle = MeshMarks.Triangle(mesh, view, quality.SmallestAngleTriangle);
        var middle = MeshMarks.Middle(triangle);
        var radius = Math.Max(14, 5 + triangle.Max(p => p.DistanceTo(middle)));
        sheet.Add(new Disc(middle, radius, OxyColors.Undefined, Leader));

        // The angle stands beside the section, level with its triangle.
        var text = KeyValues.Angle(quality.SmallestAngle);
        var lettering = Lettering.Strong with { Colour = Palette.Orange };
        var right = middle.X > view.Target.X;
        var box = view.Of(bounds);
        var away = 40 + 0.5 * lettering.Width(text);
        var x = right ? box.MaxX + away : box.MinX - away;
        if (sheet.Find(new Label(text, new ScreenPoint(x, middle.Y), lettering)) is { } label)
        {
            var start = right ? middle.X + radius : middle.X - radius;
            var end = right ? label.Box.MinX - 8 : label.Box.MaxX + 8;
            sheet.Add(new Polyline(Leader, new(start, middle.Y), new(end, label.Centre.Y)));
            sheet.Add(label);
        }
    }

    private static Disc KeptSign(ScreenPoint p) => new(p, 6, Palette.Blue, Stroke.None);

    private static Disc UnrefinedSign(ScreenPoint p) => new(p, 6, Palette.Blue, new Stroke(Palette.Paper, 1.5));

    private static string Words(UnrefinedCause cause) => cause switch
    {
        UnrefinedCause.InputAngle => "sharp corner of the outline",
        UnrefinedCause.NodeLimit => "limit on nodes reached",
        UnrefinedCause.LeastEdge => "edges too short to halve",
        _ => throw new ArgumentOutOfRangeException(nameof(cause), cause, null),
    };
}
