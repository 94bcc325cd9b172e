using System.Collections.Immutable;
using MeshSection.Geometry;
using OxyPlot;

namespace MeshSection.Plots.Drawing;

/// <summary>How a line is drawn, in units of the sheet.</summary>
internal sealed record Stroke(OxyColor Colour, double Thickness, params double[] Dash)
{
    public static readonly Stroke None = new(OxyColors.Undefined, 0);

    // The context takes dashes as multiples of the thickness.
    public double[]? DashArray => Dash.Length == 0 ? null : [.. Dash.Select(d => d / Thickness)];
}

/// <summary>One thing drawn on the sheet: its unit is a tenth of a millimetre of print, x to the right, y down.</summary>
internal abstract record Mark
{
    protected const EdgeRenderingMode Exact = EdgeRenderingMode.PreferGeometricAccuracy;

    public abstract void Draw(IRenderContext context);
}

/// <summary>Closed loops filled together; a loop that runs against the one around it cuts a hole.</summary>
internal sealed record Area(ImmutableArray<ScreenPoint[]> Loops, OxyColor Fill, Stroke Rim) : Mark
{
    public override void Draw(IRenderContext context) =>
        context.DrawPolygons([.. Loops], Fill, Rim.Colour, Rim.Thickness, Exact, Rim.DashArray, LineJoin.Round);
}

/// <summary>A line through points.</summary>
internal sealed record Polyline(ScreenPoint[] Points, Stroke Stroke) : Mark
{
    public Polyline(Stroke stroke, params ScreenPoint[] points)
        : this(points, stroke)
    {
    }

    public override void Draw(IRenderContext context) =>
        context.DrawLine(Points, Stroke.Colour, Stroke.Thickness, Exact, Stroke.DashArray, LineJoin.Round);
}

/// <summary>Separate straight pieces, each between points 2i and 2i + 1.</summary>
internal sealed record Segments(ScreenPoint[] Ends, Stroke Stroke) : Mark
{
    public override void Draw(IRenderContext context) =>
        context.DrawLineSegments(Ends, Stroke.Colour, Stroke.Thickness, Exact, Stroke.DashArray, LineJoin.Round);
}

/// <summary>A filled circle with a rim.</summary>
internal sealed record Disc(ScreenPoint Centre, double Radius, OxyColor Fill, Stroke Rim) : Mark
{
    public override void Draw(IRenderContext context) => context.DrawEllipse(
        new OxyRect(Centre.X - Radius, Centre.Y - Radius, 2 * Radius, 2 * Radius), Fill, Rim.Colour, Rim.Thickness, Exact);
}

/// <summary>A line of text in the middle of its box.</summary>
internal sealed record Label(string Text, ScreenPoint Centre, Lettering Lettering, bool IsUpright = true) : Mark
{
    /// <summary>The box that the letters fill; a label that is not upright reads from bottom to top.</summary>
    public Box Box
    {
        get
        {
            var (width, height) = IsUpright
                ? (Lettering.Width(Text), Lettering.Height)
                : (Lettering.Height, Lettering.Width(Text));
            return new Box(Centre.X - 0.5 * width, Centre.Y - 0.5 * height, Centre.X + 0.5 * width, Centre.Y + 0.5 * height);
        }
    }

    public static Label LeftAt(string text, double x, double y, Lettering lettering) =>
        new(text, new ScreenPoint(x + 0.5 * lettering.Width(text), y), lettering);

    public static Label RightAt(string text, double x, double y, Lettering lettering) =>
        new(text, new ScreenPoint(x - 0.5 * lettering.Width(text), y), lettering);

    public override void Draw(IRenderContext context) => context.DrawText(
        Centre,
        Text,
        Lettering.Colour,
        fontSize: Lettering.Size,
        fontWeight: Lettering.IsBold ? FontWeights.Bold : FontWeights.Normal,
        rotation: IsUpright ? 0 : -90,
        horizontalAlignment: HorizontalAlignment.Center,
        verticalAlignment: VerticalAlignment.Middle);
}

/// <summary>Size, weight and colour of letters; 10 units of size are 2.8 points in print.</summary>
internal sealed record Lettering(double Size, OxyColor Colour, bool IsBold = false)
{
    public static readonly Lettering Body = new(28, Palette.Ink);
    public static readonly Lettering Strong = new(28, Palette.Ink, true);
    public static readonly Lettering Small = new(24, Palette.Quiet);
    public static readonly Lettering Index = new(21, Palette.Ink);

    /// <summary>From the tallest letter to the lowest, about the middle of the line.</summary>
    public double Height => 1.12 * Size;

    public double Width(string text) => Typefaces.Width(text, Size, IsBold);
}
