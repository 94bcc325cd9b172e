using MeshSection.Dxf.Curves;

namespace MeshSection.Dxf.Loops;

/// <summary>The greatest distance between ends that are joined, mm, and the lengths that it follows from.</summary>
/// <param name="Length">The greatest distance between two ends that are joined.</param>
/// <param name="IsGiven">True if the caller chose it.</param>
/// <param name="Sliver">The length below which an edge counts as a point.</param>
/// <param name="Shortest">The distance between the ends of the shortest edge that is no sliver.</param>
internal sealed record JoinGap(double Length, bool IsGiven, double Sliver, double Shortest)
{
    // Parts of the diagonal of all that is drawn. On a section 100 mm wide: gaps to 1 µm, slivers to 1 nm.
    private const double GapOverDiagonal = 1e-5;
    private const double SliverOverDiagonal = 1e-8;

    // With gaps of at most a quarter of the shortest edge, its two ends cannot be drawn together.
    private const double GapOverShortest = 0.25;

    public static JoinGap Of(List<Piece> pieces, LocalFrame frame, double? asked)
    {
        var sliver = SliverOverDiagonal * frame.Diagonal;
        var shortest = double.PositiveInfinity;
        var shortestPiece = pieces[0];
        foreach (var piece in pieces)
        {
            var length = piece.Edge.Chord.Length;
            if (length > sliver && length < shortest)
            {
                shortest = length;
                shortestPiece = piece;
            }
        }

        if (asked is not { } gap)
        {
            var chosen = Math.Min(GapOverDiagonal * frame.Diagonal, GapOverShortest * shortest);
            return new JoinGap(chosen, false, sliver, shortest);
        }

        if (!(gap >= 0 && double.IsFinite(gap)))
        {
            throw OutlineFaults.ToleranceIsNoLength(gap);
        }

        return gap * frame.Scale < shortest
            ? new JoinGap(gap * frame.Scale, true, sliver, shortest)
            : throw OutlineFaults.ToleranceTooLarge(gap, shortest / frame.Scale, shortestPiece, frame);
    }
}
