using MeshSection.Plots.Drawing;
using MeshSection.Properties;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>Which extreme fibres govern, and the sign that marks them.</summary>
internal static class GoverningSign
{
    public static IEnumerable<ExtremeFibre> Fibres(SectionProperties properties)
    {
        foreach (var fibres in (ExtremeFibres[])[properties.ElasticX, properties.ElasticY])
        {
            if (fibres.PositiveGoverns)
            {
                yield return fibres.Positive;
            }

            if (fibres.NegativeGoverns)
            {
                yield return fibres.Negative;
            }
        }
    }

    public static Disc At(ScreenPoint place) => new(place, 9, Palette.Orange, new Stroke(Palette.Paper, 2));

    public static LegendRow Legend() => new(place => [At(place)], "governing extreme fibre");
}
