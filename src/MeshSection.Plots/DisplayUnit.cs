using MeshSection.Plots.Drawing;

namespace MeshSection.Plots;

/// <summary>The unit of length in which a picture states its numbers.</summary>
/// <param name="Symbol">Its symbol: "mm", "in".</param>
/// <param name="Millimetres">How many mm it is long, positive and finite.</param>
public sealed record DisplayUnit(string Symbol, double Millimetres)
{
    /// <summary>Millimetres, the unit of the engine.</summary>
    public static DisplayUnit Millimetre { get; } = new("mm", 1);

    /// <summary>A value in powers of mm, in the same power of this unit.</summary>
    internal double Convert(double value, int power) => value / Math.Pow(Millimetres, power);

    /// <summary>The symbol of a power of this unit: "mm⁴".</summary>
    internal string PowerOf(int power) => power == 1 ? Symbol : Symbol + Numbers.Superscript(power);
}
