using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Sections.Shapes;
using MeshSection.Tests.Verification;

namespace MeshSection.Tests.Meshing;

public class FlatteningTests
{
    [Theory]
    [InlineData(0.5)]
    [InlineData(0.01)]
    public void In_a_wall_thinner_than_the_sag_chords_are_halved_until_none_is_in_the_way(double wall)
    {
        // The inner circle turned, so that its corners lie under the middles of the outer chords.
        var outline = Outline.Create(
        [
            Boundary.Circle(default, 50),
            Boundary.Circle(default, 50 - wall).Placed(new Placement(default, Math.PI / 9)),
        ]);
        var flat = new Flattening(3, 40).Apply(outline);
        Assert.InRange(flat.MaxSag, 0, wall);
        Assert.True(OutsidePolygons.Of(flat).IsValid);
    }

    [Fact]
    public void Chords_keep_to_the_sag_and_the_turn_and_follow_their_curves()
    {
        var outline = Outline.Create(new Rectangle(100, 60, 15).Boundaries());
        foreach (var (sag, turn) in new[] { (0.001, 90.0), (10, 5) })
        {
            var flat = new Flattening(sag, turn).Apply(outline);
            Assert.All(flat.Chords, chord =>
            {
                Assert.InRange(chord.Curve.Sag, 0, sag);
                Assert.InRange(chord.Curve is ArcEdge arc ? Math.Abs(arc.Sweep) * 180 / Math.PI : 0, 0, turn * (1 + 1e-9));
            });
            Assert.Equal(flat.Chords.Max(c => c.Curve.Sag), flat.MaxSag);
            Assert.Equal(outline.Boundaries[0].Boundary.Length, flat.Chords.Sum(c => c.Curve.Length), 1e-10);
        }
    }
}
