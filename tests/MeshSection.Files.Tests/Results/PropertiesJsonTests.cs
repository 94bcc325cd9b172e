using System.Globalization;
using System.Text;
using System.Text.Json.Nodes;
using MeshSection.Files.Results;
using MeshSection.Geometry;
using MeshSection.Properties;
using MeshSection.Torsion;
using MeshSection.Units;

namespace MeshSection.Files.Tests.Results;

public class PropertiesJsonTests
{
    private const double Third = 1.0 / 3;

    /// <summary>Every number is another, so that a value under a wrong key is found.</summary>
    private static readonly SectionProperties Properties = new()
    {
        Area = 2001.1,
        OuterPerimeter = 402.2,
        InnerPerimeter = 53.3,
        BoundingBox = new Box(-11.5, -12.25, 61.5, 82.25),
        Centroid = new Point(21.125, 34.0 + Third),
        FirstMomentDatum = new AxisPair(68711.5, 42273.25),
        SecondMomentDatum = new SecondMoments(4e6 + Third, 1.5e6, 1.1e6),
        SecondMoment = new SecondMoments(1.6e6, 6.1e5, -3.1e5),
        Principal = new PrincipalAxes(1.7e6, 5.1e5, -17.5),
        ElasticX = new(Fibre(47.9, 61.5, 82.25, 33402.9), Fibre(46.6, 0.5, -12.25, 34334.7)),
        ElasticY = new(Fibre(40.4, 61.5, 3.75, 15099.0), Fibre(32.6, -11.5, 4.75, 18711.6)),
        Elastic1 = new(Fibre(50.1, 1.5, 80.25, 33932.1), Fibre(49.2, 2.5, -10.25, 34552.8)),
        Elastic2 = new(Fibre(39.3, 60.5, 5.75, 12977.1), Fibre(31.4, -10.5, 6.75, 16242.0)),
        PlasticX = new PlasticBending(35.7, 45001.1, 1.347),
        PlasticY = new PlasticBending(22.8, 25002.2, 1.656),
        Plastic1 = new PlasticBending(-0.9, 46003.3, 1.356),
        Plastic2 = new PlasticBending(1.9, 21004.4, 1.619),
        MassPerLength = 0.0157,
        CrossChecks = [.. Enum.GetValues<CheckedQuantity>().Select(q => new CrossCheck(q, 1 + (int)q, 2 + (int)q, 1e-15))],
        Chords = new ChordError(0.01, 1e-7, 2e-7, 3e-7),
        Mesh = new MeshSummary(1234, 777, 28.25),
    };

    public static TheoryData<string, int, double> Values => new()
    {
        // Path, power of length, value in mm.
        { "area", 2, 2001.1 },
        { "perimeter", 1, 402.2 + 53.3 },
        { "outerPerimeter", 1, 402.2 },
        { "innerPerimeter", 1, 53.3 },
        { "boundingBox.minX", 1, -11.5 },
        { "boundingBox.minY", 1, -12.25 },
        { "boundingBox.maxX", 1, 61.5 },
        { "boundingBox.maxY", 1, 82.25 },
        { "centroid.x", 1, 21.125 },
        { "centroid.y", 1, 34 + Third },
        { "firstMomentDatum.x", 3, 68711.5 },
        { "firstMomentDatum.y", 3, 42273.25 },
        { "secondMomentDatum.x", 4, 4e6 + Third },
        { "secondMomentDatum.y", 4, 1.5e6 },
        { "secondMomentDatum.xy", 4, 1.1e6 },
        { "secondMomentDatum.polar", 4, 4e6 + Third + 1.5e6 },
        { "secondMoment.x", 4, 1.6e6 },
        { "secondMoment.y", 4, 6.1e5 },
        { "secondMoment.xy", 4, -3.1e5 },
        { "secondMoment.polar", 4, 2.21e6 },
        { "principal.I1", 4, 1.7e6 },
        { "principal.I2", 4, 5.1e5 },
        { "principal.angle", 0, -17.5 },
        { "radiusOfGyration.x", 1, Math.Sqrt(1.6e6 / 2001.1) },
        { "radiusOfGyration.y", 1, Math.Sqrt(6.1e5 / 2001.1) },
        { "radiusOfGyration.r1", 1, Math.Sqrt(1.7e6 / 2001.1) },
        { "radiusOfGyration.r2", 1, Math.Sqrt(5.1e5 / 2001.1) },
        { "sectionModulus.top", 3, 33402.9 },
        { "sectionModulus.bottom", 3, 34334.7 },
        { "sectionModulus.left", 3, 18711.6 },
        { "sectionModulus.right", 3, 15099.0 },
        { "sectionModulus.x", 3, 33402.9 },
        { "sectionModulus.y", 3, 15099.0 },
        { "extremeFibre.top.distance", 1, 47.9 },
        { "extremeFibre.top.x", 1, 61.5 },
        { "extremeFibre.top.y", 1, 82.25 },
        { "extremeFibre.bottom.distance", 1, 46.6 },
        { "extremeFibre.bottom.x", 1, 0.5 },
        { "extremeFibre.bottom.y", 1, -12.25 },
        { "extremeFibre.left.distance", 1, 32.6 },
        { "extremeFibre.left.x", 1, -11.5 },
        { "extremeFibre.left.y", 1, 4.75 },
        { "extremeFibre.right.distance", 1, 40.4 },
        { "extremeFibre.right.x", 1, 61.5 },
        { "extremeFibre.right.y", 1, 3.75 },
        { "sectionModulusPrincipal.1.positive", 3, 33932.1 },
        { "sectionModulusPrincipal.1.negative", 3, 34552.8 },
        { "sectionModulusPrincipal.1.governing", 3, 33932.1 },
        { "sectionModulusPrincipal.2.positive", 3, 12977.1 },
        { "sectionModulusPrincipal.2.negative", 3, 16242.0 },
        { "sectionModulusPrincipal.2.governing", 3, 12977.1 },
        { "extremeFibrePrincipal.1.positive.distance", 1, 50.1 },
        { "extremeFibrePrincipal.1.positive.x", 1, 1.5 },
        { "extremeFibrePrincipal.1.positive.y", 1, 80.25 },
        { "extremeFibrePrincipal.1.negative.distance", 1, 49.2 },
        { "extremeFibrePrincipal.1.negative.x", 1, 2.5 },
        { "extremeFibrePrincipal.1.negative.y", 1, -10.25 },
        { "extremeFibrePrincipal.2.positive.distance", 1, 39.3 },
        { "extremeFibrePrincipal.2.positive.x", 1, 60.5 },
        { "extremeFibrePrincipal.2.positive.y", 1, 5.75 },
        { "extremeFibrePrincipal.2.negative.distance", 1, 31.4 },
        { "extremeFibrePrincipal.2.negative.x", 1, -10.5 },
        { "extremeFibrePrincipal.2.negative.y", 1, 6.75 },
        { "plasticModulus.x", 3, 45001.1 },
        { "plasticModulus.y", 3, 25002.2 },
        { "plasticModulus.1", 3, 46003.3 },
        { "plasticModulus.2", 3, 21004.4 },
        { "plasticNeutralAxis.x", 1, 35.7 },
        { "plasticNeutralAxis.y", 1, 22.8 },
        { "plasticNeutralAxis.1", 1, -0.9 },
        { "plasticNeutralAxis.2", 1, 1.9 },
        { "shapeFactor.x", 0, 1.347 },
        { "shapeFactor.y", 0, 1.656 },
        { "shapeFactor.1", 0, 1.356 },
        { "shapeFactor.2", 0, 1.619 },
        { "massPerLength", -1, 0.0157 },
        { "paintedSurface", 1, 402.2 },
        { "chords.maxSag", 1, 0.01 },
        { "chords.area", 0, 1e-7 },
        { "chords.secondMomentX", 0, 2e-7 },
        { "chords.secondMomentY", 0, 3e-7 },
        { "mesh.triangles", 0, 1234 },
        { "mesh.nodes", 0, 777 },
        { "mesh.minAngle", 0, 28.25 },
    };

    [Theory]
    [MemberData(nameof(Values))]
    public void Value_comes_back_bit_for_bit_in_mm(string path, int power, double value)
    {
        Assert.InRange(power, -1, 4);
        Assert.Equal(value, JsonPaths.Number(Document(LengthUnit.Millimetre), path));
    }

    [Theory]
    [MemberData(nameof(Values))]
    public void Value_is_converted_by_its_power_of_length(string path, int power, double value)
    {
        foreach (var unit in new[] { LengthUnit.Inch, LengthUnit.Metre })
        {
            var expected = value / Math.Pow(unit.Millimetres, power);
            Assert.Equal(1, JsonPaths.Number(Document(unit), path) / expected, 1e-14);
        }
    }

    [Fact]
    public void Every_number_is_under_test()
    {
        var tested = Values.Select(row => row.Data.Item1).ToHashSet(StringComparer.Ordinal);
        Assert.Empty(JsonPaths.Numbers(Document(LengthUnit.Millimetre))
            .Where(p => !p.StartsWith("crossCheck[", StringComparison.Ordinal)).Except(tested));
    }

    [Fact]
    public void Units_are_named() => Assert.Equal(
        """{"length":"in","mass":"kg","angle":"deg"}""", Document(LengthUnit.Inch)["units"]?.ToJsonString());

    [Fact]
    public void Governing_sides_are_named()
    {
        Assert.Equal("""{"x":"top","y":"right"}""", Document(LengthUnit.Inch)["governing"]?.ToJsonString());
        var other = Properties with
        {
            ElasticX = new(Properties.ElasticX.Negative, Properties.ElasticX.Positive),
            ElasticY = new(Properties.ElasticY.Negative, Properties.ElasticY.Positive),
        };
        Assert.Equal("""{"x":"bottom","y":"left"}""", Document(LengthUnit.Inch, other)["governing"]?.ToJsonString());

        // Sides that differ by rounding only both govern, whichever is the smaller in its last digit.
        var (top, right) = (Properties.ElasticX.Positive, Properties.ElasticY.Positive);
        var even = Properties with
        {
            ElasticX = new(top, top with { Modulus = top.Modulus * (1 + 1e-14) }),
            ElasticY = new(right with { Modulus = right.Modulus * (1 + 1e-14) }, right),
        };
        Assert.Equal("""{"x":"both","y":"both"}""", Document(LengthUnit.Inch, even)["governing"]?.ToJsonString());
    }

    [Fact]
    public void Cross_checks_name_the_path_of_their_quantity_and_have_its_power()
    {
        var document = Document(LengthUnit.Inch);
        var powers = Values.ToDictionary(row => row.Data.Item1, row => row.Data.Item2);
        var checks = document["crossCheck"]?.AsArray() ?? [];
        Assert.Equal(Enum.GetValues<CheckedQuantity>().Length, checks.Count);
        Assert.Equal(checks.Count, checks.Select(c => c?["quantity"]?.GetValue<string>()).Distinct().Count());
        foreach (var (check, source) in checks.Zip(Properties.CrossChecks))
        {
            var path = check?["quantity"]?.GetValue<string>() ?? "";
            var scale = Math.Pow(25.4, powers[path]);
            Assert.Equal(1, JsonPaths.Number(check, "fiber") * scale / source.Fiber, 1e-14);
            Assert.Equal(1, JsonPaths.Number(check, "boundary") * scale / source.Boundary, 1e-14);
            Assert.Equal(1e-15, JsonPaths.Number(check, "difference"));
        }
    }

    [Fact]
    public void Mass_is_left_out_if_no_density_is_known() =>
        Assert.Null(Document(LengthUnit.Inch, Properties with { MassPerLength = null })["massPerLength"]);

    [Fact]
    public void Negative_zero_loses_its_sign() => Assert.Contains(
        "\"centroid\": {\n    \"x\": 0,\n    \"y\": 0\n  }",
        Text(LengthUnit.Millimetre, Properties with { Centroid = new Point(-0.0, -0.0) }),
        StringComparison.Ordinal);

    [Fact]
    public void A_culture_with_decimal_commas_changes_nothing()
    {
        var before = CultureInfo.CurrentCulture;
        var expected = Text(LengthUnit.Inch, Properties);
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("") { NumberFormat = { NumberDecimalSeparator = ",", NumberGroupSeparator = "." } };
            Assert.Equal(expected, Text(LengthUnit.Inch, Properties));
            var file = SectionText.Parse("""{ "shapes": [ { "type": "circle", "diameter": "1.5 in" } ] }""");
            Assert.Equal(38.1, file.Outline?.Bounds.Width ?? 0, 1e-12);
            Assert.Contains("is -1.5 mm", SectionText.Fault(SectionText.With("""{ "type": "circle", "diameter": -1.5 }""")).Message, StringComparison.Ordinal);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Document_ends_with_one_line_end_and_leaves_the_stream_open()
    {
        var text = Text(LengthUnit.Millimetre, Properties);
        Assert.EndsWith("}\n", text, StringComparison.Ordinal);
        Assert.DoesNotContain("\r", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Torsion_and_shear_stand_in_the_unit_shown_and_only_where_they_exist()
    {
        var torsion = new TorsionProperties
        {
            PoissonRatio = 0.25,
            Area = 1000,
            TorsionConstant = new TorsionConstant(2 * Math.Pow(25.4, 4), 4 * Math.Pow(25.4, 4)),
            TrefftzShearCentre = new Point(25.4, -50.8),
            ElasticShearCentre = new Point(1, 1),
            WarpingConstant = 7 * Math.Pow(25.4, 6),
            ShearFlexibility = new ShearFlexibility(1 / (25.4 * 25.4), 0.5 / (25.4 * 25.4), 0),
            OutlineDeviation = 0,
        };
        var document = JsonNode.Parse(Text(LengthUnit.Inch, Properties, torsion))!;
        Assert.Equal(3, (double)document["torsionConstant"]!["value"]!, 12);
        Assert.Equal(2, (double)document["torsionConstant"]!["lower"]!, 12);
        Assert.Equal(4, (double)document["torsionConstant"]!["upper"]!, 12);
        Assert.Equal(1, (double)document["shearCentre"]!["x"]!, 12);
        Assert.Equal(-2, (double)document["shearCentre"]!["y"]!, 12);
        Assert.Equal(7, (double)document["warpingConstant"]!, 12);
        Assert.Equal(1, (double)document["shearArea"]!["x"]!, 12);
        Assert.Equal(2, (double)document["shearArea"]!["y"]!, 12);
        Assert.Equal(0.25, (double)document["shearArea"]!["poissonRatio"]!);
        Assert.DoesNotContain("torsion", Text(LengthUnit.Inch, Properties), StringComparison.Ordinal);
    }

    private static ExtremeFibre Fibre(double distance, double x, double y, double modulus) => new(distance, new Point(x, y), modulus);

    private static string Text(LengthUnit unit, SectionProperties properties, TorsionProperties? torsion = null)
    {
        using var stream = new MemoryStream();
        PropertiesJson.Write(stream, properties, torsion, unit);
        Assert.True(stream.CanWrite);
        return Encoding.UTF8.GetString(stream.ToArray());
    }

    private static JsonNode Document(LengthUnit unit, SectionProperties? properties = null) =>
        JsonNode.Parse(Text(unit, properties ?? Properties)) ?? throw new InvalidOperationException();
}
