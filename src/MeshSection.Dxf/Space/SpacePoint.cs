namespace MeshSection.Dxf.Space;

/// <summary>A point or a vector in the space of a drawing.</summary>
/// <param name="X">Coordinate along x.</param>
/// <param name="Y">Coordinate along y.</param>
/// <param name="Z">Coordinate along z.</param>
public readonly record struct SpacePoint(double X, double Y, double Z)
{
    /// <summary>The unit vector along z: the normal of the drawing's own plane.</summary>
    public static SpacePoint AlongZ => new(0, 0, 1);

    /// <summary>The length of the vector.</summary>
    public double Length => double.Hypot(double.Hypot(X, Y), Z);

    /// <summary>Scalar product.</summary>
    public double Dot(SpacePoint other) => X * other.X + Y * other.Y + Z * other.Z;

    /// <summary>Vector product.</summary>
    public SpacePoint Cross(SpacePoint other) =>
        new(Y * other.Z - Z * other.Y, Z * other.X - X * other.Z, X * other.Y - Y * other.X);

    /// <summary>Sum of two vectors.</summary>
    public static SpacePoint operator +(SpacePoint a, SpacePoint b) => new(a.X + b.X, a.Y + b.Y, a.Z + b.Z);

    /// <summary>Difference of two vectors.</summary>
    public static SpacePoint operator -(SpacePoint a, SpacePoint b) => new(a.X - b.X, a.Y - b.Y, a.Z - b.Z);

    /// <summary>A vector times a number.</summary>
    public static SpacePoint operator *(double factor, SpacePoint a) => new(factor * a.X, factor * a.Y, factor * a.Z);
}
