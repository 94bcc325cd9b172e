namespace MeshSection.Sections.Shapes;

/// <summary>A flange on one side of a web, its inner face sloped about its mean thickness at half the outstand.</summary>
/// <param name="Outstand">From the face of the web to the toe.</param>
/// <param name="MeanThickness">Thickness at half the outstand.</param>
/// <param name="Slope">Rise of the inner face over its run, 0 for parallel faces.</param>
internal readonly record struct Flange(double Outstand, double MeanThickness, double Slope)
{
    public double AtWeb => MeanThickness + 0.5 * Slope * Outstand;

    public double AtToe => MeanThickness - 0.5 * Slope * Outstand;

    /// <summary>The slope that would leave nothing at the toe.</summary>
    public double SlopeLimit => 2 * MeanThickness / Outstand;
}
