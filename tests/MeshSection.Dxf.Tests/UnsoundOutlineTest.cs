using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests;

/// <summary>What is wrong with closed boundaries is told by the drawing's own names, axes and unit.</summary>
public class UnsoundOutlineTest
{
    [Fact]
    public void A_boundary_that_crosses_itself_is_refused_at_the_crossing()
    {
        var refusal = Refusal(Drawing([LwPolyline([(100, 0, 0), (110, 10, 0), (110, 0, 0), (100, 8, 0)], handle: "3E", layer: "WALL")], unit: 6));
        Assert.Equal(DrawingFault.SelfCrossing, refusal.Fault);
        AssertAt(refusal, 100 + 40.0 / 9, 40.0 / 9);
        Assert.Contains("LWPOLYLINE #3E on layer 'WALL'", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Boundaries_that_cross_are_both_named()
    {
        var refusal = Refusal(Drawing([Square(0, 0, 10, "1"), Square(5, 3, 10, "2")]));
        Assert.Equal(DrawingFault.CrossingBoundaries, refusal.Fault);
        Assert.Equal(["1", "2"], refusal.Places.Select(p => p.Source.Handle!).Order());
        Assert.Equal("crossing", refusal.Message.Contains("(10, 3)", StringComparison.Ordinal) || refusal.Message.Contains("(5, 10)", StringComparison.Ordinal) ? "crossing" : refusal.Message);
    }

    [Fact]
    public void A_hole_that_touches_its_boundary_is_refused_at_the_point()
    {
        var refusal = Refusal(Drawing([Square(0, 0, 10, "1"), Circle(5, 8, 2, "2")]));
        Assert.Equal(DrawingFault.TouchingBoundaries, refusal.Fault);
        // Edges touch from 1e-10 of the size on; a circle of radius 2 is that near its tangent over 7.5e-5 to each side.
        AssertAt(refusal, 5, 10, 7.5e-5);
    }

    [Fact]
    public void A_boundary_that_touches_itself_is_refused_at_the_point()
    {
        var refusal = Refusal(Drawing([LwPolyline([(0, 0, 0), (10, 0, 0), (10, 10, 0), (5, 0, 0), (0, 10, 0)])]));
        Assert.Equal(DrawingFault.SelfTouching, refusal.Fault);
        AssertAt(refusal, 5, 0);
    }

    [Fact]
    public void A_boundary_without_area_is_refused() =>
        Assert.Equal(DrawingFault.NoArea, Refusal(Drawing([LwPolyline([(0, 0, 0), (4, 0, 0), (9, 0, 0)])])).Fault);

    [Fact]
    public void Every_fault_of_an_outline_has_its_message()
    {
        foreach (var fault in Enum.GetValues<OutlineFault>())
        {
            var frame = new Dxf.Curves.LocalFrame(new Point(0, 0), new Box(0, 0, 1, 1), 1);
            Assert.NotEmpty(OutlineFaults.Unsound(new OutlineException(fault), [], frame).Message);
        }
    }

    private static void AssertAt(DrawingException refusal, double x, double y, double tolerance = 1e-9)
    {
        Assert.Equal(x, refusal.Places[0].Point!.Value.X, tolerance);
        Assert.Equal(y, refusal.Places[0].Point!.Value.Y, tolerance);
    }
}
