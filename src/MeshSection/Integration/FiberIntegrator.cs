using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Meshing;

namespace MeshSection.Integration;

/// <summary>
/// Integrals over a section, fiber by fiber: each triangle of the mesh exactly, and between the chords and the curves
/// that they stand for a sliver by quadrature, so that the sum is over the true outline. A triangle on a line is cut
/// there exactly.
/// </summary>
public sealed class FiberIntegrator : IIntegrator
{
    private readonly Mesh _mesh;
    private readonly ImmutableArray<Chord> _curved;

    /// <summary>Integrates over a mesh alone: the polygon of its chords.</summary>
    public FiberIntegrator(Mesh mesh)
        : this(mesh, [])
    {
    }

    /// <summary>Integrates over a mesh and the slivers between its chords and their curves: the true outline.</summary>
    public FiberIntegrator(Mesh mesh, FlatOutline flat)
        : this(mesh, [.. flat.Chords.Where(c => c.Curve.Sag > 0)])
    {
    }

    private FiberIntegrator(Mesh mesh, ImmutableArray<Chord> curved)
    {
        _mesh = mesh;
        _curved = curved;
    }

    /// <inheritdoc/>
    public AreaMoments Moments(Point about)
    {
        var nodes = _mesh.Nodes.AsSpan();
        var corners = _mesh.Corners.AsSpan();
        double area = 0, x = 0, y = 0, xx = 0, yy = 0, xy = 0;
        for (var i = 0; i < corners.Length; i += 3)
        {
            // On a triangle of area T: ∫ x = T Σx / 3 and ∫ x y = T (Σ xᵢ yᵢ + Σx Σy) / 12.
            var (a, b, c) = (nodes[corners[i]] - about, nodes[corners[i + 1]] - about, nodes[corners[i + 2]] - about);
            var t = 0.5 * (b - a).Cross(c - a);
            var (sumX, sumY) = (a.X + b.X + c.X, a.Y + b.Y + c.Y);
            area += t;
            x += t * sumX;
            y += t * sumY;
            xx += t * (a.X * a.X + b.X * b.X + c.X * c.X + sumX * sumX);
            yy += t * (a.Y * a.Y + b.Y * b.Y + c.Y * c.Y + sumY * sumY);
            xy += t * (a.X * a.Y + b.X * b.Y + c.X * c.Y + sumX * sumY);
        }

        var sum = new AreaMoments(area, x / 3, y / 3, xx / 12, yy / 12, xy / 12);
        foreach (var chord in _curved)
        {
            sum += CapQuadrature.Moments(chord.Curve, about);
        }

        return sum;
    }

    /// <inheritdoc/>
    public PartBeyond Beyond(Point normal, double offset)
    {
        var nodes = _mesh.Nodes.AsSpan();
        var corners = _mesh.Corners.AsSpan();
        double area = 0, moment = 0;
        for (var i = 0; i < corners.Length; i += 3)
        {
            var (a, b, c) = (nodes[corners[i]], nodes[corners[i + 1]], nodes[corners[i + 2]]);
            var part = TriangleCut.Beyond(
                0.5 * (b - a).Cross(c - a), normal.Dot(a) - offset, normal.Dot(b) - offset, normal.Dot(c) - offset);
            area += part.Area;
            moment += part.Moment;
        }

        foreach (var chord in _curved)
        {
            var part = CapQuadrature.Beyond(chord.Curve, normal, offset);
            area += part.Area;
            moment += part.Moment;
        }

        return new PartBeyond(area, moment);
    }

    /// <inheritdoc/>
    public (double From, double To) Gap(Point normal, double offset)
    {
        var (from, to) = (double.NegativeInfinity, double.PositiveInfinity);
        var corners = _mesh.Corners.AsSpan();
        for (var i = 0; i < corners.Length; i += 3)
        {
            var a = normal.Dot(_mesh.Nodes[corners[i]]);
            var b = normal.Dot(_mesh.Nodes[corners[i + 1]]);
            var c = normal.Dot(_mesh.Nodes[corners[i + 2]]);
            if (!Narrow(Math.Min(a, Math.Min(b, c)), Math.Max(a, Math.Max(b, c))))
            {
                return (offset, offset);
            }
        }

        foreach (var chord in _curved)
        {
            var (low, high) = Support.Range(chord.Curve, normal);
            if (!Narrow(low, high))
            {
                return (offset, offset);
            }
        }

        return (from, to);

        bool Narrow(double low, double high)
        {
            if (low < offset && high > offset)
            {
                return false;
            }

            (from, to) = high <= offset ? (Math.Max(from, high), to) : (from, Math.Min(to, low));
            return true;
        }
    }
}
