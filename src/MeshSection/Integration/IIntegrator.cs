using MeshSection.Geometry;

namespace MeshSection.Integration;

/// <summary>
/// Integrates over a section. There are two, which share no formula and check each other in every run: over the
/// triangles of a mesh (<see cref="FiberIntegrator"/>) and around the boundaries (<see cref="BoundaryIntegrator"/>).
/// Coordinates are the outline's local ones.
/// </summary>
public interface IIntegrator
{
    /// <summary>The moments of the section about a point.</summary>
    /// <param name="about">The point, mm.</param>
    AreaMoments Moments(Point about);

    /// <summary>The part of the section beyond the line n·p = c, cut exactly at the line.</summary>
    /// <param name="normal">n, a unit vector; the part lies on its side.</param>
    /// <param name="offset">c, mm.</param>
    PartBeyond Beyond(Point normal, double offset);

    /// <summary>The strip without material that holds the line n·p = c, as distances along n; empty (c, c) if the line cuts material.</summary>
    /// <param name="normal">n, a unit vector.</param>
    /// <param name="offset">c, mm.</param>
    (double From, double To) Gap(Point normal, double offset);
}
