using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>
/// A rational Bézier curve, Σ wᵢ Pᵢ Bᵢ(t) / Σ wᵢ Bᵢ(t): the exact form of a piece of a spline or of an ellipse
/// [PieglTiller1997, chapter 1]. It turns one way only, by no more than a quarter of a turn; <see cref="BezierPieces"/>
/// cuts any curve into such pieces.
/// </summary>
public sealed record BezierEdge : Edge
{
    // More pieces than a flattening would ever ask for.
    private const int MostSteps = 100_000;

    // Where a piece rises by less than this part of the sag allowed, as at the tip of a needle, its turn does not count.
    private const double Unseen = 1e-6;

    // Weights within a piece: where they differ more, the zeros of the denominator are too near for quadrature of high
    // order; at this ratio the nearest lies two lengths of the piece away.
    private const double MostUneven = 1.5;

    /// <summary>Makes the edge.</summary>
    /// <param name="controls">P, at least three points; the curve starts at the first and ends at the last.</param>
    /// <param name="weights">w, one for each point, positive.</param>
    /// <exception cref="ArgumentException">There are too few points, or not as many weights.</exception>
    public BezierEdge(ImmutableArray<Point> controls, ImmutableArray<double> weights)
        : base(controls[0], controls[^1])
    {
        if (controls.Length < 3 || weights.Length != controls.Length)
        {
            throw new ArgumentException($"{controls.Length} points and {weights.Length} weights make no curve.", nameof(weights));
        }

        Controls = controls;
        Weights = weights;
    }

    /// <summary>P: the control points.</summary>
    public ImmutableArray<Point> Controls { get; }

    /// <summary>w: the weight of each control point.</summary>
    public ImmutableArray<double> Weights { get; }

    /// <inheritdoc/>
    public override double Length => GaussLegendre.Integral(t => VelocityAt(t).Length, Chord.Length);

    /// <inheritdoc/>
    public override bool IsFinite => Controls.All(p => p.IsFinite) && Weights.All(w => w > 0 && double.IsFinite(w));

    /// <inheritdoc/>
    public override double Sag
    {
        get
        {
            // Farthest from the chord it runs beside it. A part as short as the last digits has no chord.
            var sag = 0.0;
            if (Start == End)
            {
                return sag;
            }

            var across = Chord.Left() / Chord.Length;
            foreach (var t in Turnings(across))
            {
                sag = Math.Max(sag, Math.Abs(across.Dot(PointAt(t) - Start)));
            }

            return sag;
        }
    }

    /// <inheritdoc/>
    public override double CapArea =>
        GaussLegendre.Integral(t => 0.5 * OffsetAt(t).Cross(VelocityAt(t)), Chord.Dot(Chord));

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

        return Start + OffsetAt(t);
    }

    /// <summary>The way from the start to the point at a parameter, which loses no digits far from the origin.</summary>
    internal Point OffsetAt(double t)
    {
        Span<Homogeneous> steps = stackalloc Homogeneous[Controls.Length];
        Fill(steps);
        Reduce(steps, t, 1);
        return steps[0].Point;
    }

    /// <inheritdoc/>
    public override Point VelocityAt(double t)
    {
        // P' = n w₀ w₁ (P₁ - P₀) / w², with the last two points of de Casteljau's steps and the weight w that they give.
        Span<Homogeneous> steps = stackalloc Homogeneous[Controls.Length];
        Fill(steps);
        Reduce(steps, t, 2);
        var (a, b) = (steps[0], steps[1]);
        var w = (1 - t) * a.W + t * b.W;
        return (Controls.Length - 1) * a.W * b.W / (w * w) * (b.Point - a.Point);
    }

    /// <inheritdoc/>
    public override Point TangentAt(double t)
    {
        var velocity = VelocityAt(t);
        if (velocity.Length > 1e-12 * Chord.Length)
        {
            return velocity / velocity.Length;
        }

        // It comes to rest, where control points coincide: the tangent is the direction of the nearest that does not.
        var at = PointAt(t);
        for (var i = 1; i < Controls.Length; i++)
        {
            var way = t < 0.5 ? Controls[i] - at : at - Controls[^(i + 1)];
            if (way.Length > 1e-12 * Chord.Length)
            {
                return way / way.Length;
            }
        }

        return Chord / Chord.Length;
    }

    /// <inheritdoc/>
    public override Edge Reversed() => new BezierEdge([.. Controls.Reverse()], [.. Weights.Reverse()]);

    /// <inheritdoc/>
    public override Edge Part(double from, double to)
    {
        Span<Homogeneous> steps = stackalloc Homogeneous[Controls.Length];
        Fill(steps);
        if (to < 1)
        {
            KeepLeft(steps, to);
        }

        if (from > 0)
        {
            Reduce(steps, from / Math.Min(to, 1), steps.Length, keepsRight: true);
        }

        var controls = ImmutableArray.CreateBuilder<Point>(steps.Length);
        var weights = ImmutableArray.CreateBuilder<double>(steps.Length);
        foreach (var step in steps)
        {
            controls.Add(Start + step.Point);
            weights.Add(step.W);
        }

        controls[0] = PointAt(from);
        controls[^1] = PointAt(to);
        return new BezierEdge(controls.MoveToImmutable(), weights.MoveToImmutable());
    }

    /// <inheritdoc/>
    public override double Steps(double maxSag, double maxTurn)
    {
        // As many as the turn asks for at least, then more until every piece keeps to the limits.
        var (first, last) = (TangentAt(0), TangentAt(1));
        var turn = Math.Abs(Math.Atan2(first.Cross(last), first.Dot(last)));
        var steps = Math.Max(1, Math.Ceiling(Math.Max(turn / maxTurn, Math.Sqrt(Sag / maxSag)) * (1 - 1e-12)));
        while (steps < MostSteps && !Keeps((int)steps, maxSag, maxTurn))
        {
            steps = Math.Ceiling(1.25 * steps);
        }

        return steps;
    }

    /// <inheritdoc/>
    public override Edge Placed(Placement placement) =>
        new BezierEdge([.. Controls.Select(placement.Apply)], Weights);

    /// <inheritdoc/>
    public override Edge Between(Point start, Point end)
    {
        // The similarity that takes the old ends to the new ones, as a complex factor on the way from the start.
        var chord = Chord;
        var factor = new Point(chord.Dot(end - start), chord.Cross(end - start)) / chord.Dot(chord);
        var controls = ImmutableArray.CreateBuilder<Point>(Controls.Length);
        foreach (var control in Controls)
        {
            var way = control - Start;
            controls.Add(start + new Point(way.X * factor.X - way.Y * factor.Y, way.X * factor.Y + way.Y * factor.X));
        }

        controls[0] = start;
        controls[^1] = end;
        return new BezierEdge(controls.MoveToImmutable(), Weights);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<double> Turnings(Point direction) => Bernstein.SignChanges(SlopeAlong(direction));

    /// <summary>The parameters at which the way to a point is at right angles to the curve, in rising order, ends excluded.</summary>
    internal List<double> Perpendiculars(Point point)
    {
        // (P - p) · P' times W³, with X = W (P - p) along x and Y along y.
        var first = Bernstein.Product(Along(Point.AlongX, point), SlopeAlong(Point.AlongX));
        var second = Bernstein.Product(Along(Point.AlongY, point), SlopeAlong(Point.AlongY));
        for (var i = 0; i < first.Length; i++)
        {
            first[i] += second[i];
        }

        return Bernstein.SignChanges(first);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<double> Crossings(Point normal, double offset)
    {
        Span<double> distance = stackalloc double[Controls.Length];
        for (var i = 0; i < distance.Length; i++)
        {
            distance[i] = Weights[i] * (normal.Dot(Controls[i]) - offset);
        }

        return Bernstein.SignChanges(distance);
    }

    /// <summary>True if both run through the same points with the same weights.</summary>
    public bool Equals(BezierEdge? other) =>
        other is not null && Controls.SequenceEqual(other.Controls) && Weights.SequenceEqual(other.Weights);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Start, End, Controls.Length);

    /// <summary>W times the distance from a point along a direction, as Bernstein coefficients.</summary>
    private double[] Along(Point direction, Point from)
    {
        var along = new double[Controls.Length];
        for (var i = 0; i < along.Length; i++)
        {
            along[i] = Weights[i] * direction.Dot(Controls[i] - from);
        }

        return along;
    }

    /// <summary>The numerator of the derivative of X / W along a direction: X' W - X W'; with equal weights X' alone.</summary>
    private double[] SlopeAlong(Point direction)
    {
        var x = Along(direction, Start);
        var slope = Bernstein.Derivative(x);
        if (Weights.AsSpan().IndexOfAnyExcept(Weights[0]) < 0)
        {
            return slope;
        }

        var first = Bernstein.Product(slope, Weights.AsSpan());
        var second = Bernstein.Product(x, Bernstein.Derivative(Weights.AsSpan()));
        for (var i = 0; i < first.Length; i++)
        {
            first[i] -= second[i];
        }

        return first;
    }

    private bool Keeps(int steps, double maxSag, double maxTurn)
    {
        var (turn, tangent) = (Math.Cos(Math.Min(maxTurn, Math.PI)) - 1e-12, TangentAt(0));
        for (var i = 0; i < steps; i++)
        {
            var next = TangentAt((i + 1.0) / steps);
            var part = (BezierEdge)Part((double)i / steps, (i + 1.0) / steps);
            var sag = part.Sag;
            var turnsTooFar = tangent.Dot(next) < turn && sag > Unseen * maxSag;
            if (turnsTooFar || sag > maxSag || part.Weights.Max() > MostUneven * part.Weights.Min())
            {
                return false;
            }

            tangent = next;
        }

        return true;
    }

    /// <summary>The control points as seen from the start.</summary>
    private void Fill(Span<Homogeneous> steps)
    {
        for (var i = 0; i < steps.Length; i++)
        {
            var way = Controls[i] - Start;
            steps[i] = new Homogeneous(Weights[i] * way.X, Weights[i] * way.Y, Weights[i]);
        }
    }

    /// <summary>De Casteljau's steps until so many points are left; all rows' last points stay if the right part is wanted.</summary>
    private static void Reduce(Span<Homogeneous> steps, double t, int left, bool keepsRight = false)
    {
        for (var last = steps.Length - 1; last >= (keepsRight ? 1 : left); last--)
        {
            for (var i = 0; i < last; i++)
            {
                steps[i] = Homogeneous.Between(steps[i], steps[i + 1], t);
            }
        }
    }

    private static void KeepLeft(Span<Homogeneous> steps, double t)
    {
        for (var first = 1; first < steps.Length; first++)
        {
            for (var i = steps.Length - 1; i >= first; i--)
            {
                steps[i] = Homogeneous.Between(steps[i - 1], steps[i], t);
            }
        }
    }

    /// <summary>A control point times its weight, and the weight.</summary>
    private readonly record struct Homogeneous(double X, double Y, double W)
    {
        public Point Point => new(X / W, Y / W);

        public static Homogeneous Between(Homogeneous a, Homogeneous b, double t) =>
            new((1 - t) * a.X + t * b.X, (1 - t) * a.Y + t * b.Y, (1 - t) * a.W + t * b.W);
    }
}
