using MeshSection.Properties;

namespace MeshSection.Tests.Verification;

/// <summary>Looks properties up by the names that the command's JSON gives them, and turns them into a unit.</summary>
internal static class Quantities
{
    public static double Of(SectionProperties p, string name, string unit) => Value(p, name) / Factor(unit);

    private static double Value(SectionProperties p, string name) => name switch
    {
        "area" => p.Area,
        "centroid.x" => p.Centroid.X,
        "centroid.y" => p.Centroid.Y,
        "secondMoment.x" => p.SecondMoment.X,
        "secondMoment.y" => p.SecondMoment.Y,
        "secondMoment.xy" => p.SecondMoment.XY,
        "secondMoment.polar" => p.SecondMoment.Polar,
        "secondMomentDatum.x" => p.SecondMomentDatum.X,
        "secondMomentDatum.y" => p.SecondMomentDatum.Y,
        "secondMomentDatum.xy" => p.SecondMomentDatum.XY,
        "principal.I1" => p.Principal.I1,
        "principal.I2" => p.Principal.I2,
        "principal.angle" => p.Principal.Angle,
        "principal.tangent" => Math.Tan(p.Principal.Angle * Math.PI / 180),
        "sectionModulus.x" => p.ElasticX.Governing.Modulus,
        "sectionModulus.y" => p.ElasticY.Governing.Modulus,
        "sectionModulus.top" => p.ElasticX.Positive.Modulus,
        "sectionModulus.bottom" => p.ElasticX.Negative.Modulus,
        "radiusOfGyration.x" => p.RadiusOfGyration.X,
        "radiusOfGyration.y" => p.RadiusOfGyration.Y,
        "radiusOfGyration.r1" => p.RadiusOfGyration1,
        "radiusOfGyration.r2" => p.RadiusOfGyration2,
        "plasticNeutralAxis.x" => p.PlasticX.NeutralAxis,
        "plasticModulus.x" => p.PlasticX.Modulus,
        "plasticModulus.y" => p.PlasticY.Modulus,
        "halfPlasticModulus.x" => 0.5 * p.PlasticX.Modulus,
        "shapeFactor.x" => p.PlasticX.ShapeFactor,
        _ => throw new ArgumentOutOfRangeException(nameof(name), name, "No property has this name."),
    };

    private static double Factor(string unit) => unit switch
    {
        "" or "°" => 1,
        _ => Math.Pow(
            unit[..2] switch { "mm" => 1, "cm" => 10, "in" => 25.4, _ => throw new ArgumentOutOfRangeException(nameof(unit)) },
            unit[2..] switch { "" => 1, "²" => 2, "³" => 3, "⁴" => 4, _ => throw new ArgumentOutOfRangeException(nameof(unit)) }),
    };
}
