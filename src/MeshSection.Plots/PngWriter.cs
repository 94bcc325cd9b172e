using MeshSection.Plots.Drawing;
using SkiaSharp;

namespace MeshSection.Plots;

/// <summary>Writes figures as PNG.</summary>
public static class PngWriter
{
    // A unit of the sheet is a tenth of a millimetre in print.
    private const double UnitsPerMetre = 10_000;

    /// <summary>Writes a figure to a file, in place of what may be there.</summary>
    /// <param name="figure">What to draw.</param>
    /// <param name="path">The file to make; its folder must exist.</param>
    /// <exception cref="IOException">The file cannot be written.</exception>
    /// <exception cref="UnauthorizedAccessException">The file must not be written.</exception>
    public static void Save(Figure figure, string path)
    {
        // Drawn in full first: a fault leaves no half-written file.
        var bytes = Encode(figure);
        File.WriteAllBytes(path, bytes);
    }

    /// <summary>
    /// Draws a figure as PNG that states its size in print: 160 mm wide in the standard proportions. The same figure gives
    /// the same bytes.
    /// </summary>
    /// <param name="figure">What to draw.</param>
    public static byte[] Encode(Figure figure)
    {
        ArgumentNullException.ThrowIfNull(figure);
        var info = new SKImageInfo(figure.Size.Width, figure.Size.Height, SKColorType.Rgba8888, SKAlphaType.Opaque);
        using var bitmap = new SKBitmap(info);
        using (var canvas = new SKCanvas(bitmap))
        {
            canvas.Clear(SKColors.White);
            using var context = new EmbeddedFontContext { SkCanvas = canvas, DpiScale = (float)figure.UnitScale };
            figure.Draw(context);
        }

        using var pixels = bitmap.PeekPixels();
        using var data = pixels.Encode(new SKPngEncoderOptions(SKPngEncoderFilterFlags.Up, 6));
        return PngResolution.State(data.AsSpan(), (uint)Math.Round(figure.UnitScale * UnitsPerMetre));
    }
}
