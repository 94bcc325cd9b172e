namespace MeshSection.Geometry;

/// <summary>A rectangle with sides parallel to the axes; empty if a minimum lies above its maximum.</summary>
/// <param name="MinX">Left side.</param>
/// <param name="MinY">Bottom side.</param>
/// <param name="MaxX">Right side.</param>
/// <param name="MaxY">Top side.</param>
public readonly record struct Box(double MinX, double MinY, double MaxX, double MaxY)
{
    /// <summary>The box that holds nothing.</summary>
    public static Box Empty => new(
        double.PositiveInfinity, double.PositiveInfinity, double.NegativeInfinity, double.NegativeInfinity);

    /// <summary>Extent along x.</summary>
    public double Width => MaxX - MinX;

    /// <summary>Extent along y.</summary>
    public double Height => MaxY - MinY;

    /// <summary>Length of the diagonal.</summary>
    public double Diagonal => double.Hypot(Width, Height);

    /// <summary>The middle of the box.</summary>
    public Point Centre => new(0.5 * (MinX + MaxX), 0.5 * (MinY + MaxY));

    /// <summary>The smallest box that holds two points.</summary>
    public static Box Of(Point a, Point b) =>
        new(Math.Min(a.X, b.X), Math.Min(a.Y, b.Y), Math.Max(a.X, b.X), Math.Max(a.Y, b.Y));

    /// <summary>The smallest box that also holds a point.</summary>
    public Box With(Point p) =>
        new(Math.Min(MinX, p.X), Math.Min(MinY, p.Y), Math.Max(MaxX, p.X), Math.Max(MaxY, p.Y));

    /// <summary>The smallest box that also holds another.</summary>
    public Box With(Box b) =>
        new(Math.Min(MinX, b.MinX), Math.Min(MinY, b.MinY), Math.Max(MaxX, b.MaxX), Math.Max(MaxY, b.MaxY));

    /// <summary>The box with every side moved outwards.</summary>
    /// <param name="margin">Distance by which each side moves.</param>
    public Box Grown(double margin) => new(MinX - margin, MinY - margin, MaxX + margin, MaxY + margin);

    /// <summary>True if the two boxes share at least a point.</summary>
    public bool Meets(Box b) => MinX <= b.MaxX && b.MinX <= MaxX && MinY <= b.MaxY && b.MinY <= MaxY;

    /// <summary>True if the point lies in the box or on its rim.</summary>
    public bool Contains(Point p) => p.X >= MinX && p.X <= MaxX && p.Y >= MinY && p.Y <= MaxY;
}
