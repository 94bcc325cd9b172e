using MeshSection.Geometry;
using MeshSection.Meshing;

namespace MeshSection.Torsion;

/// <summary>Computes torsion, warping and shear of a section of one material.</summary>
public static class TorsionAnalysis
{
    /// <summary>
    /// Computes torsion, warping and shear on second-order triangles whose edges along the outline are the true curves.
    /// </summary>
    /// <remarks>
    /// The warping function bounds the torsion constant from above, the stress function from below, both on the same
    /// triangles and both conforming on the true outline, so that the true value lies between them whatever the mesh.
    /// </remarks>
    /// <param name="flat">The flattened outline, of one connected piece.</param>
    /// <param name="mesh">The mesh of <paramref name="flat"/>.</param>
    /// <param name="poissonRatio">ν of the material, in (-1, 0.5]; shear and the elastic shear centre depend on it.</param>
    /// <exception cref="TorsionException">The section is in separate pieces, or ν is out of its range.</exception>
    public static TorsionProperties Of(FlatOutline flat, Mesh mesh, double poissonRatio = 0)
    {
        ArgumentNullException.ThrowIfNull(flat);
        ArgumentNullException.ThrowIfNull(mesh);
        if (flat.Outline.RegionCount > 1)
        {
            throw new TorsionException(TorsionFault.Disconnected, flat.Outline.RegionCount);
        }

        if (!(poissonRatio is > -1 and <= 0.5))
        {
            throw new TorsionException(TorsionFault.PoissonRatio, poissonRatio);
        }

        var fitted = CentredMesh.Of(flat, CurvedMesh.Fit(flat, mesh));
        var centre = flat.Outline.Bounds.Centre;
        var whole = fitted.About(centre).EnclosedMoments().Aggregate((sum, part) => sum + part);
        var centroid = centre + whole.Centroid;
        fitted = fitted.About(centroid);
        var enclosed = fitted.EnclosedMoments().Select(m => m.Area).ToArray();
        var outer = flat.Outline.Boundaries.IndexOf(flat.Outline.Boundaries.Single(b => b.Role == BoundaryRole.Outer));
        var nodes = QuadraticNodes.Of(fitted.Curved);
        var sums = ElementSums.Of(fitted, nodes, poissonRatio);
        var lower = StressFunction.LowerBound(fitted, nodes, sums, outer, enclosed);
        var fields = WarpingFields.Solve(nodes, sums);
        var integrals = FieldIntegrals.Of(fitted, nodes, fields, poissonRatio);
        var (area, ix, iy, ixy) = (integrals.Area, integrals.YY, integrals.XX, integrals.XY);

        // The growth of bending stress (Kx x + Ky y) that goes with Vx = 1 and with Vy = 1.
        var determinant = ix * iy - ixy * ixy;
        var forX = new Point(ix, -ixy) / determinant;
        var forY = new Point(-ixy, iy) / determinant;
        var (xw, yw) = (integrals.XWarping, integrals.YWarping);
        var pole = new Point(-forY.X * xw - forY.Y * yw, forX.X * xw + forX.Y * yw);
        var elastic = new Point(
            forY.X * integrals.Moment1 + forY.Y * integrals.Moment2,
            -forX.X * integrals.Moment1 - forX.Y * integrals.Moment2);
        // Where the bounds meet, rounding may put them in the wrong order.
        var bounds = new TorsionConstant(Math.Min(lower, integrals.Torsion), Math.Max(lower, integrals.Torsion));
        return new TorsionProperties
        {
            PoissonRatio = poissonRatio,
            Area = area,
            TorsionConstant = bounds,
            TrefftzShearCentre = flat.Outline.Origin + centroid + pole,
            ElasticShearCentre = flat.Outline.Origin + centroid + elastic,
            WarpingConstant = integrals.WarpingSquare - pole.Y * xw + pole.X * yw,
            ShearFlexibility = new ShearFlexibility(Energy(forX, forX), Energy(forY, forY), Energy(forX, forY)),
            OutlineDeviation = fitted.Curved.Deviation,
        };

        double Energy(Point a, Point b) => a.X * b.X * integrals.Energy11 + a.Y * b.Y * integrals.Energy22
            + (a.X * b.Y + a.Y * b.X) * integrals.Energy12;
    }
}
