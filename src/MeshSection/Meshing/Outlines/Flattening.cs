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
    /// Flattens an outline. Where chords of two curves would cross, as in a wall thinner than the sag, or one cuts off a
    /// point that the mesh is to keep, they are halved until they do not.
    /// </summary>
    /// <param name="outline">The outline.</param>
    /// <param name="constraints">What the mesh is to keep besides; null for nothing.</param>
    /// <exception cref="ConstraintException">The mesh cannot keep what it should.</exception>
    public FlatOutline Apply(Outline outline, MeshConstraints? constraints = null)
    {
        ArgumentNullException.ThrowIfNull(outline);
        var cuts = outline.Boundaries.Select(b => b.Boundary.Edges.Select(Cuts).ToArray()).ToArray();
        var flat = ChordChain.Of(outline, cuts);
        for (var round = 0; round < MaxRounds; round++)
        {
            var inTheWay = ChordCrossings.Find(flat);
            if (inTheWay.Count == 0 && constraints is not null)
            {
                inTheWay = ConstraintPlaces.CutOff(flat, constraints);
            }

            if (inTheWay.Count == 0)
            {
                break;
            }

            foreach (var place in inTheWay)
            {
                cuts[place.Boundary][place.Edge] = Halved(cuts[place.Boundary][place.Edge]);
            }

            flat = ChordChain.Of(outline, cuts);
        }

        return constraints is null ? flat : ConstraintInsertion.Run(flat, cuts, constraints);
    }

    /// <summary>The fractions of an edge's length at which its chords begin and end.</summary>
    private double[] Cuts(Edge edge)
    {
        var steps = (int)Math.Max(1, edge.Steps(MaxSag, MaxTurn * Math.PI / 180));
        return [.. Enumerable.Range(0, steps + 1).Select(i => (double)i / steps)];
    }

    private static double[] Halved(double[] cuts)
    {
        var steps = 2 * (cuts.Length - 1);
        return [.. Enumerable.Range(0, steps + 1).Select(i => (double)i / steps)];
    }
}
