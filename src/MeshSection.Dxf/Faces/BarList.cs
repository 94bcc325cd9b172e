using System.Collections.Immutable;
using MeshSection.Dxf.Curves;
using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Selection;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Faces;

/// <summary>Turns circles and points on layers of bars into bars.</summary>
internal static class BarList
{
    public static ImmutableArray<DrawnBar> Of(
        EntitySelection selection, DrawingPlane plane, LocalFrame frame, Outline outline, List<DrawingNote> notes)
    {
        var bars = ImmutableArray.CreateBuilder<DrawnBar>(selection.Bars.Count);
        foreach (var (placed, diameter) in selection.Bars)
        {
            DrawnBar bar;
            if (placed.Entity is PointEntity point)
            {
                var place = frame.ToLocal(plane.Project(placed.Map.Apply(point.Place)));
                bar = new DrawnBar(placed.Source, place, frame.Scale * diameter);
            }
            else
            {
                // In a block that is stretched a circle is an ellipse: the bar has its area.
                var circle = (EllipticCurve)EntityCurves.Of(placed, plane).Single();
                var area = Math.Abs(circle.U.Cross(circle.V));
                bar = new DrawnBar(placed.Source, frame.ToLocal(circle.Centre), 2 * frame.Scale * Math.Sqrt(area));
            }

            bars.Add(bar);
            if (outline.Boundaries.Sum(b => WindingNumber.Of(b.Boundary, bar.Place)) == 0)
            {
                var at = frame.ToDrawing(bar.Place);
                notes.Add(new DrawingNote(
                    NoteCode.BarOutside, $"The bar {placed.Source} at {Wording.At(at)} lies outside of the section.", [placed.Source], at));
            }
        }

        return bars.MoveToImmutable();
    }
}
