using MeshSection.Geometry;
using MeshSection.Meshing;
using static MeshSection.Tests.Meshing.Graphs;

namespace MeshSection.Tests.Meshing;

public class InputAnglesTests
{
    [Fact]
    public void The_angles_of_a_triangle_are_found_smallest_first()
    {
        // The sides of 3, 4 and 5: 36.87, 53.13 and 90 degrees.
        PlanarGraph graph = Graphs.Of(Polygon(0, 0, 40, 0, 40, 30));
        InputAngle[] found = [.. InputAngles.Below(graph, 80)];
        Assert.Equal([0, 2], found.Select(a => a.Node));
        Assert.Equal(Math.Atan2(3, 4) * 180 / Math.PI, found[0].Degrees, 1e-12);
        Assert.Equal(Math.Atan2(4, 3) * 180 / Math.PI, found[1].Degrees, 1e-12);
        Assert.Equal(new Point(40, 30), found[1].Place);
        Assert.Equal(3, InputAngles.Below(graph, 90.001).Length);
        Assert.Empty(InputAngles.Below(graph, 36.8));
    }

    [Fact]
    public void Nothing_between_two_segments_is_no_angle()
    {
        // A notch of 10 degrees: outside of the material, which has 350 there.
        PlanarGraph graph = Graphs.Of(Polygon(0, 0, 100, 0, 100, 40, 30, 50, 100, 60, 100, 100, 0, 100));
        Assert.Empty(InputAngles.Below(graph, 60));

        // The same notch with another material in it.
        Segment[] segments = [.. graph.Segments.Select(s => s.From is 2 or 3 ? s with { Right = 1 } : s)];
        PlanarGraph filled = graph with { Segments = [.. segments, new Segment(2, 4, -1, 1)] };
        InputAngle found = Assert.Single(InputAngles.Below(filled, 60));
        Assert.Equal(3, found.Node);
        Assert.Equal(2 * Math.Atan2(1, 7) * 180 / Math.PI, found.Degrees, 1e-12);
    }

    [Fact]
    public void Every_gap_of_a_fan_within_a_region_counts()
    {
        InputAngle[] found = [.. InputAngles.Below(HostileGraphs.All["fan of 20 segments"], 5)];
        Assert.Equal(19, found.Length);
        Assert.All(found, a => Assert.Equal(0.05 * 180 / Math.PI, a.Degrees, 1e-9));
    }

    [Fact]
    public void A_turn_and_a_shift_change_nothing()
    {
        PlanarGraph graph = HostileGraphs.All["star of thin spikes"];
        double[] angles = [.. InputAngles.Below(graph, 60).Select(a => a.Degrees)];
        Assert.Equal(36, angles.Length);
        for (int i = 0; i < 16; i++)
        {
            double[] moved = [.. InputAngles.Below(Moved(graph, 3, 0.4 * i, new(70, -20)), 60).Select(a => a.Degrees)];
            Assert.Equal(angles, moved, (a, b) => Math.Abs(a - b) < 1e-9);
        }
    }
}
