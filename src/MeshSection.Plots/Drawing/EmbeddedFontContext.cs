using OxyPlot;
using OxyPlot.SkiaSharp;
using SkiaSharp;

namespace MeshSection.Plots.Drawing;

/// <summary>
/// The Skia render context with the embedded letters in place of installed ones, which it would look up by family name.
/// One line of text at a time.
/// </summary>
internal sealed class EmbeddedFontContext : SkiaRenderContext, IRenderContext
{
    public new void DrawText(
        ScreenPoint p,
        string text,
        OxyColor fill,
        string? fontFamily = null,
        double fontSize = 10,
        double fontWeight = 400,
        double rotation = 0,
        HorizontalAlignment horizontalAlignment = HorizontalAlignment.Left,
        VerticalAlignment verticalAlignment = VerticalAlignment.Top,
        OxySize? maxSize = null)
    {
        if (string.IsNullOrEmpty(text))
        {
            return;
        }

        using var font = Typefaces.Font(Typefaces.OfWeight(fontWeight), fontSize * DpiScale);
        using var paint = new SKPaint { Color = fill.ToSKColor(), IsAntialias = true };
        var metrics = font.Metrics;
        var x = horizontalAlignment switch
        {
            HorizontalAlignment.Left => 0f,
            HorizontalAlignment.Center => -Typefaces.Width(font, text) / 2,
            _ => -Typefaces.Width(font, text),
        };
        var y = verticalAlignment switch
        {
            VerticalAlignment.Top => -metrics.Ascent,
            VerticalAlignment.Middle => -(metrics.Ascent + metrics.Descent) / 2,
            _ => -metrics.Descent,
        };

        using var blob = SKTextBlob.Create(text, font);
        using var restored = new SKAutoCanvasRestore(SkCanvas);
        SkCanvas.Translate((float)p.X * DpiScale, (float)p.Y * DpiScale);
        SkCanvas.RotateDegrees((float)rotation);
        SkCanvas.DrawText(blob, x, y, paint);
    }

    public new OxySize MeasureText(string text, string? fontFamily = null, double fontSize = 10, double fontWeight = 500)
    {
        using var font = Typefaces.Font(Typefaces.OfWeight(fontWeight), fontSize);
        return new OxySize(Typefaces.Width(font, text), font.Metrics.Descent - font.Metrics.Ascent);
    }
}
