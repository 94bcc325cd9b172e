using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Sections.Shapes;
using MeshSection.Torsion;

namespace MeshSection.Tests.Torsion;

public class TorsionConstantTests
{
    public static TheoryData<string> Names => [.. Solids.All.Select(s => s.Name)];

    [Theory]
    [MemberData(nameof(Names))]
    public void The_bounds_hold_the_known_value_on_every_mesh(string name)
    {
        var solid = Solids.Named(name);
        foreach (var triangles in new[] { 10, 80, 300 })
        {
            var p = TorsionPipeline.Of(solid.Boundaries, triangles);
            var slack = Math.Max(solid.Uncertainty, 1e-12) * solid.Constant;
            Assert.Equal(0, p.OutlineDeviation);
            Assert.True(p.TorsionConstant.Lower <= solid.Constant + slack, $"{p.TorsionConstant} above {solid.Constant}");
            Assert.True(p.TorsionConstant.Upper >= solid.Constant - slack, $"{p.TorsionConstant} below {solid.Constant}");
        }
    }

    [Theory]
    [InlineData("circle", 1e-8)]
    [InlineData("tube", 2e-8)]
    [InlineData("eccentric tube 50/20/20", 2e-5)]
    [InlineData("shaft with a round keyway", 5e-5)]
    [InlineData("semicircle", 2e-5)]
    [InlineData("square", 5e-5)]
    [InlineData("equilateral triangle", 2e-5)]
    [InlineData("rectangle 1:10", 2e-4)]
    [InlineData("L 100×10, sharp", 2e-3)]
    public void The_gap_is_small_at_some_800_triangles(string name, double gap) =>
        Assert.InRange(TorsionPipeline.Of(Solids.Named(name).Boundaries, 400).TorsionConstant.Gap, 0, gap);

    [Fact]
    public void Bounds_that_meet_in_their_last_digits_keep_their_order()
    {
        // A ring so thin that both fields are exact but for rounding, which puts the upper bound below the lower.
        var j = TorsionPipeline.Of(new Tube(200, 0.05).Boundaries(), 300).TorsionConstant;
        Assert.True(j.Lower <= j.Value && j.Value <= j.Upper, $"{j}");
        Assert.InRange(j.Gap, 0, 1e-11);
    }

    [Theory]
    [InlineData("square")]
    [InlineData("equilateral triangle")]
    [InlineData("L 100×10, sharp")]
    [InlineData("square tube 100×10")]
    [InlineData("I, sharp")]
    public void Each_refinement_draws_the_bounds_together(string name)
    {
        var rounds = TorsionPipeline.Refined(Solids.Named(name).Boundaries, 3);
        Assert.All(rounds.Zip(rounds.Skip(1)), pair =>
        {
            Assert.True(pair.Second.TorsionConstant.Lower > pair.First.TorsionConstant.Lower);
            Assert.True(pair.Second.TorsionConstant.Upper < pair.First.TorsionConstant.Upper);
        });
    }

    // Second-order triangles: the energy converges as h⁴ where the solution is smooth. At a re-entrant corner of 270° the
    // stress grows as r^(-1/3) and the energy converges as h^(4/3); at one of 300° (sector) as h^(6/5).
    [Theory]
    [InlineData("equilateral triangle", 4, 0.05)]
    [InlineData("eccentric tube 50/20/20", 4, 0.2)]
    [InlineData("square", 4, 0.35)]
    [InlineData("L 100×10, sharp", 4.0 / 3, 0.15)]
    [InlineData("sector of 300°", 6.0 / 5, 0.15)]
    public void The_gap_closes_at_the_rate_of_theory(string name, double order, double tolerance)
    {
        var gaps = TorsionPipeline.Refined(Solids.Named(name).Boundaries, 4, 10).Select(p => p.TorsionConstant.Gap).ToArray();
        Assert.Equal(order, Math.Log2(gaps[^2] / gaps[^1]), tolerance);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(1.2)]
    [InlineData(1.5)]
    [InlineData(2.5)]
    [InlineData(3)]
    [InlineData(4)]
    [InlineData(5)]
    public void Rectangles_follow_the_series(double ratio)
    {
        var p = TorsionPipeline.Of(Solids.Rectangle(ratio), 1500);
        var j = Solids.RectangleConstant(ratio);
        Assert.Equal(j, p.TorsionConstant.Value, 2e-6 * j);
        Assert.InRange(j, p.TorsionConstant.Lower, p.TorsionConstant.Upper);
    }

    [Fact]
    public void A_single_triangle_has_bounds_too()
    {
        var outline = Outline.Create(Solids.Triangle(1));
        var flat = Flattening.For(outline).Apply(outline);
        var mesh = new DelaunayMesher().Triangulate(flat.Graph, new MeshSettings(), TestContext.Current.CancellationToken);
        Assert.Equal(1, mesh.TriangleCount);
        var p = TorsionAnalysis.Of(flat, mesh);
        Assert.Equal(0, p.TorsionConstant.Lower);
        Assert.InRange(p.TorsionConstant.Upper, Math.Sqrt(3) / 80, Math.Sqrt(3) / 48);
    }

    [Fact]
    public void The_value_lies_midway_between_the_bounds()
    {
        var constant = new TorsionConstant(99, 101);
        Assert.Equal((100, 0.02), (constant.Value, constant.Gap));
    }

    [Fact]
    public void A_slit_turns_a_closed_tube_into_an_open_one()
    {
        var closed = TorsionPipeline.Of(new Tube(102, 2).Boundaries());
        Assert.Equal(2 * Math.PI * Math.Pow(50, 3) * 2, closed.TorsionConstant.Value, 1e-3 * closed.TorsionConstant.Value);
        var slit = TorsionPipeline.Of([ThinWalls.SlitTube(50, 2, 0.01)], 1500);
        // 2 π r t³ / 3, less 0.63 t⁴ / 3 for the two ends.
        var open = 2 * Math.PI * 50 * 8 / 3 - 0.63 * 16 / 3;
        Assert.Equal(open, slit.TorsionConstant.Value, 5e-3 * open);
    }
}
