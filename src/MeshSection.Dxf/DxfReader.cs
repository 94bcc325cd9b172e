using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Tags;

namespace MeshSection.Dxf;

/// <summary>
/// Reads DXF, ASCII or binary, of the releases R12 to R2018, and what older and newer ones share with them, in one pass
/// over the stream. What it mends is in <see cref="Drawing.Notes"/>; what it cannot read plainly it refuses.
/// </summary>
public sealed class DxfReader : IDrawingReader
{
    /// <inheritdoc/>
    public Drawing Read(Stream stream)
    {
        ArgumentNullException.ThrowIfNull(stream);
        return new SectionReader(TagReader.Of(stream)).Read();
    }
}
