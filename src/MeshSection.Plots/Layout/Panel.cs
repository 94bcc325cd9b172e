using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Plots.Drawing;

namespace MeshSection.Plots.Layout;

/// <summary>The key values and the legend, beside the drawing or below it: wherever the drawing comes out larger.</summary>
/// <param name="Rows">What it says, from the top.</param>
internal sealed record Panel(ImmutableArray<PanelRow> Rows)
{
    private const double RowHeight = 44;
    private const double Gap = 48;

    /// <summary>Draws the panel at an edge of the free part of the sheet, which shrinks by it.</summary>
    /// <param name="sheet">Where to draw.</param>
    /// <param name="drawingSize">How large the drawing would come out in a box.</param>
    public void Add(Sheet sheet, Func<Box, double> drawingSize)
    {
        var free = sheet.Free;
        var columnWidth = Rows.Max(r => r.Width);
        var columnCount = Math.Max(1, (int)((free.Width + Gap) / (columnWidth + Gap)));
        var perColumn = (Rows.Length + columnCount - 1) / columnCount;
        columnCount = (Rows.Length + perColumn - 1) / perColumn;
        var beside = free with { MaxX = free.MaxX - columnWidth - Gap };
        var above = free with { MaxY = free.MaxY - perColumn * RowHeight - Gap / 2 };
        var rule = new Stroke(Palette.Rule, 2);
        if (Rows.Length * RowHeight <= free.Height && drawingSize(beside) >= drawingSize(above))
        {
            var x = beside.MaxX + Gap;
            sheet.Add(new Polyline(rule, new(x - Gap / 2, free.MinY), new(x - Gap / 2, free.MaxY)));
            Draw(sheet, Rows.AsSpan(), x, free.MinY, columnWidth);
            sheet.Free = beside with { MaxX = beside.MaxX - Gap / 2 };
            return;
        }

        sheet.Add(new Polyline(rule, new(free.MinX, above.MaxY + 12), new(free.MaxX, above.MaxY + 12)));
        var pitch = (free.Width + Gap) / columnCount;
        for (var column = 0; column < columnCount; column++)
        {
            var first = column * perColumn;
            var rows = Rows.AsSpan()[first..Math.Min(first + perColumn, Rows.Length)];
            Draw(sheet, rows, free.MinX + column * pitch, above.MaxY + Gap / 2, Math.Min(pitch - Gap, 1.3 * columnWidth));
        }

        sheet.Free = above;
    }

    private static void Draw(Sheet sheet, ReadOnlySpan<PanelRow> rows, double x, double top, double width)
    {
        for (var i = 0; i < rows.Length; i++)
        {
            rows[i].Draw(sheet, x, top + (i + 0.5) * RowHeight, width);
        }
    }
}
