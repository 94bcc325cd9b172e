namespace MeshSection.Geometry;

/// <summary>
/// A circular arc given by its two ends and its bulge b = tan(sweep / 4): positive when it runs counter-clockwise, 1
/// for a half circle. The form that drawings use, and one in which the ends are exact however flat the arc is.
/// </summary>
/// <param name="Start">Where the arc begins.</param>
/// <param name="End">Where the arc ends; not the start (a full circle is two arcs).</param>
/// <param name="Bulge">b, finite and not zero; the rise of the arc over half its chord, to the right of the chord.</param>
public sealed record ArcEdge(Point Start, Point End, double Bulge) : Edge(Start, End)
{
    /// <summary>The angle run through, counter-clockwise positive, in (-2π, 2π), radians.</summary>
    public double Sweep => 4 * Math.Atan(Bulge);

    /// <summary>r = c (1 + b²) / (4 |b|), with c the length of the chord.</summary>
    public double Radius => Chord.Length * (1 + Bulge * Bulge) / (4 * Math.Abs(Bulge));

    /// <summary>The centre of the circle.</summary>
    public Point Centre => 0.5 * (Start + End) + (1 - Bulge * Bulge) / (4 * Bulge) * Chord.Left();

    /// <summary>The angle of the start as seen from the centre, radians.</summary>
    public double StartAngle
    {
        get
        {
            // From the chord, not from the centre: a flat arc has its centre far away.
            var outwards = Math.Atan2(Chord.Y, Chord.X) - 0.5 * Math.PI;
            return Bulge > 0 ? outwards - 0.5 * Sweep : outwards + Math.PI - 0.5 * Sweep;
        }
    }

    /// <inheritdoc/>
    public override double Length => Radius * Math.Abs(Sweep);

    /// <inheritdoc/>
    public override double Sag => 0.5 * Chord.Length * Math.Abs(Bulge);

    /// <inheritdoc/>
    public override double CapArea => Cap.Of(this).Area;

    /// <inheritdoc/>
    public override bool IsFinite => Start.IsFinite && End.IsFinite && Bulge != 0 && double.IsFinite(Bulge);

    /// <inheritdoc/>
    public override Box Bounds
    {
        get
        {
            var box = Box.Of(Start, End);
            foreach (var t in Turnings(Point.AlongX))
            {
                box = box.With(PointAt(t));
            }

            foreach (var t in Turnings(Point.AlongY))
            {
                box = box.With(PointAt(t));
            }

            return box;
        }
    }

    /// <inheritdoc/>
    public override Point PointAt(double t)
    {
        if (t <= 0)
        {
            return Start;
        }

        if (t >= 1)
        {
            return End;
        }

        // The chord to the point: 2 r sin(t θ/2) long, turned by (t - 1) θ/2 from the whole chord. The ratio of the
        // two sines stays exact as θ goes to 0, and the point is reached from the nearer end.
        if (t > 0.5)
        {
            return Reversed().PointAt(1 - t);
        }

        var half = 0.5 * Sweep;
        var ratio = Math.Sin(t * half) / Math.Sin(half);
        var (sin, cos) = Math.SinCos((t - 1) * half);
        var c = Chord;
        return Start + ratio * new Point(c.X * cos - c.Y * sin, c.X * sin + c.Y * cos);
    }

    /// <inheritdoc/>
    public override Point VelocityAt(double t) => Length * TangentAt(t);

    /// <inheritdoc/>
    public override Point TangentAt(double t)
    {
        var (sin, cos) = Math.SinCos((t - 0.5) * Sweep);
        var c = Chord / Chord.Length;
        return new Point(c.X * cos - c.Y * sin, c.X * sin + c.Y * cos);
    }

    /// <inheritdoc/>
    public override Edge Reversed() => new ArcEdge(End, Start, -Bulge);

    /// <inheritdoc/>
    public override Edge Part(double from, double to) =>
        new ArcEdge(PointAt(from), PointAt(to), Math.Tan(0.25 * (to - from) * Sweep));

    /// <inheritdoc/>
    public override double Steps(double maxSag, double maxTurn)
    {
        // A piece of sweep θ has the sag r (1 - cos θ/2) = 2 r sin² θ/4.
        var bySag = 4 * Math.Asin(Math.Min(1, Math.Sqrt(0.5 * maxSag / Radius)));
        return Math.Ceiling(Math.Abs(Sweep) / Math.Min(maxTurn, bySag) * (1 - 1e-12));
    }

    /// <inheritdoc/>
    public override Edge Placed(Placement placement) =>
        new ArcEdge(placement.Apply(Start), placement.Apply(End), placement.Mirrors ? -Bulge : Bulge);

    /// <inheritdoc/>
    public override Edge Between(Point start, Point end) => new ArcEdge(start, end, Bulge);

    /// <inheritdoc/>
    public override IReadOnlyList<double> Turnings(Point direction)
    {
        // The tangent turns steadily from -θ/2 to θ/2 about the chord's direction; it must be square to `direction`.
        var square = Math.Atan2(direction.Y, direction.X) + 0.5 * Math.PI - Math.Atan2(Chord.Y, Chord.X);
        return Fractions(square, square + Math.PI);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<double> Crossings(Point normal, double offset)
    {
        // Between its turnings the distance to the line runs one way, so each change of sign hides one root.
        var from = normal.Dot(Start) - offset;
        var to = normal.Dot(End) - offset;
        var roots = new List<double>(2);
        var stops = new List<double>(4) { 0 };
        stops.AddRange(Turnings(normal));
        stops.Add(1);
        var low = from;
        for (var i = 1; i < stops.Count; i++)
        {
            var high = i == stops.Count - 1 ? to : normal.Dot(PointAt(stops[i])) - offset;
            if (low * high < 0)
            {
                roots.Add(MonotoneRoot(normal, offset, stops[i - 1], stops[i], low));
            }
            else if (high == 0 && i < stops.Count - 1)
            {
                roots.Add(stops[i]);
            }

            low = high;
        }

        return roots;
    }

    private double MonotoneRoot(Point normal, double offset, double left, double right, double atLeft)
    {
        // Newton from the middle, kept inside a bracket that halves whenever a step would leave it.
        var t = 0.5 * (left + right);
        for (var step = 0; step < 80; step++)
        {
            var value = normal.Dot(PointAt(t)) - offset;
            if (value == 0)
            {
                return t;
            }

            if (value > 0 == atLeft > 0)
            {
                left = t;
            }
            else
            {
                right = t;
            }

            var next = t - value / (normal.Dot(TangentAt(t)) * Length);
            if (!(next > left && next < right))
            {
                next = 0.5 * (left + right);
            }

            if (Math.Abs(next - t) <= 2e-16)
            {
                return next;
            }

            t = next;
        }

        return t;
    }

    private List<double> Fractions(params ReadOnlySpan<double> anglesFromChord)
    {
        var sweep = Sweep;
        var fractions = new List<double>(4);
        foreach (var angle in anglesFromChord)
        {
            // Every turn of the angle that falls strictly inside (-|θ|/2, |θ|/2).
            var reduced = Math.IEEERemainder(angle, Math.Tau);
            for (var turn = -1; turn <= 1; turn++)
            {
                var t = (reduced + turn * Math.Tau) / sweep + 0.5;
                if (t > 0 && t < 1)
                {
                    fractions.Add(t);
                }
            }
        }

        fractions.Sort();
        return fractions;
    }
}
