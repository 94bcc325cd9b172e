using CsCheck;
using MeshSection.Plots.Drawing;
using MeshSection.Plots.Layout;
using MeshSection.Units;

namespace MeshSection.Plots.Tests;

public class NumbersTests
{
    [Theory]
    [InlineData(0, "0")]
    [InlineData(1, "1")]
    [InlineData(-2.5, "−2.5")]
    [InlineData(12.34567, "12.346")]
    [InlineData(1234.56, "1_234.6")]
    [InlineData(123456.7, "123_457")]
    [InlineData(999_999.4, "999_999")]
    [InlineData(999_999.6, "1×10⁶")]
    [InlineData(1_234_567, "1.2346×10⁶")]
    [InlineData(-123_456_789, "−123.46×10⁶")]
    [InlineData(999_996_000, "1×10⁹")]
    [InlineData(999_994_000, "999.99×10⁶")]
    [InlineData(1e9, "1×10⁹")]
    [InlineData(0.0012345678, "0.0012346")]
    [InlineData(0.00098765432, "987.65×10⁻⁶")]
    [InlineData(4.5e-24, "4.5×10⁻²⁴")]
    public void Numbers_have_five_digits_and_powers_of_a_thousand(double value, string expected) =>
        Assert.Equal(expected.Replace('_', Numbers.ThinSpace), Numbers.Format(value));

    [Fact]
    public void A_number_reads_back_to_five_digits() => Gen.Double[-1, 1].Select(Gen.Int[-30, 30], (m, e) => m * Math.Pow(10, e))
        .Where(v => v != 0)
        .Sample(v => Math.Abs(Read(Numbers.Format(v)) - v) <= 0.5001e-4 * Math.Abs(v), iter: 2000);

    [Fact]
    public void Parts_of_a_chain_share_their_decimals()
    {
        var lengths = new LengthScale(LengthUnit.Millimetre, 150);
        Assert.Equal("98.61", lengths.Format(98.60526));
        Assert.Equal("0.05", lengths.Format(0.05263));
        Assert.Equal("0", lengths.Format(-0.001));
        Assert.Equal("dimensions in mm", lengths.Note);
    }

    [Fact]
    public void Lengths_out_of_plain_size_share_a_power_of_ten()
    {
        var tiny = new LengthScale(LengthUnit.Millimetre, 3e-6);
        Assert.Equal("1.5", tiny.Format(1.5e-6));
        Assert.Equal("dimensions in 10⁻⁶ mm", tiny.Note);

        var huge = new LengthScale(LengthUnit.Metre, 3e9);
        Assert.Equal("1.5", huge.Format(1.5e9));
        Assert.Equal("dimensions in 10⁶ m", huge.Note);
    }

    [Theory]
    [InlineData(260, 200)]
    [InlineData(200, 200)]
    [InlineData(199, 100)]
    [InlineData(0.0777, 0.05)]
    public void A_scale_bar_has_a_round_length(double longest, double expected) =>
        Assert.Equal(expected, ScaleBar.RoundLength(longest), 12);

    private static double Read(string text)
    {
        var parts = text.Replace(Numbers.ThinSpace.ToString(), "").Replace(Numbers.Minus, '-').Split("×10");
        var exponent = parts.Length == 1
            ? "0"
            : string.Concat(parts[1].Select(c => c == '⁻' ? '-' : (char)('0' + "⁰¹²³⁴⁵⁶⁷⁸⁹".IndexOf(c))));
        return double.Parse(parts[0], System.Globalization.CultureInfo.InvariantCulture)
            * Math.Pow(10, int.Parse(exponent, System.Globalization.CultureInfo.InvariantCulture));
    }
}
