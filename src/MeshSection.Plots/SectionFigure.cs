using MeshSection.Meshing;
using MeshSection.Plots.Drawing;
using MeshSection.Plots.Layout;
using MeshSection.Properties;
using MeshSection.Sections;
using MeshSection.Units;

namespace MeshSection.Plots;

/// <summary>
/// The picture for a calculation sheet: a section with its mesh, centroid, centroidal and principal axes, distances to
/// the extreme fibres, overall size, scale and key values.
/// </summary>
public static class SectionFigure
{
    private static readonly Stroke Extension = new(Palette.Rule, 1.6);

    /// <summary>Lays the picture out.</summary>
    /// <param name="section">The section; its title heads the picture.</param>
    /// <param name="mesh">Its mesh.</param>
    /// <param name="properties">Its properties.</param>
    /// <param name="unit">The unit for every number on the picture.</param>
    /// <param name="size">Pixels; <see cref="PictureSize.Standard"/> if null.</param>
    /// <exception cref="ArgumentOutOfRangeException">The size is out of its range.</exception>
    public static Figure Of(
        Section section, Mesh mesh, SectionProperties properties, LengthUnit unit, PictureSize? size = null)
    {
        ArgumentNullException.ThrowIfNull(section);
        ArgumentNullException.ThrowIfNull(mesh);
        ArgumentNullException.ThrowIfNull(properties);
        ArgumentNullException.ThrowIfNull(unit);
        var outline = section.Outline;
        var lengths = new LengthScale(unit, Math.Max(outline.Bounds.Width, outline.Bounds.Height));
        var frame = new DimensionFrame(outline, properties, lengths);
        var axes = new CentroidalAxes(outline.Bounds, properties.Centroid - outline.Origin, properties.Principal);

        var sheet = new Sheet(size ?? PictureSize.Standard);
        Heading.Add(sheet, section.Title);

        var panel = new Panel(KeyValues.Of(properties, unit).AddRange(axes.Legend()).Add(GoverningSign.Legend()));
        panel.Add(sheet, area => frame.ViewIn(ScaleBar.Above(area)).Scale);
        var view = frame.ViewIn(ScaleBar.Above(sheet.Free));
        ScaleBar.Add(sheet, view.Scale, unit, lengths.Note);

        frame.AddExtensions(sheet, view, Extension);
        OutlineMarks.AddRegions(sheet, outline, view);
        sheet.Add(MeshMarks.InnerEdges(mesh, view));
        OutlineMarks.AddBoundaries(sheet, outline, view, 2 * properties.Area / properties.Perimeter);
        frame.AddDimensions(sheet, view);
        axes.Add(sheet, view);
        foreach (var fibre in GoverningSign.Fibres(properties))
        {
            sheet.Add(GoverningSign.At(view.Of(fibre.Point - outline.Origin)));
        }

        return sheet.ToFigure();
    }
}
