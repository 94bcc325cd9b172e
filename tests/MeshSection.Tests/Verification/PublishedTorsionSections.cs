using MeshSection.Geometry;
using MeshSection.Sections.Shapes;
using MeshSection.Tests.Torsion;
using MeshSection.Torsion;

namespace MeshSection.Tests.Verification;

/// <summary>The sections of the published torsion values, by the id of the case, and what is computed of them.</summary>
internal static class PublishedTorsionSections
{
    private const double Triangles = 1000;

    public static (Outline Outline, TorsionProperties Properties) Compute(string id)
    {
        var outline = Outline(id);
        return (outline, TorsionPipeline.Of(outline, Triangles, PoissonRatio(id)));
    }

    /// <summary>A figure by its name in the command's JSON, in a unit.</summary>
    public static double Value((Outline Outline, TorsionProperties Properties) computed, string quantity, string unit)
    {
        var p = computed.Properties;
        var value = quantity switch
        {
            "torsionConstant.value" => p.TorsionConstant.Value,
            "shearCentre.x" => p.ShearCentre.X,
            "elasticShearCentre.x" => p.ElasticShearCentre.X,
            "shearCentreFromCentroid.x" => p.ShearCentre.X - Pipeline.Properties(computed.Outline).Centroid.X,
            "warpingConstant" => p.WarpingConstant,
            "shearCoefficient.x" => p.ShearCoefficientX,
            "shearCoefficient.y" => p.ShearCoefficientY,
            _ => throw new ArgumentOutOfRangeException(nameof(quantity), quantity, "No property has this name."),
        };
        return value / Factor(unit);
    }

    private static double PoissonRatio(string id) =>
        id.EndsWith("-nu0.25", StringComparison.Ordinal) ? 0.25 : id.EndsWith("-nu0.3", StringComparison.Ordinal) ? 0.3 : 0;

    private static Outline Outline(string id) => id switch
    {
        "tor-rect-1" => Rectangle(1),
        "tor-rect-1.2" => Rectangle(1.2),
        "tor-rect-1.5" => Rectangle(1.5),
        "tor-rect-2" => Rectangle(2),
        "tor-rect-2.5" => Rectangle(2.5),
        "tor-rect-3" => Rectangle(3),
        "tor-rect-4" => Rectangle(4),
        "tor-rect-5" => Rectangle(5),
        "tor-rect-10" => Rectangle(10),
        "tor-equilateral-triangle" => Solid("equilateral triangle"),
        "tor-circle" or "sh-energy-circle-nu0" or "sh-energy-circle-nu0.3" => Solid("circle"),
        "tor-hollow-circle" or "sh-cowper-hollow-circle-nu0" => Solid("tube"),
        "tor-semicircle-exact" => Solid("semicircle"),
        "tor-circle-with-round-keyway" => Solid("shaft with a round keyway"),
        "tor-sector-45" => Solid("sector of 45°"),
        "tor-sector-60" => Solid("sector of 60°"),
        "tor-sector-90" => Solid("sector of 90°"),
        "tor-sector-120" => Solid("sector of 120°"),
        "tor-sector-270" => Solid("sector of 270°"),
        "tor-sector-300" => Solid("sector of 300°"),
        "tor-right-isosceles" => Solid("right isosceles triangle"),
        "tor-hexagon" => Solid("hexagon"),
        "tor-octagon" => Solid("octagon"),
        "tor-square-tube-100x10" => Solid("square tube 100×10"),
        "tor-square-tube-100x5" => Solid("square tube 100×5"),
        "tor-rhs-sharp" => Solid("RHS 200×100×8, sharp"),
        "tor-l100-sharp" => Solid("L 100×10, sharp"),
        "tor-l150-sharp" => Solid("L 150×90×10, sharp"),
        "tor-tee" => Solid("tee, sharp"),
        "tor-i" => Solid("I, sharp"),
        "tor-ipe200-sharp" => Solid("IPE 200 without fillets"),
        "tor-eccentric-50-20-5" => Solid("eccentric tube 50/20/5"),
        "tor-eccentric-50-20-20" => Solid("eccentric tube 50/20/20"),
        "tor-eccentric-50-25-12.5" => Solid("eccentric tube 50/25/12.5"),
        "tor-eccentric-50-30-10" => Solid("eccentric tube 50/30/10"),
        "tor-rhs200x100x8" => PublishedSections.Outline("rs-rhs200x100x8"),
        "sh-rect-elementary" => PublishedSections.Outline("pl-rectangle"),
        "sh-semicircle" => Semicircle(),
        _ when id.StartsWith("sc-solid-semicircle", StringComparison.Ordinal) => Semicircle(),
        _ => PublishedSections.Outline(id),
    };

    private static Outline Solid(string name) => MeshSection.Geometry.Outline.Create(Solids.Named(name).Boundaries);

    private static Outline Semicircle() => MeshSection.Geometry.Outline.Create([Solids.Sector(1, 180)]);

    /// <summary>A rectangle of short side a and long side b with b / a the ratio and a³ b = 1.</summary>
    private static Outline Rectangle(double ratio) => MeshSection.Geometry.Outline.Create(
        new Rectangle(Math.Pow(ratio, -0.25), Math.Pow(ratio, 0.75)).Boundaries());

    private static double Factor(string unit) => unit switch
    {
        "" => 1,
        _ => Math.Pow(
            unit[..2] switch { "mm" => 1, "cm" => 10, "in" => 25.4, _ => throw new ArgumentOutOfRangeException(nameof(unit)) },
            unit[2..] switch { "" => 1, "⁴" => 4, "⁶" => 6, _ => throw new ArgumentOutOfRangeException(nameof(unit)) }),
    };
}
