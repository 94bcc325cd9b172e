using MeshSection.Cli.Inputs;
using MeshSection.Dxf;
using MeshSection.Plots;

namespace MeshSection.Cli.Commands;

/// <summary>What was repaired, left out and found beside the boundaries of a drawing, for its picture.</summary>
internal static class DrawingFindings
{
    /// <summary>A mark for each repair and caution that has a place, every line that took no part, faces and bars, which need none.</summary>
    public static OutlineFindings Of(SectionInput input)
    {
        if (input.Drawing is not { Report: var report } drawing)
        {
            return OutlineFindings.None;
        }

        return new OutlineFindings(
            [
                .. report.Repairs.Concat(report.Cautions)
                    .Where(note => note.Point is not null && note.Code is not (NoteCode.DanglingLeftOut or NoteCode.RegionsOverlap))
                    .Select(note => new OutlineMark(report.Unit.Millimetres * note.Point!.Value, note.Name)),
            ],
            [.. drawing.LeftOut.Select(l => new OutlinePiece(l.Edge, l.LeadsNowhere ? PieceRole.LeadsNowhere : PieceRole.LeftOut))],
            [.. drawing.Bars.Select(b => new OutlineBar(b.Place, b.Diameter))],
            [.. drawing.Faces.Select(f => new OutlineFace(f.Layer, f.Boundaries))]);
    }
}
