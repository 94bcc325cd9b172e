using System.Globalization;
using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Tags;
using MeshSection.Geometry;

namespace MeshSection.Dxf;

/// <summary>How numbers and entities are put in messages.</summary>
internal static class Wording
{
    private const int LongestName = 80;

    /// <summary>A coordinate: ten digits, so that rounding in the last ones does not show.</summary>
    public static string Coordinate(double value) =>
        (value + 0.0).ToString("G10", CultureInfo.InvariantCulture);

    /// <summary>A place at the beginning of a sentence.</summary>
    public static string Capital(FilePlace place) => place.IsByte ? $"At {place}" : $"L{place.ToString()[1..]}";

    /// <summary>A place; a coordinate that is nothing but rounding beside the other is 0.</summary>
    public static string At(Point p)
    {
        var rounding = 1e-13 * Math.Max(Math.Abs(p.X), Math.Abs(p.Y));
        return $"({Coordinate(Math.Abs(p.X) > rounding ? p.X : 0)}, {Coordinate(Math.Abs(p.Y) > rounding ? p.Y : 0)})";
    }

    /// <summary>A distance: four digits.</summary>
    public static string Distance(double value) => value.ToString("G4", CultureInfo.InvariantCulture);

    /// <summary>A name of the drawing as a message shows it: printable, and not too long.</summary>
    public static string Shown(string name)
    {
        var shown = name.Length > LongestName ? name[..LongestName] + "…" : name;
        return shown.Any(char.IsControl) ? string.Concat(shown.Select(c => char.IsControl(c) ? '?' : c)) : shown;
    }

    /// <summary>The entities by name, each once, at most five, and their layers.</summary>
    public static string Names(IEnumerable<EntitySource> sources)
    {
        var distinct = sources.Distinct().ToList();
        var names = string.Join(", ", distinct.Take(5).Select(s => s.Name));
        var layers = distinct.Select(s => Shown(s.Layer)).Distinct(StringComparer.OrdinalIgnoreCase).Take(3).ToList();
        var more = distinct.Count > 5 ? $" and {distinct.Count - 5} more" : "";
        return $"{names}{more} on layer{(layers.Count > 1 ? "s" : "")} '{string.Join("', '", layers)}'";
    }
}
