using System.Text;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Entities;

/// <summary>Layer names in every script that drawings come in.</summary>
public class NamesTest
{
    [Theory]
    [InlineData("AC1015", "ANSI_1252", 1252, "Träger")]
    [InlineData("AC1015", "ansi_932", 932, "断面")]
    [InlineData("AC1015", "ANSI_936", 936, "截面")]
    [InlineData("AC1009", "dos850", 850, "Träger")]
    [InlineData("AC1018", "BIG5", 950, "斷面")]
    [InlineData("AC1021", "ANSI_1252", 65001, "断面 Träger")]
    [InlineData("AC1032", null, 65001, "Сечение")]
    public void A_name_is_read_in_the_code_page_that_the_drawing_states(string release, string? codePage, int written, string name)
    {
        var drawing = Read(Bytes(release, codePage, written, name));
        Assert.Equal(name, Assert.Single(drawing.Layers).Name);
        Assert.Equal(name, Assert.Single(drawing.Entities).Source.Layer);
        Assert.DoesNotContain(drawing.Notes, n => n.Code == NoteCode.CodePageAssumed);
    }

    [Theory]
    [InlineData("AC1015", null, "no code page")]
    [InlineData("AC1015", "KLINGON_7", "'KLINGON_7'")]
    [InlineData("AC1032", "ANSI_1252", "not in UTF-8")]
    public void A_name_in_an_unknown_code_page_is_read_in_1252_and_noted(string release, string? codePage, string part)
    {
        var drawing = Read(Bytes(release, codePage, 1252, "Träger"));
        Assert.Equal("Träger", Assert.Single(drawing.Entities).Source.Layer);
        Assert.Contains(part, Assert.Single(drawing.Notes, n => n.Code == NoteCode.CodePageAssumed).Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("bar \\U+00D812", "bar Ø12")]
    [InlineData("\\U+65AD\\u+9762", "断面")]
    [InlineData("C:\\U+00", "C:\\U+00")]
    [InlineData("\\U+ZZZZ", "\\U+ZZZZ")]
    public void Escaped_characters_are_read(string written, string name) =>
        Assert.Equal(name, Assert.Single(Read(Drawing([Circle(0, 0, 1, layer: written)])).Entities).Source.Layer);

    private static byte[] Bytes(string release, string? codePage, int written, string name)
    {
        var text = Drawing([Circle(0, 0, 1, layer: name)], release: release, layers: Layer(name));
        if (codePage is not null)
        {
            text = text.Replace("  9\n$INSUNITS", Tagged((9, "$DWGCODEPAGE"), (3, codePage)) + "  9\n$INSUNITS", StringComparison.Ordinal);
        }

        return (CodePagesEncodingProvider.Instance.GetEncoding(written) ?? Encoding.UTF8).GetBytes(text);
    }
}
