namespace MeshSection.Plots;

/// <summary>
/// The size of a picture in pixels. Letters and lines grow with it, so that a picture printed 160 mm wide reads the
/// same at every size.
/// </summary>
/// <param name="Width">Pixels from left to right, <see cref="Least"/> to <see cref="Most"/>.</param>
/// <param name="Height">Pixels from top to bottom, <see cref="Least"/> to <see cref="Most"/>.</param>
public readonly record struct PictureSize(int Width, int Height)
{
    /// <summary>The fewest pixels on a side.</summary>
    public const int Least = 300;

    /// <summary>The most pixels on a side.</summary>
    public const int Most = 16_000;

    /// <summary>1600 by 1200: ten pixels a millimetre when printed 160 mm wide.</summary>
    public static PictureSize Standard => new(1600, 1200);

    /// <summary>Pixels per unit of the sheet on which figures are laid out; the standard size has one.</summary>
    internal double Scale => Math.Min(Width / 1600.0, Height / 1200.0);
}
