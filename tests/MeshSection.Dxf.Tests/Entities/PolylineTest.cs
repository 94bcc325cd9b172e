using MeshSection.Dxf.Entities;
using MeshSection.Geometry;
using static MeshSection.Dxf.Tests.DxfText;

namespace MeshSection.Dxf.Tests.Entities;

public class PolylineTest
{
    [Fact]
    public void The_frame_of_a_fitted_polyline_is_dropped()
    {
        string Vertex(double x, double y, int flags) => Tagged((0, "VERTEX"), (8, "0"), (10, x), (20, y), (30, 0), (70, flags));
        var text = Tagged((0, "POLYLINE"), (8, "0"), (66, 1), (70, 1 | 4)) +
            Vertex(0, 0, 16) + Vertex(9, 9, 16) + Vertex(0, 0, 8) + Vertex(4, 0, 8) + Vertex(4, 4, 8) + Tagged((0, "SEQEND"), (8, "0"));

        var polyline = Assert.IsType<PolylineEntity>(Assert.Single(Read(Drawing([text], release: "AC1009")).Entities));
        Assert.Equal([new Point(0, 0), new Point(4, 0), new Point(4, 4)], polyline.Vertices.Select(v => v.Point));
        Assert.True(polyline.IsClosed);
    }

    [Theory]
    [InlineData(16)]
    [InlineData(64)]
    public void A_mesh_is_counted_as_not_read(int flags)
    {
        var mesh = Polyline([(0, 0, 0), (1, 0, 0)], handle: "5").Replace(" 70\n1\n", $" 70\n{flags}\n", StringComparison.Ordinal);
        var report = Outline(Drawing([Square(0, 0, 10), mesh])).Report;
        Assert.Equal("POLYLINE (mesh)", Assert.Single(report.LeftOut).Kind);
    }

    [Fact]
    public void A_polyline_without_its_end_mark_is_read_and_noted()
    {
        var text = Polyline([(0, 0, 0), (1, 0, 0), (1, 1, 0)], handle: "5");
        var drawing = Read(Drawing([text[..text.LastIndexOf("  0\nSEQEND", StringComparison.Ordinal)], Circle(9, 9, 1)]));
        Assert.Equal(2, drawing.Entities.Length);
        Assert.Equal(NoteCode.PolylineMended, Assert.Single(drawing.Notes).Code);
    }

    [Fact]
    public void A_polyline_that_miscounts_its_vertices_is_noted() =>
        Assert.Contains(
            "says 7 vertices and has 4",
            Assert.Single(Read(Drawing([Square(0, 0, 1).Replace(" 90\n4", " 90\n7", StringComparison.Ordinal)])).Notes).Message,
            StringComparison.Ordinal);

    [Fact]
    public void A_vertex_that_lacks_a_coordinate_is_refused() =>
        Assert.Equal(DrawingFault.BadEntity, Refusal(Drawing([LwPolyline([(0, 0, 0), (7.5, 1, 0)]).Replace(" 20\n1\n", "", StringComparison.Ordinal)])).Fault);

    [Fact]
    public void Edges_are_traced_to_their_entities_whichever_way_they_run()
    {
        // Clockwise, so that the outer boundary is turned round; the circle becomes a hole, turned the other way.
        var result = Outline(Drawing(
            [Line(0, 0, 0, 10, "1"), Line(0, 10, 7, 10, "2"), Arc(7, 5, 5, 270, 90, "3"), Line(7, 0, 0, 0, "4"), Circle(5, 5, 1, "C")]));
        var outer = result.Outline.Boundaries.ToList().FindIndex(b => b.Role == BoundaryRole.Outer);
        for (var e = 0; e < 4; e++)
        {
            var edge = result.Outline.Boundaries[outer].Boundary.Edges[e];
            var handle = edge is ArcEdge ? "3" : edge.Chord.Y < 0 ? "1" : edge.Chord.X < 0 ? "2" : "4";
            Assert.Equal(handle, result.Sources[outer][e].Handle);
        }

        Assert.All(result.Sources[1 - outer], s => Assert.Equal("C", s.Handle));
        Assert.Equal((6, 4), (result.Report.Pieces, result.Report.Joins));
    }
}
