using System.Globalization;
using System.Text.Json;
using MeshSection.Dxf.Entities;
using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Units;

namespace MeshSection.Dxf.Tests.Drawings;

/// <summary>
/// Drawings that other programs wrote, against values computed apart from this project: see README.md and expected.json
/// beside this file.
/// </summary>
public class DrawingsByOthersTest
{
    private static readonly string Folder = Path.Combine(RepositoryRoot.Path, "tests", "MeshSection.Dxf.Tests", "Drawings");

    private static readonly JsonElement[] All =
        [.. JsonDocument.Parse(File.ReadAllText(Path.Combine(Folder, "expected.json"))).RootElement.EnumerateArray()];

    private static readonly Dictionary<string, JsonElement> ByName = All.ToDictionary(Name);

    /// <summary>What a person has to add where a drawing can be understood in more than one way.</summary>
    private static readonly Dictionary<string, Func<OutlineOptions, OutlineOptions>> Settled = new()
    {
        ["11-shared-edge-two-layers.dxf unit mm"] = o => o with { Regions = ["TIMBER", "STEEL"] },
        ["11-shared-edge-two-layers-lines.dxf unit mm"] = o => o with { Regions = ["TIMBER", "STEEL"] },
        ["11-rectangles-overlapping.dxf unit mm"] = o => o with { Inside = [new(5, 5), new(50, 35), new(70, 50)] },
        ["11-bar-closes-mouth.dxf unit mm"] = o => o with { Inside = [new(4, 50), new(54, 50)] },
    };

    /// <summary>Drawings that are refused, for what fault and with what words.</summary>
    public static TheoryData<string, DrawingFault, string> Refused => new()
    {
        { "10-mline-tube.dxf", DrawingFault.NoBoundary, "1 MLINE not read" },
        { "10-region.dxf", DrawingFault.NoBoundary, "1 REGION not read" },
        { "10-3dsolid.dxf", DrawingFault.NoBoundary, "1 3DSOLID not read" },
        { "05-block-in-itself.dxf", DrawingFault.BlocksUnusable, "puts a block into itself" },
        { "11-corner-touch.dxf unit mm", DrawingFault.TouchingBoundaries, "touch at (30, 20)" },
    };

    /// <summary>Those with an area that are not refused.</summary>
    public static TheoryData<string> Cases => [.. ByName
        .Where(c => c.Value.GetProperty("area").ValueKind == JsonValueKind.Number && !Refused.Any(r => r.Data.Item1 == c.Key))
        .Select(c => c.Key)];

    public static TheoryData<string> ToBeSettled => [.. Settled.Keys];

    [Theory]
    [MemberData(nameof(Refused))]
    public void A_drawing_that_is_not_understood_is_refused_with_the_reason(string name, DrawingFault fault, string words)
    {
        var refusal = Assert.Throws<DrawingException>(() => Outline(ByName[name], o => o));
        Assert.Equal(fault, refusal.Fault);
        Assert.Contains(words, refusal.Message, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(ToBeSettled))]
    public void A_drawing_with_two_meanings_is_refused_with_what_would_settle_it(string name)
    {
        var refusal = Assert.Throws<DrawingException>(() => Outline(ByName[name], o => o));
        Assert.Contains("--inside", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_spline_of_fit_points_is_one_boundary_with_a_caution()
    {
        var result = Outline(ByName["03-spline-fit-points.dxf"], o => o);
        Assert.Single(result.Outline.Boundaries);
        Assert.Contains(result.Report.Cautions, c => c.Code == NoteCode.SplineInterpolated);
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void A_drawing_gives_the_outline_that_it_shows(string name)
    {
        var expected = ByName[name];
        var area = expected.GetProperty("area").GetDouble();
        var result = Outline(expected, Settled.GetValueOrDefault(name, o => o));
        var scale = result.Report.Unit.Millimetres;
        var exact = expected.GetProperty("exactTo").GetDouble() * 20;
        var moments = new BoundaryIntegrator(result.Outline).Moments(Point.Origin);
        var centroid = moments.Centroid;
        var central = new BoundaryIntegrator(result.Outline).Moments(centroid);
        Assert.Equal(expected.GetProperty("boundaries").GetInt32(), result.Outline.Boundaries.Length);
        Assert.Equal(expected.GetProperty("holes").GetInt32(), result.Outline.Boundaries.Count(b => b.Role == BoundaryRole.Hole));
        Assert.Equal(1, moments.Area / scale / scale / area, exact);
        var place = expected.GetProperty("centroid");
        var size = result.Report.Extents.Diagonal;
        var found = (centroid + result.Outline.Origin) / scale;
        var spacing = 8 * Math.BitIncrement(Math.Abs(place[0].GetDouble()) + Math.Abs(place[1].GetDouble())) - 8 * (Math.Abs(place[0].GetDouble()) + Math.Abs(place[1].GetDouble()));
        Assert.Equal(place[0].GetDouble(), found.X, exact * size + spacing);
        Assert.Equal(place[1].GetDouble(), found.Y, exact * size + spacing);
        var second = expected.GetProperty("secondMoment");
        var fourth = scale * scale * scale * scale;
        Assert.Equal(1, central.YY / fourth / second[0].GetDouble(), 5 * exact);
        Assert.Equal(1, central.XX / fourth / second[1].GetDouble(), 5 * exact);
        Assert.Equal(second[2].GetDouble(), central.XY / fourth, 5 * exact * Math.Sqrt(second[0].GetDouble() * second[1].GetDouble()));
        if (expected.TryGetProperty("perimeter", out var perimeter))
        {
            Assert.Equal(1, result.Outline.Boundaries.Sum(b => b.Boundary.Length) / scale / perimeter.GetDouble(), 5 * exact);
        }
    }

    private static DrawingOutline Outline(JsonElement expected, Func<OutlineOptions, OutlineOptions> settle)
    {
        using var stream = File.OpenRead(Path.Combine(Folder, expected.GetProperty("file").GetString()!));
        var drawing = new DxfReader().Read(stream);
        return DrawingOutliner.Outline(drawing, settle(Options(expected.GetProperty("options"))));
    }

    private static OutlineOptions Options(JsonElement given) => new()
    {
        Unit = given.TryGetProperty("unit", out var unit) ? LengthUnit.Parse(unit.GetString()!) : null,
        Layers = given.TryGetProperty("layers", out var layers) ? [.. layers.EnumerateArray().Select(l => l.GetString()!)] : [],
        Colours = given.TryGetProperty("colors", out var colours)
            ? [.. colours.EnumerateArray().Select(c => new DrawingColour(c.GetInt32()))]
            : [],
        Joining = new Joining { MaxGap = given.TryGetProperty("tolerance", out var gap) ? gap.GetDouble() : null },
    };

    private static string Name(JsonElement expected) => expected.GetProperty("file").GetString() +
        string.Concat(expected.GetProperty("options").EnumerateObject().Select(o => string.Create(CultureInfo.InvariantCulture, $" {o.Name} {o.Value}")));
}
