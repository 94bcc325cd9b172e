using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Properties;

/// <summary>Values about the x and the y axis.</summary>
/// <param name="X">About x.</param>
/// <param name="Y">About y.</param>
public readonly record struct AxisPair(double X, double Y);

/// <summary>Second moments of area.</summary>
/// <param name="X">Ix = ∫ y² dA, mm⁴.</param>
/// <param name="Y">Iy = ∫ x² dA, mm⁴.</param>
/// <param name="XY">Ixy = ∫ x y dA, mm⁴.</param>
public readonly record struct SecondMoments(double X, double Y, double XY)
{
    /// <summary>Polar second moment Ip = Ix + Iy, mm⁴.</summary>
    public double Polar => X + Y;
}

/// <summary>Principal axes through the centroid.</summary>
/// <param name="I1">Major second moment, mm⁴.</param>
/// <param name="I2">Minor second moment, mm⁴.</param>
/// <param name="Angle">Counter-clockwise from x to axis 1, degrees, in (-90, 90]; 0 where every axis is principal.</param>
public readonly record struct PrincipalAxes(double I1, double I2, double Angle);

/// <summary>The point of a section that lies farthest to one side of an axis.</summary>
/// <param name="Distance">Distance from the axis, mm, positive.</param>
/// <param name="Point">The point, in the drawing's axes, mm.</param>
/// <param name="Modulus">Elastic section modulus I / distance, mm³.</param>
public readonly record struct ExtremeFibre(double Distance, Point Point, double Modulus);

/// <summary>Both sides of an axis: an unsymmetric section has a different modulus at each.</summary>
/// <param name="Positive">Top for x, right for y, the positive side of the other axis for 1 and 2.</param>
/// <param name="Negative">Bottom for x, left for y, the negative side of the other axis for 1 and 2.</param>
public readonly record struct ExtremeFibres(ExtremeFibre Positive, ExtremeFibre Negative)
{
    // Two sides whose moduli differ by rounding only both govern.
    private const double Tie = 1e-9;

    /// <summary>The side with the smaller modulus: there the stress is greatest.</summary>
    public ExtremeFibre Governing => Positive.Modulus <= Negative.Modulus ? Positive : Negative;

    /// <summary>True if the positive side governs, or both do.</summary>
    public bool PositiveGoverns => Positive.Modulus <= Negative.Modulus * (1 + Tie);

    /// <summary>True if the negative side governs, or both do.</summary>
    public bool NegativeGoverns => Negative.Modulus <= Positive.Modulus * (1 + Tie);
}

/// <summary>Full plastic bending about one axis.</summary>
/// <param name="NeutralAxis">
/// Where the plastic neutral axis lies. About x its y and about y its x, in the drawing's axes; about 1 and 2 its
/// signed distance from the centroid along the other principal axis; mm.
/// </param>
/// <param name="Modulus">Plastic section modulus ∫ |d| dA with d the distance from the plastic neutral axis, mm³.</param>
/// <param name="ShapeFactor">Plastic modulus over the governing elastic one.</param>
public readonly record struct PlasticBending(double NeutralAxis, double Modulus, double ShapeFactor);

/// <summary>One quantity by the two integrators.</summary>
/// <param name="Quantity">Which quantity.</param>
/// <param name="Fiber">By the fibers of the mesh, in powers of mm.</param>
/// <param name="Boundary">By the boundary integrals around the outline, in powers of mm.</param>
/// <param name="Difference">|fiber - boundary| over a natural scale of the quantity.</param>
public readonly record struct CrossCheck(CheckedQuantity Quantity, double Fiber, double Boundary, double Difference);

/// <summary>The quantities that every run computes twice.</summary>
public enum CheckedQuantity
{
    /// <summary>Area, mm².</summary>
    Area,

    /// <summary>x of the centroid, mm.</summary>
    CentroidX,

    /// <summary>y of the centroid, mm.</summary>
    CentroidY,

    /// <summary>Ix about the centroid, mm⁴.</summary>
    SecondMomentX,

    /// <summary>Iy about the centroid, mm⁴.</summary>
    SecondMomentY,

    /// <summary>Ixy about the centroid, mm⁴.</summary>
    SecondMomentXY,

    /// <summary>Plastic modulus about x, mm³.</summary>
    PlasticModulusX,

    /// <summary>Plastic modulus about y, mm³.</summary>
    PlasticModulusY,

    /// <summary>Plastic modulus about axis 1, mm³.</summary>
    PlasticModulus1,

    /// <summary>Plastic modulus about axis 2, mm³.</summary>
    PlasticModulus2,
}

/// <summary>How far the chords of the mesh are from the curved outline.</summary>
/// <param name="MaxSag">Greatest distance of a chord from its curve, mm.</param>
/// <param name="Area">Relative error in area of the polygon of the chords.</param>
/// <param name="SecondMomentX">Relative error in Ix of the polygon of the chords, about its own centroid.</param>
/// <param name="SecondMomentY">Relative error in Iy of the polygon of the chords, about its own centroid.</param>
public readonly record struct ChordError(double MaxSag, double Area, double SecondMomentX, double SecondMomentY);

/// <summary>What is known of the mesh on which the fibers were integrated.</summary>
/// <param name="Triangles">How many triangles.</param>
/// <param name="Nodes">How many nodes.</param>
/// <param name="MinAngle">The smallest angle of any triangle, degrees.</param>
/// <param name="Unrefined">How many triangles could not be given the quality asked for.</param>
public readonly record struct MeshSummary(int Triangles, int Nodes, double MinAngle, int Unrefined = 0);

/// <summary>
/// Every area property of a section of one material. Values are those of the curved outline itself (boundary
/// integrals), each checked by the fibers of the mesh. Coordinates are in the drawing's axes; base units mm and kg.
/// </summary>
public sealed record SectionProperties
{
    /// <summary>Area A, mm².</summary>
    public required double Area { get; init; }

    /// <summary>Length of the outer boundaries, mm.</summary>
    public required double OuterPerimeter { get; init; }

    /// <summary>Length of the boundaries inside: holes and the islands in them, mm; 0 without holes.</summary>
    public required double InnerPerimeter { get; init; }

    /// <summary>Length of all boundaries, mm.</summary>
    public double Perimeter => OuterPerimeter + InnerPerimeter;

    /// <summary>The smallest box that holds the section, mm.</summary>
    public required Box BoundingBox { get; init; }

    /// <summary>Centroid, mm.</summary>
    public required Point Centroid { get; init; }

    /// <summary>First moments about the drawing's own origin: X = ∫ y dA, Y = ∫ x dA, mm³.</summary>
    public required AxisPair FirstMomentDatum { get; init; }

    /// <summary>Second moments about the drawing's own origin, mm⁴.</summary>
    public required SecondMoments SecondMomentDatum { get; init; }

    /// <summary>Second moments about the centroid, mm⁴.</summary>
    public required SecondMoments SecondMoment { get; init; }

    /// <summary>Principal axes and moments.</summary>
    public required PrincipalAxes Principal { get; init; }

    /// <summary>Top (positive) and bottom (negative) fibres about x.</summary>
    public required ExtremeFibres ElasticX { get; init; }

    /// <summary>Right (positive) and left (negative) fibres about y.</summary>
    public required ExtremeFibres ElasticY { get; init; }

    /// <summary>Fibres about axis 1: positive towards +2.</summary>
    public required ExtremeFibres Elastic1 { get; init; }

    /// <summary>Fibres about axis 2: positive towards +1.</summary>
    public required ExtremeFibres Elastic2 { get; init; }

    /// <summary>Plastic bending about x.</summary>
    public required PlasticBending PlasticX { get; init; }

    /// <summary>Plastic bending about y.</summary>
    public required PlasticBending PlasticY { get; init; }

    /// <summary>Plastic bending about axis 1.</summary>
    public required PlasticBending Plastic1 { get; init; }

    /// <summary>Plastic bending about axis 2.</summary>
    public required PlasticBending Plastic2 { get; init; }

    /// <summary>Mass per length of member, kg/mm; null if no density is known.</summary>
    public required double? MassPerLength { get; init; }

    /// <summary>The same quantities by both integrators.</summary>
    public required ImmutableArray<CrossCheck> CrossChecks { get; init; }

    /// <summary>How far the chords of the mesh are from the curved outline.</summary>
    public required ChordError Chords { get; init; }

    /// <summary>The mesh on which the fibers were integrated.</summary>
    public required MeshSummary Mesh { get; init; }

    /// <summary>Radii of gyration r = √(I/A) about x and y, mm.</summary>
    public AxisPair RadiusOfGyration => new(Math.Sqrt(SecondMoment.X / Area), Math.Sqrt(SecondMoment.Y / Area));

    /// <summary>Radius of gyration about axis 1, mm.</summary>
    public double RadiusOfGyration1 => Math.Sqrt(Principal.I1 / Area);

    /// <summary>Radius of gyration about axis 2, mm.</summary>
    public double RadiusOfGyration2 => Math.Sqrt(Principal.I2 / Area);

    /// <summary>
    /// Surface to paint per length of member: the outer perimeter, mm²/mm; the inner faces of holes are not reached
    /// and are given by <see cref="InnerPerimeter"/>.
    /// </summary>
    public double PaintedSurfacePerLength => OuterPerimeter;
}
