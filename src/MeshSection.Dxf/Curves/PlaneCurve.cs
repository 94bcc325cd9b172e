using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>A curve in the drawing's plane, axes and unit.</summary>
internal abstract record PlaneCurve;

/// <summary>Lines in a row.</summary>
/// <param name="Points">The points in running order.</param>
internal sealed record StraightCurve(ImmutableArray<Point> Points) : PlaneCurve;

/// <summary>A circular arc between two stated ends.</summary>
/// <param name="Start">Where it begins.</param>
/// <param name="End">Where it ends.</param>
/// <param name="Bulge">tan(sweep / 4); 0 for a line.</param>
internal sealed record BulgedCurve(Point Start, Point End, double Bulge) : PlaneCurve;

/// <summary>A part of an ellipse: Centre + cos t U + sin t V.</summary>
/// <param name="Centre">The centre.</param>
/// <param name="U">One half axis, or any half diameter.</param>
/// <param name="V">The half diameter conjugate to it.</param>
/// <param name="Start">t where it begins, degrees.</param>
/// <param name="Sweep">How far t runs, degrees, positive, at most 360.</param>
internal sealed record EllipticCurve(Point Centre, Point U, Point V, double Start, double Sweep) : PlaneCurve
{
    // How far axes may be from equal and square and still make a circle: rounding only.
    private const double Roundness = 1e-9;

    /// <summary>True if it is a part of a circle.</summary>
    public bool IsCircular =>
        Math.Abs(U.Length - V.Length) <= Roundness * U.Length && Math.Abs(U.Dot(V)) <= Roundness * U.Dot(U);
}

/// <summary>A rational Bézier curve.</summary>
/// <param name="Controls">The control points.</param>
/// <param name="Weights">Their weights.</param>
internal sealed record FreeCurve(ImmutableArray<Point> Controls, ImmutableArray<double> Weights) : PlaneCurve;
