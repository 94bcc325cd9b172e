using MeshSection.Dxf.Entities;
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

            if (drawn.Placed.Entity is SplineEntity { Spline.Controls.IsEmpty: true })
            {
                notes.Add(DrawingNote.About(
                    NoteCode.SplineInterpolated,
                    $"{drawn.Placed.Source} states only points that it runs through: it was taken as the cubic of continuous curvature " +
                    "through them, with chord lengths as parameter, which another program may draw a little otherwise.",
                    drawn.Placed.Source));
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
