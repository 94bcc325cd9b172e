using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>The number of each boundary, from 1, in a ring beside it.</summary>
internal static class BoundaryNumbers
{
    public static void Add(Sheet sheet, Outline outline, View view)
    {
        foreach (var (boundary, _, _, _) in outline.Boundaries)
        {
            if (BoundaryMarks.SignScale(boundary, view) < 1)
            {
                sheet.Keep(view.Of(boundary.Bounds));
            }
        }

        for (var i = 0; i < outline.Boundaries.Length; i++)
        {
            AddOne(sheet, outline.Boundaries[i], Numbers.Count(i + 1), view);
        }
    }

    /// <summary>A number in a ring; among many small boundaries, which it must not hide, some stay without.</summary>
    private static void AddOne(Sheet sheet, NestedBoundary nested, string number, View view)
    {
        var (boundary, role, _, _) = nested;
        var colour = BoundaryMarks.StrokeOf(role).Colour;
        var lettering = Lettering.Strong with { Colour = colour };
        var radius = 0.5 * Math.Max(lettering.Width(number), lettering.Height) + 3;
        var room = radius - 0.5 * lettering.Height;
        var away = radius + 15;

        // By the start, on the right of the way and so off the material, else on its left; else around the boundary.
        var start = view.Of(boundary.Edges[0].Start);
        var along = boundary.Edges[0].TangentAt(0);
        var aside = away * along.Left() - 8 * along;
        var box = view.Of(boundary.Bounds);
        var middle = new ScreenPoint(0.5 * (box.MinX + box.MaxX), 0.5 * (box.MinY + box.MaxY));
        var label = sheet.FirstFree(
            room,
            At(start.X - aside.X, start.Y + aside.Y),
            At(start.X + aside.X, start.Y - aside.Y),
            At(middle.X, box.MinY - away),
            At(middle.X, box.MaxY + away),
            At(box.MinX - away, middle.Y),
            At(box.MaxX + away, middle.Y));
        if (label is not null)
        {
            sheet.Keep(label.Box.Grown(room));
            sheet.Add(new Disc(label.Centre, radius, Palette.Paper, new Stroke(colour, 2.4)));
            sheet.Add(label);
        }

        Label At(double x, double y) => new(number, new ScreenPoint(x, y), lettering);
    }
}
