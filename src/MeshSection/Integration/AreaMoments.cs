using MeshSection.Geometry;

namespace MeshSection.Integration;

/// <summary>The integrals of 1, x, y, x², y² and xy over a section, about a point.</summary>
/// <param name="Area">∫ dA, mm².</param>
/// <param name="X">∫ x dA, mm³.</param>
/// <param name="Y">∫ y dA, mm³.</param>
/// <param name="XX">∫ x² dA, mm⁴.</param>
/// <param name="YY">∫ y² dA, mm⁴.</param>
/// <param name="XY">∫ x y dA, mm⁴.</param>
public readonly record struct AreaMoments(double Area, double X, double Y, double XX, double YY, double XY)
{
    /// <summary>The centroid, relative to the point about which the moments were taken, mm.</summary>
    public Point Centroid => new(X / Area, Y / Area);

    /// <summary>The moments of the region shifted by a vector, about the same point.</summary>
    internal AreaMoments Moved(Point by) => new(
        Area,
        X + Area * by.X,
        Y + Area * by.Y,
        XX + 2 * by.X * X + Area * by.X * by.X,
        YY + 2 * by.Y * Y + Area * by.Y * by.Y,
        XY + by.X * Y + by.Y * X + Area * by.X * by.Y);

    /// <summary>Sum over two regions, both about the same point.</summary>
    public static AreaMoments operator +(AreaMoments a, AreaMoments b) =>
        new(a.Area + b.Area, a.X + b.X, a.Y + b.Y, a.XX + b.XX, a.YY + b.YY, a.XY + b.XY);
}

/// <summary>The part of a section beyond a line n·p = c, with d = n·p - c the distance from the line.</summary>
/// <param name="Area">∫ dA over d > 0, mm².</param>
/// <param name="Moment">∫ d dA over d > 0, mm³.</param>
public readonly record struct PartBeyond(double Area, double Moment);
