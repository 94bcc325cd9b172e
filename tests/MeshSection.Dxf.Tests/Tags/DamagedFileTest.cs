using System.Text;
using CsCheck;
using MeshSection.Units;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Tags;

/// <summary>Damaged files end in one clear refusal each, or in a drawing; never in any other exception.</summary>
public class DamagedFileTest
{
    private static readonly string Small = Drawing(
        [Line(0, 0, 4, 0), Arc(4, 1, 1, -90, 0, "B1"), Line(5, 1, 0, 0, "B2"), Circle(2, 0.4, 0.1), Square(20, 0, 3), Polyline([(9, 9, 0.5), (8, 9, 1)])],
        layers: Layer("0"));

    [Fact]
    public void An_empty_file_says_so()
    {
        Assert.Equal(DrawingFault.EmptyFile, Refusal("").Fault);
        Assert.Equal(DrawingFault.EmptyFile, Refusal(" \r\n\r\n").Fault);
    }

    [Theory]
    [InlineData("AC1027\0\0\0\0", DrawingFault.Dwg, "DWG")]
    [InlineData("\u00FF\u00FE0\0\n\0", DrawingFault.NotDxf, "UTF-16")]
    [InlineData("%PDF-1.7\n", DrawingFault.NotDxf, "'%PDF-1.7'")]
    [InlineData("{ \"title\": 1 }", DrawingFault.NotDxf, "line 1")]
    [InlineData("10\n20\n30\n40\n", DrawingFault.NotDxf, "'10'")]
    public void What_is_no_dxf_is_named_with_what_to_do(string text, DrawingFault fault, string part)
    {
        var refusal = Refusal(text);
        Assert.Equal(fault, refusal.Fault);
        Assert.Contains(part, refusal.Message, StringComparison.Ordinal);
        Assert.Contains("DXF", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_line_without_end_is_refused_before_it_fills_the_memory() =>
        Assert.Equal(DrawingFault.NotDxf, Refusal("999\n" + new string('x', 3_000_000)).Fault);

    [Fact]
    public void A_group_code_that_is_no_number_is_refused_with_its_line()
    {
        var refusal = Refusal(Drawing([Line(0, 0, 1, 0).Replace(" 20\n", " 2O\n", StringComparison.Ordinal)]));
        Assert.Equal((DrawingFault.BadGroupCode, 39L), (refusal.Fault, refusal.Place!.Value.Number));
        Assert.Contains("'2O'", refusal.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("nan")]
    [InlineData("NaN")]
    [InlineData("inf")]
    [InlineData("-Infinity")]
    [InlineData("1e400")]
    [InlineData("2,5")]
    [InlineData("1.5mm")]
    [InlineData("1 5")]
    [InlineData("0x10")]
    [InlineData("")]
    public void A_value_that_is_no_finite_number_is_refused_with_line_code_and_entity(string value)
    {
        var refusal = Refusal(Drawing([Circle(7.25, 0, 1, handle: "2F", layer: "WALL").Replace("7.25", value, StringComparison.Ordinal)]));

        Assert.Equal((DrawingFault.BadNumber, 38L, 10), (refusal.Fault, refusal.Place!.Value.Number, refusal.GroupCode));
        var source = Assert.Single(refusal.Places).Source;
        Assert.Equal(("CIRCLE", "2F", "WALL"), (source.Kind, source.Handle, source.Layer));
        Assert.Contains("Line 38: group 10 of CIRCLE #2F on layer 'WALL'", refusal.Message, StringComparison.Ordinal);
        Assert.Equal(value.Contains(','), refusal.Message.Contains("comma", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(" 1.5 ")]
    [InlineData("+1.5")]
    [InlineData("1.5E+00")]
    [InlineData("15e-1")]
    [InlineData(".15e1")]
    public void Plain_numbers_are_read_in_every_spelling(string value)
    {
        var drawing = Read(Drawing([Circle(0, 0, 7.25).Replace("7.25", value, StringComparison.Ordinal)]));
        Assert.Equal(1.5, Assert.IsType<Dxf.Entities.CircleEntity>(Assert.Single(drawing.Entities)).Radius);
    }

    [Fact]
    public void Flags_and_units_that_are_no_whole_numbers_are_refused()
    {
        Assert.Equal(70, Refusal(Drawing([Square(0, 0, 1).Replace(" 70\n1\n", " 70\n1.5\n", StringComparison.Ordinal)])).GroupCode);
        Assert.Contains("$INSUNITS", Refusal(Drawing([]).Replace(" 70\n4\n", " 70\nmm\n", StringComparison.Ordinal)).Message, StringComparison.Ordinal);
        Assert.Contains("'WALL'", Refusal(Drawing([], layers: Layer("WALL").Replace("62\n7", "62\nred", StringComparison.Ordinal))).Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(" 20\n", 20, "start point")]
    [InlineData(" 11\n", 11, "end point")]
    public void A_line_that_lacks_a_coordinate_is_refused(string code, int group, string what)
    {
        var refusal = Refusal(Drawing([Line(0, 0, 1, 0).Replace(code, "1000\n", StringComparison.Ordinal)]));
        Assert.Equal((DrawingFault.BadEntity, group), (refusal.Fault, refusal.GroupCode));
        Assert.Contains(what, refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_negative_radius_is_refused() =>
        Assert.Equal(DrawingFault.BadEntity, Refusal(Drawing([Circle(0, 0, -1)])).Fault);

    [Fact]
    public void A_file_cut_off_at_any_byte_gives_a_drawing_or_one_refusal()
    {
        var whole = Read(Small);
        var bytes = Encoding.ASCII.GetBytes(Small);
        var refused = 0;
        for (var length = 0; length < bytes.Length; length++)
        {
            try
            {
                var drawing = Read(bytes[..length]);
                var isWhole = drawing.Entities.Length == whole.Entities.Length;
                Assert.True(drawing.Notes.Any(n => n.Code == NoteCode.NoEndOfFile) || (isWhole && length >= bytes.Length - 1), $"silent at {length}");
            }
            catch (DrawingException e)
            {
                refused++;
                Assert.True(e.Fault is DrawingFault.Truncated || length < 12, $"{e.Fault} at {length}");
            }
        }

        Assert.InRange(refused, bytes.Length / 2, bytes.Length);
    }

    [Theory]
    [InlineData("LWPOLYLINE", "vertices")]
    [InlineData("POLYLINE", "SEQEND")]
    public void A_polyline_cut_off_between_vertices_is_refused_as_such(string kind, string part)
    {
        (double, double, double)[] vertices = [(0, 0, 0), (1, 0, 0), (1, 1, 0)];
        var text = kind == "POLYLINE" ? Polyline(vertices) : LwPolyline(vertices);
        var head = Drawing([text]).Split("  0\nENDSEC\n  0\nEOF\n")[0];
        var refusal = Refusal(head[..head.LastIndexOf(kind == "POLYLINE" ? "  0\nSEQEND" : " 10\n", StringComparison.Ordinal)]);
        Assert.Equal(DrawingFault.Truncated, refusal.Fault);
        Assert.Contains(part, refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Random_changes_of_bytes_give_an_outline_or_one_refusal()
    {
        var bytes = Encoding.ASCII.GetBytes(Small);
        var edit = Gen.Select(Gen.Int[0, bytes.Length - 1], Gen.Int[0, 3], Gen.OneOf(Gen.Byte, Gen.Const((byte)'\n'), Gen.Byte[48, 57]));
        edit.List[1, 6].Sample(edits =>
        {
            var changed = bytes.ToList();
            foreach (var (at, kind, value) in edits)
            {
                var place = Math.Min(at, changed.Count - 1);
                switch (kind)
                {
                    case 0:
                        changed.Insert(place, value);
                        break;
                    case 1:
                        changed.RemoveAt(place);
                        break;
                    case 2:
                        changed.AddRange(changed.GetRange(place / 2, Math.Min(40, changed.Count - place / 2)));
                        break;
                    default:
                        changed[place] = value;
                        break;
                }
            }

            try
            {
                DrawingOutliner.Outline(Read([.. changed]), new OutlineOptions { Unit = LengthUnit.Millimetre });
            }
            catch (DrawingException e)
            {
                Assert.NotEmpty(e.Message);
            }
        }, iter: 5_000);
    }
}
