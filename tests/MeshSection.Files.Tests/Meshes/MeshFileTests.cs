using MeshSection.Geometry;

namespace MeshSection.Files.Tests.Meshes;

public class MeshFileTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    public void Nodes_are_in_the_drawings_axes_and_the_unit(int order)
    {
        var file = Meshed.Tube.Of(order);
        for (var i = 0; i < Meshed.Tube.Mesh.Nodes.Length; i++)
        {
            var mm = order == 1 ? Meshed.Tube.Mesh.Nodes[i] : Meshed.Tube.Curved.Nodes[i];
            Assert.Equal(0, (25.4 * file.Nodes[i]).DistanceTo(mm + new Point(2540, -254)), 1e-9);
        }

        Assert.Contains(file.Nodes, n => (25.4 * n).DistanceTo(new(2500, -249)) < 1e-9);
    }

    [Fact]
    public void Triangles_of_second_order_fill_the_true_outline()
    {
        // Chords of 20 degrees: regular polygons of 18 corners.
        const double SquareInch = 25.4 * 25.4;
        var (exact, polygons) = (Math.PI * 1600 / SquareInch, 9 * Math.Sin(Math.PI / 9) * 1600 / SquareInch);
        var (first, second) = (Meshed.Tube.Of(1), Meshed.Tube.Of(2));
        Assert.Equal(polygons, Meshed.Area(first.Nodes, [.. first.Elements.Chunk(3)]), 1e-12 * exact);
        Assert.Equal(exact, Meshed.Area(second.Nodes, [.. second.Elements.Chunk(6)]), 1e-4 * exact);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    public void Every_edge_on_a_boundary_or_a_line_is_there_once(int order)
    {
        var file = Meshed.Tube.Of(order);
        var lines = file.Lines.Chunk(file.NodesPerLine).ToArray();
        Assert.Equal(file.LineGroups.Length, lines.Length);
        Assert.Equal(lines.Length, lines.Select(l => (Math.Min(l[0], l[1]), Math.Max(l[0], l[1]))).Distinct().Count());
        var lengths = new double[3];
        for (var i = 0; i < lines.Length; i++)
        {
            var nodes = lines[i].Select(n => file.Nodes[n]).ToArray();
            lengths[file.LineGroups[i]] += order == 1
                ? nodes[0].DistanceTo(nodes[1])
                : nodes[0].DistanceTo(nodes[2]) + nodes[2].DistanceTo(nodes[1]);
        }

        var ofPolygon = 36 * Math.Sin(Math.PI / 18) / 25.4;
        if (order == 1)
        {
            Assert.Equal([50 * ofPolygon, 30 * ofPolygon], lengths[..2], (a, b) => Math.Abs(a - b) < 1e-12);
        }
        else
        {
            Assert.InRange(lengths[0], 50 * ofPolygon * 1.003, Math.Tau * 50 / 25.4);
            Assert.InRange(lengths[1], 30 * ofPolygon * 1.003, Math.Tau * 30 / 25.4);
        }

        Assert.Equal(15 / 25.4, lengths[2], 1e-9);
        Assert.Equal(["boundary 1", "boundary 2", "line"], file.GroupNames);
    }
}
