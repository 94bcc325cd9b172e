namespace MeshSection.Files.Quantities;

/// <summary>From a unit to the internal one, as a fraction: 7850 / 1e9 is exact to the last bit, 7850 * 1e-9 is not.</summary>
internal readonly record struct UnitFactor(double Times, double Over = 1)
{
    public double Of(double value) => value * Times / Over;
}
