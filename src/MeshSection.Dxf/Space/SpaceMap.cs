namespace MeshSection.Dxf.Space;

/// <summary>An affine map of space: x X + y Y + z Z + Shift.</summary>
/// <param name="X">Where the vector along x goes.</param>
/// <param name="Y">Where the vector along y goes.</param>
/// <param name="Z">Where the vector along z goes.</param>
/// <param name="Shift">Where the origin goes.</param>
internal sealed record SpaceMap(SpacePoint X, SpacePoint Y, SpacePoint Z, SpacePoint Shift)
{
    // Below this slope against z the arbitrary axis rule takes y instead of z to find the x axis.
    private const double NearZ = 1.0 / 64;

    public static SpaceMap Identity { get; } = new(new(1, 0, 0), new(0, 1, 0), new(0, 0, 1), default);

    public SpacePoint Apply(SpacePoint p) => Turn(p) + Shift;

    /// <summary>The image of a vector.</summary>
    public SpacePoint Turn(SpacePoint p) => p.X * X + p.Y * Y + p.Z * Z;

    /// <summary>The map that applies another first, then this one.</summary>
    public SpaceMap After(SpaceMap first) => ReferenceEquals(this, Identity) ? first
        : ReferenceEquals(first, Identity) ? this
        : new(Turn(first.X), Turn(first.Y), Turn(first.Z), Apply(first.Shift));

    /// <summary>
    /// From the coordinates of a flat entity to space, by the arbitrary axis algorithm [Dxf2012]: z along the normal, x at
    /// right angles to it and to the world's y or z.
    /// </summary>
    /// <param name="normal">The normal; a null vector counts as the drawing's own.</param>
    public static SpaceMap OfPlane(SpacePoint normal)
    {
        var length = normal.Length;
        if (normal == SpacePoint.AlongZ || length == 0 || !double.IsFinite(length))
        {
            return Identity;
        }

        var z = 1 / length * normal;
        var x = Math.Abs(z.X) < NearZ && Math.Abs(z.Y) < NearZ ? new SpacePoint(0, 1, 0).Cross(z) : SpacePoint.AlongZ.Cross(z);
        x = 1 / x.Length * x;
        return new SpaceMap(x, z.Cross(x), z, default);
    }
}
