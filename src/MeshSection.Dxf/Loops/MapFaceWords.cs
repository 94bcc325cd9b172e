using MeshSection.Dxf.Curves;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>A face of a map as an error names it.</summary>
/// <param name="Text">Its area and a point in it, in the drawing's axes and unit.</param>
internal sealed record MapFaceWords(string Text)
{
    public static MapFaceWords Of(MapFace face, LocalFrame frame)
    {
        var at = frame.ToDrawing(face.Inside);
        var area = face.Area / frame.Scale / frame.Scale;
        return new MapFaceWords($"{Wording.Distance(area)} around {Wording.At(at)}");
    }
}
