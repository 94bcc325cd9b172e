using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Plots.Drawing;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>The lines of a mesh, each drawn once.</summary>
internal static class MeshMarks
{
    /// <summary>How lines that the mesh was to keep are drawn.</summary>
    public static readonly Stroke Kept = new(Palette.Blue, 2.6);

    /// <summary>The edges inside regions, as thin as their length asks for.</summary>
    public static Segments InnerEdges(Mesh mesh, View view) =>
        EdgesOf(mesh, view, e => mesh.Segments[e] < 0, InnerStroke(mesh, view));

    /// <summary>The edges along the outline: chords where it is curved.</summary>
    public static Segments OutlineEdges(Mesh mesh, View view) =>
        EdgesOf(mesh, view, e => mesh.Segments[e] >= 0 && !IsKept(mesh, e), new Stroke(Palette.Ink, 3.2));

    /// <summary>The edges along lines inside a region that the mesh was to keep.</summary>
    public static Segments KeptEdges(Mesh mesh, View view) => EdgesOf(mesh, view, e => IsKept(mesh, e), Kept);

    public static ScreenPoint[] Triangle(Mesh mesh, View view, int triangle) =>
        [.. Enumerable.Range(0, 3).Select(k => view.Of(mesh.Nodes[mesh.Corners[3 * triangle + k]]))];

    /// <summary>The centroid of three points.</summary>
    public static ScreenPoint Middle(ScreenPoint[] triangle) => new(triangle.Average(p => p.X), triangle.Average(p => p.Y));

    private static bool IsKept(Mesh mesh, int e) =>
        mesh.Segments[e] >= 0 && mesh.Neighbours[e] >= 0 && mesh.Regions[mesh.Neighbours[e]] == mesh.Regions[e / 3];

    private static Segments EdgesOf(Mesh mesh, View view, Predicate<int> isDrawn, Stroke stroke)
    {
        var ends = new List<ScreenPoint>();
        for (var i = 0; i < mesh.Corners.Length; i++)
        {
            var triangle = i / 3;
            if (mesh.Neighbours[i] < triangle && isDrawn(i))
            {
                ends.Add(view.Of(mesh.Nodes[mesh.Corners[3 * triangle + (i + 1) % 3]]));
                ends.Add(view.Of(mesh.Nodes[mesh.Corners[3 * triangle + (i + 2) % 3]]));
            }
        }

        return new Segments([.. ends], stroke);
    }

    private static Stroke InnerStroke(Mesh mesh, View view)
    {
        // An equilateral triangle of the mean area tells how long edges are.
        var area = 0.0;
        for (var t = 0; t < mesh.TriangleCount; t++)
        {
            Point a = mesh.Nodes[mesh.Corners[3 * t]], b = mesh.Nodes[mesh.Corners[3 * t + 1]], c = mesh.Nodes[mesh.Corners[3 * t + 2]];
            area += 0.5 * (b - a).Cross(c - a);
        }

        var edge = view.Scale * Math.Sqrt(4 / Math.Sqrt(3) * area / mesh.TriangleCount);
        return new Stroke(Palette.MeshLine, Math.Clamp(0.06 * edge, 0.35, 1.3));
    }
}
