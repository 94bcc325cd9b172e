using CsCheck;
using MeshSection.Geometry;

namespace MeshSection.Tests.Geometry;

/// <summary>Where boxes meet, where edges cross, and which place of an edge is nearest.</summary>
public class EdgeSearchTests
{
    private static readonly Gen<Point> AnyPoint = Gen.Select(Gen.Double[-10, 10], Gen.Double[-10, 10], (x, y) => new Point(x, y));

    private static readonly Gen<Edge> AnyEdge = Gen.OneOf(
        Gen.Select(AnyPoint, AnyPoint).Where((a, b) => a.DistanceTo(b) > 0.1).Select((a, b) => (Edge)new LineEdge(a, b)),
        Gen.Select(AnyPoint, AnyPoint, Gen.Double[-1, 1]).Where((a, b, bulge) => a.DistanceTo(b) > 0.1 && Math.Abs(bulge) > 1e-3)
            .Select((a, b, bulge) => (Edge)new ArcEdge(a, b, bulge)),
        Gen.Select(AnyPoint, AnyPoint, AnyPoint, Gen.Double[0.3, 3])
            .Select((a, b, c, w) => BezierPieces.Of([a, b, c], [1, w, 1], 0)[0]).Where(e => e.Chord.Length > 0.1));

    [Fact]
    public void A_tree_finds_the_boxes_that_a_plain_search_finds() =>
        Gen.Select(Gen.Select(AnyPoint, AnyPoint, Box.Of).Array[0, 200], Gen.Select(AnyPoint, AnyPoint, Box.Of)).Sample((boxes, asked) =>
        {
            var found = new List<int>();
            new BoxTree(boxes).Query(asked, found);
            Assert.Equal(Enumerable.Range(0, boxes.Length).Where(i => boxes[i].Meets(asked)), found.Order());
        });

    [Fact]
    public void Crossings_lie_on_both_edges_and_none_is_missed() => Gen.Select(AnyEdge, AnyEdge).Sample((a, b) =>
    {
        var found = EdgeCrossings.Find(a, b, 1e-9)!;
        foreach (var (s, t) in found)
        {
            Assert.Equal(0, a.PointAt(s).DistanceTo(b.PointAt(t)), 1e-9);
        }

        // b as a chain of many chords, each cut with a by its exact roots: where they cross well inside, there is one nearby.
        const int Steps = 3000;
        for (var i = 0; i < Steps; i++)
        {
            var (p, q) = (b.PointAt((double)i / Steps), b.PointAt((i + 1.0) / Steps));
            var along = (q - p) / (q - p).Length;
            foreach (var t in a.Crossings(along.Left(), along.Left().Dot(p)))
            {
                var at = a.PointAt(t);
                var isOnChord = (at - p).Dot(along) >= 0 && (at - p).Dot(along) <= (q - p).Length;
                var isAtEnd = new[] { a.Start, a.End, b.Start, b.End }.Any(e => e.DistanceTo(at) < 0.01);
                if (isOnChord && !isAtEnd && Math.Abs(along.Cross(a.TangentAt(t))) > 0.01)
                {
                    Assert.Contains(found, f => a.PointAt(f.A).DistanceTo(at) < 0.01);
                }
            }
        }
    });

    [Fact]
    public void Edges_that_lie_on_each_other_have_no_crossings_to_tell()
    {
        var circle = new ArcEdge(new(10, 0), new(-10, 0), 1);
        Assert.Null(EdgeCrossings.Find(circle, circle.Part(0.1, 0.6), 1e-9));
    }

    [Fact]
    public void The_nearest_place_is_nearer_than_any_other() => Gen.Select(AnyEdge, Gen.Double[0, 1], AnyPoint).Sample((edge, t, way) =>
    {
        var point = edge.PointAt(t) + 1e-4 * way;
        var nearest = edge.PointAt(NearestOnEdge.Parameter(edge, point)).DistanceTo(point);
        for (var i = 0; i <= 500; i++)
        {
            Assert.True(nearest <= edge.PointAt(i / 500.0).DistanceTo(point) + 1e-12);
        }

        Assert.True(nearest <= 1e-4 * way.Length + 1e-12);
    });
}
