using MeshSection.Plots.Drawing;

namespace MeshSection.Plots.Layout;

/// <summary>A line of the panel.</summary>
internal abstract record PanelRow
{
    protected const double Space = 14;

    /// <summary>The least width that it needs.</summary>
    public abstract double Width { get; }

    /// <param name="sheet">Where to draw.</param>
    /// <param name="x">The left end.</param>
    /// <param name="y">The middle of the line.</param>
    /// <param name="width">At least <see cref="Width"/>.</param>
    public abstract void Draw(Sheet sheet, double x, double y, double width);
}

/// <summary>A quantity: symbol with index and remark at the left, value at the right.</summary>
internal sealed record ValueRow(string Symbol, string Index, string Remark, string Value) : PanelRow
{
    public override double Width
    {
        get
        {
            var left = Lettering.Body.Width(Symbol) + Lettering.Index.Width(Index);
            var remark = Remark.Length == 0 ? 0 : Space + Lettering.Small.Width(Remark);
            return left + remark + 2 * Space + Lettering.Body.Width(Value);
        }
    }

    public override void Draw(Sheet sheet, double x, double y, double width)
    {
        sheet.Add(Label.LeftAt(Symbol, x, y, Lettering.Body));
        var end = x + Lettering.Body.Width(Symbol);
        if (Index.Length > 0)
        {
            sheet.Add(Label.LeftAt(Index, end, y + 0.25 * Lettering.Body.Size, Lettering.Index));
            end += Lettering.Index.Width(Index);
        }

        if (Remark.Length > 0)
        {
            sheet.Add(Label.LeftAt(Remark, end + Space, y, Lettering.Small));
        }

        if (Value.Length > 0)
        {
            sheet.Add(Label.RightAt(Value, x + width, y, Lettering.Body));
        }
    }
}

/// <summary>What a sign or a line of the drawing means.</summary>
/// <param name="Sample">The sign, made for the middle of a box 60 wide.</param>
/// <param name="Text">Its meaning.</param>
internal sealed record LegendRow(Func<OxyPlot.ScreenPoint, IEnumerable<Mark>> Sample, string Text) : PanelRow
{
    /// <summary>Half the width of a sample.</summary>
    public const double Reach = 30;

    public override double Width => 2 * Reach + Space + Lettering.Small.Width(Text);

    /// <summary>A line as sample.</summary>
    public static LegendRow OfLine(Stroke stroke, string text) =>
        new(p => [new Polyline(stroke, new(p.X - Reach, p.Y), new(p.X + Reach, p.Y))], text);

    public override void Draw(Sheet sheet, double x, double y, double width)
    {
        foreach (var mark in Sample(new(x + Reach, y)))
        {
            sheet.Add(mark);
        }

        sheet.Add(Label.LeftAt(Text, x + 2 * Reach + Space, y, Lettering.Small));
    }
}
