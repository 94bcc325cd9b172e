using MeshSection.Geometry;

namespace MeshSection.Tests.Sections.Shapes;

/// <summary>Area by chords and circular segments, apart from the code under test.</summary>
internal static class LoopMeasure
{
    /// <summary>Area enclosed, counter-clockwise positive.</summary>
    public static double Area(Boundary loop) => loop.Edges.Sum(edge => 0.5 * edge.Start.Cross(edge.End) + Segment(edge));

    private static double Segment(Edge edge) => edge is ArcEdge arc
        ? 0.5 * arc.Radius * arc.Radius * (arc.Sweep - Math.Sin(arc.Sweep))
        : 0;
}
