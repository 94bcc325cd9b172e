using MeshSection.Dxf.Selection;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Selection;

/// <summary>Which entities make the outline.</summary>
public class LayersTest
{
    private static readonly string Mixed = Drawing(
        [
            Square(0, 0, 10, layer: "Wall-Outer"), Circle(5, 5, 1, layer: "WALL-INNER"), Line(0, 0, 50, 50, layer: "Off"),
            Line(0, 0, 50, 50, layer: "Frozen"), Line(0, 0, 50, 50, layer: "defpoints"),
            Line(0, 0, 50, 50) + Tagged((67, 1)), Line(0, 0, 50, 50) + Tagged((60, 1)),
            Tagged((0, "TEXT"), (8, "NOTES"), (10, "not a number"), (1, "PLAN")), Tagged((0, "INSERT"), (8, "NOTES"), (2, "BOLT"), (10, 0), (20, 0)),
        ],
        layers: Layer("Wall-Outer") + Layer("Wall-Inner") + Layer("Off", colour: -7) + Layer("Frozen", flags: 1) + Layer("Defpoints"));

    [Fact]
    public void What_no_one_sees_or_what_bounds_nothing_is_left_out_and_counted_by_reason()
    {
        var report = Outline(Mixed).Report;

        Assert.Equal(
            [
                ("TEXT", LeftOutReason.Annotation), ("LINE", LeftOutReason.LayerOff),
                ("LINE", LeftOutReason.LayerFrozen), ("LINE", LeftOutReason.LayerNotPlotted), ("LINE", LeftOutReason.PaperSpace),
                ("LINE", LeftOutReason.Invisible), ("INSERT", LeftOutReason.BlockMissing),
            ],
            report.LeftOut.Select(c => (c.Kind, c.Reason)));
        Assert.Equal(2, report.Used.Sum(c => c.Count));
        Assert.Contains("'BOLT'", Assert.Single(report.Cautions, c => c.Code == NoteCode.BlockMissing).Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("wall-outer", 1)]
    [InlineData("wall-*", 2)]
    [InlineData("*", 2)]
    [InlineData("WALL-?????", 2)]
    [InlineData("*inner", 1)]
    [InlineData("w*l*-*n*r", 1)]
    public void Layers_are_chosen_by_name_and_wildcards_in_any_case(string pattern, int boundaries) =>
        Assert.Equal(boundaries, Outline(Mixed, new OutlineOptions { Layers = [pattern] }).Outline.Boundaries.Length);

    [Fact]
    public void A_hidden_layer_is_read_only_if_it_is_named_in_full()
    {
        var text = Drawing([Square(0, 0, 10, layer: "OLD"), Circle(5, 5, 1)], layers: Layer("OLD", colour: -1));
        Assert.Equal(DrawingFault.NoBoundary, Refusal(text, new OutlineOptions { Layers = ["OL*"] }).Fault);
        var report = Outline(text, new OutlineOptions { Layers = ["old"] }).Report;
        Assert.Equal(NoteCode.HiddenLayerRead, Assert.Single(report.Cautions).Code);
    }

    [Fact]
    public void A_pattern_that_matches_no_layer_is_refused_with_those_there_are()
    {
        var refusal = Refusal(Mixed, new OutlineOptions { Layers = ["wall-*", "SKIN"] });
        Assert.Equal(DrawingFault.NoSuchLayer, refusal.Fault);
        Assert.Contains("'SKIN'", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("'Wall-Outer'", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_drawing_without_entities_says_so() =>
        Assert.Contains("no entities", Refusal(Drawing([])).Message, StringComparison.Ordinal);

    [Fact]
    public void A_drawing_of_what_is_not_read_says_what_and_what_to_do()
    {
        var refusal = Refusal(Drawing([Tagged((0, "HELIX"), (8, "A")), Tagged((0, "MLINE"), (8, "A")), Tagged((0, "REGION"), (8, "B")), Line(0, 0, 1, 1) + Tagged((67, 1))]));

        Assert.Equal(DrawingFault.NoBoundary, refusal.Fault);
        foreach (var part in new[] { "1 HELIX on 'A' (not read)", "convert them to polylines", "REGION", "on a layout sheet" })
        {
            Assert.Contains(part, refusal.Message, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Layers_named_by_entities_alone_are_known_too() =>
        Assert.Equal(["A", "B"], Read(Drawing([Circle(0, 0, 1, layer: "B")], layers: Layer("A"))).Layers.Select(l => l.Name));
}
