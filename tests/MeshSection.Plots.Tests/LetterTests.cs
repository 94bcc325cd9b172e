using MeshSection.Plots.Drawing;
using MeshSection.Plots.Tests.Samples;
using MeshSection.Units;
using OxyPlot;
using SkiaSharp;

namespace MeshSection.Plots.Tests;

public class LetterTests
{
    [Fact]
    public void Both_faces_are_the_embedded_ones()
    {
        Assert.Equal("DejaVu Sans", Typefaces.Regular.FamilyName);
        Assert.False(Typefaces.Regular.IsBold);
        Assert.Equal("DejaVu Sans", Typefaces.Bold.FamilyName);
        Assert.True(Typefaces.Bold.IsBold);
    }

    [Fact]
    public void Every_letter_of_every_picture_has_a_glyph()
    {
        IEnumerable<Figure> figures =
        [
            .. Hostile.All.Select(h => h.Sample.Figure()),
            OutlineFigure.Of(Outlines.Plate(), "Plate", LengthUnit.Millimetre, OutlineFindings.None),
            MeshFigure.Of(Sample.Angle().Section, Sample.Angle().Mesh, Sample.Angle().Report, LengthUnit.Millimetre),
        ];
        var letters = figures.SelectMany(f => f.Marks.OfType<Label>()).SelectMany(l => l.Text).Distinct().ToArray();

        Assert.Superset(new HashSet<char>("²³⁴⁶⁻×−°α●…\u2009"), new HashSet<char>(letters));
        Assert.All(letters, c => Assert.True(Typefaces.Regular.ContainsGlyphs(c.ToString()), $"U+{(int)c:X4}"));
        Assert.All(letters, c => Assert.True(Typefaces.Bold.ContainsGlyphs(c.ToString()), $"U+{(int)c:X4}"));
    }

    [Theory]
    [InlineData("²")]
    [InlineData("√")]
    [InlineData("φ")]
    public void Letters_are_drawn_from_the_embedded_face_whatever_family_is_asked_for(string text)
    {
        using var face = SKTypeface.FromFile(RepositoryRoot.PathOf("src/MeshSection.Plots/Fonts/DejaVuSans.ttf"));
        using var font = Typefaces.Font(face, 60);
        using var paint = new SKPaint { Color = SKColors.Black, IsAntialias = true };
        var expected = Pixels(canvas => canvas.DrawText(text, 20, 20 - font.Metrics.Ascent, font, paint));

        Assert.Equal(expected, Pixels(canvas => Draw(canvas, text, "No Such Family")));
        Assert.NotEqual(expected, Pixels(canvas => Draw(canvas, "\uFFFF", "No Such Family")));
    }

    [Fact]
    public void The_context_measures_what_it_draws()
    {
        using var context = new EmbeddedFontContext();
        var size = context.MeasureText("I = 12 345 mm⁴", null, 40, FontWeights.Bold);

        Assert.Equal(Typefaces.Width("I = 12 345 mm⁴", 40, true), size.Width, 3);
        Assert.InRange(size.Height, 40, 60);
    }

    private static void Draw(SKCanvas canvas, string text, string family)
    {
        using var context = new EmbeddedFontContext { SkCanvas = canvas };
        ((IRenderContext)context).DrawText(new ScreenPoint(20, 20), text, OxyColors.Black, family, 60);
    }

    private static byte[] Pixels(Action<SKCanvas> draw)
    {
        using var bitmap = new SKBitmap(new SKImageInfo(120, 120, SKColorType.Rgba8888, SKAlphaType.Opaque));
        using var canvas = new SKCanvas(bitmap);
        canvas.Clear(SKColors.White);
        draw(canvas);
        canvas.Flush();
        Assert.Contains(bitmap.Pixels, p => p != SKColors.White);
        return bitmap.Bytes;
    }
}
