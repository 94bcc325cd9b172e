using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>How long the sides of a triangle may be: the least of all limits that hold where it lies.</summary>
internal sealed class WantedSides(Triangulation mesh, MeshSettings settings, SizeMap? map)
{
    private readonly ImmutableArray<double> byRegion = settings.RegionMaxSides;
    private readonly ISizeField? field = settings.SizeField;

    /// <summary>The limit that holds everywhere, squared, mm².</summary>
    public double UniformSquared { get; } = settings.MaxSide * settings.MaxSide;

    /// <summary>True if the limit differs from place to place.</summary>
    public bool IsVaried { get; } = !settings.RegionMaxSides.IsEmpty || settings.SizeField is not null || map is not null;

    /// <summary>The longest side wanted of triangle t, squared, mm².</summary>
    public double SquaredAt(int t)
    {
        double side = settings.MaxSide;
        int region = mesh.Corners[4 * t + 3];
        if (region < byRegion.Length) side = Math.Min(side, byRegion[region]);
        if (field is not null || map is not null)
        {
            Point centre = mesh.CentreOf(t);
            if (field is not null) side = Math.Min(side, field.At(centre));
            if (map is not null) side = Math.Min(side, map.At(centre, t));
        }
        return side * side;
    }
}
