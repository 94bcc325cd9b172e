namespace MeshSection.Dxf.Entities;

/// <summary>A colour as drawings state it.</summary>
/// <param name="Index">The number in the format's table, 1 to 255; 256 for the layer's colour, 0 for the block's.</param>
/// <param name="Rgb">The true colour, 0xRRGGBB, which goes before the number; null if there is none.</param>
public readonly record struct DrawingColour(int Index, int? Rgb = null)
{
    private const int OfLayer = 256;
    private const int OfBlock = 0;

    /// <summary>White or black, whatever the paper is not: what layers have that state no colour.</summary>
    public static DrawingColour Plain => new(7);

    /// <summary>The layer's colour: what entities have that state none.</summary>
    public static DrawingColour ByLayer => new(OfLayer);

    /// <summary>True if it stands for the colour of the entity's layer.</summary>
    public bool IsByLayer => Rgb is null && Index == OfLayer;

    /// <summary>True if it stands for the colour of the block's insertion.</summary>
    public bool IsByBlock => Rgb is null && Index == OfBlock;

    /// <summary>True if it is the colour asked for: by true colour if that is what is asked for, else by number.</summary>
    /// <param name="asked">A number, or a true colour.</param>
    public bool Matches(DrawingColour asked) => asked.Rgb is { } rgb ? Rgb == rgb : Index == asked.Index;
}
