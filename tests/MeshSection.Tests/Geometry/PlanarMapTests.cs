using System.Collections.Immutable;
using CsCheck;
using MeshSection.Geometry;
using NetTopologySuite.Geometries;
using NetTopologySuite.Operation.Polygonize;
using Point = MeshSection.Geometry.Point;

namespace MeshSection.Tests.Geometry;

public class PlanarMapTests
{
    [Fact]
    public void Faces_of_random_lines_are_those_of_NetTopologySuite() =>
        Gen.Select(Gen.Int[0, 12], Gen.Int[0, 12], Gen.Int[0, 12], Gen.Int[0, 12]).Array[3, 25].Sample(
            lines =>
            {
                // On a grid, so that lines cross, overlap and meet in every way; cut by the other library.
                var factory = new GeometryFactory();
                var raw = lines.Where(l => (l.Item1, l.Item2) != (l.Item3, l.Item4))
                    .Select(l => (NetTopologySuite.Geometries.Geometry)factory.CreateLineString([new(l.Item1, l.Item2), new(l.Item3, l.Item4)])).ToArray();
                if (raw.Length == 0)
                {
                    return;
                }

                var cut = NetTopologySuite.Operation.Union.UnaryUnionOp.Union(raw);
                var polygonizer = new Polygonizer();
                polygonizer.Add(cut);
                var expected = polygonizer.GetPolygons();
                var map = PlanarMap.Of([.. Pieces(cut)]);

                // The other library's faces have no dangling lines in them, ours are the same faces with them.
                Assert.Equal(expected.Count, map.Faces.Length);
                Assert.Equal(expected.Sum(p => p.Area), map.Faces.Sum(f => f.Area), 1e-9);
                foreach (var face in map.Faces)
                {
                    var holder = Assert.Single(expected, p => p.Contains(factory.CreatePoint(new Coordinate(face.Inside.X, face.Inside.Y))));
                    Assert.Equal(holder.Area, face.Area, 1e-9);
                }
            },
            iter: 1000);

    [Fact]
    public void The_border_of_chosen_faces_encloses_their_area() =>
        Gen.Select(Gen.Int[2, 6], Gen.Int[2, 6], Gen.Bool.Array[36]).Sample((columns, rows, choice) =>
        {
            var map = PlanarMap.Of([.. Grid(columns, rows)]);
            Assert.Equal(columns * rows, map.Faces.Length);
            var isChosen = map.Faces.Select((_, i) => choice[i]).ToArray();
            var area = map.Border(isChosen).Sum(loop => Boundary.Create(loop.Select(d => d.IsForward ? map.Edges[d.Edge] : map.Edges[d.Edge].Reversed())).SignedArea);
            Assert.Equal(isChosen.Count(c => c), area, 1e-12);
        });

    [Fact]
    public void A_ring_in_a_ring_has_faces_with_holes_and_both_sides_of_each_edge_are_known()
    {
        var edges = Boundary.Circle(Point.Origin, 10).Edges.AddRange(Boundary.Circle(new(1, 0), 3).Edges);
        var map = PlanarMap.Of(edges);
        Assert.Equal(2, map.Faces.Length);
        Assert.Equal([Math.PI * 91, Math.PI * 9], map.Faces.Select(f => f.Area), (a, b) => Math.Abs(a - b) < 1e-11);
        Assert.Equal([2, 1], map.Faces.Select(f => f.Loops.Length));
        Assert.Equal((0, PlanarMap.Outside), map.FacesBeside(0));
        Assert.Equal((1, 0), map.FacesBeside(2));
    }

    [Fact]
    public void Curves_that_leave_a_node_side_by_side_are_told_apart()
    {
        // Three arcs from the origin to (10, 0) with one tangent at their start: flat, flatter, a line.
        ImmutableArray<Edge> edges =
        [
            new LineEdge(new(0, 0), new(10, 0)),
            new BezierEdge([new(0, 0), new(5, 0), new(10, 0), new(10, 2), new(10, 4)], [1, 1, 1, 1, 1]),
            new BezierEdge([new(0, 0), new(5, 0), new(10, 0), new(10, 4), new(10, 8)], [1, 1, 1, 1, 1]),
            new LineEdge(new(10, 0), new(10, 4)), new LineEdge(new(10, 4), new(10, 8)),
        ];
        var map = PlanarMap.Of(edges);
        Assert.Equal(2, map.Faces.Length);
        Assert.All(map.Faces, f => Assert.InRange(f.Area, 1, 30));
        Assert.Equal(edges[2].CapArea - 0.5 * 10 * 8 + 40 + 40, 80 + edges[2].CapArea - 40, 1e-12);
    }

    private static IEnumerable<Edge> Pieces(NetTopologySuite.Geometries.Geometry cut)
    {
        for (var i = 0; i < cut.NumGeometries; i++)
        {
            var points = cut.GetGeometryN(i).Coordinates.Select(c => new Point(c.X, c.Y)).ToArray();
            foreach (var (a, b) in points.Zip(points.Skip(1)))
            {
                yield return new LineEdge(a, b);
            }
        }
    }

    private static IEnumerable<Edge> Grid(int columns, int rows)
    {
        for (var x = 0; x <= columns; x++)
        {
            for (var y = 0; y <= rows; y++)
            {
                if (x < columns)
                {
                    yield return new LineEdge(new(x, y), new(x + 1, y));
                }

                if (y < rows)
                {
                    yield return new LineEdge(new(x, y), new(x, y + 1));
                }
            }
        }
    }
}
