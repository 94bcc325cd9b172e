using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Placing;

/// <summary>Blocks that cannot be put into the drawing, or only with care. The rest is in the drawings by others.</summary>
public class BlocksTest
{
    [Theory]
    [InlineData("A", "A")]
    [InlineData("A", "B", "A")]
    [InlineData("A", "B", "C", "B")]
    public void A_block_that_holds_itself_is_refused_with_the_chain(params string[] chain)
    {
        var blocks = chain.Zip(chain.Skip(1)).Select((p, i) => Block(p.First, [Insert(p.Second, $"B{i}")])).Append(Block("Z", []));
        var refusal = Refusal(WithBlocks(blocks, [Insert(chain[0], "E1")]));
        Assert.Equal(DrawingFault.BlocksUnusable, refusal.Fault);
        Assert.Contains("into itself", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Blocks_nested_ten_thousand_deep_are_refused()
    {
        var blocks = Enumerable.Range(0, 10_000).Select(i => Block($"B{i}", [Insert($"B{i + 1}", $"{i:X}")]));
        Assert.Contains("deep", Refusal(WithBlocks(blocks, [Insert("B0", "E1")])).Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(30_000, 30_000)]
    [InlineData(2_147_483_647, 2_147_483_647)]
    public void An_array_of_a_billion_is_refused_before_it_is_made(int columns, int rows)
    {
        var text = WithBlocks([Block("A", [Square(0, 0, 1)])], [Insert("A", "E1") + Tagged((70, columns), (71, rows), (44, 2.0), (45, 2.0))]);
        var before = GC.GetAllocatedBytesForCurrentThread();
        Assert.Contains("more than 4000000 entities", Refusal(text).Message, StringComparison.Ordinal);
        Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, 10_000_000);
    }

    [Fact]
    public void Doubling_blocks_are_refused_before_they_are_made()
    {
        var blocks = Enumerable.Range(0, 60).Select(i => Block($"B{i}", [Insert($"B{i + 1}", "1"), Insert($"B{i + 1}", "2")])).Append(Block("B60", [Square(0, 0, 1)]));
        Assert.Equal(DrawingFault.BlocksUnusable, Refusal(WithBlocks(blocks, [Insert("B0", "E1")])).Fault);
    }

    [Fact]
    public void A_block_that_is_missing_or_external_is_told_and_the_rest_is_read()
    {
        var text = WithBlocks([Block("X", [], flags: 4)], [Insert("X", "1"), Insert("NONE", "2"), Insert("NONE", "3"), Square(0, 0, 1, "4")]);
        var cautions = Outline(text).Report.Cautions.Where(c => c.Code == NoteCode.BlockMissing).ToArray();
        Assert.Equal(2, cautions.Length);
        Assert.Contains("another file", cautions[0].Message, StringComparison.Ordinal);
        Assert.Contains("'NONE'", cautions[1].Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_gap_in_a_block_is_named_with_the_insertion()
    {
        string[] open = [Line(0, 0, 4, 0, "1"), Line(4, 0, 4, 4, "2"), Line(4, 4, 0, 0.5, "3")];
        var refusal = Refusal(WithBlocks([Block("A", open)], [Insert("A", "E1", "WALL")]));
        Assert.Equal(DrawingFault.OpenBoundary, refusal.Fault);
        Assert.Contains("LINE #3 of INSERT #E1 on layer 'WALL'", refusal.Message, StringComparison.Ordinal);
        Assert.Equal(new Point(100, 50.5), refusal.Places.Single(p => p.Source.Handle == "3").Point);
    }

    [Fact]
    public void A_block_without_an_end_is_read_and_noted()
    {
        var text = WithBlocks([Block("A", [Square(0, 0, 1)]).Replace("  0\nENDBLK\n", "", StringComparison.Ordinal)], [Insert("A", "1")]);
        Assert.Contains(Outline(text).Report.Repairs, r => r.Code == NoteCode.BlockMended);
    }

    internal static string WithBlocks(IEnumerable<string> blocks, IEnumerable<string> entities) => Drawing(entities).Replace(
        "  0\nSECTION\n  2\nENTITIES\n",
        Tagged((0, "SECTION"), (2, "BLOCKS")) + string.Concat(blocks) + Tagged((0, "ENDSEC"), (0, "SECTION"), (2, "ENTITIES")),
        StringComparison.Ordinal);

    internal static string Block(string name, IEnumerable<string> entities, int flags = 0) =>
        Tagged((0, "BLOCK"), (8, "0"), (2, name), (70, flags), (10, 0), (20, 0), (30, 0)) + string.Concat(entities) + Tagged((0, "ENDBLK"));

    internal static string Insert(string block, string handle, string layer = "0") =>
        Tagged((0, "INSERT"), (5, handle), (8, layer), (2, block), (10, 100), (20, 50), (30, 0));
}
