using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Loops;

/// <summary>One channel with two root fillets, drawn in every way that is read.</summary>
public class SameChannelTest
{
    // Web 10 thick and 80 high, flanges 40 wide and 8 thick, fillets of radius 6 inside the corners.
    private static readonly double Quarter = Math.Tan(Math.PI / 8);

    private static readonly (double X, double Y, double Bulge)[] Vertices =
    [
        (0, 0, 0), (40, 0, 0), (40, 8, 0), (16, 8, -Quarter), (10, 14, 0), (10, 66, -Quarter), (16, 72, 0), (40, 72, 0),
        (40, 80, 0), (0, 80, 0),
    ];

    private static readonly string[] Loose =
    [
        Line(0, 0, 40, 0), Line(40, 8, 40, 0), Line(40, 8, 16, 8), Arc(16, 14, 6, 180, 270), Line(10, 14, 10, 66),
        Arc(16, 66, 6, 90, 180), Line(40, 72, 16, 72), Line(40, 72, 40, 80), Line(0, 80, 40, 80), Line(0, 80, 0, 0),
    ];

    public static TheoryData<string> Drawings =>
    [
        Drawing([LwPolyline(Vertices)]),
        Drawing([Polyline(Vertices)], release: "AC1009"),
        Drawing([LwPolyline([.. Vertices.Select(v => (-v.X, v.Y, -v.Bulge))], isMirrored: true)]),
        Drawing([.. Loose.Where(e => !e.Contains("ARC")), Arc(-16, 14, 6, 270, 0, isMirrored: true), Arc(-16, 66, 6, 0, 90, isMirrored: true)]),
        Drawing(Loose.Reverse()),
    ];

    [Theory]
    [MemberData(nameof(Drawings))]
    public void The_same_channel_gives_the_same_edges_however_it_is_drawn(string text)
    {
        var boundary = Assert.Single(Outline(text).Outline.Boundaries).Boundary;
        var expected = Assert.Single(Outline(Drawing(Loose)).Outline.Boundaries).Boundary;
        Assert.Equal(10, boundary.Edges.Length);
        for (var i = 0; i < 10; i++)
        {
            Assert.Equal(expected.Edges[i].Start, boundary.Edges[i].Start);
            Assert.Equal(expected.Edges[i].Length, boundary.Edges[i].Length, 1e-13);
            Assert.Equal(expected.Edges[i] is ArcEdge, boundary.Edges[i] is ArcEdge);
        }
    }
}
