using MeshSection.Dxf.Entities;
using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Entities;

/// <summary>Entities stated in planes of their own.</summary>
public class PlanesTest
{
    [Fact]
    public void Entities_seen_from_below_are_mirrored()
    {
        var down = Tagged((210, 0), (220, 0), (230, -1));
        var drawing = Read(Drawing(
            [Arc(3, 4, 2, 10, 100, isMirrored: true), Circle(3, 4, 2) + down, LwPolyline([(1, 2, 0.5), (3, 4, 0)], isMirrored: true), Line(1, 2, 3, 4) + down]));

        var arc = Assert.IsType<ArcEntity>(drawing.Entities[0]);
        Assert.Equal((new Point(-3, 4), 80.0, 170.0), (arc.Centre, arc.StartAngle, arc.EndAngle));
        Assert.Equal(new Point(-3, 4), Assert.IsType<CircleEntity>(drawing.Entities[1]).Centre);
        Assert.Equal([new(new Point(-1, 2), -0.5), new(new Point(-3, 4), -0.0)], Assert.IsType<PolylineEntity>(drawing.Entities[2]).Vertices);
        Assert.Equal(new Point(3, 4), Assert.IsType<LineEntity>(drawing.Entities[3]).End);
    }

    public static TheoryData<string> Tilted =>
    [
        Circle(0, 0, 1, "7E") + Tagged((210, 0), (220, 1), (230, 0)),
        Circle(0, 0, 1, "7E") + Tagged((210, 0), (220, 0.001), (230, 1)),
        Circle(0, 0, 1, "7E") + Tagged((210, 0), (220, 0), (230, 0)),
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
