using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Units;

namespace MeshSection.Files.Meshes;

/// <summary>A mesh as files hold it: coordinates in the unit and the axes of the drawing, whole elements, and no more.</summary>
/// <param name="Nodes">The nodes, in the unit.</param>
/// <param name="Elements">
/// The nodes of each triangle, counter-clockwise: its corners, and in a mesh of second order then the nodes between
/// corners 0 and 1, 1 and 2, 2 and 0.
/// </param>
/// <param name="NodesPerElement">3 or 6.</param>
/// <param name="Regions">The region of each triangle, from 0.</param>
/// <param name="Lines">
/// The nodes of each edge on a boundary or a line to be kept: its ends, and in a mesh of second order then the one between.
/// </param>
/// <param name="LineGroups">What each of them lies on: a boundary of the outline, or one past the last for lines to be kept.</param>
/// <param name="GroupNames">The name of each of those that there are.</param>
/// <param name="Unit">The unit of the coordinates.</param>
public sealed record MeshFile(
    ImmutableArray<Point> Nodes,
    ImmutableArray<int> Elements,
    int NodesPerElement,
    ImmutableArray<int> Regions,
    ImmutableArray<int> Lines,
    ImmutableArray<int> LineGroups,
    ImmutableArray<string> GroupNames,
    LengthUnit Unit)
{
    private static readonly int[] SecondOrder = [0, 1, 2, 5, 3, 4];

    /// <summary>How many triangles there are.</summary>
    public int ElementCount => Regions.Length;

    /// <summary>How many nodes an edge has: 2 or 3.</summary>
    public int NodesPerLine => NodesPerElement / 3 + 1;

    /// <summary>A mesh of straight triangles with three nodes.</summary>
    /// <param name="flat">The flattened outline.</param>
    /// <param name="mesh">The mesh of its graph.</param>
    /// <param name="unit">The unit to write in.</param>
    public static MeshFile OfFirstOrder(FlatOutline flat, Mesh mesh, LengthUnit unit)
    {
        ArgumentNullException.ThrowIfNull(mesh);
        return Of(flat, mesh, mesh.Nodes, mesh.Corners, 3, (from, to, _) => [from, to], unit);
    }

    /// <summary>A mesh of triangles with six nodes, those along the outline on the true curves.</summary>
    /// <param name="flat">The flattened outline.</param>
    /// <param name="mesh">The mesh fitted to it.</param>
    /// <param name="unit">The unit to write in.</param>
    public static MeshFile OfSecondOrder(FlatOutline flat, CurvedMesh mesh, LengthUnit unit)
    {
        ArgumentNullException.ThrowIfNull(mesh);
        var elements = new int[mesh.Elements.Length];
        for (var i = 0; i < elements.Length; i++)
        {
            elements[i] = mesh.Elements[i - i % 6 + SecondOrder[i % 6]];
        }

        return Of(
            flat,
            mesh.Mesh,
            mesh.Nodes,
            [.. elements],
            CurvedMesh.NodesPerTriangle,
            (from, to, e) => [from, to, mesh.Elements[6 * (e / 3) + 3 + e % 3]],
            unit);
    }

    private static MeshFile Of(
        FlatOutline flat,
        Mesh mesh,
        ImmutableArray<Point> nodes,
        ImmutableArray<int> elements,
        int nodesPerElement,
        Func<int, int, int, int[]> nodesOfLine,
        LengthUnit unit)
    {
        ArgumentNullException.ThrowIfNull(flat);
        ArgumentNullException.ThrowIfNull(unit);
        var (lines, groups) = (ImmutableArray.CreateBuilder<int>(), ImmutableArray.CreateBuilder<int>());
        for (var e = 0; e < mesh.Segments.Length; e++)
        {
            var segment = mesh.Segments[e];
            if (segment < 0 || mesh.Neighbours[e] > e / 3)
            {
                continue;
            }

            var first = e - e % 3;
            lines.AddRange(nodesOfLine(mesh.Corners[first + (e + 1) % 3], mesh.Corners[first + (e + 2) % 3], e));
            groups.Add(segment < flat.Chords.Length ? flat.Chords[segment].Place.Boundary : flat.Outline.Boundaries.Length);
        }

        return new MeshFile(
            [.. nodes.Select(n => InUnit(flat.Outline.Origin + n))],
            elements,
            nodesPerElement,
            mesh.Regions,
            lines.ToImmutable(),
            groups.ToImmutable(),
            [.. flat.Outline.Boundaries.Select((_, b) => $"boundary {b + 1}"), "line"],
            unit);

        Point InUnit(Point p) => new(unit.FromMillimetres(p.X, 1), unit.FromMillimetres(p.Y, 1));
    }
}
