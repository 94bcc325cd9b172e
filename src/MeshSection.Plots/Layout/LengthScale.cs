using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using MeshSection.Units;

namespace MeshSection.Plots.Layout;

/// <summary>
/// How all lengths of one drawing are written: the same decimals and the same power of ten, so that the parts of a
/// chain of dimensions add up to the whole as a reader sees them.
/// </summary>
internal sealed class LengthScale
{
    private readonly LengthUnit unit;
    private readonly int exponent;
    private readonly int decimals;

    /// <param name="unit">The unit to state.</param>
    /// <param name="largest">The largest length of the drawing, mm.</param>
    public LengthScale(LengthUnit unit, double largest)
    {
        this.unit = unit;
        var size = unit.FromMillimetres(largest, 1);
        exponent = Numbers.SharedExponent(size);
        decimals = Numbers.DecimalsFor(size / Math.Pow(10, exponent));
    }

    /// <summary>What a reader must know: "dimensions in mm".</summary>
    public string Note => exponent == 0
        ? $"dimensions in {unit.Symbol}"
        : $"dimensions in 10{Numbers.Superscript(exponent)} {unit.Symbol}";

    /// <summary>The same after an overall width and height: "200 × 120, dimensions in mm".</summary>
    public string NoteOn(Box bounds) => $"{Format(bounds.Width)} × {Format(bounds.Height)}, {Note}";

    public string Format(double millimetres) =>
        Numbers.Fixed(unit.FromMillimetres(millimetres, 1) / Math.Pow(10, exponent), decimals);
}
