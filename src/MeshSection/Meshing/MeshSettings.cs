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

    /// <summary>Most nodes that the mesh may have; refinement stops there and says so.</summary>
    public int MaxNodes { get; init; } = 5_000_000;
}
