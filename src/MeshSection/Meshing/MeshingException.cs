using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>The graph given to the mesher is not planar.</summary>
public sealed class MeshingException : Exception
{
    /// <summary>Makes the exception.</summary>
    /// <param name="first">Index of a segment.</param>
    /// <param name="second">Index of the segment that crosses it, or -1 if a point lies on the first.</param>
    /// <param name="point">Where they meet, in the graph's coordinates, mm.</param>
    public MeshingException(int first, int second, Point point)
        : base(second < 0
            ? $"A point lies on segment {first} at {point}."
            : $"Segments {first} and {second} cross at {point}.")
    {
        First = first;
        Second = second;
        Point = point;
    }

    /// <summary>Index of a segment.</summary>
    public int First { get; }

    /// <summary>Index of the segment that crosses it, or -1 if a point lies on the first.</summary>
    public int Second { get; }

    /// <summary>Where they meet, in the graph's coordinates, mm.</summary>
    public Point Point { get; }
}
