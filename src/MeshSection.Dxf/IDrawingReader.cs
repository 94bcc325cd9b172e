using MeshSection.Dxf.Entities;

namespace MeshSection.Dxf;

/// <summary>Reads drawings of one format.</summary>
public interface IDrawingReader
{
    /// <summary>Reads a drawing.</summary>
    /// <param name="stream">The bytes of the drawing, read from where the stream stands to its end.</param>
    /// <returns>The entities with their layers and unit.</returns>
    /// <exception cref="DrawingException">The bytes are no drawing of this format, or a damaged one.</exception>
    Drawing Read(Stream stream);
}
