using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Properties;

/// <summary>Holds the two integrators' answers against each other.</summary>
internal static class CrossChecking
{
    /// <summary>Compares two sets of properties of one section.</summary>
    /// <param name="fiber">By the fibers.</param>
    /// <param name="boundary">By the boundary integrals.</param>
    /// <param name="size">The outline's diagonal: the scale of the centroid, mm.</param>
    /// <param name="origin">Where the local origin lies in the drawing's axes.</param>
    public static ImmutableArray<CrossCheck> Compare(
        AreaProperties fiber, AreaProperties boundary, double size, Point origin)
    {
        var (f, b) = (fiber.SecondMoment, boundary.SecondMoment);
        return
        [
            Relative(CheckedQuantity.Area, fiber.Area, boundary.Area),
            Shifted(CheckedQuantity.CentroidX, fiber.Centroid.X, boundary.Centroid.X, origin.X),
            Shifted(CheckedQuantity.CentroidY, fiber.Centroid.Y, boundary.Centroid.Y, origin.Y),
            Relative(CheckedQuantity.SecondMomentX, f.X, b.X),
            Relative(CheckedQuantity.SecondMomentY, f.Y, b.Y),
            // Ixy may be zero: its scale is the largest that it could be.
            new CrossCheck(CheckedQuantity.SecondMomentXY, f.XY, b.XY, Math.Abs(f.XY - b.XY) / Math.Sqrt(b.X * b.Y)),
            Relative(CheckedQuantity.PlasticModulusX, fiber.PlasticX.Modulus, boundary.PlasticX.Modulus),
            Relative(CheckedQuantity.PlasticModulusY, fiber.PlasticY.Modulus, boundary.PlasticY.Modulus),
            Relative(CheckedQuantity.PlasticModulus1, fiber.Plastic1.Modulus, boundary.Plastic1.Modulus),
            Relative(CheckedQuantity.PlasticModulus2, fiber.Plastic2.Modulus, boundary.Plastic2.Modulus),
        ];

        CrossCheck Shifted(CheckedQuantity quantity, double byFiber, double byBoundary, double shift) =>
            new(quantity, shift + byFiber, shift + byBoundary, Math.Abs(byFiber - byBoundary) / size);
    }

    private static CrossCheck Relative(CheckedQuantity quantity, double byFiber, double byBoundary) =>
        new(quantity, byFiber, byBoundary, Math.Abs(byFiber - byBoundary) / byBoundary);
}
