using MeshSection.Geometry;
using MeshSection.Integration;

namespace MeshSection.Properties;

/// <summary>A plastic neutral axis at right angles to a direction.</summary>
/// <param name="Offset">Its distance from the local origin along the direction, mm.</param>
/// <param name="Modulus">∫ |d| dA with d the distance from it, mm³.</param>
internal readonly record struct PlasticAxis(double Offset, double Modulus)
{
    // Halves that differ by no more than this part of the area are equal.
    private const double EqualRatio = 1e-13;

    /// <summary>Finds the line n·p = c that halves the area, and the plastic modulus about it.</summary>
    /// <remarks>
    /// The area beyond the line falls steadily with c, so a bracket always holds the root. Where a gap in the section
    /// leaves a whole strip of lines that halve it, the middle of the strip is taken; the modulus is the same for all.
    /// </remarks>
    /// <param name="integrator">Integrates over the section.</param>
    /// <param name="normal">n, a unit vector: the direction of bending.</param>
    /// <param name="area">The whole area, mm².</param>
    /// <param name="moment">The whole first moment ∫ n·p dA about the local origin, mm³.</param>
    /// <param name="low">Least distance of the section along n, mm.</param>
    /// <param name="high">Greatest distance of the section along n, mm.</param>
    public static PlasticAxis Find(
        IIntegrator integrator, Point normal, double area, double moment, double low, double high)
    {
        var offset = RootFinder.Find(
            c => 2 * integrator.Beyond(normal, c).Area / area - 1, low, high, 1, -1, EqualRatio, 1e-15 * (high - low));
        var (from, to) = integrator.Gap(normal, offset);
        if (from < to)
        {
            offset = 0.5 * (from + to);
        }

        return new PlasticAxis(offset, 2 * integrator.Beyond(normal, offset).Moment - (moment - area * offset));
    }
}
