using System.Collections.Immutable;

namespace MeshSection.Meshing;

/// <summary>What is asked of a mesh.</summary>
public sealed record MeshSettings
{
    /// <summary>
    /// Smallest angle wanted in every triangle, degrees, 0 to 33. Refinement is proven to end up to about 28.6
    /// ([Shewchuk2002]); 0 asks for no refinement by angle.
    /// </summary>
    public double MinAngle { get; init; } = 28;

    /// <summary>Largest area wanted of any triangle, mm², positive; infinite for no limit.</summary>
    public double MaxArea { get; init; } = double.PositiveInfinity;

    /// <summary>Longest side wanted of any triangle, mm, positive; infinite for no limit.</summary>
    public double MaxSide { get; init; } = double.PositiveInfinity;

    /// <summary>
    /// Longest side wanted in each region, by its number, mm, positive; infinite for no limit, and so for regions beyond
    /// the list. Where several limits hold, the least does.
    /// </summary>
    public ImmutableArray<double> RegionMaxSides { get; init; } = [];

    /// <summary>Longest side wanted from place to place; null for no such limit.</summary>
    public ISizeField? SizeField { get; init; }

    /// <summary>Most nodes that the mesh may have; refinement stops there and says so.</summary>
    public int MaxNodes { get; init; } = 5_000_000;
}
