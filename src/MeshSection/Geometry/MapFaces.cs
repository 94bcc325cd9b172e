using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>Walks around the faces of a map and puts loops that lie within a face to it.</summary>
internal sealed class MapFaces
{
    // Lines across a face at these parts of its height are tried for a point inside: none lines up with a drawing.
    private static readonly double[] Heights = [0.5021, 0.3819, 0.6181, 0.2763, 0.7237, 0.1459, 0.8541, 0.0557, 0.9443];

    private readonly ImmutableArray<Edge> _edges;
    private readonly List<ImmutableArray<DirectedEdge>> _loops = [];
    private readonly List<double> _areas = [];
    private readonly int[] _loopOfHalf;

    private MapFaces(ImmutableArray<Edge> edges, int[] next)
    {
        _edges = edges;
        _loopOfHalf = new int[next.Length];
        Array.Fill(_loopOfHalf, -1);
        for (var first = 0; first < next.Length; first++)
        {
            if (_loopOfHalf[first] >= 0)
            {
                continue;
            }

            var loop = ImmutableArray.CreateBuilder<DirectedEdge>();
            for (var half = first; _loopOfHalf[half] < 0; half = next[half])
            {
                _loopOfHalf[half] = _loops.Count;
                loop.Add(new DirectedEdge(half / 2, half % 2 == 0));
            }

            _loops.Add(loop.ToImmutable());
            _areas.Add(Area(_loops[^1]));
        }
    }

    public static (ImmutableArray<MapFace> Faces, int[] FaceOfHalf) Of(ImmutableArray<Edge> edges, int[] next)
    {
        var walk = new MapFaces(edges, next);
        var faceOfLoop = walk.FaceOfLoop(out var count);
        var loops = new ImmutableArray<DirectedEdge>[count][];
        for (var face = 0; face < count; face++)
        {
            loops[face] = [.. Enumerable.Range(0, faceOfLoop.Length)
                .Where(l => faceOfLoop[l] == face).OrderBy(l => walk._areas[l] > 0 ? 0 : 1).ThenBy(l => l)
                .Select(l => walk._loops[l])];
        }

        var areas = new double[count];
        for (var l = 0; l < faceOfLoop.Length; l++)
        {
            if (faceOfLoop[l] >= 0)
            {
                areas[faceOfLoop[l]] += walk._areas[l];
            }
        }

        return (
            [.. loops.Select((l, i) => new MapFace([.. l], areas[i], walk.Inside(l)))],
            [.. walk._loopOfHalf.Select(l => faceOfLoop[l])]);
    }

    /// <summary>The area to the left of a loop; edges that it runs along both ways enclose nothing, in every bit.</summary>
    private double Area(ImmutableArray<DirectedEdge> loop)
    {
        var anchor = _edges[loop[0].Edge].Start;
        var area = 0.0;
        foreach (var (edge, isForward) in loop)
        {
            if (_loopOfHalf[2 * edge] == _loopOfHalf[2 * edge + 1])
            {
                continue;
            }

            var e = _edges[edge];
            var part = 0.5 * (e.Start - anchor).Cross(e.End - anchor) + e.CapArea;
            area += isForward ? part : -part;
        }

        return area;
    }

    /// <summary>Loops that run counter-clockwise bound a face each; the others lie in the smallest of those around them.</summary>
    private int[] FaceOfLoop(out int count)
    {
        var faces = new int[_loops.Count];
        count = 0;
        for (var l = 0; l < faces.Length; l++)
        {
            faces[l] = _areas[l] > 0 ? count++ : PlanarMap.Outside;
        }

        var components = Components();
        int[] outer = [.. Enumerable.Range(0, faces.Length).Where(l => _areas[l] > 0)];
        var tree = new BoxTree([.. outer.Select(l => Bounds(_loops[l]))]);
        var boundaries = new Boundary?[faces.Length];
        var near = new List<int>();
        for (var l = 0; l < faces.Length; l++)
        {
            if (_areas[l] > 0 || outer.Length == 0)
            {
                continue;
            }

            var point = Start(_loops[l][0]);
            near.Clear();
            tree.Query(Box.Of(point, point), near);
            var least = double.PositiveInfinity;
            foreach (var o in near.Select(n => outer[n]))
            {
                if (_areas[o] < least && components[o] != components[l] &&
                    WindingNumber.Of(boundaries[o] ??= Boundary.Create(_loops[o].Select(Directed)), point) != 0)
                {
                    (faces[l], least) = (faces[o], _areas[o]);
                }
            }
        }

        return faces;
    }

    /// <summary>For each loop the connected piece of the map that it belongs to.</summary>
    private int[] Components()
    {
        var numbers = new Dictionary<Point, int>();
        var parents = new List<int>();
        foreach (var edge in _edges)
        {
            var (a, b) = (Find(Number(edge.Start)), Find(Number(edge.End)));
            parents[Math.Max(a, b)] = Math.Min(a, b);
        }

        return [.. _loops.Select(l => Find(numbers[Start(l[0])]))];

        int Number(Point point)
        {
            if (!numbers.TryGetValue(point, out var number))
            {
                numbers.Add(point, number = parents.Count);
                parents.Add(number);
            }

            return number;
        }

        int Find(int node)
        {
            while (parents[node] != node)
            {
                node = parents[node] = parents[parents[node]];
            }

            return node;
        }
    }

    /// <summary>The middle of the widest part of the face on one of several lines across it.</summary>
    private Point Inside(ImmutableArray<DirectedEdge>[] loops)
    {
        var box = Bounds(loops[0]);
        var (best, widest) = (box.Centre, 0.0);
        foreach (var height in Heights)
        {
            var y = box.MinY + height * box.Height;
            var xs = new List<double>();
            foreach (var (edge, _) in loops.SelectMany(l => l))
            {
                xs.AddRange(_edges[edge].Crossings(Point.AlongY, y).Select(t => _edges[edge].PointAt(t).X));
            }

            xs.Sort();
            for (var i = 0; xs.Count % 2 == 0 && i < xs.Count; i += 2)
            {
                if (xs[i + 1] - xs[i] > widest)
                {
                    (best, widest) = (new Point(0.5 * (xs[i] + xs[i + 1]), y), xs[i + 1] - xs[i]);
                }
            }
        }

        return best;
    }

    private Box Bounds(ImmutableArray<DirectedEdge> loop) =>
        loop.Aggregate(Box.Empty, (box, d) => box.With(_edges[d.Edge].Bounds));

    private Point Start(DirectedEdge d) => d.IsForward ? _edges[d.Edge].Start : _edges[d.Edge].End;

    private Edge Directed(DirectedEdge d) => d.IsForward ? _edges[d.Edge] : _edges[d.Edge].Reversed();
}
