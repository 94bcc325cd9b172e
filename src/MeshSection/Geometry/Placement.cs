namespace MeshSection.Geometry;

/// <summary>A similarity of the plane: mirror (if asked) in the y axis, scale, turn, then shift.</summary>
/// <param name="Shift">Where the origin goes.</param>
/// <param name="Turn">Turn counter-clockwise about the origin, radians.</param>
/// <param name="Scale">Factor on every length, positive.</param>
/// <param name="Mirrors">True if x is reversed first, so that left becomes right.</param>
public readonly record struct Placement(Point Shift, double Turn = 0, double Scale = 1, bool Mirrors = false)
{
    /// <summary>A plain shift.</summary>
    public static Placement Moved(double x, double y) => new(new Point(x, y));

    /// <summary>The image of a point. Quarter turns are exact.</summary>
    public Point Apply(Point p)
    {
        var x = Mirrors ? -p.X : p.X;
        var (sin, cos) = Turn == 0 ? (0, 1) : SinCos(Turn);
        return new Point(
            Shift.X + Scale * (x * cos - p.Y * sin),
            Shift.Y + Scale * (x * sin + p.Y * cos));
    }

    private static (double Sin, double Cos) SinCos(double angle)
    {
        var quarters = angle / (0.5 * Math.PI);
        var whole = Math.Round(quarters);
        if (quarters != whole)
        {
            return Math.SinCos(angle);
        }

        var quarter = (((long)whole % 4) + 4) % 4;
        return quarter switch
        {
            0 => (0, 1),
            1 => (1, 0),
            2 => (0, -1),
            _ => (-1, 0),
        };
    }
}
