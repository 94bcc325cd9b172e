using System.Globalization;

namespace MeshSection.Files.Tests.Quantities;

public class QuantityTests
{
    [Theory]
    [InlineData("\"250 mm\"", 250)]
    [InlineData("\"250mm\"", 250)]
    [InlineData("\" 25 cm \"", 250)]
    [InlineData("\"4.5 in\"", 114.3)]
    [InlineData("\"4.5\\\"\"", 114.3)]
    [InlineData("\".5 ft\"", 152.4)]
    [InlineData("\"+2.e2 mm\"", 200)]
    [InlineData("\"1.5e-1 m\"", 150)]
    [InlineData("\"500 µm\"", 0.5)]
    [InlineData("\"500 um\"", 0.5)]
    [InlineData("\"2 inches\"", 50.8)]
    [InlineData("\"1 fathom\"", 1828.8)]
    [InlineData("7", 70)]
    [InlineData("1.5e1", 150)]
    public void Length_is_read_with_its_unit(string text, double millimetres)
    {
        var file = SectionText.Parse(
            $$"""{ "units": { "length": "cm" }, "shapes": [ { "type": "circle", "diameter": {{text}} } ] }""");
        Assert.Equal(millimetres, file.Outline?.Bounds.Width ?? 0, 1e-10);
    }

    [Theory]
    [InlineData("7850 kg/m3", 7850)]
    [InlineData("7850 kg/m³", 7850)]
    [InlineData("7850 kg/m^3", 7850)]
    [InlineData("7850kg / m3", 7850)]
    [InlineData("7.85 g/cm3", 7850)]
    [InlineData("7.85 t/m3", 7850)]
    [InlineData("7.85e-6 kg/mm3", 7850)]
    [InlineData("490 lb/ft3", 490 * 0.45359237 / (0.3048 * 0.3048 * 0.3048))]
    [InlineData("0.284 lb/in³", 0.284 * 0.45359237 / (0.0254 * 0.0254 * 0.0254))]
    [InlineData("7.85 g/ml", 7850)]
    [InlineData("7.85 kg/l", 7850)]
    public void Density_is_read_with_its_unit(string text, double kilogramsPerCubicMetre)
    {
        var density = SectionText.Parse(
            $$"""{ "shapes": [ { "type": "circle", "diameter": "1 m" } ], "materials": { "steel": { "density": "{{text}}" } } }""").Material?.Density;
        Assert.Equal(1, density * 1e9 / kilogramsPerCubicMetre ?? 0, 1e-12);
    }

    [Theory]
    [InlineData("\"1:6\"", 1.0 / 6)]
    [InlineData("\" 8 : 100 \"", 0.08)]
    [InlineData("0.14", 0.14)]
    public void Slope_is_read_as_a_ratio_or_a_number(string text, double slope)
    {
        string Channel(string given) => SectionText.With(
            $$"""{ "type": "channel", "height": 200, "width": 80, "flangeThickness": 11, "webThickness": 8, "flangeSlope": {{given}} }""");
        Assert.Equal(
            SectionText.Parse(Channel(slope.ToString("R", CultureInfo.InvariantCulture))).Outline?.Boundaries[0].Boundary.Edges,
            SectionText.Parse(Channel(text)).Outline?.Boundaries[0].Boundary.Edges);
    }
}
