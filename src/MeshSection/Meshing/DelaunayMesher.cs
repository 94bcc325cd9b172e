using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// The mesher: a constrained Delaunay triangulation of the graph, refined to the quality and size asked for. The same
/// graph and settings give the same mesh, bit for bit.
/// </summary>
/// <remarks>
/// Exact predicates [Shewchuk1997]; points in rounds along a Hilbert curve [AmentaChoiRote2003]; segments by emptying and
/// refilling what they cross [Anglada1997]; refinement by encroached segments, then by triangles, smallest first
/// [Ruppert1995, Shewchuk2002], with off-centres [Ungor2009]; at corners of the outline under 60 degrees, concentric
/// circles and triangles that are left alone [MillerPavWalkington2003], listed in <see cref="Mesh.Unrefined"/>.
/// </remarks>
public sealed class DelaunayMesher : IMesher
{
    /// <summary>Triangles in a refined mesh for each time that the largest one would fit into the area.</summary>
    private const double TrianglesPerFit = 2;

    /// <summary>The largest coordinate, mm, of which four may be multiplied without overflow.</summary>
    private const double LargestCoordinate = 1e60;

    /// <inheritdoc/>
    /// <exception cref="ArgumentOutOfRangeException">A setting lies outside its range.</exception>
    /// <exception cref="ArgumentException">
    /// A coordinate is not finite or beyond 1e60 mm, two points are alike, a segment has no length or names a point that there is not, or
    /// segments name different regions for one place.
    /// </exception>
    public Mesh Triangulate(PlanarGraph graph, MeshSettings settings, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(graph);
        ArgumentNullException.ThrowIfNull(settings);
        Check(settings);
        Check(graph);

        ImmutableArray<Point> points = graph.Points;
        var mesh = new Triangulation(points.Length + 16, TriangleCapacity(graph, settings));
        foreach (Point point in points) mesh.AddGiven(point);
        if (PointInsertion.Run(mesh, cancellation))
        {
            SegmentInsertion.Run(mesh, graph.Segments, cancellation);
            RegionFlood.Run(mesh, graph.Segments);
        }
        var refiner = new Refiner(mesh, graph, settings);
        refiner.Run(cancellation);
        return MeshNumbering.Run(mesh, points, refiner);
    }

    /// <inheritdoc/>
    /// <exception cref="ArgumentOutOfRangeException">A setting lies outside its range, or a side is not positive.</exception>
    /// <exception cref="ArgumentException">The mesh is not one of the graph, or the sides are not as many as its triangles.</exception>
    public Mesh Refine(
        Mesh mesh,
        PlanarGraph graph,
        ImmutableArray<double> sides,
        MeshSettings settings,
        CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(mesh);
        ArgumentNullException.ThrowIfNull(graph);
        ArgumentNullException.ThrowIfNull(settings);
        Check(settings);
        Check(mesh, graph, sides);

        Triangulation opened = MeshReopening.Run(mesh, graph);
        var refiner = new Refiner(opened, graph, settings, new SizeMap(opened, mesh, sides));
        refiner.Run(cancellation);
        return MeshNumbering.Run(opened, mesh.Nodes, refiner);
    }

    private static int TriangleCapacity(PlanarGraph graph, MeshSettings settings)
    {
        double twiceArea = 0;
        foreach (Segment s in graph.Segments)
        {
            if (s.Left >= 0 == s.Right >= 0) continue;
            double cross = (graph.Points[s.From] - graph.Points[0]).Cross(graph.Points[s.To] - graph.Points[0]);
            twiceArea += s.Left >= 0 ? cross : -cross;
        }
        double fits = Math.Min(0.5 * twiceArea / settings.MaxArea * TrianglesPerFit, 2.0 * settings.MaxNodes);
        return 4 * graph.Points.Length + 64 + (int)Math.Clamp(fits, 0, 1 << 24);
    }

    private static void Check(MeshSettings settings)
    {
        if (!(settings.MinAngle is >= 0 and <= 33))
        {
            throw new ArgumentOutOfRangeException(
                nameof(settings), settings.MinAngle, "The smallest angle must be 0 to 33 degrees.");
        }
        if (!(settings.MaxArea > 0))
        {
            throw new ArgumentOutOfRangeException(
                nameof(settings), settings.MaxArea, "The largest area must be positive.");
        }
        if (!(settings.MaxSide > 0))
        {
            throw new ArgumentOutOfRangeException(
                nameof(settings), settings.MaxSide, "The longest side must be positive.");
        }
        foreach (double side in settings.RegionMaxSides)
        {
            if (side > 0) continue;
            throw new ArgumentOutOfRangeException(
                nameof(settings), side, "The longest side in a region must be positive.");
        }
    }

    private static void Check(Mesh mesh, PlanarGraph graph, ImmutableArray<double> sides)
    {
        if (sides.IsDefault || sides.Length != mesh.TriangleCount)
        {
            throw new ArgumentException(
                $"{(sides.IsDefault ? 0 : sides.Length)} sides were given for {mesh.TriangleCount} triangles.", nameof(sides));
        }
        foreach (double side in sides)
        {
            if (!(side > 0)) throw new ArgumentOutOfRangeException(nameof(sides), side, "A side must be positive.");
        }
        bool isOfGraph = mesh.Nodes.Length >= graph.Points.Length
            && mesh.Nodes.AsSpan()[..graph.Points.Length].SequenceEqual(graph.Points.AsSpan());
        if (!isOfGraph) throw new ArgumentException("The mesh does not begin with the points of the graph.", nameof(mesh));
    }

    private static void Check(PlanarGraph graph)
    {
        for (int i = 0; i < graph.Points.Length; i++)
        {
            Point point = graph.Points[i];
            if (Math.Abs(point.X) <= LargestCoordinate && Math.Abs(point.Y) <= LargestCoordinate) continue;
            throw new ArgumentException($"Point {i} of the graph is not finite, or further than 1e60 mm away: {point}.");
        }
        for (int s = 0; s < graph.Segments.Length; s++)
        {
            Segment segment = graph.Segments[s];
            bool isInside = (uint)segment.From < (uint)graph.Points.Length && (uint)segment.To < (uint)graph.Points.Length;
            if (!isInside || segment.From == segment.To)
            {
                throw new ArgumentException(
                    $"Segment {s} of the graph joins points {segment.From} and {segment.To}, of {graph.Points.Length}.");
            }
        }
    }
}
