using System.Text;
using MeshSection.Dxf.Entities;

namespace MeshSection.Dxf.Tags;

/// <summary>The errors of reading, each with its message.</summary>
internal static class ReadingFaults
{
    public static DrawingException Empty() =>
        new(DrawingFault.EmptyFile, "The file is empty. Export the drawing again as an ASCII DXF.");

    public static DrawingException Binary() => new(
        DrawingFault.BinaryDxf,
        "The file is a binary DXF, which is not read. Save the drawing as an ASCII DXF.");

    public static DrawingException Dwg() => new(
        DrawingFault.Dwg,
        "The file is a DWG, whatever its name ends with. Save the drawing as an ASCII DXF.");

    public static DrawingException Utf16() => new(
        DrawingFault.NotDxf,
        "The file is text in UTF-16, which no DXF is. Save it as an ASCII DXF, or as text in UTF-8.");

    public static DrawingException NotDxf(int line, string found) => new(
        DrawingFault.NotDxf,
        $"The file is no DXF: line {line} should hold the group code 0 of a section or an entity, not {found}. " +
        "Save the drawing as an ASCII DXF.")
    { Line = line };

    public static DrawingException LongLine(int line) => new(
        DrawingFault.NotDxf,
        $"Line {line} is longer than a million characters; no DXF has such a line. Save the drawing as an ASCII DXF.")
    { Line = line };

    public static DrawingException GroupCode(int line, string found) => new(
        DrawingFault.BadGroupCode,
        $"Line {line} should hold a group code, a whole number, not {found}. A line was added or lost above it, " +
        "or the file is damaged. Export the drawing again.")
    { Line = line };

    public static DrawingException CodeWithoutValue(int line, int code) => new(
        DrawingFault.Truncated,
        $"The file is cut off: it ends at line {line} after the group code {code}, whose value is missing. " +
        "Export or copy the drawing again.")
    { Line = line, GroupCode = code };

    public static DrawingException CutValue(int line, string found) => new(
        DrawingFault.Truncated,
        $"The file is cut off: it ends in line {line} with {found}, without a line break and without the end mark EOF. " +
        "Export or copy the drawing again.")
    { Line = line };

    public static DrawingException CutSection(int line, string section) => new(
        DrawingFault.Truncated,
        $"The file is cut off: it ends at line {line} in the section {section}, before any entity. " +
        "Export or copy the drawing again.")
    { Line = line };

    public static DrawingException CutEntity(int line, EntitySource source, string missing) => new(
        DrawingFault.Truncated,
        $"The file is cut off: it ends at line {line} within {source}, which lacks {missing}. " +
        "Export or copy the drawing again.")
    { Line = line, Places = [new EntityPlace(source, null)] };

    /// <param name="tags">The tag whose value is no number.</param>
    /// <param name="owner">What the value belongs to.</param>
    /// <param name="source">The entity that it belongs to, if it is one.</param>
    public static DrawingException Number(TagReader tags, string owner, EntitySource? source = null)
    {
        if (tags.UnterminatedValue is { } cut)
        {
            return CutValue(tags.Line, $"'{cut}'");
        }

        return new DrawingException(
            DrawingFault.BadNumber,
            $"Line {tags.Line}: group {tags.Code} of {owner} should be a finite number, whole where it counts something, " +
            $"not {Quoted(tags.Value)}." +
            (tags.Value.Contains((byte)',') ? " Numbers in a DXF have a decimal point, never a comma." : "") +
            " Export the drawing again.")
        { Line = tags.Line, GroupCode = tags.Code, Places = source is null ? [] : [new EntityPlace(source, null)] };
    }

    public static DrawingException Missing(EntitySource source, int code, string what) => new(
        DrawingFault.BadEntity,
        $"{source} (line {source.Line}) lacks its {what}, group {code}. Export the drawing again, or delete the entity.")
    { Line = source.Line, GroupCode = code, Places = [new EntityPlace(source, null)] };

    public static DrawingException NegativeRadius(EntitySource source) => new(
        DrawingFault.BadEntity,
        $"{source} (line {source.Line}) has a negative radius. Draw it again.")
    { Line = source.Line, GroupCode = 40, Places = [new EntityPlace(source, null)] };

    /// <summary>A value as a person can read it: printable, quoted, not too long.</summary>
    public static string Quoted(ReadOnlySpan<byte> value)
    {
        if (value.IsEmpty)
        {
            return "nothing";
        }

        var text = new StringBuilder("'");
        foreach (var b in value[..Math.Min(value.Length, 40)])
        {
            text.Append(b is >= 32 and < 127 ? (char)b : '?');
        }

        return text.Append(value.Length > 40 ? "…'" : "'").ToString();
    }
}
