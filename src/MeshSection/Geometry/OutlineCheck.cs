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
        CheckAreas(loops, size, origin);
        new ContactSearch(loops, TouchRatio * size, origin).Run();
    }

    private static void CheckNumbers(ImmutableArray<Boundary> loops, Point origin)
    {
        for (var b = 0; b < loops.Length; b++)
        {
            for (var e = 0; e < loops[b].Edges.Length; e++)
            {
                var edge = loops[b].Edges[e];
                if (!edge.Start.IsFinite || edge is ArcEdge { Bulge: var bulge } && (bulge == 0 || !double.IsFinite(bulge)))
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

    private static void CheckAreas(ImmutableArray<Boundary> loops, double size, Point origin)
    {
        for (var b = 0; b < loops.Length; b++)
        {
            // Relative to the loop's own box on both sides, so that a thin plate is not taken for nothing.
            var scale = loops[b].Length * Math.Max(loops[b].Bounds.Diagonal, AreaRatio * size);
            if (Math.Abs(loops[b].SignedArea) <= AreaRatio * scale)
            {
                throw new OutlineException(
                    OutlineFault.NoArea, origin + loops[b].Edges[0].Start, new EdgePlace(b, 0));
            }
        }
    }
}
