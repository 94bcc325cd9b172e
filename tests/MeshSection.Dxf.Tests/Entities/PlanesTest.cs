using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Entities;

/// <summary>Entities stated in planes of their own.</summary>
public class PlanesTest
{
    [Fact]
    public void Entities_seen_from_below_are_mirrored()
    {
        // An arc from 10 to 100 degrees about (3, 4), a circle, and a polyline with an arc, all seen from below.
        var down = Tagged((210, 0), (220, 0), (230, -1));
        var outline = Outline(Drawing(
            [
                LwPolyline([(0, 0, 0), (2, 0, 1), (2, 2, 0), (0, 2, 0)], handle: "1", isMirrored: true),
                Circle(9, 4, 2, "2") + down,
                Arc(20, 5, 1, 0, 180, "3", isMirrored: true), Line(-21, 5, -19, 5, "4") + down,
            ])).Outline;
        var bounds = outline.Boundaries.Select(b => (b.Boundary.Bounds.MinX + outline.Origin.X, b.Boundary.Bounds.MaxX + outline.Origin.X)).Order();
        Assert.Equal([(-21.0, -19.0), (-11.0, -7.0), (-3.0, 0.0)], bounds);
        Assert.All(outline.Boundaries, b => Assert.True(b.Boundary.SignedArea > 0));
    }

    public static TheoryData<string> Tilted =>
    [
        Circle(0, 0, 1, "7E") + Tagged((210, 0), (220, 1), (230, 0)),
        Circle(0, 0, 1, "7E") + Tagged((210, 0), (220, 0.001), (230, 1)),
        Line(0, 0, 1, 0, "7E").Replace(" 31\n0\n", " 31\n0.5\n", StringComparison.Ordinal),
        Polyline([(0, 0, 0), (1, 0, 0), (1, 1, 0)], handle: "7E").Replace(" 70\n1\n", " 70\n9\n", StringComparison.Ordinal).Replace("20\n1\n 30\n0", "20\n1\n 30\n2", StringComparison.Ordinal),
    ];

    [Theory]
    [MemberData(nameof(Tilted))]
    public void A_tilted_entity_is_refused_by_its_handle_unless_its_layer_is_left_out(string text)
    {
        var drawing = Drawing([Square(0, 0, 10, layer: "WALL"), text]);
        var refusal = Refusal(drawing);
        Assert.Equal((DrawingFault.TiltedEntity, "7E"), (refusal.Fault, Assert.Single(refusal.Places).Source.Handle));
        Assert.Contains("#7E", refusal.Message, StringComparison.Ordinal);
        Assert.Single(Outline(drawing, new OutlineOptions { Layers = ["wall"] }).Outline.Boundaries);
    }

    [Fact]
    public void Entities_at_different_heights_are_projected_and_noted()
    {
        var raised = Circle(5, 5, 2, "9").Replace(" 30\n0\n", " 30\n25\n", StringComparison.Ordinal);
        var result = Outline(Drawing([Square(0, 0, 10), raised]));
        Assert.Equal(2, result.Outline.Boundaries.Length);
        var note = Assert.Single(result.Report.Cautions);
        Assert.Equal("DR304", note.Name);
        Assert.Contains("25 (CIRCLE #9)", note.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_flat_spatial_polyline_is_read() =>
        Assert.Single(Outline(Drawing([Polyline([(0, 0, 0), (1, 0, 0), (1, 1, 0)]).Replace(" 70\n1\n", " 70\n9\n", StringComparison.Ordinal)])).Outline.Boundaries);
}
