using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>Replaces the curves of an outline by chords whose ends lie on them.</summary>
/// <param name="MaxSag">Greatest distance of a chord from its curve, mm, positive.</param>
/// <param name="MaxTurn">Greatest turn of a curve over one chord, degrees, positive, at most 90.</param>
public sealed record Flattening(double MaxSag, double MaxTurn = 15)
{
    // Each round halves the chords that are in the way; no two sound curves are still crossed after this many.
    private const int MaxRounds = 40;

    /// <summary>A sag of a ten-thousandth of the outline's diagonal: too fine to be seen on a sheet.</summary>
    public static Flattening For(Outline outline) => new(1e-4 * outline.Bounds.Diagonal);

    /// <summary>
    /// Flattens an outline. Where chords of two curves would cross, as in a wall thinner than the sag, they are halved
    /// until they do not.
    /// </summary>
    public FlatOutline Apply(Outline outline)
    {
        var steps = outline.Boundaries
            .Select(b => b.Boundary.Edges.Select(e => (int)Math.Max(1, e.Steps(MaxSag, MaxTurn * Math.PI / 180))).ToArray())
            .ToArray();
        for (var round = 0; ; round++)
        {
            var flat = Chords(outline, steps);
            var crossed = ChordCrossings.Find(flat);
            if (crossed.Count == 0 || round == MaxRounds)
            {
                return flat;
            }

            foreach (var place in crossed)
            {
                steps[place.Boundary][place.Edge] *= 2;
            }
        }
    }

    private static FlatOutline Chords(Outline outline, int[][] steps)
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
                var edge = boundary.Edges[e];
                var count = steps[b][e];
                for (var i = 0; i < count; i++)
                {
                    var piece = count == 1 ? edge : edge.Part((double)i / count, (double)(i + 1) / count);
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
