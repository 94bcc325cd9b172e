using System.Text;
using MeshSection.Dxf.Entities;

namespace MeshSection.Dxf.Tags;

/// <summary>The errors of reading, each with its message.</summary>
internal static class ReadingFaults
{
    public static DrawingException Empty() =>
        new(DrawingFault.EmptyFile, "The file is empty. Export the drawing again as a DXF.");

    public static DrawingException Dwg() => new(
        DrawingFault.Dwg,
        "The file is a DWG, whatever its name ends with. Save the drawing as a DXF.");

    public static DrawingException Utf16() => new(
        DrawingFault.NotDxf,
        "The file is text in UTF-16, which no DXF is. Save it as a DXF, or as text in UTF-8.");

    public static DrawingException NotDxf(FilePlace place, string found) => new(
        DrawingFault.NotDxf,
        $"The file is no DXF: {place} should hold the group code 0 of a section or an entity, not {found}. " +
        "Save the drawing as a DXF.")
    { Place = place };

    public static DrawingException LongText(FilePlace place) => new(
        DrawingFault.NotDxf,
        $"The text at {place} is longer than a million characters; no DXF has such a text. Save the drawing as a DXF.")
    { Place = place };

    public static DrawingException GroupCode(FilePlace place, string found) => new(
        DrawingFault.BadGroupCode,
        $"{Wording.Capital(place)} should hold a group code that the format knows, not {found}. A line was added or lost above it, " +
        "or the file is damaged. Export the drawing again.")
    { Place = place };

    public static DrawingException CodeWithoutValue(FilePlace place, int code) => new(
        DrawingFault.Truncated,
        $"The file is cut off: it ends at {place} after the group code {code}, whose value is missing. " +
        "Export or copy the drawing again.")
    { Place = place, GroupCode = code };

    public static DrawingException CutBinary(FilePlace place) => new(
        DrawingFault.Truncated,
        $"The file is cut off: it ends at {place} in the middle of a value. Export or copy the drawing again.")
    { Place = place };

    public static DrawingException CutValue(FilePlace place, string found) => new(
        DrawingFault.Truncated,
        $"The file is cut off: it ends in {place} with {found}, without a line break and without the end mark EOF. " +
        "Export or copy the drawing again.")
    { Place = place };

    public static DrawingException CutSection(FilePlace place, string section) => new(
        DrawingFault.Truncated,
        $"The file is cut off: it ends at {place} in the section {section}, before any entity. " +
        "Export or copy the drawing again.")
    { Place = place };

    public static DrawingException CutEntity(FilePlace place, EntitySource source, string missing) => new(
        DrawingFault.Truncated,
        $"The file is cut off: it ends at {place} within {source}, which lacks {missing}. " +
        "Export or copy the drawing again.")
    { Place = place, Places = [new EntityPlace(source, null)] };

    /// <param name="tags">The tag whose value is no number.</param>
    /// <param name="owner">What the value belongs to.</param>
    /// <param name="source">The entity that it belongs to, if it is one.</param>
    public static DrawingException Number(TagReader tags, string owner, EntitySource? source = null)
    {
        if (tags.UnterminatedValue is { } cut)
        {
            return CutValue(tags.Place, $"'{cut}'");
        }

        return new DrawingException(
            DrawingFault.BadNumber,
            $"{Wording.Capital(tags.Place)}: group {tags.Code} of {owner} should be a finite number, whole where it counts something, " +
            $"not {Quoted(tags.Value)}." +
            (tags.Value.Contains((byte)',') ? " Numbers in a DXF have a decimal point, never a comma." : "") +
            " Export the drawing again.")
        { Place = tags.Place, GroupCode = tags.Code, Places = source is null ? [] : [new EntityPlace(source, null)] };
    }

    public static DrawingException Missing(EntitySource source, int code, string what) => new(
        DrawingFault.BadEntity,
        $"{source} ({source.Place}) lacks its {what}, group {code}. Export the drawing again, or delete the entity.")
    { Place = source.Place, GroupCode = code, Places = [new EntityPlace(source, null)] };

    public static DrawingException NegativeRadius(EntitySource source) => BadValue(source, 40, "a negative radius");

    /// <param name="source">The entity.</param>
    /// <param name="code">The group of the value.</param>
    /// <param name="what">What it has that makes no sense.</param>
    public static DrawingException BadValue(EntitySource source, int code, string what) => new(
        DrawingFault.BadEntity,
        $"{source} ({source.Place}) has {what} (group {code}). Draw it again, or delete it.")
    { Place = source.Place, GroupCode = code, Places = [new EntityPlace(source, null)] };

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
