using MeshSection.Geometry;
using MeshSection.Units;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Units;

public class DrawingUnitTest
{
    [Theory]
    [InlineData(null)]
    [InlineData(0)]
    public void Without_a_unit_the_drawing_is_refused_and_its_size_shown_in_three_units(int? code)
    {
        var refusal = Refusal(Drawing([LwPolyline([(0, 0, 0), (90, 0, 0), (90, 150, 0), (0, 150, 0)])], unit: code));

        Assert.Equal(DrawingFault.UnitUnknown, refusal.Fault);
        Assert.Equal(new Box(0, 0, 90, 150), refusal.Extents);
        Assert.Contains("90 x 150 mm if it is in mm", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("90 x 150 m if in m", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("2286 x 3810 mm if in inches", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("--unit", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_unit_given_is_obeyed_and_noted_if_the_drawing_states_another()
    {
        var result = Outline(Drawing([Square(0, 0, 2)], unit: 1), new OutlineOptions { Unit = LengthUnit.Metre });

        Assert.Equal(2000, result.Outline.Bounds.Width);
        Assert.True(result.Report.IsUnitGiven);
        var note = Assert.Single(result.Report.Cautions);
        Assert.Equal("DR201", note.Name);
    }

    [Fact]
    public void A_unit_given_as_the_drawing_states_it_is_not_worth_a_note() =>
        Assert.Empty(Outline(Drawing([Square(0, 0, 2)], unit: 1), new OutlineOptions { Unit = LengthUnit.Inch }).Report.Cautions);

    [Theory]
    [InlineData(100.5, 6, NoteCode.VeryLarge)]
    [InlineData(0.9, 4, NoteCode.VerySmall)]
    public void A_very_large_or_small_section_calls_for_attention(double side, int unit, NoteCode code) =>
        Assert.Equal(code, Assert.Single(Outline(Drawing([Square(0, 0, side)], unit)).Report.Cautions).Code);

    [Theory]
    [InlineData(1e200)]
    [InlineData(1e-200)]
    public void Extents_beyond_arithmetic_are_refused(double side) =>
        Assert.Equal(DrawingFault.ExtentsUnusable, Refusal(Drawing([Square(0, 0, side)])).Fault);

    [Theory]
    [InlineData(1, "in")]
    [InlineData(2, "ft")]
    [InlineData(4, "mm")]
    [InlineData(5, "cm")]
    [InlineData(6, "m")]
    [InlineData(9, "mil")]
    [InlineData(10, "yd")]
    [InlineData(13, "µm")]
    [InlineData(14, "dm")]
    [InlineData(20, "pc")]
    [InlineData(24, "miUS")]
    public void The_drawing_s_code_gives_its_unit(int code, string symbol) =>
        Assert.Equal(symbol, Read(Drawing([Square(0, 0, 1)], unit: code)).Unit?.Symbol);

    [Fact]
    public void A_code_that_the_format_does_not_know_is_no_unit_and_noted()
    {
        var drawing = Read(Drawing([Square(0, 0, 1)], unit: 77));
        Assert.Null(drawing.Unit);
        Assert.Contains(drawing.Notes, n => n.Code == NoteCode.UnitCodeUnknown && n.Message.Contains("77", StringComparison.Ordinal));
    }
}
