using System.Text.Json;

namespace MeshSection.Cli.Tests;

/// <summary>The keys that other programs count on, and that they agree with each other.</summary>
public class PropertiesJsonTests
{
    public static TheoryData<string> Samples => [.. Repository.Samples.Select(s => string.Join(' ', s))];

    [Theory]
    [MemberData(nameof(Samples))]
    public void Every_sample_has_every_key_and_they_agree(string sample)
    {
        var run = CommandRun.Of(["properties", .. Repository.Resolve(sample.Split(' ')), "--json", "--quiet"]);
        Assert.Equal((0, ""), (run.Status, run.Error));
        using var document = JsonDocument.Parse(run.Output);
        var root = document.RootElement;

        double Number(string path)
        {
            var value = path.Split('.').Aggregate(root, (element, key) => element.GetProperty(key)).GetDouble();
            Assert.True(double.IsFinite(value), path);
            return value;
        }

        double Positive(string path)
        {
            var value = Number(path);
            Assert.True(value > 0, path);
            return value;
        }

        void Same(double a, double b) => Assert.Equal(a, b, 1e-9 * Math.Max(Math.Abs(a), Math.Abs(b)));

        Assert.False(string.IsNullOrEmpty(root.GetProperty("units").GetProperty("length").GetString()));
        var area = Positive("area");
        Same(Positive("perimeter"), Number("outerPerimeter") + Number("innerPerimeter"));
        foreach (var (axis, sides) in new[] { ("x", new[] { "top", "bottom" }), ("y", ["left", "right"]) })
        {
            Number($"centroid.{axis}");
            Number($"plasticNeutralAxis.{axis}");
            Positive($"secondMomentDatum.{axis}");
            Same(Positive($"radiusOfGyration.{axis}"), Math.Sqrt(Positive($"secondMoment.{axis}") / area));
            var governing = Positive($"sectionModulus.{axis}");
            Same(governing, sides.Min(s => Positive($"sectionModulus.{s}")));
            var side = root.GetProperty("governing").GetProperty(axis).GetString();
            Same(governing, Number($"sectionModulus.{(side == "both" ? sides[0] : side)}"));
            Assert.True(Positive($"plasticModulus.{axis}") > governing);
            Same(Positive($"shapeFactor.{axis}"), Number($"plasticModulus.{axis}") / governing);
        }

        Number("secondMoment.xy");
        Number("secondMomentDatum.xy");
        Same(Positive("radiusOfGyration.r1"), Math.Sqrt(Positive("principal.I1") / area));
        Same(Positive("radiusOfGyration.r2"), Math.Sqrt(Positive("principal.I2") / area));
        Assert.True(Number("principal.I1") >= Number("principal.I2"));
        Assert.InRange(Number("principal.angle"), -90 + 1e-12, 90);
        Same(Number("principal.I1") + Number("principal.I2"), Number("secondMoment.x") + Number("secondMoment.y"));
        Positive("mesh.triangles");
        Positive("mesh.nodes");
        Assert.InRange(Positive("mesh.minAngle"), 20, 60);
        var checks = root.GetProperty("crossCheck").EnumerateArray().ToArray();
        Assert.Equal(10, checks.Length);
        Assert.All(checks, check =>
        {
            Assert.False(string.IsNullOrEmpty(check.GetProperty("quantity").GetString()));
            Assert.True(double.IsFinite(check.GetProperty("fiber").GetDouble()));
            Assert.True(double.IsFinite(check.GetProperty("boundary").GetDouble()));
            Assert.InRange(check.GetProperty("difference").GetDouble(), 0, 1e-12);
        });
        if (sample.Contains("two-channels", StringComparison.Ordinal) || sample.Contains("runway-channels", StringComparison.Ordinal))
        {
            // In separate pieces: no one torsion constant.
            Assert.False(root.TryGetProperty("torsionConstant", out _));
            return;
        }

        Assert.InRange(Positive("torsionConstant.value"), Positive("torsionConstant.lower"), Positive("torsionConstant.upper"));
        Assert.InRange(Number("torsionConstant.upper") / Number("torsionConstant.lower"), 1, 1.01);
        Number("shearCentre.x");
        Number("shearCentre.y");
        Assert.True(Number("warpingConstant") >= 0);
        Assert.InRange(Positive("shearArea.x"), 0, area);
        Assert.InRange(Positive("shearArea.y"), 0, area);
    }

    [Fact]
    public void The_same_section_in_another_unit_or_place_gives_the_same_answers()
    {
        using var folder = new TemporaryFolder();
        double Area(string name, string entities, int unit) => JsonDocument
            .Parse(CommandRun.Of("properties", folder.Write(name, DxfText.Drawing(entities, unit)), "--json").Output)
            .RootElement.GetProperty("secondMoment").GetProperty("x").GetDouble();

        var home = Area("home.dxf", DxfText.Square(0, 0, 64) + DxfText.Circle(32, 32, 8), 4);
        Assert.Equal(Math.Pow(64, 4) / 12 - Math.PI * Math.Pow(8, 4) / 4, home, 1e-9 * home);
        var away = Area("away.dxf", DxfText.Square(1e7, -1e7, 64) + DxfText.Circle(1e7 + 32, -1e7 + 32, 8), 4);
        Assert.Equal(home, away, 1e-12 * home);
        var metres = Area("metres.dxf", DxfText.Square(0, 0, 0.064) + DxfText.Circle(0.032, 0.032, 0.008), 6);
        Assert.Equal(home, 1e12 * metres, 1e-12 * home);
        var micrometres = Area("micrometres.dxf", DxfText.Square(0, 0, 64000) + DxfText.Circle(32000, 32000, 8000), 13);
        Assert.Equal(home, 1e-12 * micrometres, 1e-12 * home);
    }

    [Fact]
    public void A_density_gives_mass_and_a_culture_with_commas_changes_nothing()
    {
        var args = new[] { "properties", Repository.PathOf("dxf-samples/handrail-channel.dxf"), "--density", "2700 kg/m3", "--json" };
        var plain = CommandRun.Of(args);
        var before = Thread.CurrentThread.CurrentCulture;
        try
        {
            var commas = (System.Globalization.CultureInfo)System.Globalization.CultureInfo.InvariantCulture.Clone();
            commas.NumberFormat.NumberDecimalSeparator = ",";
            commas.NumberFormat.NegativeSign = "~";
            Thread.CurrentThread.CurrentCulture = commas;
            Assert.Equal(plain, CommandRun.Of(args));
            Assert.DoesNotContain("~", CommandRun.Of(args[..2]).Output, StringComparison.Ordinal);
        }
        finally
        {
            Thread.CurrentThread.CurrentCulture = before;
        }

        var root = JsonDocument.Parse(plain.Output).RootElement;
        Assert.Equal(2700e-9 * root.GetProperty("area").GetDouble(), root.GetProperty("massPerLength").GetDouble(), 1e-15);
    }
}
