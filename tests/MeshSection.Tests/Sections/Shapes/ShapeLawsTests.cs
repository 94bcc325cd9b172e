using CsCheck;
using MeshSection.Geometry;

namespace MeshSection.Tests.Sections.Shapes;

/// <summary>What holds for every shape, whatever its dimensions.</summary>
public class ShapeLawsTests
{
    [Theory]
    [MemberData(nameof(ShapeCases.Names), MemberType = typeof(ShapeCases))]
    public void Boundaries_make_an_outline(string kind) => ShapeCases.All[kind].Sample(
        shape =>
        {
            var outline = Outline.Create(shape.Boundaries());
            Assert.Equal(1, outline.RegionCount);
            Assert.Equal(BoundaryRole.Outer, outline.Boundaries[0].Role);
        },
        iter: 200);

    [Theory]
    [MemberData(nameof(ShapeCases.Names), MemberType = typeof(ShapeCases))]
    public void Boundaries_run_counter_clockwise(string kind) => ShapeCases.All[kind].Sample(
        shape => Assert.All(shape.Boundaries(), b => Assert.True(LoopMeasure.Area(b) > 0)), iter: 200);

    [Theory]
    [MemberData(nameof(ShapeCases.Names), MemberType = typeof(ShapeCases))]
    public void Arcs_leave_and_join_their_neighbours_without_a_kink(string kind) => ShapeCases.All[kind].Sample(
        shape =>
        {
            foreach (var boundary in shape.Boundaries())
            {
                for (var i = 0; i < boundary.Edges.Length; i++)
                {
                    var (edge, next) = (boundary.Edges[i], boundary.Edges[(i + 1) % boundary.Edges.Length]);
                    if (edge is ArcEdge || next is ArcEdge)
                    {
                        Assert.Equal(0, edge.TangentAt(1).Cross(next.TangentAt(0)), 1e-9);
                        Assert.True(edge.TangentAt(1).Dot(next.TangentAt(0)) > 0);
                    }
                }
            }
        },
        iter: 200);

    [Theory]
    [MemberData(nameof(ShapeCases.Names), MemberType = typeof(ShapeCases))]
    public void The_same_dimensions_give_the_same_bits(string kind) => ShapeCases.All[kind].Sample(
        shape => Assert.Equal(
            shape.Boundaries().SelectMany(b => b.Edges),
            shape.Boundaries().SelectMany(b => b.Edges)),
        iter: 20);
}
