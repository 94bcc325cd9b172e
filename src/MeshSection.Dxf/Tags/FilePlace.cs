using System.Globalization;

namespace MeshSection.Dxf.Tags;

/// <summary>A place in a file: a line of a text file, from 1, or a byte of a binary one, from 0.</summary>
/// <param name="Number">The number of the line or the byte.</param>
/// <param name="IsByte">True if it counts bytes.</param>
public readonly record struct FilePlace(long Number, bool IsByte = false)
{
    /// <summary>The place for a person: "line 214", "byte 4711".</summary>
    public override string ToString() =>
        (IsByte ? "byte " : "line ") + Number.ToString(CultureInfo.InvariantCulture);
}
