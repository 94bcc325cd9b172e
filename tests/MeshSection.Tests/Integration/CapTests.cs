using System.Collections.Immutable;
using CsCheck;
using MeshSection.Geometry;
using MeshSection.Integration;

namespace MeshSection.Tests.Integration;

public class CapTests
{
    private static readonly Gen<ArcEdge> AnyArc =
        from angle in Gen.Double[-Math.PI, Math.PI]
        from length in Gen.Double[1, 10]
        from bulge in Gen.OneOf(Gen.Double[1e-4, 0.3], Gen.Double[0.3, 3])
        from left in Gen.Bool
        select new ArcEdge(new Point(3, -2), new Point(3, -2) + length * Point.Direction(angle), left ? bulge : -bulge);

    [Fact]
    public void Closed_form_and_quadrature_agree() => AnyArc.Sample(arc =>
    {
        // Quadrature on pieces of at most 15 degrees, as on a flattened outline: caps of the pieces, and between the
        // arc's chord and theirs a polygon.
        var about = new Point(1, 1);
        var whole = new BoundaryMoments([arc, new LineEdge(arc.End, arc.Start)]).About(about);
        var count = (int)Math.Ceiling(Math.Abs(arc.Sweep) / (Math.PI / 12));
        var pieces = Enumerable.Range(0, count).Select(i => arc.Part((double)i / count, (i + 1.0) / count)).ToArray();
        var chords = pieces.Select(p => (Edge)new LineEdge(p.Start, p.End)).Append(new LineEdge(arc.End, arc.Start));
        var sum = new BoundaryMoments(chords).About(about);
        foreach (var piece in pieces)
        {
            sum += CapQuadrature.Moments(piece, about);
        }

        var scale = Math.Pow(arc.Length + 8, 2);
        Assert.Equal(whole.Area, sum.Area, 1e-13 * scale);
        Assert.Equal(whole.X, sum.X, 1e-13 * scale * 20);
        Assert.Equal(whole.Y, sum.Y, 1e-13 * scale * 20);
        Assert.Equal(whole.XX, sum.XX, 1e-13 * scale * 400);
        Assert.Equal(whole.YY, sum.YY, 1e-13 * scale * 400);
        Assert.Equal(whole.XY, sum.XY, 1e-13 * scale * 400);
    });

    [Fact]
    public void Series_and_closed_form_meet_where_one_takes_over()
    {
        // tan(α / 2) with α just to either side of the limit of 0.5.
        var below = Cap.Of(new ArcEdge(default, new Point(2, 0), Math.Tan(0.25 * (1 - 1e-13))));
        var above = Cap.Of(new ArcEdge(default, new Point(2, 0), Math.Tan(0.25 * (1 + 1e-13))));
        Assert.Equal(1, below.Area / above.Area, 1e-12);
        Assert.Equal(1, below.First / above.First, 1e-12);
        Assert.Equal(1, below.Along / above.Along, 1e-12);
        Assert.Equal(1, below.Across / above.Across, 1e-12);
    }

    [Theory]
    [InlineData(1e-3)]
    [InlineData(1e-6)]
    [InlineData(1e-9)]
    public void A_flat_cap_is_a_parabolic_segment(double bulge)
    {
        // Chord 2, rise b: area 2/3 · 2 b, centroid at 2/5 of the rise, Iy = chord³ rise / 30 (Young and Budynas,
        // Table A.1); the arc differs from the parabola by a part of the order of b².
        var cap = Cap.Of(new ArcEdge(default, new Point(2, 0), bulge));
        var tolerance = 2 * bulge * bulge + 1e-14;
        Assert.Equal(1, cap.Area / (4 * bulge / 3), tolerance);
        Assert.Equal(1, cap.First / (cap.Area * 0.4 * bulge), tolerance);
        Assert.Equal(1, cap.Along / (8 * bulge / 30), tolerance);
        Assert.Equal(1, cap.Across / (cap.Area * (8.0 / 35) * bulge * bulge), tolerance);
    }

    private sealed class BoundaryMoments(IEnumerable<Edge> edges)
    {
        private readonly ImmutableArray<Edge> _edges = [.. edges];

        public AreaMoments About(Point about)
        {
            var sum = default(AreaMoments);
            foreach (var edge in _edges)
            {
                sum += BoundaryIntegrator.EdgeMoments(edge, about);
            }

            return sum;
        }
    }
}
