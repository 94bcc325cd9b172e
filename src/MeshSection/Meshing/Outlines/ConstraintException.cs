using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>What is wrong with a point or a line that a mesh is to keep.</summary>
public enum ConstraintFault
{
    /// <summary>A point, or an end of a line, lies outside of the section.</summary>
    Outside,

    /// <summary>A line crosses a boundary of the section, or runs along one.</summary>
    MeetsBoundary,

    /// <summary>A line ends where it begins.</summary>
    NoLength,
}

/// <summary>A point or a line that a mesh cannot keep.</summary>
public sealed class ConstraintException : Exception
{
    /// <summary>Makes the exception.</summary>
    /// <param name="fault">What is wrong.</param>
    /// <param name="place">Where, in the outline's coordinates, mm.</param>
    /// <param name="line">The line that is wrong; null for a point.</param>
    public ConstraintException(ConstraintFault fault, Point place, ConstraintLine? line = null)
        : base($"{(line is null ? "A point" : "A line")} that the mesh is to keep: {fault} at {place}.")
    {
        Fault = fault;
        Place = place;
        Line = line;
    }

    /// <summary>What is wrong.</summary>
    public ConstraintFault Fault { get; }

    /// <summary>Where, in the outline's coordinates, mm.</summary>
    public Point Place { get; }

    /// <summary>The line that is wrong; null for a point.</summary>
    public ConstraintLine? Line { get; }
}
