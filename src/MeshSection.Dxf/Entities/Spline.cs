using System.Collections.Immutable;
using MeshSection.Dxf.Space;

namespace MeshSection.Dxf.Entities;

/// <summary>A rational B-spline as drawings state it [PieglTiller1997, chapter 4].</summary>
/// <param name="Degree">p, at least 1.</param>
/// <param name="Knots">Never falling; as many as control points and p + 1 more. Empty if there are fit points only.</param>
/// <param name="Controls">The control points; empty if there are fit points only.</param>
/// <param name="Weights">One for each control point, positive.</param>
/// <param name="FitPoints">The points that it runs through, if it states no control points; else empty.</param>
/// <param name="StartTangent">Its direction at the first fit point, if stated.</param>
/// <param name="EndTangent">Its direction at the last fit point, if stated.</param>
/// <param name="IsClosed">True if it is marked as closed or periodic.</param>
public sealed record Spline(
    int Degree,
    ImmutableArray<double> Knots,
    ImmutableArray<SpacePoint> Controls,
    ImmutableArray<double> Weights,
    ImmutableArray<SpacePoint> FitPoints,
    SpacePoint? StartTangent,
    SpacePoint? EndTangent,
    bool IsClosed);
