using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>The material of an outline and the lines around it.</summary>
internal static class OutlineMarks
{
    private static readonly Stroke Boundary = new(Palette.Ink, 3.2);

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
    public static void AddBoundaries(Sheet sheet, Outline outline, View view)
    {
        ImmutableArray<ScreenPoint[]> loops = [.. outline.Boundaries.Select(b => view.Of(b.Boundary))];
        sheet.Add(new Area(loops, OxyColors.Undefined, Boundary));
    }
}
