using CsCheck;
using MeshSection.Geometry;
using MeshSection.Properties;
using MeshSection.Sections.Shapes;
using MeshSection.Tests.Sections.Shapes;

namespace MeshSection.Tests.Properties;

/// <summary>Laws that hold for every section, over every starter shape.</summary>
public class PropertiesLawsTests
{
    private const int Iterations = 25;

    public static TheoryData<string> Shapes => [.. ShapeCases.All.Keys];

    [Theory]
    [MemberData(nameof(Shapes))]
    public void Both_integrators_agree_and_the_chords_are_near(string shape) => ShapeCases.All[shape].Sample(
        s =>
        {
            var p = Pipeline.Properties(Outline.Create(s.Boundaries()), 100);
            Assert.All(p.CrossChecks, check => Assert.True(check.Difference < 1e-12, $"{check}"));
            Assert.InRange(Math.Abs(p.Chords.Area), 0, 0.02);
        },
        iter: Iterations);

    [Theory]
    [MemberData(nameof(Shapes))]
    public void A_shift_moves_the_centroid_and_nothing_else(string shape) =>
        Gen.Select(ShapeCases.All[shape], Gen.Double[-1e3, 1e3], Gen.Double[-1e3, 1e3]).Sample(
            (s, dx, dy) =>
            {
                var (home, away) = (Of(s, default), Of(s, Placement.Moved(dx, dy)));
                var size = home.BoundingBox.Diagonal;
                Assert.Equal(home.Centroid.X + dx, away.Centroid.X, 1e-11 * (1e3 + size));
                Assert.Equal(home.Centroid.Y + dy, away.Centroid.Y, 1e-11 * (1e3 + size));
                // Coordinates of 1e3 keep 1e-13; the thinnest walls here are a hundredth of the section.
                Same(home.Area, away.Area, 1e-10);
                Same(home.SecondMoment.X, away.SecondMoment.X, 1e-10);
                Same(home.SecondMoment.Y, away.SecondMoment.Y, 1e-10);
                Same(home.PlasticX.Modulus, away.PlasticX.Modulus, 1e-10);
                Same(home.Plastic2.Modulus, away.Plastic2.Modulus, 1e-6);
                // Steiner's theorem, to the drawing's own origin.
                var c = away.Centroid;
                Assert.Equal(away.SecondMoment.X + away.Area * c.Y * c.Y, away.SecondMomentDatum.X, 1e-9 * away.SecondMomentDatum.X);
                Assert.Equal(away.Area * c.Y, away.FirstMomentDatum.X, 1e-9 * Math.Abs(away.Area * c.Y));
            },
            iter: Iterations);

    [Theory]
    [MemberData(nameof(Shapes))]
    public void A_turn_turns_the_axes_and_keeps_the_invariants(string shape) =>
        Gen.Select(ShapeCases.All[shape], Gen.Double[-Math.PI, Math.PI]).Sample(
            (s, turn) =>
            {
                var (home, turned) = (Of(s, default), Of(s, new Placement(default, turn)));
                Same(home.Area, turned.Area, 1e-11);
                Same(home.Perimeter, turned.Perimeter, 1e-11);
                Same(home.SecondMoment.Polar, turned.SecondMoment.Polar, 1e-11);
                Same(home.Principal.I1, turned.Principal.I1, 1e-10);
                Same(home.Principal.I2, turned.Principal.I2, 1e-8);
                if (home.Principal.I1 > 1.001 * home.Principal.I2)
                {
                    var off = Math.IEEERemainder(home.Principal.Angle + turn * 180 / Math.PI - turned.Principal.Angle, 180);
                    Assert.Equal(0, off, 1e-6);
                    Same(home.Plastic1.Modulus, turned.Plastic1.Modulus, 1e-6);
                    Same(home.Elastic1.Governing.Modulus, turned.Elastic1.Governing.Modulus, 1e-6);
                    Same(home.Elastic2.Governing.Modulus, turned.Elastic2.Governing.Modulus, 1e-6);
                }
            },
            iter: Iterations);

    [Theory]
    [MemberData(nameof(Shapes))]
    public void A_quarter_turn_swaps_x_and_y(string shape) => ShapeCases.All[shape].Sample(
        s =>
        {
            var (home, turned) = (Of(s, default), Of(s, new Placement(default, Math.PI / 2)));
            Same(home.SecondMoment.X, turned.SecondMoment.Y, 1e-12);
            Assert.Equal(-home.SecondMoment.XY, turned.SecondMoment.XY, 1e-11 * home.SecondMoment.Polar);
            Same(home.ElasticX.Positive.Modulus, turned.ElasticY.Negative.Modulus, 1e-12);
            Same(home.ElasticY.Positive.Modulus, turned.ElasticX.Positive.Modulus, 1e-12);
            Same(home.PlasticX.Modulus, turned.PlasticY.Modulus, 1e-12);
        },
        iter: Iterations);

    [Theory]
    [MemberData(nameof(Shapes))]
    public void A_mirror_swaps_left_and_right(string shape) => ShapeCases.All[shape].Sample(
        s =>
        {
            var (home, mirrored) = (Of(s, default), Of(s, new Placement(default, Mirrors: true)));
            Same(home.Area, mirrored.Area, 1e-13);
            Same(home.SecondMoment.Y, mirrored.SecondMoment.Y, 1e-13);
            Assert.Equal(-home.SecondMoment.XY, mirrored.SecondMoment.XY, 1e-12 * home.SecondMoment.Polar);
            Same(home.ElasticY.Positive.Modulus, mirrored.ElasticY.Negative.Modulus, 1e-12);
            Same(home.ElasticX.Positive.Modulus, mirrored.ElasticX.Positive.Modulus, 1e-12);
        },
        iter: Iterations);

    [Theory]
    [MemberData(nameof(Shapes))]
    public void A_scale_goes_with_the_power_of_the_length(string shape) =>
        Gen.Select(ShapeCases.All[shape], Gen.Double[-6, 6]).Sample(
            (s, power) =>
            {
                var k = Math.Pow(10, power);
                var (home, scaled) = (Of(s, default), Of(s, new Placement(default, Scale: k)));
                Same(k * home.Perimeter, scaled.Perimeter, 1e-12);
                Same(k * k * home.Area, scaled.Area, 1e-12);
                Same(Math.Pow(k, 4) * home.SecondMoment.X, scaled.SecondMoment.X, 1e-11);
                Same(Math.Pow(k, 3) * home.PlasticY.Modulus, scaled.PlasticY.Modulus, 1e-11);
                Same(home.PlasticX.ShapeFactor, scaled.PlasticX.ShapeFactor, 1e-11);
                Assert.Equal(home.Mesh.Triangles > 0, scaled.Mesh.Triangles > 0);
            },
            iter: Iterations);

    [Theory]
    [MemberData(nameof(Shapes))]
    public void Moments_keep_their_order(string shape) => ShapeCases.All[shape].Sample(
        s =>
        {
            var p = Of(s, default);
            Assert.True(p.Principal.I1 >= Math.Max(p.SecondMoment.X, p.SecondMoment.Y) * (1 - 1e-12));
            Assert.True(p.Principal.I2 <= Math.Min(p.SecondMoment.X, p.SecondMoment.Y) * (1 + 1e-12));
            Assert.InRange(p.Principal.Angle, -90 + 1e-300, 90);
            foreach (var (plastic, elastic) in new[]
            {
                (p.PlasticX, p.ElasticX), (p.PlasticY, p.ElasticY), (p.Plastic1, p.Elastic1), (p.Plastic2, p.Elastic2),
            })
            {
                Assert.True(plastic.Modulus > elastic.Governing.Modulus);
                Assert.True(elastic.Governing.Modulus <= Math.Min(elastic.Positive.Modulus, elastic.Negative.Modulus));
            }

            Assert.Equal(p.BoundingBox.Height, p.ElasticX.Positive.Distance + p.ElasticX.Negative.Distance, 1e-10 * p.BoundingBox.Height);
            Assert.Equal(p.BoundingBox.Width, p.ElasticY.Positive.Distance + p.ElasticY.Negative.Distance, 1e-10 * p.BoundingBox.Width);
        },
        iter: Iterations);

    private static SectionProperties Of(Shape shape, Placement placement) => Pipeline.Properties(
        Outline.Create(shape.Boundaries().Select(b => placement == default ? b : b.Placed(placement))), 50);

    private static void Same(double expected, double actual, double relative) =>
        Assert.Equal(expected, actual, relative * Math.Abs(expected));
}
