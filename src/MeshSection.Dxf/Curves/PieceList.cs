using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>Turns the curves of the entities used into pieces, and notes what has no length.</summary>
internal static class PieceList
{
    public static List<Piece> Of(List<DrawnEntity> entities, LocalFrame frame, List<DrawingNote> notes)
    {
        var pieces = new List<Piece>(entities.Count);
        var edges = new List<Edge>();
        foreach (var drawn in entities)
        {
            edges.Clear();
            var dropped = 0;
            foreach (var curve in drawn.Curves)
            {
                dropped += CurveEdges.Append(curve, frame, edges);
            }

            foreach (var edge in edges)
            {
                pieces.Add(new Piece(edge, drawn.Placed));
            }

            if (dropped > 0 || edges.Count == 0)
            {
                var source = drawn.Placed.Source;
                var what = edges.Count == 0 ? "has no length and was left out" : $"repeats {dropped} of its vertices; once is enough";
                notes.Add(DrawingNote.About(NoteCode.NoLength, $"{source} {what}.", source));
            }
        }

        return pieces;
    }
}
