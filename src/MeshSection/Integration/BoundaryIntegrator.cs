using MeshSection.Geometry;

namespace MeshSection.Integration;

/// <summary>
/// Integrals over a section by Green's theorem around its boundaries, in closed form: every edge gives the triangle
/// between its chord and a fixed point, and a curve besides gives the cap on its chord. Exact but for rounding, with no
/// mesh; the cost is a few operations an edge.
/// </summary>
/// <param name="outline">The section's boundaries.</param>
public sealed class BoundaryIntegrator(Outline outline) : IIntegrator
{
    /// <inheritdoc/>
    public AreaMoments Moments(Point about)
    {
        var sum = default(AreaMoments);
        foreach (var nested in outline.Boundaries)
        {
            foreach (var edge in nested.Boundary.Edges)
            {
                sum += EdgeMoments(edge, about);
            }
        }

        return sum;
    }

    /// <summary>What one edge adds: the moments of the region between it and a point, about that point.</summary>
    internal static AreaMoments EdgeMoments(Edge edge, Point about)
    {
        // ∮ over a straight edge from a to b, with w = a × b (Green; see docs/integration.md).
        var (a, b) = (edge.Start - about, edge.End - about);
        var w = a.Cross(b);
        var triangle = new AreaMoments(
            w / 2,
            w * (a.X + b.X) / 6,
            w * (a.Y + b.Y) / 6,
            w * (a.X * a.X + a.X * b.X + b.X * b.X) / 12,
            w * (a.Y * a.Y + a.Y * b.Y + b.Y * b.Y) / 12,
            w * (a.X * b.Y + 2 * (a.X * a.Y + b.X * b.Y) + b.X * a.Y) / 24);
        return triangle + CapMoments.Of(edge, about);
    }

    /// <inheritdoc/>
    public PartBeyond Beyond(Point normal, double offset)
    {
        // In axes s along the line and d across it, ∫∫ dA over d > 0 is -∮ max(d, 0) ds and ∫∫ d dA is
        // -∮ max(d, 0)² / 2 ds: what runs below the line gives nothing, and neither does the line itself.
        var along = new Point(normal.Y, -normal.X);
        double area = 0, moment = 0;
        foreach (var nested in outline.Boundaries)
        {
            foreach (var edge in nested.Boundary.Edges)
            {
                var from = 0.0;
                var crossings = edge.Crossings(normal, offset);
                for (var i = 0; i <= crossings.Count; i++)
                {
                    var to = i < crossings.Count ? crossings[i] : 1;
                    if (normal.Dot(edge.PointAt(0.5 * (from + to))) > offset)
                    {
                        AddPiece(crossings.Count == 0 ? edge : edge.Part(from, to));
                    }

                    from = to;
                }
            }
        }

        return new PartBeyond(area, moment);

        void AddPiece(Edge piece)
        {
            if (piece.Start == piece.End)
            {
                // Two crossings nearer than the coordinates can tell, at a curve that grazes the line.
                return;
            }

            var d0 = Math.Max(0, normal.Dot(piece.Start) - offset);
            var d1 = Math.Max(0, normal.Dot(piece.End) - offset);
            var ds = along.Dot(piece.Chord);
            area -= ds * (d0 + d1) / 2;
            moment -= ds * (d0 * d0 + d0 * d1 + d1 * d1) / 6;
            var cap = CapMoments.Of(piece, piece.Start);
            area += cap.Area;
            moment += cap.Area * d0 + normal.Dot(new Point(cap.X, cap.Y));
        }
    }

    /// <inheritdoc/>
    public (double From, double To) Gap(Point normal, double offset)
    {
        var (from, to) = (double.NegativeInfinity, double.PositiveInfinity);
        foreach (var nested in outline.Boundaries)
        {
            foreach (var edge in nested.Boundary.Edges)
            {
                var (low, high) = Support.Range(edge, normal);
                if (low < offset && high > offset)
                {
                    return (offset, offset);
                }

                if (high <= offset)
                {
                    from = Math.Max(from, high);
                }
                else
                {
                    to = Math.Min(to, low);
                }
            }
        }

        return (from, to);
    }
}
