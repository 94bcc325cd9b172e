using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;
using MeshSection.Sections;
using MeshSection.Units;

namespace MeshSection.Cli.Inputs;

/// <summary>What the command line says of the mesh.</summary>
/// <param name="Elements">How many triangles to make, if given.</param>
/// <param name="ElementSize">The longest side of a triangle, if given.</param>
/// <param name="Across">How many elements to have across every wall, if given.</param>
/// <param name="MinAngle">The smallest angle wanted, degrees, if given.</param>
/// <param name="Sag">The farthest that a chord may lie from its curve, if given.</param>
internal sealed record MeshRequest(
    int? Elements, GivenLength? ElementSize, int? Across, double? MinAngle, GivenLength? Sag)
{
    /// <summary>
    /// About how many triangles are made by default: enough for a picture, and for exact integrals any number is.
    /// </summary>
    public const int DefaultElements = 1000;

    /// <summary>The most triangles that may be asked for.</summary>
    public const int MostElements = 5_000_000;

    /// <summary>The most elements across a wall that may be asked for.</summary>
    public const int MostAcross = 1000;

    /// <summary>The largest minimum angle that may be asked for, degrees.</summary>
    public const double LargestMinAngle = 33;

    /// <summary>The largest minimum angle for which refinement is proven to end, degrees.</summary>
    public const double ProvenMinAngle = 28.6;

    // Nodes that an outline may need for its own small features, whatever the size of its triangles.
    private const int LeastNodeLimit = 300_000;

    // An equilateral triangle of the longest side, for each triangle that a mesh of that longest side has.
    private const double FitsPerTriangle = 0.46;

    /// <summary>What is said of single places.</summary>
    public MeshDetail Detail { get; init; } = MeshDetail.None;

    /// <summary>Flattens and meshes a section.</summary>
    /// <param name="section">The section.</param>
    /// <param name="unit">The unit of bare lengths.</param>
    /// <param name="memory">What the work takes for each triangle, so that it is refused before the memory runs out.</param>
    /// <exception cref="CommandException">
    /// The mesh would have more triangles or chords than may be asked for or memory holds, or a point or line to keep does
    /// not lie in the section.
    /// </exception>
    public (FlatOutline Flat, Mesh Mesh) Apply(Section section, LengthUnit unit, MemoryNeed memory)
    {
        var outline = section.Outline;
        var flat = Flatten(outline, unit);
        var area = new BoundaryIntegrator(outline).Moments(outline.Bounds.Centre).Area;
        var mesher = new DelaunayMesher();
        var settings = new MeshSettings
        {
            SizeField = Detail.SizeField(outline, unit),
            RegionMaxSides = Detail.RegionMaxSides(section, unit),
        };
        var byRegion = TrianglesByRegion(outline, settings.RegionMaxSides);
        Refuse(byRegion, "--region-size", "Give longer ones.", memory);
        settings = settings with
        {
            MinAngle = MinAngle ?? settings.MinAngle,
            MaxNodes = LeastNodeLimit + (int)byRegion,
        };
        Mesh mesh;
        if (ElementSize is { } size)
        {
            var side = size.In(LengthUnit.Millimetre, unit);
            var triangles = Triangles(area, side);
            Refuse(triangles, $"--element-size {size.Value}", "Give a longer one.", memory);
            settings = settings with { MaxSide = side, MaxNodes = settings.MaxNodes + (int)triangles };
            mesh = mesher.Triangulate(flat.Graph, settings);
        }
        else if (Elements is { } count)
        {
            Refuse(count, $"--elements {count}", "Give fewer.", memory);
            settings = settings with { MaxNodes = settings.MaxNodes + count };
            mesh = MeshSizing.ForCount(mesher, flat.Graph, settings, area, count);
        }
        else
        {
            // Nobody asked for a number: one mesh of about the default does.
            mesh = mesher.Triangulate(
                flat.Graph, settings with { MaxArea = MeshSizing.LargestAreaFor(area, DefaultElements) });
        }

        return (flat, Across is { } across ? Refined(mesher, mesh, flat.Graph, settings, across, memory) : mesh);
    }

    /// <summary>About how many triangles the regions take that have a longest side of their own.</summary>
    private static double TrianglesByRegion(Outline outline, ImmutableArray<double> sides) => outline.Boundaries
        .GroupBy(b => b.Region)
        .Where(region => region.Key < sides.Length)
        .Sum(region => Triangles(region.Sum(b => b.Boundary.SignedArea), sides[region.Key]));

    private static double Triangles(double area, double longestSide) =>
        area / (FitsPerTriangle * Math.Sqrt(3) / 4 * longestSide * longestSide);

    private static Mesh Refined(
        DelaunayMesher mesher, Mesh mesh, PlanarGraph graph, MeshSettings settings, int across, MemoryNeed memory)
    {
        var count = mesh.TriangleCount + WallSurvey.Of(mesh, graph).Estimate(across);
        Refuse(count, $"--across {across}", "Give fewer.", memory);
        settings = settings with { MaxNodes = settings.MaxNodes + (int)count };
        return MeshSizing.AcrossWalls(mesher, mesh, graph, settings, across);
    }

    private static void Refuse(double count, string option, string advice, MemoryNeed memory)
    {
        if (count > MostElements)
        {
            throw new CommandException(FormattableString.Invariant(
                $"{option}: would need about {count:G3} triangles, and {MostElements} are the most. {advice}"));
        }

        memory.Check(count, option, advice);
    }

    private FlatOutline Flatten(Outline outline, LengthUnit unit)
    {
        var flattening = Sag is { } sag ? WithSag(sag, outline, unit) : Flattening.For(outline);
        try
        {
            return flattening.Apply(outline, Detail.Constraints(outline, unit));
        }
        catch (ConstraintException fault)
        {
            throw new CommandException(ConstraintWords.Of(fault, outline, unit));
        }
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
}
