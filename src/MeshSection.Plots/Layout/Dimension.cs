using MeshSection.Plots.Drawing;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>One dimension between two stops of a dimension line.</summary>
/// <param name="From">Where it begins along the line.</param>
/// <param name="To">Where it ends, at least <paramref name="From"/>.</param>
/// <param name="Text">What stands on it.</param>
/// <param name="IsGoverning">True to bring it out.</param>
internal readonly record struct Dimension(double From, double To, string Text, bool IsGoverning)
{
    public Lettering Lettering =>
        IsGoverning ? Lettering.Strong with { Colour = Palette.Orange } : Lettering.Body;

    /// <summary>The text with the sign of the governing side.</summary>
    public string Inscription => IsGoverning ? "● " + Text : Text;

    public double TextWidth => Lettering.Width(Inscription);

    /// <summary>True if the text can stand between the two ends.</summary>
    public bool HasRoom => To - From >= TextWidth + 20;
}

/// <summary>Dimension lines with oblique ticks, which stay clear however short a dimension is.</summary>
internal static class DimensionLine
{
    private const double Tick = 9;
    private const double TextGap = 8;

    private static readonly Stroke Line = new(Palette.Quiet, 1.6);
    private static readonly Stroke Slash = new(Palette.Ink, 2.6);

    /// <summary>A line from left to right at a height; the text above it, or beside it where there is no room.</summary>
    public static void AddHorizontal(Sheet sheet, double y, params ReadOnlySpan<Dimension> chain)
    {
        sheet.Add(new Polyline(Line, new(chain[0].From, y), new(chain[^1].To, y)));
        AddTick(sheet, chain[0].From, y);
        for (var i = 0; i < chain.Length; i++)
        {
            var d = chain[i];
            AddTick(sheet, d.To, y);
            var above = new Label(
                d.Inscription, new ScreenPoint(0.5 * (d.From + d.To), y - 0.5 * d.Lettering.Height - 2), d.Lettering);
            var atLeft = Label.RightAt(d.Inscription, chain[0].From - Tick - TextGap, y, d.Lettering);
            var atRight = Label.LeftAt(d.Inscription, chain[^1].To + Tick + TextGap, y, d.Lettering);
            var beside = i == 0 && chain.Length > 1 ? (atLeft, atRight) : (atRight, atLeft);
            sheet.Place(d.HasRoom ? above : beside.Item1, beside.Item1, beside.Item2);
        }
    }

    /// <summary>A line from top to bottom; the text along it, or level and beside it where there is no room.</summary>
    /// <param name="sheet">Where to draw.</param>
    /// <param name="x">Where the line stands.</param>
    /// <param name="textAtLeft">The side of the line on which the text stands.</param>
    /// <param name="chain">The dimensions, from the top.</param>
    public static void AddVertical(Sheet sheet, double x, bool textAtLeft, params ReadOnlySpan<Dimension> chain)
    {
        sheet.Add(new Polyline(Line, new(x, chain[0].From), new(x, chain[^1].To)));
        AddTick(sheet, x, chain[0].From);
        for (var i = 0; i < chain.Length; i++)
        {
            var d = chain[i];
            AddTick(sheet, x, d.To);
            var middle = 0.5 * (d.From + d.To);
            var half = 0.5 * d.Lettering.Height + 2;
            var along = new Label(d.Inscription, new ScreenPoint(textAtLeft ? x - half : x + half, middle), d.Lettering, false);
            var level = chain.Length == 1 ? middle : i == 0 ? Math.Min(middle, d.To - half) : Math.Max(middle, d.From + half);
            var beside = textAtLeft
                ? Label.RightAt(d.Inscription, x - Tick - TextGap, level, d.Lettering)
                : Label.LeftAt(d.Inscription, x + Tick + TextGap, level, d.Lettering);
            sheet.Place(d.HasRoom ? along : beside, beside);
        }
    }

    private static void AddTick(Sheet sheet, double x, double y) =>
        sheet.Add(new Polyline(Slash, new(x - Tick, y + Tick), new(x + Tick, y - Tick)));
}
