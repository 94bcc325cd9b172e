using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>What a boundary separates.</summary>
public enum BoundaryRole
{
    /// <summary>Material inside, nothing around it.</summary>
    Outer,

    /// <summary>Nothing inside, material around it.</summary>
    Hole,

    /// <summary>Material inside, a hole around it.</summary>
    Island,
}

/// <summary>A boundary in its place among the others of an outline.</summary>
/// <param name="Boundary">The loop, with the material on its left: counter-clockwise unless it is a hole.</param>
/// <param name="Role">What it separates.</param>
/// <param name="Parent">Index of the boundary directly around it, or -1.</param>
/// <param name="Region">Index of the region that it bounds: the connected piece of material on its left.</param>
public sealed record NestedBoundary(Boundary Boundary, BoundaryRole Role, int Parent, int Region);

/// <summary>
/// The closed boundaries of a cross-section, nested: which of them hold material and which are holes. An outline that
/// exists is sound: no boundary crosses or touches itself or another, and none is without area.
/// </summary>
public sealed class Outline
{
    private Outline(ImmutableArray<NestedBoundary> boundaries, int regionCount, Box bounds, Point origin)
    {
        Boundaries = boundaries;
        RegionCount = regionCount;
        Bounds = bounds;
        Origin = origin;
    }

    /// <summary>The boundaries in the order given, in local coordinates, mm.</summary>
    public ImmutableArray<NestedBoundary> Boundaries { get; }

    /// <summary>How many separate pieces of material there are: outer boundaries and islands.</summary>
    public int RegionCount { get; }

    /// <summary>The smallest box that holds the outline, in local coordinates, mm.</summary>
    public Box Bounds { get; }

    /// <summary>
    /// Where the local origin lies in the drawing's axes, mm. Geometry is kept near the origin so that a section far
    /// from the drawing's origin loses no digits; only results are moved back.
    /// </summary>
    public Point Origin { get; }

    /// <summary>Nests the boundaries and makes sure that they are sound.</summary>
    /// <param name="boundaries">Closed boundaries in local coordinates, in any order and direction.</param>
    /// <param name="origin">Where the local origin lies in the drawing's axes; by default they are the same.</param>
    /// <exception cref="OutlineException">A boundary crosses or touches itself or another, or has no area.</exception>
    public static Outline Create(IEnumerable<Boundary> boundaries, Point origin = default)
    {
        ImmutableArray<Boundary> loops = [.. boundaries];
        OutlineCheck.Run(loops, origin);
        var nested = Nesting.Of(loops, out var regionCount);
        var bounds = loops.Aggregate(Box.Empty, (box, b) => box.With(b.Bounds));
        return new Outline(nested, regionCount, bounds, origin);
    }
}
