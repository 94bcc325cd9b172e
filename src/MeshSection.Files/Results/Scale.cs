using MeshSection.Dxf.Units;

namespace MeshSection.Files.Results;

/// <summary>Converts results from mm to the unit that they are shown in.</summary>
internal readonly record struct Scale(LengthUnit Unit)
{
    /// <summary>A value in mm to some power, in the unit to that power; a negative zero loses its sign.</summary>
    public double Of(double value, int power)
    {
        for (; power > 0; power--)
        {
            value /= Unit.Millimetres;
        }

        return value + 0.0;
    }

    /// <summary>A value per mm, per unit.</summary>
    public double PerLength(double value) => value * Unit.Millimetres;
}
