using System.Runtime.InteropServices;
using MeshSection.Dxf.Curves;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>
/// The points at which ends of pieces meet. Every end has a node; ends in the same place share one from the start, and
/// nodes can be merged. Where a merged node lies depends on which points it holds, not on their order.
/// </summary>
internal sealed class EndNodes
{
    private readonly Dictionary<Point, int> _byPoint = [];
    private readonly List<Point> _points = [];
    private readonly List<bool> _stated = [];
    private readonly int[] _starts;
    private readonly int[] _ends;
    private readonly int[] _parents;

    public EndNodes(List<Piece> pieces)
    {
        _starts = new int[pieces.Count];
        _ends = new int[pieces.Count];
        for (var i = 0; i < pieces.Count; i++)
        {
            _starts[i] = Number(pieces[i].Edge.Start, pieces[i].Entity.EndsAreStated);
            _ends[i] = Number(pieces[i].Edge.End, pieces[i].Entity.EndsAreStated);
        }

        _parents = new int[_points.Count];
        for (var i = 0; i < _parents.Length; i++)
        {
            _parents[i] = i;
        }
    }

    /// <summary>The number of different points; nodes are named by numbers below it.</summary>
    public int Count => _points.Count;

    /// <summary>The points as they were drawn, one for each number.</summary>
    public IReadOnlyList<Point> Points => _points;

    /// <summary>The node at which a piece starts.</summary>
    public int Start(int piece) => Find(_starts[piece]);

    /// <summary>The node at which a piece ends.</summary>
    public int End(int piece) => Find(_ends[piece]);

    /// <summary>The node that a point belongs to.</summary>
    public int Find(int point)
    {
        while (_parents[point] != point)
        {
            _parents[point] = _parents[_parents[point]];
            point = _parents[point];
        }

        return point;
    }

    /// <summary>Makes two nodes one, named by the least of its points, so that the order of merging does not show.</summary>
    public void Merge(int a, int b)
    {
        var (first, second) = (Find(a), Find(b));
        if (first != second)
        {
            var isInOrder = IsBefore(first, second);
            _parents[isInOrder ? second : first] = isInOrder ? first : second;
        }
    }

    /// <summary>True if the point of one node lies left of (or, if neither does, below) that of another.</summary>
    public bool IsBefore(int a, int b) => (_points[a].X, _points[a].Y).CompareTo((_points[b].X, _points[b].Y)) < 0;

    /// <summary>The drawn points of each node that holds more than one.</summary>
    public Dictionary<int, List<int>> Merged()
    {
        var merged = new Dictionary<int, List<int>>();
        for (var point = 0; point < Count; point++)
        {
            var node = Find(point);
            if (node != point)
            {
                ref var members = ref CollectionsMarshal.GetValueRefOrAddDefault(merged, node, out _);
                members ??= [node];
                members.Add(point);
            }
        }

        return merged;
    }

    /// <summary>The common place of points that became one node: the mean of those that the drawing states.</summary>
    public Point Place(List<int> members)
    {
        var stated = members.Where(m => _stated[m]).ToList();
        var chosen = (stated.Count > 0 ? stated : members).ConvertAll(m => _points[m]);
        chosen.Sort((a, b) => (a.X, a.Y).CompareTo((b.X, b.Y)));
        return chosen.Aggregate((a, b) => a + b) / chosen.Count;
    }

    private int Number(Point point, bool isStated)
    {
        if (!_byPoint.TryGetValue(point, out var number))
        {
            number = _points.Count;
            _byPoint.Add(point, number);
            _points.Add(point);
            _stated.Add(isStated);
        }

        _stated[number] |= isStated;
        return number;
    }
}
