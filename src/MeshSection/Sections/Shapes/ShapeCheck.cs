using System.Runtime.CompilerServices;

namespace MeshSection.Sections.Shapes;

/// <summary>The checks that the dimensions of every shape run through.</summary>
internal static class ShapeCheck
{
    public static void Positive(double value, [CallerArgumentExpression(nameof(value))] string name = "") =>
        Above(value, 0, name);

    public static void Above(double value, double limit, [CallerArgumentExpression(nameof(value))] string name = "") =>
        Require(value > limit, value, ShapeBound.Above, limit, name);

    public static void AtLeast(double value, double limit, [CallerArgumentExpression(nameof(value))] string name = "") =>
        Require(value >= limit, value, ShapeBound.AtLeast, limit, name);

    public static void Below(double value, double limit, [CallerArgumentExpression(nameof(value))] string name = "") =>
        Require(value < limit, value, ShapeBound.Below, limit, name);

    public static void AtMost(double value, double limit, [CallerArgumentExpression(nameof(value))] string name = "") =>
        Require(value <= limit, value, ShapeBound.AtMost, limit, name);

    /// <summary>
    /// The outer arc of a right-angled bend must not reach its inner side. With walls t1 and t2 and inner radius r the
    /// two arcs touch, on the line through their centres, at an outer radius of t1 + t2 + r + √(2 t1 t2).
    /// </summary>
    public static void Bend(
        double outerRadius,
        double innerRadius,
        double wall1,
        double wall2,
        [CallerArgumentExpression(nameof(outerRadius))] string name = "") =>
        Below(outerRadius, wall1 + wall2 + innerRadius + Math.Sqrt(2 * wall1 * wall2), name);

    private static void Require(bool holds, double value, ShapeBound bound, double limit, string name)
    {
        if (!double.IsFinite(value))
        {
            throw new ShapeException(name, value, ShapeBound.Finite);
        }

        if (!holds)
        {
            throw new ShapeException(name, value, bound, limit);
        }
    }
}
