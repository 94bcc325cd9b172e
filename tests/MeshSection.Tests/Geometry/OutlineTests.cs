using MeshSection.Geometry;

namespace MeshSection.Tests.Geometry;

public class OutlineTests
{
    private static Boundary Rectangle(double x, double y, double width, double height) => Boundary.Polygon(
        new Point(x, y), new Point(x + width, y), new Point(x + width, y + height), new Point(x, y + height));

    private static OutlineException Refused(params Boundary[] boundaries) =>
        Assert.Throws<OutlineException>(() => Outline.Create(boundaries));

    [Fact]
    public void Nesting_alternates_material_and_hole()
    {
        var outline = Outline.Create(
        [
            Rectangle(30, 30, 40, 40), Rectangle(0, 0, 100, 100), Boundary.Circle(new Point(50, 50), 10),
            Rectangle(200, 0, 10, 10), Rectangle(10, 10, 80, 80).Reversed(),
        ]);
        Assert.Equal(
            [BoundaryRole.Island, BoundaryRole.Outer, BoundaryRole.Hole, BoundaryRole.Outer, BoundaryRole.Hole],
            outline.Boundaries.Select(b => b.Role));
        Assert.Equal([4, -1, 0, -1, 1], outline.Boundaries.Select(b => b.Parent));
        Assert.Equal([0, 1, 0, 2, 1], outline.Boundaries.Select(b => b.Region));
        Assert.Equal(3, outline.RegionCount);
        Assert.All(
            outline.Boundaries,
            b => Assert.Equal(b.Role != BoundaryRole.Hole, b.Boundary.SignedArea > 0));
    }

    [Fact]
    public void A_bar_in_the_mouth_of_a_channel_is_not_a_hole()
    {
        var channel = Boundary.Polygon(
            new Point(0, 0), new Point(60, 0), new Point(60, 10), new Point(10, 10), new Point(10, 90),
            new Point(60, 90), new Point(60, 100), new Point(0, 100));
        var outline = Outline.Create([channel, Boundary.Circle(new Point(40, 50), 15)]);
        Assert.All(outline.Boundaries, b => Assert.Equal(BoundaryRole.Outer, b.Role));
        Assert.Equal(2, outline.RegionCount);
    }

    [Fact]
    public void A_hole_is_found_where_the_ray_to_it_grazes_arcs_and_corners()
    {
        // The hole's first point is level with corners, with the tops of arcs and with horizontal edges to its right.
        var outer = Boundary.Create(
        [
            new LineEdge(new Point(0, 0), new Point(100, 0)),
            new ArcEdge(new Point(100, 0), new Point(100, 40), -0.5),
            new LineEdge(new Point(100, 40), new Point(120, 40)),
            new LineEdge(new Point(120, 40), new Point(120, 80)),
            new ArcEdge(new Point(120, 80), new Point(0, 80), 0.3),
            new LineEdge(new Point(0, 80), new Point(0, 0)),
        ]);
        foreach (var y in new[] { 20.0, 40, 60, 75 })
        {
            var outline = Outline.Create([outer, Boundary.Circle(new Point(30, y), 5)]);
            Assert.Equal(BoundaryRole.Hole, outline.Boundaries[1].Role);
        }
    }

    [Fact]
    public void No_boundary_is_refused() => Assert.Equal(OutlineFault.Empty, Refused().Fault);

    [Fact]
    public void A_bow_tie_crosses_itself_and_says_where()
    {
        var fault = Refused(Boundary.Polygon(new Point(0, 0), new Point(10, 10), new Point(10, 0), new Point(0, 12)));
        Assert.Equal(OutlineFault.SelfCrossing, fault.Fault);
        Assert.Equal(60.0 / 11, fault.Point!.Value.X, 9);
        Assert.Equal(60.0 / 11, fault.Point!.Value.Y, 9);
        Assert.Equal((0, 2), (fault.First!.Value.Edge, fault.Second!.Value.Edge));
    }

    [Fact]
    public void A_crossing_is_named_even_where_the_areas_cancel_or_arcs_are_cut_in_their_middle()
    {
        var bowTie = Boundary.Polygon(new Point(0, 0), new Point(10, 10), new Point(10, 0), new Point(0, 10));
        Assert.Equal((OutlineFault.SelfCrossing, new Point(5, 5)), (Refused(bowTie).Fault, Refused(bowTie).Point));
        var circle = Boundary.Circle(new Point(0, 5), 2);
        Assert.Equal(OutlineFault.Crossing, Refused(Rectangle(0, 0, 10, 10), circle).Fault);
    }

    [Fact]
    public void An_arc_that_cuts_its_neighbours_neighbour_crosses()
    {
        var fault = Refused(Boundary.Create(
        [
            new LineEdge(new Point(0, 0), new Point(10, 0)),
            new LineEdge(new Point(10, 0), new Point(10, 5)),
            new ArcEdge(new Point(10, 5), new Point(0, 5), -1.5),
            new LineEdge(new Point(0, 5), new Point(0, 0)),
        ]));
        Assert.Equal(OutlineFault.SelfCrossing, fault.Fault);
        Assert.Equal(0, fault.Point!.Value.Y, 9);
    }

    [Fact]
    public void Neighbours_that_cross_at_a_second_point_are_refused()
    {
        // The arc starts at the line's end, swings round and comes back through the line.
        var fault = Refused(Boundary.Create(
        [
            new LineEdge(new Point(0, 0), new Point(10, 0)),
            new ArcEdge(new Point(10, 0), new Point(5, -3), 3),
            new LineEdge(new Point(5, -3), new Point(0, 0)),
        ]));
        Assert.Contains(fault.Fault, new[] { OutlineFault.SelfCrossing, OutlineFault.SelfTouching });
    }

    [Fact]
    public void A_spike_that_runs_back_on_itself_is_refused() => Assert.Equal(
        OutlineFault.SelfTouching,
        Refused(Boundary.Polygon(
            new Point(0, 0), new Point(10, 0), new Point(10, 5), new Point(20, 5), new Point(10, 5.0), new Point(0, 10)))
            .Fault);

    [Theory]
    [InlineData(5, 5, 10, 10, OutlineFault.Crossing)]
    [InlineData(10, 0, 5, 10, OutlineFault.Touching)]
    [InlineData(10, 10, 5, 5, OutlineFault.Touching)]
    [InlineData(2, 0, 3, 3, OutlineFault.Touching)]
    [InlineData(0, 0, 10, 10, OutlineFault.Duplicate)]
    public void Two_boundaries_that_meet_are_refused(double x, double y, double width, double height, OutlineFault expected)
    {
        var fault = Refused(Rectangle(0, 0, 10, 10), Rectangle(x, y, width, height));
        Assert.Equal(expected, fault.Fault);
        Assert.Equal(0, fault.First!.Value.Boundary);
        Assert.Equal(1, fault.Second!.Value.Boundary);
    }

    [Fact]
    public void Circles_that_touch_from_inside_or_outside_are_refused_and_a_ligament_of_a_millionth_is_not()
    {
        var big = Boundary.Circle(default, 50);
        Assert.Equal(OutlineFault.Touching, Refused(big, Boundary.Circle(new Point(30, 0), 20)).Fault);
        Assert.Equal(OutlineFault.Touching, Refused(big, Boundary.Circle(new Point(42, 56), 20)).Fault);
        Assert.Equal(2, Outline.Create([big, Boundary.Circle(new Point(30 - 1e-4, 0), 20)]).Boundaries.Length);
        Assert.Equal(2, Outline.Create([big, Boundary.Circle(default, 50 - 1e-4)]).Boundaries.Length);
    }

    [Fact]
    public void A_fault_is_placed_in_the_drawings_axes()
    {
        var fault = Assert.Throws<OutlineException>(() => Outline.Create(
            [Rectangle(0, 0, 10, 10), Rectangle(10, 10, 5, 5)], new Point(1e6, 2e6)));
        Assert.Equal(new Point(1e6 + 10, 2e6 + 10), fault.Point);
    }

    [Fact]
    public void Nothing_without_area_or_finite_coordinates_is_accepted()
    {
        var line = Boundary.Create([new LineEdge(default, new Point(9, 0)), new LineEdge(new Point(9, 0), default)]);
        Assert.Equal(OutlineFault.NoArea, Refused(line).Fault);
        var broken = Boundary.Polygon(default, new Point(double.NaN, 0), new Point(0, 1));
        Assert.Equal(OutlineFault.NotFinite, Refused(broken).Fault);
        var stuck = Boundary.Polygon(default, new Point(1, 0), new Point(1, 0), new Point(0, 1));
        Assert.Equal(OutlineFault.NoLength, Refused(stuck).Fault);
    }

    [Fact]
    public void Loops_nested_at_random_have_the_parents_they_were_made_with()
    {
        var random = new Random(3);
        for (var run = 0; run < 50; run++)
        {
            var (loops, parents) = (new List<Boundary>(), new List<int>());
            Grow(new Box(0, 0, 1000, 1000), -1, 0);

            // In any order.
            int[] order = [.. Enumerable.Range(0, loops.Count)];
            random.Shuffle(order);
            var outline = Outline.Create(order.Select(i => loops[i]));
            for (var i = 0; i < order.Length; i++)
            {
                var parent = parents[order[i]];
                Assert.Equal(parent < 0 ? -1 : Array.IndexOf(order, parent), outline.Boundaries[i].Parent);
            }

            void Grow(Box cell, int parent, int depth)
            {
                var (x, y) = (cell.Centre.X, cell.Centre.Y);
                foreach (var quarter in new[]
                {
                    new Box(cell.MinX, cell.MinY, x, y), new Box(x, cell.MinY, cell.MaxX, y),
                    new Box(cell.MinX, y, x, cell.MaxY), new Box(x, y, cell.MaxX, cell.MaxY),
                })
                {
                    if (depth == 4 || (loops.Count > 0 && random.NextDouble() < 0.4))
                    {
                        continue;
                    }

                    var box = quarter.Grown(-(0.05 + 0.1 * random.NextDouble()) * quarter.Width);
                    var loop = random.Next(2) == 0
                        ? Boundary.Polygon(new(box.MinX, box.MinY), new(box.MaxX, box.MinY), new(box.MaxX, box.MaxY), new(box.MinX, box.MaxY))
                        : Boundary.Polygon(new(box.MinX, box.MaxY), new(box.MaxX, box.MaxY), new(box.MaxX, box.MinY), new(box.MinX, box.MinY));
                    loops.Add(loop);
                    parents.Add(parent);
                    Grow(box, loops.Count - 1, depth + 1);
                }
            }
        }
    }
}
