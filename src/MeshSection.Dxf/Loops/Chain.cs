using MeshSection.Dxf.Entities;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>A free end of linework.</summary>
/// <param name="Source">The entity that ends there.</param>
/// <param name="Place">Where, in local axes, mm.</param>
/// <param name="Outwards">The direction in which it would go on.</param>
internal readonly record struct FreeEnd(EntitySource Source, Point Place, Point Outwards);

/// <summary>Strands from a free end to a node at which others go on, or to another free end.</summary>
/// <param name="Strands">The strands, the first from the free end on.</param>
/// <param name="EndsFreely">True if its other end is free too.</param>
internal sealed record Chain(List<Strand> Strands, bool EndsFreely)
{
    public double Length { get; } = Strands.Sum(s => s.Edge.Length);

    /// <summary>Its free ends, one or two.</summary>
    public IEnumerable<FreeEnd> FreeEnds()
    {
        var (first, last) = (Strands[0], Strands[^1]);
        yield return new FreeEnd(first.Entity.Source, first.Edge.Start, -first.Edge.TangentAt(0));
        if (EndsFreely)
        {
            yield return new FreeEnd(last.Entity.Source, last.Edge.End, last.Edge.TangentAt(1));
        }
    }
}
