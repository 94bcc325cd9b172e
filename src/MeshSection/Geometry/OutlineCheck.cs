using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>
/// Makes sure that boundaries are sound: finite, with area, crossing and touching neither themselves nor each other.
/// Two edges touch if they come nearer than 1e-10 of the outline's diagonal: less than the last digits of a drawing
/// can tell apart, and a millionth of the thinnest ligament that a mesh could resolve.
/// </summary>
internal static class OutlineCheck
{
    private const double TouchRatio = 1e-10;
    private const double AreaRatio = 1e-14;

    public static void Run(ImmutableArray<Boundary> loops, Point origin)
    {
        if (loops.IsEmpty)
        {
            throw new OutlineException(OutlineFault.Empty);
        }

        CheckNumbers(loops, origin);
        var size = loops.Aggregate(Box.Empty, (box, b) => box.With(b.Bounds)).Diagonal;
        new ContactSearch(loops, TouchRatio * size, origin).Run();
    }

    private static void CheckNumbers(ImmutableArray<Boundary> loops, Point origin)
    {
        for (var b = 0; b < loops.Length; b++)
        {
            for (var e = 0; e < loops[b].Edges.Length; e++)
            {
                var edge = loops[b].Edges[e];
                if (!edge.IsFinite)
                {
                    throw new OutlineException(OutlineFault.NotFinite, origin + edge.Start, new EdgePlace(b, e));
                }

                if (edge.Start == edge.End)
                {
                    throw new OutlineException(OutlineFault.NoLength, origin + edge.Start, new EdgePlace(b, e));
                }
            }
        }
    }

    /// <summary>True if a boundary encloses nothing, beside what its own box could hold.</summary>
    public static bool HasNoArea(Boundary loop) =>
        Math.Abs(loop.SignedArea) <= AreaRatio * loop.Length * loop.Bounds.Diagonal;
}
