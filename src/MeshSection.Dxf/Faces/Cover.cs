using MeshSection.Dxf.Loops;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Faces;

/// <summary>What one layer, or one filled area, makes material: all that lies in an odd number of its loops.</summary>
/// <param name="Layer">The layer.</param>
/// <param name="Loops">Its closed loops.</param>
internal sealed record Cover(string Layer, List<Loop> Loops)
{
    private readonly List<(Boundary Boundary, Box Bounds)> _boundaries =
        Loops.ConvertAll(l => Boundary.Create(l.Edges)).ConvertAll(b => (b, b.Bounds));

    public bool Holds(Point point)
    {
        var around = 0;
        foreach (var (boundary, bounds) in _boundaries)
        {
            around += bounds.Contains(point) ? Math.Abs(WindingNumber.Of(boundary, point)) : 0;
        }

        return around % 2 == 1;
    }
}
