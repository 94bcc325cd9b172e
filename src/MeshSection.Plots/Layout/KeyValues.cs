using System.Collections.Immutable;
using MeshSection.Plots.Drawing;
using MeshSection.Properties;
using MeshSection.Units;

namespace MeshSection.Plots.Layout;

/// <summary>The values that a checker looks for first.</summary>
internal static class KeyValues
{
    public static ImmutableArray<PanelRow> Of(SectionProperties properties, LengthUnit unit)
    {
        // A centroid on an axis of the drawing is 0 and not the rounding that is left of it.
        var box = properties.BoundingBox;
        var least = 1e-9 * box.Diagonal;
        string Value(double value, int power) => $"{Numbers.Format(unit.FromMillimetres(value, power))} {unit.SymbolOf(power)}";
        string Coordinate(double value) => Value(Math.Abs(value) < least ? 0 : value, 1);

        var x = properties.ElasticX;
        var y = properties.ElasticY;
        return
        [
            new ValueRow("A", "", "", Value(properties.Area, 2)),
            new ValueRow("x", "C", "", Coordinate(properties.Centroid.X)),
            new ValueRow("y", "C", "", Coordinate(properties.Centroid.Y)),
            new ValueRow("I", "x", "", Value(properties.SecondMoment.X, 4)),
            new ValueRow("I", "y", "", Value(properties.SecondMoment.Y, 4)),
            new ValueRow("W", "x", Governing(x, "top", "bottom"), Value(x.Governing.Modulus, 3)),
            new ValueRow("W", "y", Governing(y, "right", "left"), Value(y.Governing.Modulus, 3)),
            new ValueRow("I", "1", "", Value(properties.Principal.I1, 4)),
            new ValueRow("I", "2", "", Value(properties.Principal.I2, 4)),
            new ValueRow("α", "", "x to 1", Angle(properties.Principal.Angle)),
            new ValueRow("Mesh", "", "", $"{Numbers.Count(properties.Mesh.Triangles)} triangles"),
        ];
    }

    public static string Angle(double degrees) => Numbers.Fixed(degrees, 2) + "°";

    private static string Governing(ExtremeFibres fibres, string positive, string negative)
    {
        var isTie = fibres.PositiveGoverns && fibres.NegativeGoverns;
        return isTie ? $"{positive} = {negative}"
            : fibres.PositiveGoverns ? $"{positive} governs"
            : $"{negative} governs";
    }
}
