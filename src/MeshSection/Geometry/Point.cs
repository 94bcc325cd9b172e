namespace MeshSection.Geometry;

/// <summary>A point of the section's plane, or a vector in it: x to the right, y up. mm unless said otherwise.</summary>
/// <param name="X">Coordinate along x.</param>
/// <param name="Y">Coordinate along y.</param>
public readonly record struct Point(double X, double Y)
{
    /// <summary>The origin.</summary>
    public static Point Origin => default;

    /// <summary>The unit vector along x.</summary>
    public static Point AlongX => new(1, 0);

    /// <summary>The unit vector along y.</summary>
    public static Point AlongY => new(0, 1);

    /// <summary>Distance from the origin; the length of the vector.</summary>
    public double Length => double.Hypot(X, Y);

    /// <summary>True if neither coordinate is NaN or infinite.</summary>
    public bool IsFinite => double.IsFinite(X) && double.IsFinite(Y);

    /// <summary>The unit vector at an angle counter-clockwise from x.</summary>
    /// <param name="angle">Angle in radians.</param>
    public static Point Direction(double angle)
    {
        var (sin, cos) = Math.SinCos(angle);
        return new Point(cos, sin);
    }

    /// <summary>Distance to another point.</summary>
    public double DistanceTo(Point other) => (other - this).Length;

    /// <summary>Scalar product.</summary>
    public double Dot(Point other) => X * other.X + Y * other.Y;

    /// <summary>The z component of the vector product: positive if <paramref name="other"/> lies to the left.</summary>
    public double Cross(Point other) => X * other.Y - Y * other.X;

    /// <summary>The vector turned a quarter turn counter-clockwise.</summary>
    public Point Left() => new(-Y, X);

    /// <summary>Sum of two vectors.</summary>
    public static Point operator +(Point a, Point b) => new(a.X + b.X, a.Y + b.Y);

    /// <summary>Difference of two vectors: the way from b to a.</summary>
    public static Point operator -(Point a, Point b) => new(a.X - b.X, a.Y - b.Y);

    /// <summary>The opposite vector.</summary>
    public static Point operator -(Point a) => new(-a.X, -a.Y);

    /// <summary>A vector times a number.</summary>
    public static Point operator *(double factor, Point a) => new(factor * a.X, factor * a.Y);

    /// <summary>A vector divided by a number.</summary>
    public static Point operator /(Point a, double divisor) => new(a.X / divisor, a.Y / divisor);
}
