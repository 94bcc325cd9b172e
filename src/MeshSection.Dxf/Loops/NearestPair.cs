using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>Finds the two of some points that are closest together.</summary>
internal static class NearestPair
{
    // Points are swept along a direction that no drawing lines its points up against; two points are at least as far
    // apart as their shadows on it.
    private static readonly Point SweepDirection = Point.Direction(0.6180339887);

    /// <param name="numbers">At least two numbers of points.</param>
    /// <param name="points">The points by number.</param>
    public static (int A, int B) Of(List<int> numbers, Point[] points)
    {
        // Ties are settled by the points, so that the answer does not hang on the order.
        var sorted = numbers
            .OrderBy(n => SweepDirection.Dot(points[n])).ThenBy(n => points[n].X).ThenBy(n => points[n].Y).ToArray();
        var best = (A: sorted[0], B: sorted[1]);
        var least = double.PositiveInfinity;
        for (var i = 0; i < sorted.Length; i++)
        {
            var shadow = SweepDirection.Dot(points[sorted[i]]);
            for (var j = i + 1; j < sorted.Length && SweepDirection.Dot(points[sorted[j]]) - shadow < least; j++)
            {
                var distance = points[sorted[i]].DistanceTo(points[sorted[j]]);
                if (distance < least)
                {
                    least = distance;
                    best = (sorted[i], sorted[j]);
                }
            }
        }

        return best;
    }
}
