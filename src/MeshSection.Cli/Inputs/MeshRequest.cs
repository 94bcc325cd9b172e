using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;
using MeshSection.Sections;
using MeshSection.Units;

namespace MeshSection.Cli.Inputs;

/// <summary>What the command line says of the mesh.</summary>
/// <param name="Elements">About how many triangles to make, if no size is given.</param>
/// <param name="ElementSize">The largest side of a triangle, if given.</param>
/// <param name="MinAngle">The smallest angle wanted, degrees, if given.</param>
/// <param name="Sag">The farthest that a chord may lie from its curve, if given.</param>
internal sealed record MeshRequest(int Elements, GivenLength? ElementSize, double? MinAngle, GivenLength? Sag)
{
    /// <summary>Triangles made by default: enough for a picture, and for exact integrals any number is.</summary>
    public const int DefaultElements = 1000;

    /// <summary>The most triangles that may be asked for.</summary>
    public const int MostElements = 5_000_000;

    /// <summary>The largest minimum angle that may be asked for, degrees.</summary>
    public const double LargestMinAngle = 33;

    // Nodes that an outline may need for its own small features, whatever the size of its triangles.
    private const int LeastNodeLimit = 300_000;

    // Refinement halves areas until they fit, so that the mean ends near two thirds of the largest.
    private const double MeanOverLargest = 0.65;

    /// <summary>Flattens and meshes a section.</summary>
    /// <param name="section">The section.</param>
    /// <param name="unit">The unit of bare lengths.</param>
    /// <exception cref="CommandException">The mesh would have more triangles or chords than may be asked for.</exception>
    public (FlatOutline Flat, Mesh Mesh) Apply(Section section, LengthUnit unit)
    {
        var outline = section.Outline;
        var flattening = Sag is { } sag ? WithSag(sag, outline, unit) : Flattening.For(outline);
        var flat = flattening.Apply(outline);
        var area = new BoundaryIntegrator(outline).Moments(outline.Bounds.Centre).Area;
        var settings = new MeshSettings();
        var maxArea = MaxArea(area, unit);
        settings = settings with
        {
            MinAngle = MinAngle ?? settings.MinAngle,
            MaxArea = maxArea,
            MaxNodes = LeastNodeLimit + (int)(2 * area / maxArea),
        };
        return (flat, new DelaunayMesher().Triangulate(flat.Graph, settings));
    }

    private static Flattening WithSag(GivenLength sag, Outline outline, LengthUnit unit)
    {
        var flattening = new Flattening(sag.In(LengthUnit.Millimetre, unit));
        var count = outline.Boundaries.SelectMany(b => b.Boundary.Edges)
            .Sum(e => e.Steps(flattening.MaxSag, flattening.MaxTurn * Math.PI / 180));
        return count <= LeastNodeLimit
            ? flattening
            : throw new CommandException(FormattableString.Invariant(
                $"--sag {sag.Value}: would need about {count:G3} chords, and {LeastNodeLimit} are the most. Give a larger one."));
    }

    private double MaxArea(double area, LengthUnit unit)
    {
        if (ElementSize is not { } size)
        {
            return area / (MeanOverLargest * Elements);
        }

        // An equilateral triangle of that side.
        var side = size.In(LengthUnit.Millimetre, unit);
        var largest = Math.Sqrt(3) / 4 * side * side;
        var count = area / (MeanOverLargest * largest);
        return count <= MostElements
            ? largest
            : throw new CommandException(FormattableString.Invariant(
                $"--element-size {size.Value}: would need about {count:G3} triangles, and {MostElements} are the most. Give a larger size."));
    }
}
