using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>A closed loop of edges, each beginning exactly where the one before it ends.</summary>
public sealed class Boundary
{
    private Boundary(ImmutableArray<Edge> edges) => Edges = edges;

    /// <summary>The edges in running order; the last ends where the first begins.</summary>
    public ImmutableArray<Edge> Edges { get; }

    /// <summary>The length of the loop, mm.</summary>
    public double Length => Edges.Sum(e => e.Length);

    /// <summary>The smallest box that holds the loop.</summary>
    public Box Bounds => Edges.Aggregate(Box.Empty, (box, e) => box.With(e.Bounds));

    /// <summary>Area enclosed, mm²; positive if the loop runs counter-clockwise.</summary>
    public double SignedArea
    {
        get
        {
            // The polygon of the chords, and the caps on them.
            var anchor = Edges[0].Start;
            var area = 0.0;
            foreach (var edge in Edges)
            {
                area += 0.5 * (edge.Start - anchor).Cross(edge.End - anchor) + edge.CapArea;
            }

            return area;
        }
    }

    /// <summary>Makes a boundary of a chain of edges.</summary>
    /// <param name="edges">At least two edges, each beginning in the same bits in which the one before it ends.</param>
    /// <exception cref="ArgumentException">The chain is broken, open, or has fewer than two edges.</exception>
    public static Boundary Create(IEnumerable<Edge> edges)
    {
        var chain = edges.ToImmutableArray();
        if (chain.Length < 2)
        {
            throw new ArgumentException("A boundary needs at least two edges.", nameof(edges));
        }

        for (var i = 0; i < chain.Length; i++)
        {
            var next = chain[(i + 1) % chain.Length];
            if (chain[i].End != next.Start)
            {
                throw new ArgumentException($"Edge {i} ends at {chain[i].End}, the next begins at {next.Start}.", nameof(edges));
            }
        }

        return new Boundary(chain);
    }

    /// <summary>Makes a boundary of straight edges.</summary>
    /// <param name="corners">At least three corners; the last is not a repetition of the first.</param>
    public static Boundary Polygon(params ReadOnlySpan<Point> corners)
    {
        var edges = ImmutableArray.CreateBuilder<Edge>(corners.Length);
        for (var i = 0; i < corners.Length; i++)
        {
            edges.Add(new LineEdge(corners[i], corners[(i + 1) % corners.Length]));
        }

        return Create(edges);
    }

    /// <summary>A full circle, counter-clockwise, as two half circles.</summary>
    public static Boundary Circle(Point centre, double radius)
    {
        var right = centre + new Point(radius, 0);
        var left = centre - new Point(radius, 0);
        return Create([new ArcEdge(right, left, 1), new ArcEdge(left, right, 1)]);
    }

    /// <summary>The loop run through the other way.</summary>
    public Boundary Reversed() => new([.. Edges.Reverse().Select(e => e.Reversed())]);

    /// <summary>The loop moved, turned, mirrored or scaled; a mirrored loop runs the other way round.</summary>
    public Boundary Placed(Placement placement) => new([.. Edges.Select(e => e.Placed(placement))]);
}
