namespace MeshSection.Geometry;

/// <summary>A straight edge.</summary>
/// <param name="Start">Where the edge begins.</param>
/// <param name="End">Where the edge ends.</param>
public sealed record LineEdge(Point Start, Point End) : Edge(Start, End)
{
    /// <inheritdoc/>
    public override double Length => Chord.Length;

    /// <inheritdoc/>
    public override Box Bounds => Box.Of(Start, End);

    /// <inheritdoc/>
    public override double Sag => 0;

    /// <inheritdoc/>
    public override double CapArea => 0;

    /// <inheritdoc/>
    public override bool IsFinite => Start.IsFinite && End.IsFinite;

    /// <inheritdoc/>
    public override Point PointAt(double t) => t <= 0 ? Start : t >= 1 ? End : Start + t * Chord;

    /// <inheritdoc/>
    public override Point VelocityAt(double t) => Chord;

    /// <inheritdoc/>
    public override Point TangentAt(double t) => Chord / Chord.Length;

    /// <inheritdoc/>
    public override Edge Reversed() => new LineEdge(End, Start);

    /// <inheritdoc/>
    public override Edge Part(double from, double to) => new LineEdge(PointAt(from), PointAt(to));

    /// <inheritdoc/>
    public override double Steps(double maxSag, double maxTurn) => 1;

    /// <inheritdoc/>
    public override Edge Placed(Placement placement) => new LineEdge(placement.Apply(Start), placement.Apply(End));

    /// <inheritdoc/>
    public override Edge Between(Point start, Point end) => new LineEdge(start, end);

    /// <inheritdoc/>
    public override IReadOnlyList<double> Turnings(Point direction) => [];

    /// <inheritdoc/>
    public override IReadOnlyList<double> Crossings(Point normal, double offset)
    {
        var from = normal.Dot(Start) - offset;
        var to = normal.Dot(End) - offset;
        return from * to < 0 ? [from / (from - to)] : [];
    }
}
