using System.Globalization;

namespace MeshSection.Sections.Shapes;

/// <summary>The kind of bound that a dimension breaks.</summary>
public enum ShapeBound
{
    /// <summary>It must be a finite number.</summary>
    Finite,

    /// <summary>It must be greater than the limit.</summary>
    Above,

    /// <summary>It must be the limit or greater.</summary>
    AtLeast,

    /// <summary>It must be smaller than the limit.</summary>
    Below,

    /// <summary>It must be the limit or smaller.</summary>
    AtMost,

    /// <summary>It must differ from the point before it.</summary>
    Distinct,
}

/// <summary>A dimension of a shape is out of its bounds.</summary>
public sealed class ShapeException : Exception
{
    /// <summary>Makes the exception.</summary>
    /// <param name="parameter">See <see cref="Parameter"/>.</param>
    /// <param name="value">See <see cref="Value"/>.</param>
    /// <param name="bound">See <see cref="Bound"/>.</param>
    /// <param name="limit">See <see cref="Limit"/>.</param>
    public ShapeException(string parameter, double value, ShapeBound bound, double limit = 0)
        : base(Text(parameter, value, bound, limit))
    {
        Parameter = parameter;
        Value = value;
        Bound = bound;
        Limit = limit;
    }

    /// <summary>The name of the dimension: that of the shape's property.</summary>
    public string Parameter { get; }

    /// <summary>Its value, in its own unit: mm for a length.</summary>
    public double Value { get; }

    /// <summary>The kind of bound that it breaks.</summary>
    public ShapeBound Bound { get; }

    /// <summary>The bound, given the other dimensions, in the unit of the value; 0 where the kind has none.</summary>
    public double Limit { get; }

    private static string Text(string parameter, double value, ShapeBound bound, double limit)
    {
        var wanted = bound switch
        {
            ShapeBound.Finite => "a finite number",
            ShapeBound.Above => Number("greater than", limit),
            ShapeBound.AtLeast => Number("at least", limit),
            ShapeBound.Below => Number("less than", limit),
            ShapeBound.AtMost => Number("at most", limit),
            ShapeBound.Distinct => "another point than the one before it",
            _ => throw new ArgumentOutOfRangeException(nameof(bound)),
        };
        return $"{Number($"{parameter} is", value)}: it must be {wanted}.";
    }

    private static string Number(string words, double number) =>
        string.Create(CultureInfo.InvariantCulture, $"{words} {number:g6}");
}
