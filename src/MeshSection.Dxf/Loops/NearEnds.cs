using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>Finds the points within a distance of one another by a grid of cells of that size.</summary>
internal sealed class NearEnds
{
    private readonly Dictionary<(long X, long Y), int> _cells;
    private readonly int[] _nextInCell;
    private readonly IReadOnlyList<Point> _points;
    private readonly double _distance;

    public NearEnds(IReadOnlyList<Point> points, double distance)
    {
        _points = points;
        _distance = distance;
        _cells = new Dictionary<(long X, long Y), int>(points.Count);
        _nextInCell = new int[points.Count];
        for (var i = 0; i < points.Count; i++)
        {
            var cell = Cell(points[i]);
            _nextInCell[i] = _cells.TryGetValue(cell, out var head) ? head : -1;
            _cells[cell] = i;
        }
    }

    /// <summary>The numbers of the other points within the distance of a point.</summary>
    public IEnumerable<int> Of(int number)
    {
        var point = _points[number];
        var (column, row) = Cell(point);
        for (var x = column - 1; x <= column + 1; x++)
        {
            for (var y = row - 1; y <= row + 1; y++)
            {
                var other = _cells.TryGetValue((x, y), out var head) ? head : -1;
                for (; other >= 0; other = _nextInCell[other])
                {
                    if (other != number && _points[other].DistanceTo(point) <= _distance)
                    {
                        yield return other;
                    }
                }
            }
        }
    }

    private (long X, long Y) Cell(Point p) => ((long)Math.Floor(p.X / _distance), (long)Math.Floor(p.Y / _distance));
}
