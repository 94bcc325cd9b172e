using System.Collections.Immutable;
using MeshSection.Plots.Drawing;
using OxyPlot;

namespace MeshSection.Plots;

/// <summary>A finished picture as a list of marks, ready to be drawn by any render context.</summary>
public sealed class Figure
{
    internal Figure(PictureSize size, ImmutableArray<Mark> marks)
    {
        Size = size;
        Marks = marks;
    }

    /// <summary>The size that it was laid out for, pixels.</summary>
    public PictureSize Size { get; }

    /// <summary>What is drawn, in order; coordinates in units of the sheet.</summary>
    internal ImmutableArray<Mark> Marks { get; }

    /// <summary>Draws every mark on a white ground.</summary>
    /// <param name="context">Takes coordinates in sheet units: picture pixels over <see cref="UnitScale"/>.</param>
    public void Draw(IRenderContext context)
    {
        ArgumentNullException.ThrowIfNull(context);
        foreach (var mark in Marks)
        {
            mark.Draw(context);
        }
    }

    /// <summary>Pixels per unit of the coordinates that <see cref="Draw"/> uses.</summary>
    public double UnitScale => Size.Scale;
}
