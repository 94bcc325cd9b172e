using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>Finds the points within a distance of one another by a grid of cells of that size.</summary>
internal sealed class NearEnds
{
    // No drawing has so many ends in nine cells; looking at all of them for each would take forever.
    private const int Crowd = 1000;

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

    /// <summary>Finds the other points within the distance of a point.</summary>
    /// <param name="number">The number of the point.</param>
    /// <param name="found">Their numbers; what it held before is removed.</param>
    /// <returns>False if so many lie about the point that they were not all looked at.</returns>
    public bool TryFind(int number, List<int> found)
    {
        found.Clear();
        var seen = 0;
        var point = _points[number];
        var (column, row) = Cell(point);
        for (var x = column - 1; x <= column + 1; x++)
        {
            for (var y = row - 1; y <= row + 1; y++)
            {
                var other = _cells.TryGetValue((x, y), out var head) ? head : -1;
                for (; other >= 0; other = _nextInCell[other])
                {
                    if (++seen > Crowd)
                    {
                        return false;
                    }

                    if (other != number && _points[other].DistanceTo(point) <= _distance)
                    {
                        found.Add(other);
                    }
                }
            }
        }

        return true;
    }

    private (long X, long Y) Cell(Point p) => ((long)Math.Floor(p.X / _distance), (long)Math.Floor(p.Y / _distance));
}
