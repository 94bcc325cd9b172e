using System.Collections.Immutable;
using MeshSection.Dxf.Curves;
using MeshSection.Dxf.Loops;
using MeshSection.Dxf.Selection;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Faces;

/// <summary>Gathers the curves that took no part: what leads nowhere, and what was not chosen but is seen in the drawing.</summary>
internal static class LeftOutEdges
{
    public static ImmutableArray<LeftOutEdge> Of(EntitySelection selection, DrawingPlane plane, LocalFrame frame, JoinNotes joined)
    {
        var left = ImmutableArray.CreateBuilder<LeftOutEdge>();
        foreach (var strand in joined.LeadingNowhere)
        {
            left.Add(new LeftOutEdge(strand.Edge, strand.Entity.Source, LeadsNowhere: true));
        }

        var edges = new List<Edge>();
        foreach (var placed in selection.NotChosen.Where(plane.Holds))
        {
            edges.Clear();
            foreach (var curve in EntityCurves.Of(placed, plane))
            {
                CurveEdges.Append(curve, frame, edges);
            }

            left.AddRange(edges.Where(e => e.IsFinite).Select(e => new LeftOutEdge(e, placed.Source, LeadsNowhere: false)));
        }

        return left.ToImmutable();
    }
}
