using System.Collections.Immutable;
using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Tags;
using MeshSection.Geometry;

namespace MeshSection.Dxf;

/// <summary>A place on an entity of the drawing.</summary>
/// <param name="Source">The entity.</param>
/// <param name="Point">The point, in the drawing's axes and unit; null if the whole entity is meant.</param>
public sealed record EntityPlace(EntitySource Source, Point? Point);

/// <summary>
/// A drawing cannot be read, or no outline can be made of it. The message says what is wrong, where, and what to do;
/// the properties hold the same as facts.
/// </summary>
public sealed class DrawingException : Exception
{
    internal DrawingException(DrawingFault fault, string message)
        : base(message) => Fault = fault;

    /// <summary>What is wrong.</summary>
    public DrawingFault Fault { get; }

    /// <summary>The place in the file, if one is concerned.</summary>
    public FilePlace? Place { get; init; }

    /// <summary>The group code of the value concerned, if it is one.</summary>
    public int? GroupCode { get; init; }

    /// <summary>The entities concerned, with coordinates where there are any.</summary>
    public ImmutableArray<EntityPlace> Places { get; init; } = [];

    /// <summary>How far apart the two ends are, in the drawing's unit, if a boundary is open.</summary>
    public double? Distance { get; init; }

    /// <summary>The tolerance that would join the ends, in the drawing's unit, if one can.</summary>
    public double? Tolerance { get; init; }

    /// <summary>The extents of what was read, in the drawing's axes and unit, if they matter.</summary>
    public Box? Extents { get; init; }
}
