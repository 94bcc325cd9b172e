using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>The material of an outline and the lines around it.</summary>
internal static class OutlineMarks
{
    /// <summary>A light fill for each region, its holes left empty.</summary>
    public static void AddRegions(Sheet sheet, Outline outline, View view)
    {
        foreach (var region in outline.Boundaries.GroupBy(b => b.Region))
        {
            ImmutableArray<ScreenPoint[]> loops = [.. region.Select(b => view.Of(b.Boundary))];
            sheet.Add(new Area(loops, Palette.Tint(region.Key), Stroke.None));
        }
    }

    /// <summary>Every boundary in a strong line, curves as curves.</summary>
    /// <param name="sheet">Where to draw.</param>
    /// <param name="outline">The boundaries.</param>
    /// <param name="view">How they lie on the sheet.</param>
    /// <param name="wall">The mean thickness of the walls, mm: on thin ones the line is thinner, lest it fill them.</param>
    public static void AddBoundaries(Sheet sheet, Outline outline, View view, double wall)
    {
        ImmutableArray<ScreenPoint[]> loops = [.. outline.Boundaries.Select(b => view.Of(b.Boundary))];
        sheet.Add(new Area(loops, OxyColors.Undefined, new Stroke(Palette.Ink, Math.Clamp(0.2 * wall * view.Scale, 1.2, 3.2))));
    }
}
