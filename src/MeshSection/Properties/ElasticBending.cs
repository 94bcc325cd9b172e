using MeshSection.Geometry;

namespace MeshSection.Properties;

/// <summary>Elastic section moduli: the second moment over the distance to the extreme fibre, on either side.</summary>
internal static class ElasticBending
{
    /// <summary>The extreme fibres to both sides of an axis through the centroid.</summary>
    /// <param name="outline">The section's outline.</param>
    /// <param name="centroid">Its centroid, in local coordinates.</param>
    /// <param name="direction">The unit vector at right angles to the axis, towards its positive side.</param>
    /// <param name="secondMoment">The second moment about the axis, mm⁴.</param>
    public static ExtremeFibres Fibres(Outline outline, Point centroid, Point direction, double secondMoment)
    {
        return new ExtremeFibres(Fibre(direction), Fibre(-direction));

        ExtremeFibre Fibre(Point towards)
        {
            var point = Support.Farthest(outline, towards);
            var distance = towards.Dot(point - centroid);
            return new ExtremeFibre(distance, outline.Origin + point, secondMoment / distance);
        }
    }
}
