using System.Globalization;
using System.Runtime.InteropServices;
using System.Xml.Linq;
using MeshSection.Files.Meshes;
using MeshSection.Geometry;

namespace MeshSection.Files.Tests.Meshes;

public class VtuWriterTests
{
    [Theory]
    [InlineData(1, 5)]
    [InlineData(2, 22)]
    public void What_is_written_is_read_back_bit_for_bit(int order, byte type)
    {
        var file = Meshed.Tube.Of(order);
        var grid = Read(file);
        var points = Values<double>(grid, "Points");
        Assert.Equal(file.Nodes.SelectMany(n => new[] { n.X, n.Y, 0 }), points);
        Assert.Equal(file.Elements, Values<int>(grid, "connectivity"));
        Assert.Equal(Enumerable.Range(1, file.ElementCount).Select(t => t * file.NodesPerElement), Values<int>(grid, "offsets"));
        Assert.Equal(Enumerable.Repeat(type, file.ElementCount), Values<byte>(grid, "types"));
        Assert.Equal(file.Regions.Select(r => r + 1), Values<int>(grid, "region"));
        var piece = grid.Descendants("Piece").Single();
        Assert.Equal(file.Nodes.Length, (int)piece.Attribute("NumberOfPoints")!);
        Assert.Equal(file.ElementCount, (int)piece.Attribute("NumberOfCells")!);
    }

    [Fact]
    public void The_smallest_angle_of_each_triangle_is_in_the_file()
    {
        var file = new MeshFile(
            [new(0, 0), new(1, 0), new(0, 1), new(Math.Sqrt(3), 0)], [0, 1, 2, 0, 3, 2], 3, [0, 4], [], [], [], Units.LengthUnit.Metre);
        var grid = Read(file);
        Assert.Equal([45, 30], Values<double>(grid, "smallest_angle"), (a, b) => Math.Abs(a - b) < 1e-12);
        Assert.Equal([1, 5], Values<int>(grid, "region"));
    }

    [Fact]
    public void Long_arrays_are_one_run_of_base_64()
    {
        var nodes = Enumerable.Range(0, 50_000).Select(i => new Point(i, 1.0 / (i + 1))).ToArray();
        var file = new MeshFile(
            [.. nodes], [.. Enumerable.Range(0, 3 * 16_000)], 3, [.. new int[16_000]], [], [], [], Units.LengthUnit.Millimetre);
        Assert.Equal(nodes.Select(n => n.Y), Values<double>(Read(file), "Points").Where((_, i) => i % 3 == 1));
    }

    [Fact]
    public void The_locale_changes_nothing()
    {
        var before = Written(Meshed.Tube.Of(1));
        var (culture, comma) = (CultureInfo.CurrentCulture, (CultureInfo)CultureInfo.InvariantCulture.Clone());
        comma.NumberFormat.NumberDecimalSeparator = ",";
        comma.NumberFormat.NegativeSign = "~";
        try
        {
            CultureInfo.CurrentCulture = comma;
            Assert.Equal(before, Written(Meshed.Tube.Of(1)));
        }
        finally
        {
            CultureInfo.CurrentCulture = culture;
        }
    }

    private static byte[] Written(MeshFile file)
    {
        using var stream = new MemoryStream();
        VtuWriter.Write(stream, file);
        return stream.ToArray();
    }

    private static XDocument Read(MeshFile file)
    {
        using var stream = new MemoryStream(Written(file));
        return XDocument.Load(stream);
    }

    /// <summary>The values of an array: a length in base 64, then the bytes in base 64.</summary>
    private static T[] Values<T>(XDocument grid, string name)
        where T : struct
    {
        var text = grid.Descendants("DataArray").Single(a => (string?)a.Attribute("Name") == name).Value.Trim();
        var length = BitConverter.ToUInt64(Convert.FromBase64String(text[..12]));
        var bytes = Convert.FromBase64String(text[12..]);
        Assert.Equal((ulong)bytes.Length, length);
        return MemoryMarshal.Cast<byte, T>(bytes).ToArray();
    }
}
