namespace MeshSection.Dxf.Entities;

/// <summary>A layer of the drawing.</summary>
/// <param name="Name">Its name.</param>
/// <param name="IsOff">True if it is switched off.</param>
/// <param name="IsFrozen">True if it is frozen.</param>
/// <param name="IsPlotted">False if it never appears on paper.</param>
/// <param name="Colour">The colour of what takes its layer's.</param>
public sealed record Layer(string Name, bool IsOff, bool IsFrozen, bool IsPlotted, DrawingColour Colour)
{
    /// <summary>True if a person who looks at the finished drawing does not see the layer.</summary>
    public bool IsHidden => IsOff || IsFrozen || !IsPlotted;
}
