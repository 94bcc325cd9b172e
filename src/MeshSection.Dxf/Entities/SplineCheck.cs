using System.Collections.Immutable;
using MeshSection.Dxf.Space;
using MeshSection.Dxf.Tags;

namespace MeshSection.Dxf.Entities;

/// <summary>Makes sure that knots, control points and weights make a curve.</summary>
internal static class SplineCheck
{
    // No program draws splines of a higher degree.
    private const int HighestDegree = 25;

    // Beyond this ratio of weights no digit of the curve between them is left.
    private const double MostUneven = 1e9;

    // Knots that fall by less than this part of their range do so by rounding.
    private const double KnotRounding = 1e-9;

    public static Spline Mended(
        EntitySource source,
        int degree,
        List<double> knots,
        List<SpacePoint> controls,
        List<double> weights,
        List<SpacePoint> fitPoints,
        SpacePoint? startTangent,
        SpacePoint? endTangent,
        bool isClosed,
        bool mayBeCut)
    {
        if (degree is < 1 or > HighestDegree)
        {
            throw ReadingFaults.BadValue(source, 71, $"the degree {degree}, which is not from 1 to {HighestDegree}");
        }

        if (controls.Count == 0)
        {
            return new Spline(degree, [], [], [], [.. fitPoints], startTangent, endTangent, isClosed);
        }

        var needed = controls.Count + degree + 1;
        if (controls.Count <= degree || knots.Count != needed)
        {
            var found = $"{controls.Count} control points, {knots.Count} knots and the degree {degree}";
            throw mayBeCut
                ? ReadingFaults.CutEntity(source.Place, source, $"control points or knots: it has {found}")
                : ReadingFaults.BadValue(source, 40, $"{found}, which make no spline: it needs {degree + 1} control points at least, and {degree + 1} knots more than control points");
        }

        if (weights.Count != 0 && weights.Count != controls.Count)
        {
            throw ReadingFaults.BadValue(source, 41, $"{weights.Count} weights for {controls.Count} control points");
        }

        if (weights.Exists(w => !(w > 0)) || (weights.Count > 0 && weights.Max() > MostUneven * weights.Min()))
        {
            throw ReadingFaults.BadValue(source, 41, $"weights that are not above zero, or some {MostUneven:E0} times others");
        }

        ImmutableArray<double> ones = [.. Enumerable.Repeat(1.0, controls.Count)];
        return new Spline(
            degree, Rising(source, knots), [.. controls], weights.Count == 0 ? ones : [.. weights], [], null, null, isClosed);
    }

    private static ImmutableArray<double> Rising(EntitySource source, List<double> knots)
    {
        var range = knots.Max() - knots.Min();
        var rising = ImmutableArray.CreateBuilder<double>(knots.Count);
        rising.Add(knots[0]);
        foreach (var knot in knots.Skip(1))
        {
            if (knot < rising[^1] - KnotRounding * range)
            {
                throw ReadingFaults.BadValue(source, 40, "knots out of order");
            }

            rising.Add(Math.Max(knot, rising[^1]));
        }

        return rising.MoveToImmutable();
    }
}
