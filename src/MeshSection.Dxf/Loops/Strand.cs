using MeshSection.Dxf.Placing;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>A piece of linework between two nodes, or a part of one.</summary>
/// <param name="From">The node at which it begins.</param>
/// <param name="To">The node at which it ends.</param>
/// <param name="Edge">The curve, from the place of one node to that of the other.</param>
/// <param name="Entity">The entity that it came from.</param>
/// <param name="Whole">The piece that it is cut from; <paramref name="Edge"/> itself if it is not cut.</param>
/// <param name="Begin">Where it begins on the whole piece, as its parameter.</param>
/// <param name="Stop">Where it ends there.</param>
internal readonly record struct Strand(int From, int To, Edge Edge, PlacedEntity Entity, Edge Whole, double Begin, double Stop)
{
    /// <summary>True if the connected linework that it belongs to did not close when its ends were joined.</summary>
    public bool IsLoose { get; init; }

    /// <summary>A whole piece.</summary>
    public static Strand Of(int from, int to, Edge edge, PlacedEntity entity) => new(from, to, edge, entity, edge, 0, 1);

    /// <summary>The same run through the other way.</summary>
    public Strand Reversed() => new(To, From, Edge.Reversed(), Entity, Whole.Reversed(), 1 - Stop, 1 - Begin) { IsLoose = IsLoose };

    /// <summary>True if the other goes on along the same whole piece.</summary>
    public bool IsContinuedBy(Strand next) => ReferenceEquals(Entity, next.Entity) && Stop == next.Begin && Whole == next.Whole;
}
