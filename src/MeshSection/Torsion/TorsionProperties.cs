using MeshSection.Geometry;

namespace MeshSection.Torsion;

/// <summary>A torsion constant between two bounds.</summary>
/// <param name="Lower">Lower bound, from the stress function, mm⁴.</param>
/// <param name="Upper">Upper bound, from the warping function, mm⁴.</param>
public readonly record struct TorsionConstant(double Lower, double Upper)
{
    /// <summary>The mean of the two bounds, mm⁴: no farther from the true value than half the gap.</summary>
    public double Value => 0.5 * (Lower + Upper);

    /// <summary>The distance of the bounds as a part of <see cref="Value"/>.</summary>
    public double Gap => (Upper - Lower) / Value;
}

/// <summary>
/// How a section yields to shear forces through its shear centre: the strain energy per length of member is
/// (X Vx² + Y Vy² + 2 XY Vx Vy) / (2 G).
/// </summary>
/// <param name="X">∫ τ·τ dA for Vx = 1, 1/mm².</param>
/// <param name="Y">∫ τ·τ dA for Vy = 1, 1/mm².</param>
/// <param name="XY">∫ τ·τ' dA between the two, 1/mm²: not zero where x and y are no axes of symmetry.</param>
public readonly record struct ShearFlexibility(double X, double Y, double XY);

/// <summary>
/// Torsion, warping and shear of a section of one material, by the theory of Saint-Venant. Coordinates are in the
/// drawing's axes; mm.
/// </summary>
public sealed record TorsionProperties
{
    /// <summary>Poisson's ratio ν that was used for shear.</summary>
    public required double PoissonRatio { get; init; }

    /// <summary>Area of the region analysed, mm²: that of the outline if <see cref="OutlineDeviation"/> is 0.</summary>
    public required double Area { get; init; }

    /// <summary>
    /// The torsion constant J, with T = G J θ. The bounds hold for the true outline, curves included, up to rounding, if
    /// <see cref="OutlineDeviation"/> is 0; otherwise for the region analysed.
    /// </summary>
    public required TorsionConstant TorsionConstant { get; init; }

    /// <summary>
    /// The shear centre: <see cref="TrefftzShearCentre"/>, which depends on the shape alone and about which bending and
    /// torsion share no energy.
    /// </summary>
    public Point ShearCentre => TrefftzShearCentre;

    /// <summary>
    /// The shear centre from the warping function [Trefftz1935]: also the pole about which the warping is orthogonal to
    /// bending, and the elastic shear centre for ν = 0.
    /// </summary>
    public required Point TrefftzShearCentre { get; init; }

    /// <summary>
    /// The elastic shear centre for the ν given: a force through it bends without twist in the mean over the section.
    /// </summary>
    public required Point ElasticShearCentre { get; init; }

    /// <summary>
    /// Warping constant Iw = ∫ ω² dA, mm⁶, with ω about the Trefftz shear centre and of zero mean; warping through the
    /// thickness of the walls is included.
    /// </summary>
    public required double WarpingConstant { get; init; }

    /// <summary>
    /// Flexibility in shear by the energy of the exact flexure field for the ν given, without mean twist
    /// [SchrammKitisKangPilkey1994].
    /// </summary>
    public required ShearFlexibility ShearFlexibility { get; init; }

    /// <summary>Shear area for a force along x, mm²: its energy per length is Vx² / (2 G As).</summary>
    public double ShearAreaX => 1 / ShearFlexibility.X;

    /// <summary>Shear area for a force along y, mm²: its energy per length is Vy² / (2 G As).</summary>
    public double ShearAreaY => 1 / ShearFlexibility.Y;

    /// <summary>Shear coefficient As / A for a force along x, 5/6 for a rectangle with ν = 0.</summary>
    public double ShearCoefficientX => ShearAreaX / Area;

    /// <summary>Shear coefficient As / A for a force along y.</summary>
    public double ShearCoefficientY => ShearAreaY / Area;

    /// <summary>
    /// Greatest distance of the region analysed from the true outline, mm: 0, unless a curve runs so close to another
    /// boundary that its triangles would be turned inside out and must keep their chords.
    /// </summary>
    public required double OutlineDeviation { get; init; }
}
