using System.Globalization;
using System.Text;
using MeshSection.Files.Meshes;

namespace MeshSection.Files.Tests.Meshes;

public class MshWriterTests
{
    [Theory]
    [InlineData(1, 1, 2)]
    [InlineData(2, 8, 9)]
    public void What_is_written_is_read_back_bit_for_bit(int order, int line, int triangle)
    {
        var file = Meshed.Tube.Of(order);
        var text = Written(file);
        Assert.DoesNotContain('\r', text);
        var sections = Sections(text);
        Assert.Equal(["2.2 0 8"], sections["MeshFormat"]);
        Assert.Equal(["Coordinates in in."], sections["Comments"]);
        Assert.Equal(
            ["4", "1 1 \"boundary 1\"", "1 2 \"boundary 2\"", "1 3 \"line\"", "2 1 \"region 1\""], sections["PhysicalNames"]);

        double[][] nodes = [.. sections["Nodes"].Skip(1).Select(Numbers)];
        Assert.Equal(file.Nodes.Length, int.Parse(sections["Nodes"][0], CultureInfo.InvariantCulture));
        Assert.Equal(Enumerable.Range(1, nodes.Length).Select(i => (double)i), nodes.Select(n => n[0]));
        Assert.Equal(file.Nodes.Select(n => (n.X, n.Y, 0.0)), nodes.Select(n => (n[1], n[2], n[3])));

        int[][] elements = [.. sections["Elements"].Skip(1).Select(l => Numbers(l).Select(n => (int)n).ToArray())];
        Assert.Equal(Enumerable.Range(1, elements.Length), elements.Select(e => e[0]));
        int[][] lines = [.. elements.Where(e => e[1] == line)];
        int[][] triangles = [.. elements.Where(e => e[1] == triangle)];
        Assert.Equal(elements.Length, lines.Length + triangles.Length);
        Assert.All(elements, e => Assert.Equal((2, e[3]), (e[2], e[4])));
        Assert.Equal(file.LineGroups.Select(g => g + 1), lines.Select(l => l[3]));
        Assert.Equal(file.Lines.Select(n => n + 1), lines.SelectMany(l => l[5..]));
        Assert.Equal(file.Regions.Select(r => r + 1), triangles.Select(t => t[3]));
        Assert.Equal(file.Elements.Select(n => n + 1), triangles.SelectMany(t => t[5..]));
    }

    private static string Written(MeshFile file)
    {
        using var stream = new MemoryStream();
        MshWriter.Write(stream, file);
        return Encoding.UTF8.GetString(stream.ToArray());
    }

    private static Dictionary<string, string[]> Sections(string text)
    {
        var sections = new Dictionary<string, string[]>();
        var lines = text.TrimEnd('\n').Split('\n');
        for (var i = 0; i < lines.Length; i++)
        {
            var name = lines[i][1..];
            var end = Array.IndexOf(lines, "$End" + name, i);
            sections.Add(name, lines[(i + 1)..end]);
            i = end;
        }

        return sections;
    }

    private static double[] Numbers(string line) =>
        [.. line.TrimEnd().Split(' ').Select(w => double.Parse(w, CultureInfo.InvariantCulture))];
}
