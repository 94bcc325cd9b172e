using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using MeshSection.Properties;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>
/// The dimension lines around a section: extreme-fibre distances at the left and the bottom, overall height and width
/// at the right and the top.
/// </summary>
internal sealed class DimensionFrame(Outline outline, SectionProperties properties, LengthScale lengths)
{
    /// <summary>How far the dimension lines stand off the section; the axes and their names lie in between.</summary>
    private const double SideOffset = 128;
    private const double Offset = 100;

    private const double Overshoot = 12;

    private readonly Box bounds = outline.Bounds;
    private readonly Point centroid = properties.Centroid - outline.Origin;

    /// <summary>The largest view of the section that leaves room for its dimensions.</summary>
    public View ViewIn(Box area)
    {
        var view = View.Fit(bounds, Inner(area, Lettering.Body.Height));
        var vertical = Chains(view).Vertical;
        var hasRoom = vertical.TrueForAll(d => d.HasRoom);
        return hasRoom ? view : View.Fit(bounds, Inner(area, vertical.Max(d => d.TextWidth) + 10));
    }

    public void AddExtensions(Sheet sheet, View view, Stroke stroke)
    {
        var box = view.Of(bounds);
        var c = view.Of(centroid);
        var (left, right) = (box.MinX - SideOffset - Overshoot, box.MaxX + SideOffset + Overshoot);
        var (top, bottom) = (box.MinY - Offset - Overshoot, box.MaxY + Offset + Overshoot);
        foreach (var y in (double[])[box.MinY, box.MaxY])
        {
            sheet.Add(new Polyline(stroke, new(left, y), new(right, y)));
        }

        foreach (var x in (double[])[box.MinX, box.MaxX])
        {
            sheet.Add(new Polyline(stroke, new(x, top), new(x, bottom)));
        }

        sheet.Add(new Polyline(stroke, new(left, c.Y), new(box.MinX, c.Y)));
        sheet.Add(new Polyline(stroke, new(c.X, box.MaxY), new(c.X, bottom)));
    }

    public void AddDimensions(Sheet sheet, View view)
    {
        var box = view.Of(bounds);
        var (top, bottom, left, right, height, width) = Chains(view);
        DimensionLine.AddVertical(sheet, box.MinX - SideOffset, true, top, bottom);
        DimensionLine.AddVertical(sheet, box.MaxX + SideOffset, false, height);
        DimensionLine.AddHorizontal(sheet, box.MaxY + Offset, left, right);
        DimensionLine.AddHorizontal(sheet, box.MinY - Offset, width);
        KeepLines(sheet, box, view.Of(centroid));
    }

    /// <summary>Keeps the names of the axes off the section and the lines around it.</summary>
    private static void KeepLines(Sheet sheet, Box box, ScreenPoint c)
    {
        var around = new Box(
            box.MinX - SideOffset - Overshoot, box.MinY - Offset - Overshoot, box.MaxX + SideOffset, box.MaxY + Offset + Overshoot);
        sheet.Keep(box);
        foreach (var y in (double[])[box.MinY, box.MaxY, box.MinY - Offset, box.MaxY + Offset])
        {
            sheet.Keep(around with { MinY = y, MaxY = y });
        }

        foreach (var x in (double[])[box.MinX, box.MaxX, box.MinX - SideOffset, box.MaxX + SideOffset])
        {
            sheet.Keep(around with { MinX = x, MaxX = x });
        }

        sheet.Keep(around with { MinY = c.Y, MaxY = c.Y, MaxX = box.MinX });
        sheet.Keep(around with { MinX = c.X, MaxX = c.X, MinY = box.MaxY });
    }

    private static Box Inner(Box area, double sideText)
    {
        var side = SideOffset + Overshoot + sideText;
        var foot = Offset + Overshoot;
        var head = Offset + Lettering.Body.Height + 4;
        return new Box(area.MinX + side, area.MinY + head, area.MaxX - side, area.MaxY - foot);
    }

    private Dimensions Chains(View view)
    {
        var box = view.Of(bounds);
        var c = view.Of(centroid);
        var x = properties.ElasticX;
        var y = properties.ElasticY;
        return new Dimensions(
            new Dimension(box.MinY, c.Y, lengths.Format(x.Positive.Distance), x.PositiveGoverns),
            new Dimension(c.Y, box.MaxY, lengths.Format(x.Negative.Distance), x.NegativeGoverns),
            new Dimension(box.MinX, c.X, lengths.Format(y.Negative.Distance), y.NegativeGoverns),
            new Dimension(c.X, box.MaxX, lengths.Format(y.Positive.Distance), y.PositiveGoverns),
            new Dimension(box.MinY, box.MaxY, lengths.Format(bounds.Height), false),
            new Dimension(box.MinX, box.MaxX, lengths.Format(bounds.Width), false));
    }

    private readonly record struct Dimensions(
        Dimension Top, Dimension Bottom, Dimension Left, Dimension Right, Dimension Height, Dimension Width)
    {
        public List<Dimension> Vertical => [Top, Bottom, Height];
    }
}
