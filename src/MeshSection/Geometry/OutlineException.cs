namespace MeshSection.Geometry;

/// <summary>What can be wrong with a set of closed boundaries.</summary>
public enum OutlineFault
{
    /// <summary>There is no boundary at all.</summary>
    Empty,

    /// <summary>A coordinate is NaN or infinite, or a bulge is zero or not finite.</summary>
    NotFinite,

    /// <summary>An edge begins and ends in the same point.</summary>
    NoLength,

    /// <summary>A boundary encloses no area.</summary>
    NoArea,

    /// <summary>Two edges of one boundary cross.</summary>
    SelfCrossing,

    /// <summary>Two edges of one boundary touch without being neighbours.</summary>
    SelfTouching,

    /// <summary>Two boundaries cross.</summary>
    Crossing,

    /// <summary>Two boundaries touch: at a point or along a piece of edge.</summary>
    Touching,

    /// <summary>The same boundary is there twice.</summary>
    Duplicate,
}

/// <summary>A place on the boundaries that were given.</summary>
/// <param name="Boundary">Index of the boundary in the order given.</param>
/// <param name="Edge">Index of the edge in that boundary.</param>
public readonly record struct EdgePlace(int Boundary, int Edge);

/// <summary>The boundaries given do not make an outline.</summary>
public sealed class OutlineException : Exception
{
    /// <summary>Makes the exception.</summary>
    /// <param name="fault">What is wrong.</param>
    /// <param name="point">Where, in the drawing's axes, mm; null if there is no one place.</param>
    /// <param name="first">The edge concerned, if there is one.</param>
    /// <param name="second">The other edge concerned, if there is one.</param>
    public OutlineException(OutlineFault fault, Point? point = null, EdgePlace? first = null, EdgePlace? second = null)
        : base($"{fault} at {point}: {first}, {second}")
    {
        Fault = fault;
        Point = point;
        First = first;
        Second = second;
    }

    /// <summary>What is wrong.</summary>
    public OutlineFault Fault { get; }

    /// <summary>Where, in the drawing's axes, mm; null if there is no one place.</summary>
    public Point? Point { get; }

    /// <summary>The edge concerned, if there is one.</summary>
    public EdgePlace? First { get; }

    /// <summary>The other edge concerned, if there is one.</summary>
    public EdgePlace? Second { get; }
}
