using System.Text;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Tags;

/// <summary>The same drawing in every form that files take.</summary>
public class FileFormTest
{
    private static readonly string Plain = Drawing([Square(0, 0, 10), Circle(5, 5, 2)]);

    public static TheoryData<string> Forms =>
    [
        Plain,
        Plain.Replace("\n", "\r\n", StringComparison.Ordinal),
        Plain.Replace("\n", "\r", StringComparison.Ordinal),
        "\u00EF\u00BB\u00BF" + Plain,
        "999\nwritten by hand\n" + Plain.Replace("LWPOLYLINE\n", "LWPOLYLINE\n999\nan aside\n", StringComparison.Ordinal),
        Plain.Replace("  0\n", "0 \n", StringComparison.Ordinal).Replace("10.", "\t10.", StringComparison.Ordinal),
        Plain + "\u001a",
        Plain.TrimEnd(),
    ];

    [Theory]
    [MemberData(nameof(Forms))]
    public void Line_breaks_marks_comments_and_blanks_do_not_matter(string text)
    {
        var result = Outline(text);
        Assert.Equal(Outline(Plain).Outline.Boundaries.SelectMany(b => b.Boundary.Edges), result.Outline.Boundaries.SelectMany(b => b.Boundary.Edges));
        Assert.Empty(result.Report.Repairs);
    }

    [Fact]
    public void Values_longer_than_the_buffer_and_breaks_at_its_end_are_read()
    {
        for (var length = 65_400; length < 65_560; length++)
        {
            var text = Plain.Replace("\n", "\r\n", StringComparison.Ordinal);
            Assert.Equal(2, Outline("999\r\n" + new string('x', length) + "\r\n" + text).Outline.Boundaries.Length);
        }
    }

    [Theory]
    [InlineData("AC1032", true)]
    [InlineData("AC1009", true)]
    [InlineData("AC1050", false)]
    public void An_unknown_release_is_read_and_noted(string release, bool isKnown)
    {
        var result = Outline(Drawing([Square(0, 0, 10)], release: release));
        Assert.Equal(release, result.Report.Release);
        Assert.Equal(isKnown, result.Report.Cautions.All(n => n.Code != NoteCode.ReleaseUnknown));
    }

    [Fact]
    public void Bare_entities_are_read_and_what_was_assumed_is_noted()
    {
        var drawing = Read(Square(0, 0, 10));
        Assert.Equal(
            [NoteCode.BareEntities, NoteCode.NoEndOfFile, NoteCode.ReleaseUnknown], drawing.Notes.Select(n => n.Code));
        Assert.Single(drawing.Entities);
    }

    [Fact]
    public void A_missing_end_of_file_is_noted_with_the_last_entity()
    {
        var drawing = Read(Plain.Replace("  0\nENDSEC\n  0\nEOF\n", "", StringComparison.Ordinal));
        var note = Assert.Single(drawing.Notes);
        Assert.Equal("DR101", note.Name);
        Assert.Contains("CIRCLE #A3", note.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_missing_end_of_section_is_noted()
    {
        var at = Plain.IndexOf("  0\nENDSEC\n", StringComparison.Ordinal);
        var note = Assert.Single(Read(Plain.Remove(at, 11)).Notes);
        Assert.Equal(NoteCode.NoEndOfSection, note.Code);
        Assert.Contains("HEADER", note.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void What_follows_the_end_is_noted_and_not_read() =>
        Assert.Equal(NoteCode.TextAfterEnd, Assert.Single(Read(Plain + Square(50, 50, 10)).Notes).Code);

    [Fact]
    public void Blocks_and_objects_are_passed_over()
    {
        var blocks = Tagged((0, "SECTION"), (2, "BLOCKS"), (0, "BLOCK"), (2, "A")) + Square(90, 90, 1) + Tagged((0, "ENDBLK"), (0, "ENDSEC"));
        var at = Plain.IndexOf("  0\nSECTION\n  2\nENTITIES", StringComparison.Ordinal);
        Assert.Equal(2, Read(Plain.Insert(at, blocks)).Entities.Length);
    }

    [Fact]
    public void Bytes_that_come_one_by_one_make_the_same_drawing()
    {
        using var stream = new OneByteStream(Encoding.ASCII.GetBytes(Plain));
        Assert.Equal(2, new DxfReader().Read(stream).Entities.Length);
    }

    private sealed class OneByteStream(byte[] bytes) : MemoryStream(bytes)
    {
        public override int Read(Span<byte> buffer) => base.Read(buffer[..Math.Min(1, buffer.Length)]);
    }
}
