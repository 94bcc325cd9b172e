using MeshSection.Dxf.Entities;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>Turns the entities used into pieces, and notes what has no length.</summary>
internal static class PieceList
{
    public static List<Piece> Of(List<Entity> entities, LocalFrame frame, List<DrawingNote> notes)
    {
        var pieces = new List<Piece>(entities.Count);
        var edges = new List<Edge>();
        foreach (var entity in entities)
        {
            edges.Clear();
            var dropped = EntityEdges.Append(entity, frame, edges);
            foreach (var edge in edges)
            {
                pieces.Add(new Piece(edge, entity));
            }

            if (dropped > 0)
            {
                var source = entity.Source;
                var what = edges.Count == 0 ? "has no length and was left out" : $"repeats {dropped} of its vertices; once is enough";
                notes.Add(DrawingNote.About(NoteCode.NoLength, $"{source} {what}.", source));
            }
        }

        return pieces;
    }
}
