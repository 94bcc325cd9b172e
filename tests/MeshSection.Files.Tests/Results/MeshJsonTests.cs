using System.Text;
using System.Text.Json.Nodes;
using MeshSection.Files.Results;
using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Units;

namespace MeshSection.Files.Tests.Results;

public class MeshJsonTests
{
    /// <summary>A 25.4 mm square in two triangles, one region each, beside a smaller triangle of the second.</summary>
    private static readonly Mesh Mesh = new(
        nodes: [new(0, 0), new(25.4, 0), new(25.4, 25.4), new(0, 25.4), new(0, 50.8)],
        corners: [0, 1, 2, 0, 2, 3, 3, 2, 4],
        neighbours: [-1, 1, -1, 2, -1, 0, -1, -1, 1],
        regions: [0, 1, 1],
        segments: [-1, -1, -1, -1, -1, -1, -1, -1, -1],
        unrefined:
        [
            new UnrefinedTriangle(0, new Point(2.54, 5.08), 12.5, UnrefinedCause.InputAngle),
            new UnrefinedTriangle(1, new Point(2.54, 5.08), 13.5, UnrefinedCause.NodeLimit),
            new UnrefinedTriangle(2, new Point(2.54, 5.08), 14.5, UnrefinedCause.LeastEdge),
        ]);

    private static readonly MeshReport Report = new(
        MeshQuality.Of(Mesh),
        MeshRegion.Of(Mesh),
        [new InputAngle(0, new(0, 0), 20, 0, 1)],
        new Wall(12.7, new(25.4, 0), new(25.4, 12.7), 3),
        0.254,
        []);

    private static readonly JsonNode Document = Written(new Point(254, -254), Report, TimeSpan.FromSeconds(0.25));

    [Fact]
    public void Counts_and_angles()
    {
        Assert.Equal(3, JsonPaths.Number(Document, "triangles"));
        Assert.Equal(5, JsonPaths.Number(Document, "nodes"));
        Assert.Equal(45, JsonPaths.Number(Document, "minAngle"), 1e-12);
        Assert.Equal(90, JsonPaths.Number(Document, "maxAngle"), 1e-12);
        var place = new Point(JsonPaths.Number(Document, "minAnglePlace.x"), JsonPaths.Number(Document, "minAnglePlace.y"));
        Assert.Contains(Mesh.Nodes, node => node.DistanceTo(25.4 * place - new Point(254, -254)) < 1e-9);
        var histogram = Document["angleHistogram"]?.AsArray().Select(n => n?.GetValue<int>()) ?? [];
        Assert.Equal(18, histogram.Count());
        Assert.Equal(9, histogram.Sum());
    }

    [Fact]
    public void Areas_in_the_unit_asked_for()
    {
        Assert.Equal("in", Document["units"]?["length"]?.GetValue<string>());
        Assert.Equal(1.5, JsonPaths.Number(Document, "area"), 1e-12);
        Assert.Equal(0.5, JsonPaths.Number(Document, "largestTriangle"), 1e-12);
        Assert.Equal(0.5, JsonPaths.Number(Document["regions"]?[0], "area"), 1e-12);
        Assert.Equal(1.0, JsonPaths.Number(Document["regions"]?[1], "area"), 1e-12);
        Assert.Equal(2, JsonPaths.Number(Document["regions"]?[1], "triangles"));
        Assert.Equal(10 + 2.0 / 3, JsonPaths.Number(Document["regions"]?[0], "centroid.x"), 1e-12);
        Assert.Equal(-10 + 1.0 / 3, JsonPaths.Number(Document["regions"]?[0], "centroid.y"), 1e-12);
    }

    [Fact]
    public void Unrefined_triangles_have_their_place_in_the_drawings_axes_and_their_cause()
    {
        var unrefined = Document["unrefined"]?.AsArray() ?? [];
        Assert.Equal(["inputAngle", "nodeLimit", "leastEdge"], unrefined.Select(u => u?["cause"]?.GetValue<string>()));
        Assert.Equal(Enum.GetValues<UnrefinedCause>().Length, unrefined.Count);
        Assert.Equal(2, JsonPaths.Number(unrefined[2], "triangle"));
        Assert.Equal(10.1, JsonPaths.Number(unrefined[2], "x"), 1e-12);
        Assert.Equal(-9.8, JsonPaths.Number(unrefined[2], "y"), 1e-12);
        Assert.Equal(14.5, JsonPaths.Number(unrefined[2], "angle"));
    }

    [Fact]
    public void The_thinnest_wall_and_the_sharp_corners()
    {
        Assert.Equal(0.5, JsonPaths.Number(Document, "thinnestWall.thickness"), 1e-12);
        Assert.Equal(3, JsonPaths.Number(Document, "thinnestWall.elements"));
        Assert.Equal(11, JsonPaths.Number(Document, "thinnestWall.from.x"), 1e-12);
        Assert.Equal(-9.5, JsonPaths.Number(Document, "thinnestWall.to.y"), 1e-12);
        var corner = Assert.Single(Document["inputAngles"]?.AsArray() ?? []);
        Assert.Equal(20, JsonPaths.Number(corner, "angle"));
        Assert.Equal(10, JsonPaths.Number(corner, "x"), 1e-12);
        Assert.Equal(0.01, JsonPaths.Number(Document, "chords.maxSag"), 1e-12);
        Assert.Equal(0.25, JsonPaths.Number(Document, "seconds"));

        JsonNode plain = Written(default, Report with { ThinnestWall = null }, null);
        Assert.Null(plain["thinnestWall"]);
        Assert.True(plain.AsObject().ContainsKey("thinnestWall"));
        Assert.False(plain.AsObject().ContainsKey("seconds"));
    }

    private static JsonNode Written(Point origin, MeshReport report, TimeSpan? time)
    {
        using var stream = new MemoryStream();
        MeshJson.Write(stream, Mesh, report, time, origin, LengthUnit.Inch);
        return JsonNode.Parse(Encoding.UTF8.GetString(stream.ToArray())) ?? throw new InvalidOperationException();
    }
}
