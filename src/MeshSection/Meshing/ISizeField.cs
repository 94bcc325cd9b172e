using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// How long the sides of triangles may be from place to place. It is asked at the centres of triangles, from the largest
/// down, so that it should grow by less than the distance from where it is small: a dip that no centre falls into is not
/// seen.
/// </summary>
public interface ISizeField
{
    /// <summary>The longest side wanted around a place, mm, positive; infinite for no limit. The same place must give the same bits.</summary>
    /// <param name="place">The place, mm.</param>
    double At(Point place);
}
