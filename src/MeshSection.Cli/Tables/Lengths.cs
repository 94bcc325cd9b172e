using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Cli.Tables;

/// <summary>Turns lengths in mm, and their powers, into the unit of a table.</summary>
/// <param name="Unit">The unit of the table.</param>
internal readonly record struct Lengths(LengthUnit Unit)
{
    /// <summary>A number in a power of mm.</summary>
    public string Of(double value, int power = 1) => Digits.Of(In(value, power));

    /// <summary>A coordinate: what is nothing beside the section's size is 0.</summary>
    public string Coordinate(double value, double size) => Digits.Near(In(value), In(size));

    /// <summary>A point: (x, y).</summary>
    public string Of(Point point, double size) => $"({Coordinate(point.X, size)}, {Coordinate(point.Y, size)})";

    /// <summary>The symbol of a power of the unit.</summary>
    public string Symbol(int power = 1) => Unit.Symbol + Digits.Power(power);

    private double In(double value, int power = 1) => value / Math.Pow(Unit.Millimetres, power);
}
