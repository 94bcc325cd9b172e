using SkiaSharp;

namespace MeshSection.Plots.Drawing;

/// <summary>
/// The letters of every picture, carried inside the assembly: a machine may have no fonts at all, and those that it
/// has may lack superscripts or Greek.
/// </summary>
internal static class Typefaces
{
    private static readonly Lazy<SKTypeface> RegularFace = new(() => Load("DejaVuSans.ttf"));
    private static readonly Lazy<SKTypeface> BoldFace = new(() => Load("DejaVuSans-Bold.ttf"));

    public static SKTypeface Regular => RegularFace.Value;

    public static SKTypeface Bold => BoldFace.Value;

    public static SKTypeface OfWeight(double weight) => weight >= 600 ? Bold : Regular;

    /// <summary>Width of a text on one line, in the unit of its size.</summary>
    public static double Width(string text, double size, bool isBold)
    {
        using var font = Font(isBold ? Bold : Regular, size);
        return Width(font, text);
    }

    /// <summary>Width of a text on one line in a font.</summary>
    public static float Width(SKFont font, string text) => font.MeasureText(Glyphs(font, text));

    private static ushort[] Glyphs(SKFont font, string text)
    {
        var glyphs = new ushort[font.CountGlyphs(text)];
        font.GetGlyphs(text, glyphs);
        return glyphs;
    }

    /// <summary>A font whose letters keep their places whatever the size: no hinting.</summary>
    public static SKFont Font(SKTypeface face, double size) =>
        new(face, (float)size) { Subpixel = true, Hinting = SKFontHinting.None, Edging = SKFontEdging.Antialias };

    private static SKTypeface Load(string name)
    {
        using var stream = typeof(Typefaces).Assembly.GetManifestResourceStream(name)!;
        using var data = SKData.Create(stream);
        return SKTypeface.FromData(data);
    }
}
