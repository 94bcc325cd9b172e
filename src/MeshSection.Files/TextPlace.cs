using System.Globalization;

namespace MeshSection.Files;

/// <summary>A place in a text.</summary>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column in characters, from 1.</param>
public readonly record struct TextPlace(int Line, int Column)
{
    /// <summary>Line and column with a colon between, as editors take them.</summary>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{Line}:{Column}");
}
