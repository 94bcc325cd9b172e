using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using MeshSection.Units;

namespace MeshSection.Plots.Layout;

/// <summary>A bar of a round length at the foot of the drawing, with the unit that lengths are stated in.</summary>
internal static class ScaleBar
{
    private const double Height = 52;

    private const double Longest = 320;

    /// <summary>The part of a box that the bar leaves at its foot.</summary>
    public static Box Above(Box area) => area with { MaxY = area.MaxY - Height };

    public static void Add(Sheet sheet, double unitsPerMillimetre, LengthUnit unit, string note)
    {
        var perUnit = unitsPerMillimetre * unit.Millimetres;
        var length = RoundLength(Longest / perUnit);
        var y = sheet.Free.MaxY - 0.5 * Height + 6;
        var (left, right) = (sheet.Free.MinX, sheet.Free.MinX + length * perUnit);
        var middle = 0.5 * (left + right);
        var rim = new Stroke(Palette.Ink, 2);
        sheet.Add(Bar(left, right, y, Palette.Paper, rim));
        sheet.Add(Bar(left, middle, y, Palette.Ink, Stroke.None));
        var text = $"{Numbers.Format(length)} {unit.Symbol}";
        sheet.Add(Label.LeftAt(text, right + 14, y, Lettering.Body));
        sheet.Add(Label.LeftAt(note, right + 14 + Lettering.Body.Width(text) + 36, y, Lettering.Small));
        sheet.Free = Above(sheet.Free);
    }

    /// <summary>The greatest 1, 2 or 5 times a power of ten that is no longer than asked for.</summary>
    public static double RoundLength(double longest)
    {
        var power = Math.Pow(10, Math.Floor(Math.Log10(longest)));
        var lead = longest / power;
        return power * (lead >= 5 ? 5 : lead >= 2 ? 2 : 1);
    }

    private static Area Bar(double left, double right, double y, OxyPlot.OxyColor fill, Stroke rim) =>
        new([[new(left, y - 6), new(right, y - 6), new(right, y + 6), new(left, y + 6)]], fill, rim);
}
