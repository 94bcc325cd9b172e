using MeshSection.Plots.Drawing;
using MeshSection.Properties;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>Which extreme fibres govern, and the sign that marks them.</summary>
internal static class GoverningSign
{
    // Two sides whose moduli differ by rounding only both govern.
    private const double Tie = 1e-9;

    public static bool PositiveGoverns(ExtremeFibres fibres) =>
        fibres.Positive.Modulus <= fibres.Negative.Modulus * (1 + Tie);

    public static bool NegativeGoverns(ExtremeFibres fibres) =>
        fibres.Negative.Modulus <= fibres.Positive.Modulus * (1 + Tie);

    public static IEnumerable<ExtremeFibre> Fibres(SectionProperties properties)
    {
        foreach (var fibres in (ExtremeFibres[])[properties.ElasticX, properties.ElasticY])
        {
            if (PositiveGoverns(fibres))
            {
                yield return fibres.Positive;
            }

            if (NegativeGoverns(fibres))
            {
                yield return fibres.Negative;
            }
        }
    }

    public static Disc At(ScreenPoint place) => new(place, 9, Palette.Orange, new Stroke(Palette.Paper, 2));

    public static LegendRow Legend() => new(place => [At(place)], "governing extreme fibre");
}
