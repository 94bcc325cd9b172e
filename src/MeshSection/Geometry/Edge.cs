namespace MeshSection.Geometry;

/// <summary>
/// One smooth piece of a boundary, run through from <see cref="Start"/> to <see cref="End"/> as a parameter t goes from 0
/// to 1: on lines and arcs the fraction of their length. The two end points are stored as given, never recomputed, so
/// that neighbouring edges meet in the same bits.
/// </summary>
/// <param name="Start">Where the edge begins.</param>
/// <param name="End">Where the edge ends.</param>
public abstract record Edge(Point Start, Point End)
{
    /// <summary>Length along the edge, never negative.</summary>
    public abstract double Length { get; }

    /// <summary>The smallest box that holds the edge.</summary>
    public abstract Box Bounds { get; }

    /// <summary>Greatest distance of the edge from its chord; 0 for a straight edge.</summary>
    public abstract double Sag { get; }

    /// <summary>The area between the edge and its chord, mm²: positive to the right of the chord; 0 for a straight edge.</summary>
    public abstract double CapArea { get; }

    /// <summary>True if every number that makes the edge is one that can be computed with.</summary>
    public abstract bool IsFinite { get; }

    /// <summary>The vector from start to end.</summary>
    public Point Chord => End - Start;

    /// <summary>The point at a parameter.</summary>
    /// <param name="t">0 at the start (exactly <see cref="Start"/>), 1 at the end (exactly <see cref="End"/>).</param>
    public abstract Point PointAt(double t);

    /// <summary>The derivative of the point with respect to the parameter, mm.</summary>
    /// <param name="t">The parameter, 0 to 1.</param>
    public abstract Point VelocityAt(double t);

    /// <summary>The unit vector along the edge, in its running direction.</summary>
    /// <param name="t">The parameter, 0 to 1.</param>
    public abstract Point TangentAt(double t);

    /// <summary>The same curve run through the other way.</summary>
    public abstract Edge Reversed();

    /// <summary>The piece between two parameters.</summary>
    /// <param name="from">Where the piece begins, 0 to 1.</param>
    /// <param name="to">Where the piece ends, greater than <paramref name="from"/>.</param>
    public abstract Edge Part(double from, double to);

    /// <summary>Into how many pieces of equal parameter the edge must be cut so that chords follow it closely enough.</summary>
    /// <param name="maxSag">Greatest distance allowed between a chord and its piece, positive.</param>
    /// <param name="maxTurn">Greatest turn of the tangent allowed over a piece, radians, positive.</param>
    public abstract double Steps(double maxSag, double maxTurn);

    /// <summary>The edge moved, turned, mirrored or scaled.</summary>
    /// <param name="placement">The similarity to apply to every point.</param>
    public abstract Edge Placed(Placement placement);

    /// <summary>The same shape between other ends: turned and stretched as a whole, so that angles stay.</summary>
    /// <param name="start">Where it begins.</param>
    /// <param name="end">Where it ends; not <paramref name="start"/>.</param>
    public abstract Edge Between(Point start, Point end);

    /// <summary>
    /// The parameters at which it runs at right angles to a direction, in rising order, ends
    /// excluded: where the distance along that direction may be extreme.
    /// </summary>
    /// <param name="direction">A vector that is not zero.</param>
    public abstract IReadOnlyList<double> Turnings(Point direction);

    /// <summary>
    /// The parameters at which it crosses the line n·p = c, in rising order, ends excluded.
    /// </summary>
    /// <param name="normal">n, a unit vector.</param>
    /// <param name="offset">c, the line's distance from the origin along n.</param>
    public abstract IReadOnlyList<double> Crossings(Point normal, double offset);
}
