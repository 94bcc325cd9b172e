namespace MeshSection.Files.Shapes;

/// <summary>How a dimension of a shape is written.</summary>
internal enum DimensionKind
{
    /// <summary>A length.</summary>
    Length,

    /// <summary>Rise over run.</summary>
    Slope,

    /// <summary>A whole number.</summary>
    Count,

    /// <summary>A list of points.</summary>
    Points,
}

/// <summary>A dimension of a shape: its key is the name of the shape's property with a small first letter.</summary>
internal sealed record Dimension(string Key, bool IsRequired, DimensionKind Kind = DimensionKind.Length);
