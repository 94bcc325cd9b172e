namespace MeshSection.Geometry;

/// <summary>
/// Finds the boxes that meet a box: a packed tree, filled once by sorting into slices along x and runs along y
/// [LeuteneggerLopezEdgington1997]. Filling costs n log n, a query log n and what it finds.
/// </summary>
internal sealed class BoxTree
{
    private const int Fanout = 8;

    private readonly int[] _items;
    private readonly Box[] _boxes;
    private readonly List<Box[]> _levels = [];

    /// <param name="boxes">The boxes, named by their index.</param>
    public BoxTree(Box[] boxes)
    {
        _boxes = boxes;
        _items = new int[boxes.Length];
        var keys = new double[boxes.Length];
        for (var i = 0; i < boxes.Length; i++)
        {
            _items[i] = i;
            keys[i] = boxes[i].MinX + boxes[i].MaxX;
        }

        Array.Sort(keys, _items);
        var leaves = (boxes.Length + Fanout - 1) / Fanout;
        var slice = Fanout * (int)Math.Ceiling(Math.Sqrt(leaves));
        for (var start = 0; start < boxes.Length; start += Math.Max(slice, 1))
        {
            var count = Math.Min(slice, boxes.Length - start);
            for (var i = start; i < start + count; i++)
            {
                keys[i] = boxes[_items[i]].MinY + boxes[_items[i]].MaxY;
            }

            Array.Sort(keys, _items, start, count);
        }

        for (var below = boxes.Length; below > 1 || _levels.Count == 0; below = _levels[^1].Length)
        {
            var level = new Box[Math.Max(1, (below + Fanout - 1) / Fanout)];
            for (var i = 0; i < level.Length; i++)
            {
                level[i] = Box.Empty;
                for (var j = Fanout * i; j < Math.Min(Fanout * (i + 1), below); j++)
                {
                    level[i] = level[i].With(_levels.Count == 0 ? boxes[_items[j]] : _levels[^1][j]);
                }
            }

            _levels.Add(level);
        }
    }

    /// <summary>Adds the indices of the boxes that meet a box, in an order that depends on the boxes alone.</summary>
    public void Query(Box box, List<int> found) => Query(box, _levels.Count - 1, 0, found);

    private void Query(Box box, int level, int node, List<int> found)
    {
        if (!_levels[level][node].Meets(box))
        {
            return;
        }

        var below = level == 0 ? _items.Length : _levels[level - 1].Length;
        for (var child = Fanout * node; child < Math.Min(Fanout * (node + 1), below); child++)
        {
            if (level > 0)
            {
                Query(box, level - 1, child, found);
            }
            else if (_boxes[_items[child]].Meets(box))
            {
                found.Add(_items[child]);
            }
        }
    }
}
