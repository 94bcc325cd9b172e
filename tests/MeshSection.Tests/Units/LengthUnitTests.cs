using MeshSection.Units;

namespace MeshSection.Tests.Units;

public class LengthUnitTests
{
    [Theory]
    [InlineData("mm", 1)]
    [InlineData(" MM ", 1)]
    [InlineData("millimeters", 1)]
    [InlineData("Millimetre", 1)]
    [InlineData("cm", 10)]
    [InlineData("m", 1000)]
    [InlineData("metres", 1000)]
    [InlineData("um", 0.001)]
    [InlineData("µm", 0.001)]
    [InlineData("μm", 0.001)]
    [InlineData("microns", 0.001)]
    [InlineData("in", 25.4)]
    [InlineData("inch", 25.4)]
    [InlineData("inches", 25.4)]
    [InlineData("\"", 25.4)]
    [InlineData("ft", 304.8)]
    [InlineData("feet", 304.8)]
    [InlineData("yards", 914.4)]
    [InlineData("mil", 0.0254)]
    [InlineData("Gm", 1e12)]
    [InlineData("US survey foot", 304.800609601219)]
    public void A_unit_is_found_by_symbol_or_name(string text, double millimetres) =>
        Assert.Equal(millimetres, LengthUnit.Parse(text).Millimetres, millimetres * 1e-14);

    [Theory]
    [InlineData("")]
    [InlineData("furlong")]
    [InlineData("mm2")]
    public void What_is_no_unit_is_refused_with_those_that_are_known(string text)
    {
        var refusal = Assert.Throws<FormatException>(() => LengthUnit.Parse(text));
        Assert.Contains("mm, cm, m", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Every_symbol_and_name_finds_its_own_unit()
    {
        foreach (var unit in LengthUnit.All)
        {
            Assert.Same(unit, LengthUnit.Parse(unit.Symbol));
            Assert.Same(unit, LengthUnit.Parse(unit.Name));
        }
    }

    // The table of $INSUNITS in the DXF reference, group codes of the header section.
}
