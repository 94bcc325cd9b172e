using System.Text;
using MeshSection.Plots.Drawing;

namespace MeshSection.Plots.Layout;

/// <summary>The title across the top: smaller if it is long, then on two lines, then cut.</summary>
internal static class Heading
{
    private const double Largest = 40;
    private const double Smallest = 30;

    public static void Add(Sheet sheet, string title)
    {
        var free = sheet.Free;
        var y = free.MinY;
        var line = OneLine(title);
        if (line.Length == 0)
        {
            return;
        }

        foreach (var (text, lettering) in Lines(line, free.Width))
        {
            sheet.Add(Label.LeftAt(text, free.MinX, y + 0.5 * lettering.Height, lettering));
            y += lettering.Height;
        }

        y += 10;
        sheet.Add(new Polyline(new Stroke(Palette.Rule, 2), new(free.MinX, y), new(free.MaxX, y)));
        sheet.Free = free with { MinY = y + 24 };
    }

    private static List<(string Text, Lettering Lettering)> Lines(string title, double width)
    {
        for (var size = Largest; size >= Smallest; size -= 2)
        {
            var lettering = new Lettering(size, Palette.Ink, true);
            if (lettering.Width(title) <= width)
            {
                return [(title, lettering)];
            }
        }

        var small = new Lettering(Smallest, Palette.Ink, true);
        var first = LongestStart(title, width, small);
        var space = title.LastIndexOf(' ', first);
        var cut = space > first / 2 ? space : first;
        return [(title[..cut], small), (Cut(title[cut..].Trim(), width, small), small)];
    }

    private static string Cut(string text, double width, Lettering lettering)
    {
        if (lettering.Width(text) <= width)
        {
            return text;
        }

        const string Ellipsis = "…";
        return text[..LongestStart(text, width - lettering.Width(Ellipsis), lettering)].TrimEnd() + Ellipsis;
    }

    private static int LongestStart(string text, double width, Lettering lettering)
    {
        var (fits, fails) = (0, text.Length);
        while (fails - fits > 1)
        {
            var middle = (fits + fails) / 2;
            (fits, fails) = lettering.Width(text[..middle]) <= width ? (middle, fails) : (fits, middle);
        }

        return fits > 0 && char.IsHighSurrogate(text[fits - 1]) ? fits - 1 : fits;
    }

    private static string OneLine(string title)
    {
        var line = new StringBuilder();
        foreach (var word in title.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries))
        {
            line.Append(string.Concat(word.Where(c => !char.IsControl(c)))).Append(' ');
        }

        return line.ToString().Trim();
    }
}
