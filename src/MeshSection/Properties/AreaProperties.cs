using MeshSection.Geometry;
using MeshSection.Integration;

namespace MeshSection.Properties;

/// <summary>What one integrator gives of a section, in local coordinates: the quantities that are computed twice.</summary>
internal sealed record AreaProperties
{
    // Principal moments that differ by no more than this part of their sum are equal, and every axis is principal.
    private const double EqualRatio = 1e-11;

    public required double Area { get; init; }

    public required Point Centroid { get; init; }

    public required SecondMoments SecondMoment { get; init; }

    public required PrincipalAxes Principal { get; init; }

    public required PlasticAxis PlasticX { get; init; }

    public required PlasticAxis PlasticY { get; init; }

    public required PlasticAxis Plastic1 { get; init; }

    public required PlasticAxis Plastic2 { get; init; }

    public Point Axis1 => Principal.Angle == 90 ? Point.AlongY : Point.Direction(Principal.Angle * Math.PI / 180);

    public Point Axis2 => Axis1.Left();

    /// <summary>Integrates everything.</summary>
    /// <param name="integrator">Integrates over the section.</param>
    /// <param name="outline">The section's outline.</param>
    /// <param name="axes">
    /// The principal axes to take for plastic bending, if not those found here: where the two principal moments nearly
    /// agree, rounding turns the axes, and two integrators must be compared about the same ones.
    /// </param>
    public static AreaProperties Of(IIntegrator integrator, Outline outline, PrincipalAxes? axes = null)
    {
        var (area, centroid, second) = CentroidalMoments(integrator, outline.Bounds.Centre);
        var elastic = new AreaProperties
        {
            Area = area,
            Centroid = centroid,
            SecondMoment = second,
            Principal = axes ?? PrincipalOf(second),
            PlasticX = default,
            PlasticY = default,
            Plastic1 = default,
            Plastic2 = default,
        };
        return elastic with
        {
            PlasticX = Plastic(Point.AlongY),
            PlasticY = Plastic(Point.AlongX),
            Plastic1 = Plastic(elastic.Axis2),
            Plastic2 = Plastic(elastic.Axis1),
        };

        PlasticAxis Plastic(Point direction) => PlasticAxis.Find(
            integrator,
            direction,
            area,
            area * direction.Dot(centroid),
            direction.Dot(Support.Farthest(outline, -direction)),
            direction.Dot(Support.Farthest(outline, direction)));
    }

    /// <summary>Area, centroid and second moments about the centroid, in two passes so that none are subtracted.</summary>
    /// <param name="integrator">Integrates over the section.</param>
    /// <param name="near">Any point in or near the section.</param>
    public static (double Area, Point Centroid, SecondMoments SecondMoment) CentroidalMoments(
        IIntegrator integrator, Point near)
    {
        var centroid = near + integrator.Moments(near).Centroid;
        var own = integrator.Moments(centroid);
        return (own.Area, centroid + own.Centroid, new SecondMoments(own.YY, own.XX, own.XY));
    }

    private static PrincipalAxes PrincipalOf(SecondMoments own)
    {
        var mean = 0.5 * (own.X + own.Y);
        var difference = 0.5 * (own.X - own.Y);
        var radius = double.Hypot(difference, own.XY);
        if (radius <= EqualRatio * mean)
        {
            return new PrincipalAxes(Math.Max(own.X, own.Y), Math.Min(own.X, own.Y), 0);
        }

        // tan 2θ = -2 Ixy / (Ix - Iy); a product moment lost in rounding leaves the axes as they are.
        var product = Math.Abs(own.XY) <= 1e-14 * mean ? 0 : own.XY;
        var angle = product == 0
            ? difference > 0 ? 0 : 90
            : 0.5 * Math.Atan2(-product, difference) * 180 / Math.PI;
        return new PrincipalAxes(mean + radius, mean - radius, angle);
    }
}
