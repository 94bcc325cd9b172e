using System.Buffers.Binary;
using MeshSection.Plots.Tests.Samples;
using SkiaSharp;

namespace MeshSection.Plots.Tests;

public class PngTests
{
    [Theory]
    [InlineData(1600, 1200)]
    [InlineData(800, 600)]
    [InlineData(1000, 1600)]
    [InlineData(300, 300)]
    public void A_picture_is_a_PNG_of_the_size_asked_for(int width, int height)
    {
        var bytes = PngWriter.Encode(Sample.Angle().Figure(new PictureSize(width, height)));

        Assert.Equal([0x89, .. "PNG\r\n\u001a\n"u8], bytes[..8]);
        using var picture = SKBitmap.Decode(bytes);
        Assert.Equal((width, height), (picture.Width, picture.Height));
        Assert.Equal(SKColors.White, picture.GetPixel(0, 0));
        Assert.True(Colours(picture).Count > 20);
    }

    [Theory]
    [InlineData(299, 1200)]
    [InlineData(1600, 0)]
    [InlineData(-1600, -1200)]
    [InlineData(16_001, 1200)]
    public void A_size_out_of_range_is_refused(int width, int height) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Sample.Angle().Figure(new PictureSize(width, height)));

    [Fact]
    public void The_same_section_gives_the_same_bytes() =>
        Assert.Equal(PngWriter.Encode(Sample.Angle(0.3).Figure()), PngWriter.Encode(Sample.Angle(0.3).Figure()));

    [Fact]
    public void Another_section_gives_other_bytes() =>
        Assert.NotEqual(PngWriter.Encode(Sample.Angle(0.3).Figure()), PngWriter.Encode(Sample.Angle(0.31).Figure()));

    [Fact]
    public void The_standard_picture_prints_160_mm_wide()
    {
        var bytes = PngWriter.Encode(Sample.Angle().Figure());

        // Length, type, two resolutions, unit, and the checksum that the specification asks for.
        Assert.Equal("pHYs"u8.ToArray(), bytes[37..41]);
        Assert.Equal(0.16, 1600.0 / BinaryPrimitives.ReadUInt32BigEndian(bytes.AsSpan(41)), 12);
        Assert.Equal(bytes[41..45], bytes[45..49]);
        Assert.Equal(1, bytes[49]);
        Assert.Equal([0x94, 0x69, 0x51, 0x19], bytes[50..54]);
    }

    [Fact]
    public void Saving_writes_what_encoding_gives_and_replaces_the_file()
    {
        var path = System.IO.Path.GetTempFileName();
        try
        {
            File.WriteAllBytes(path, new byte[1_000_000]);
            var figure = Sample.Rectangle(100, 50, 10).Figure();
            PngWriter.Save(figure, path);
            Assert.Equal(PngWriter.Encode(figure), File.ReadAllBytes(path));
        }
        finally
        {
            File.Delete(path);
        }
    }

    [Fact]
    public void Saving_to_a_folder_that_is_not_there_says_so() => Assert.ThrowsAny<IOException>(
        () => PngWriter.Save(Sample.Rectangle(100, 50, 10).Figure(), "/no/such/folder/picture.png"));

    private static HashSet<SKColor> Colours(SKBitmap picture) => [.. picture.Pixels];
}
