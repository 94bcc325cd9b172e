namespace MeshSection.Geometry;

/// <summary>How far edges and outlines reach in a direction.</summary>
internal static class Support
{
    // Points this near in distance, as a part of the outline's diagonal, are level.
    private const double LevelRatio = 1e-12;

    /// <summary>The least and greatest distance of an edge along a direction.</summary>
    public static (double Low, double High) Range(Edge edge, Point normal)
    {
        var (start, end) = (normal.Dot(edge.Start), normal.Dot(edge.End));
        var (low, high) = (Math.Min(start, end), Math.Max(start, end));
        foreach (var t in edge.Turnings(normal))
        {
            var d = normal.Dot(edge.PointAt(t));
            (low, high) = (Math.Min(low, d), Math.Max(high, d));
        }

        return (low, high);
    }

    /// <summary>
    /// The point of an outline farthest in a direction. Of several that are level, the one farthest to the left as
    /// seen along the direction, so that the choice does not depend on where a boundary starts.
    /// </summary>
    public static Point Farthest(Outline outline, Point direction)
    {
        var level = LevelRatio * outline.Bounds.Diagonal;
        var left = direction.Left();
        var best = outline.Boundaries[0].Boundary.Edges[0].Start;
        foreach (var nested in outline.Boundaries)
        {
            foreach (var edge in nested.Boundary.Edges)
            {
                Consider(edge.Start);
                foreach (var t in edge.Turnings(direction))
                {
                    Consider(edge.PointAt(t));
                }
            }
        }

        return best;

        void Consider(Point p)
        {
            var ahead = direction.Dot(p - best);
            if (ahead > level || (ahead >= -level && left.Dot(p - best) > level))
            {
                best = p;
            }
        }
    }
}
