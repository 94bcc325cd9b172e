using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>Where two boundaries of a region face each other, as across a sheet or a web.</summary>
/// <param name="Thickness">How far they are apart there, at right angles to one of them, mm.</param>
/// <param name="From">The place on that one, mm.</param>
/// <param name="To">The place across, mm.</param>
/// <param name="Elements">
/// How many elements there are across, at least: the fewest sides that it takes from one face to the other, told from the
/// longest side between them.
/// </param>
public sealed record Wall(double Thickness, Point From, Point To, int Elements);
