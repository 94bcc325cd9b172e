namespace MeshSection.Geometry;

/// <summary>How many times a loop runs counter-clockwise around a point.</summary>
internal static class WindingNumber
{
    /// <summary>The winding number of a loop about a point that does not lie on it.</summary>
    public static int Of(Boundary loop, Point p)
    {
        // Crossings of the ray from p to the right, upward ones counted +1 and downward ones -1 [Sunday2001]. Pieces
        // that rise or fall steadily cross it at most once; the half-open rule counts a shared end once.
        var winding = 0;
        foreach (var edge in loop.Edges)
        {
            if (edge.Bounds is var box && (box.MaxY < p.Y || box.MinY > p.Y || box.MaxX < p.X))
            {
                continue;
            }

            var from = 0.0;
            var start = edge.Start;
            foreach (var to in edge.Turnings(Point.AlongY).Append(1))
            {
                var end = edge.PointAt(to);
                if (start.Y <= p.Y != end.Y <= p.Y && IsRightOf(edge, from, to, start, end, p))
                {
                    winding += start.Y <= p.Y ? 1 : -1;
                }

                (from, start) = (to, end);
            }
        }

        return winding;
    }

    private static bool IsRightOf(Edge edge, double from, double to, Point start, Point end, Point p)
    {
        if (edge is LineEdge)
        {
            var side = (end - start).Cross(p - start);
            return start.Y <= p.Y ? side > 0 : side < 0;
        }

        foreach (var t in edge.Crossings(Point.AlongY, p.Y))
        {
            if (t > from && t < to)
            {
                return edge.PointAt(t).X > p.X;
            }
        }

        // The ray passes through an end of the piece.
        return (start.Y == p.Y ? start : end).X > p.X;
    }
}
