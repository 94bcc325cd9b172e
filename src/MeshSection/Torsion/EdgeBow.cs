using MeshSection.Geometry;

namespace MeshSection.Torsion;

/// <summary>
/// How a curved edge of a triangle bows away from its chord: with t from 0 to 1 along the edge,
/// g(t) = (curve(t) - chord(t)) / (t (1 - t)) and its derivative, at the integration points of the triangle.
/// </summary>
internal sealed class EdgeBow
{
    /// <summary>Samples a curve.</summary>
    /// <param name="curve">The curve, along the edge with the triangle on its left.</param>
    /// <param name="side">k, of the edge opposite corner k: where t = (1 + λᵦ - λₐ)/2 from corner a to b.</param>
    public EdgeBow(Edge curve, int side)
    {
        Curve = curve;
        var rule = TriangleRule.Curved;
        Values = new Point[rule.Count];
        Slopes = new Point[rule.Count];
        for (var q = 0; q < rule.Count; q++)
        {
            var (xi, eta) = (rule.Xi[q], rule.Eta[q]);
            var difference = side switch { 0 => eta - xi, 1 => 1 - xi - 2 * eta, _ => 2 * xi + eta - 1 };
            var t = 0.5 * (1 + difference);
            var bubble = t * (1 - t);
            Values[q] = (curve.PointAt(t) - curve.Start - t * curve.Chord) / bubble;
            Slopes[q] = (curve.VelocityAt(t) - curve.Chord - (1 - 2 * t) * Values[q]) / bubble;
        }
    }

    /// <summary>The curve itself, in the outline's coordinates.</summary>
    public Edge Curve { get; }

    /// <summary>g at each integration point, mm.</summary>
    public Point[] Values { get; }

    /// <summary>dg/dt at each integration point, mm.</summary>
    public Point[] Slopes { get; }
}
