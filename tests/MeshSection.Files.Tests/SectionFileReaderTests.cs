using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Files.Tests;

public class SectionFileReaderTests
{
    [Fact]
    public void Everything_that_the_file_says_is_read()
    {
        var file = SectionText.Parse(
            """
            // A packing plate.
            {
              "title": "Packing plate",
              "units": { "length": "in" },
              "shapes": [ { "type": "rectangle", "width": 4, "height": "10 mm", "at": [1, "2 cm"], } ],
              "materials": { "steel": { "density": "7850 kg/m3" }, "oak": {} },
              "material": "steel", /* not oak */
            }
            """);
        Assert.Equal("rail.json", file.Path);
        Assert.Equal("Packing plate", file.Title);
        Assert.Equal(LengthUnit.Inch, file.Unit);
        Assert.Null(file.Drawing);
        Assert.Equal(["steel", "oak"], file.Materials.Select(m => m.Name));
        Assert.Equal("steel", file.Material?.Name);
        Assert.Equal(7.85e-6, file.Material?.Density);
        Assert.Null(file.Materials[1].Density);
        AssertBox(new Box(25.4 - 50.8, 20, 25.4 + 50.8, 30), file.Outline);
    }

    [Fact]
    public void A_lone_material_fills_the_section()
    {
        var json = $$"""{ "units": { "length": "mm" }, "shapes": [{{SectionText.Plate}}], "materials": { "oak": { "density": "690 kg/m³" } } }""";
        Assert.Equal("oak", SectionText.Parse(json).Material?.Name);
    }

    [Fact]
    public void Without_materials_there_is_none() =>
        Assert.Null(SectionText.Parse(SectionText.With(SectionText.Plate)).Material);

    [Fact]
    public void A_file_whose_lengths_all_have_units_needs_no_base_unit()
    {
        var file = SectionText.Parse("""{ "shapes": [ { "type": "circle", "diameter": "3 cm", "at": [0, 0] } ] }""");
        Assert.Null(file.Unit);
        AssertBox(new Box(-15, -15, 15, 15), file.Outline);
    }

    [Fact]
    public void Drawing_is_found_from_the_folder_of_the_file()
    {
        var folder = Directory.CreateTempSubdirectory("meshsection");
        try
        {
            File.WriteAllText(Path.Combine(folder.FullName, "frame.dxf"), "");
            var path = Path.Combine(folder.FullName, "frame.json");
            File.WriteAllText(
                path,
                """{ "outline": { "drawing": "frame.dxf", "unit": "mm", "layers": ["FRAME*", "0"], "tolerance": "0.05 mm" } }""");
            var drawing = SectionFileReader.Read(path).Drawing;
            Assert.NotNull(drawing);
            Assert.Equal(Path.Combine(folder.FullName, "frame.dxf"), drawing.Path);
            Assert.Equal(LengthUnit.Millimetre, drawing.Unit);
            Assert.Equal(["FRAME*", "0"], drawing.Layers);
            Assert.Equal(0.05, drawing.Tolerance);
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }

    [Fact]
    public void A_byte_order_mark_and_windows_line_ends_do_not_matter()
    {
        var json = "\uFEFF" + SectionText.With(SectionText.Plate).Replace(",", ",\r\n", StringComparison.Ordinal);
        Assert.Equal(1, SectionText.Parse(json).Outline?.RegionCount);
    }

    [Fact]
    public void A_missing_file_is_named()
    {
        var fault = Assert.Throws<SectionFileException>(() => SectionFileReader.Read("no-such-rail.json"));
        Assert.Equal("no-such-rail.json: There is no such file. Check its path and its rights.", fault.Message);
    }

    internal static void AssertBox(Box expected, Outline? outline)
    {
        Assert.NotNull(outline);
        Assert.Equal(expected.MinX, outline.Bounds.MinX + outline.Origin.X, 1e-12);
        Assert.Equal(expected.MinY, outline.Bounds.MinY + outline.Origin.Y, 1e-12);
        Assert.Equal(expected.MaxX, outline.Bounds.MaxX + outline.Origin.X, 1e-12);
        Assert.Equal(expected.MaxY, outline.Bounds.MaxY + outline.Origin.Y, 1e-12);
    }
}
