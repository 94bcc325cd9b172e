using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>
/// A polygon of equal sides and angles, such as a hexagon bar. The origin is its centre; one side lies level at the
/// bottom.
/// </summary>
/// <param name="Sides">How many sides, 3 to 360.</param>
/// <param name="AcrossFlats">
/// Diameter of the circle that touches every side, mm: for an even number of sides the distance between two opposite
/// ones. The circle through the corners is 1 / cos(π / Sides) times as large.
/// </param>
/// <param name="CornerRadius">Radius of every corner, mm, at most half the distance across flats; 0 for sharp ones.</param>
public sealed record RegularPolygon(int Sides, double AcrossFlats, double CornerRadius = 0) : Shape
{
    /// <summary>The most sides; a section with more is a circle.</summary>
    public const int MostSides = 360;

    /// <inheritdoc/>
    public override ImmutableArray<Boundary> Boundaries()
    {
        ShapeCheck.AtLeast(Sides, 3);
        ShapeCheck.AtMost(Sides, MostSides);
        ShapeCheck.Positive(AcrossFlats);
        var radius = 0.5 * AcrossFlats / Math.Cos(Math.PI / Sides);
        var corners = new Corner[Sides];
        for (var k = 0; k < Sides; k++)
        {
            var corner = radius * Point.Direction(-0.5 * Math.PI + (2 * k + 1) * Math.PI / Sides);
            corners[k] = new Corner(corner.X, corner.Y, CornerRadius);
        }

        return [RoundedPolygon.Draw(corners)];
    }
}
