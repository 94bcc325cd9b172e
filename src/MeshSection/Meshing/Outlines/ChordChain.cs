using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>Cuts the edges of an outline into chords.</summary>
internal static class ChordChain
{
    /// <summary>The chords of an outline.</summary>
    /// <param name="outline">The outline.</param>
    /// <param name="cuts">Of each edge of each boundary, the fractions of its length to cut at, from 0 to 1, rising.</param>
    public static FlatOutline Of(Outline outline, double[][][] cuts)
    {
        var chords = ImmutableArray.CreateBuilder<Chord>();
        var points = ImmutableArray.CreateBuilder<Point>();
        var segments = ImmutableArray.CreateBuilder<Segment>();
        var maxSag = 0.0;
        for (var b = 0; b < outline.Boundaries.Length; b++)
        {
            var (boundary, region) = (outline.Boundaries[b].Boundary, outline.Boundaries[b].Region);
            var first = points.Count;
            for (var e = 0; e < boundary.Edges.Length; e++)
            {
                var (edge, fractions) = (boundary.Edges[e], cuts[b][e]);
                for (var i = 1; i < fractions.Length; i++)
                {
                    var piece = fractions.Length == 2 ? edge : edge.Part(fractions[i - 1], fractions[i]);
                    maxSag = Math.Max(maxSag, piece.Sag);
                    chords.Add(new Chord(piece, new EdgePlace(b, e)));
                    points.Add(piece.Start);
                    segments.Add(new Segment(points.Count - 1, points.Count, region, -1));
                }
            }

            segments[^1] = segments[^1] with { To = first };
        }

        return new FlatOutline(
            outline, chords.ToImmutable(), new PlanarGraph(points.ToImmutable(), segments.ToImmutable()), maxSag);
    }
}
