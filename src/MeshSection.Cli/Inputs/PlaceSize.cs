using MeshSection.Geometry;
using MeshSection.Meshing;

namespace MeshSection.Cli.Inputs;

/// <summary>Short sides around places, growing with the distance from them.</summary>
/// <param name="Places">The places, in the outline's coordinates, and the longest side there, mm.</param>
internal sealed record PlaceSize(IReadOnlyList<(Point Place, double Side)> Places) : ISizeField
{
    // A mesh of good angles can follow this growth without steps.
    private const double Growth = 0.3;

    /// <inheritdoc/>
    public double At(Point place)
    {
        var side = double.PositiveInfinity;
        foreach (var (centre, least) in Places)
        {
            side = Math.Min(side, least + Growth * centre.DistanceTo(place));
        }

        return side;
    }
}
