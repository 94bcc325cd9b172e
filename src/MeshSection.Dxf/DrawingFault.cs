namespace MeshSection.Dxf;

/// <summary>What can keep a drawing from becoming an outline.</summary>
public enum DrawingFault
{
    /// <summary>There is nothing in the file.</summary>
    EmptyFile,

    /// <summary>The file is no DXF.</summary>
    NotDxf,

    /// <summary>The file is a DWG.</summary>
    Dwg,

    /// <summary>The file stops in the middle of something.</summary>
    Truncated,

    /// <summary>A line that should be a group code is no whole number.</summary>
    BadGroupCode,

    /// <summary>A value that should be a number is none, or is not finite.</summary>
    BadNumber,

    /// <summary>An entity lacks a value that it cannot do without, or has one that makes no sense.</summary>
    BadEntity,

    /// <summary>A layer was asked for that the drawing does not have.</summary>
    NoSuchLayer,

    /// <summary>Blocks hold themselves, or come to too many entities.</summary>
    BlocksUnusable,

    /// <summary>An entity does not lie parallel to the drawing's plane.</summary>
    TiltedEntity,

    /// <summary>Neither the drawing nor the caller says what its unit is.</summary>
    UnitUnknown,

    /// <summary>The drawing is too large or too small for any arithmetic.</summary>
    ExtentsUnusable,

    /// <summary>Nothing is left that an outline could be made of.</summary>
    NoBoundary,

    /// <summary>The tolerance is no length, or as large as the shortest edge.</summary>
    ToleranceUnusable,

    /// <summary>A gap can be closed in more than one way.</summary>
    AmbiguousGap,

    /// <summary>Lines divide the drawing into faces of which some may be holes.</summary>
    Ambiguous,

    /// <summary>A point that should lie in the section lies in no closed boundary.</summary>
    NothingThere,

    /// <summary>A boundary does not close.</summary>
    OpenBoundary,

    /// <summary>A boundary encloses no area.</summary>
    NoArea,

    /// <summary>A boundary crosses itself.</summary>
    SelfCrossing,

    /// <summary>A boundary touches itself.</summary>
    SelfTouching,

    /// <summary>Two boundaries cross.</summary>
    CrossingBoundaries,

    /// <summary>Two boundaries touch at a point or along an edge.</summary>
    TouchingBoundaries,

    /// <summary>The same boundary is there twice.</summary>
    DuplicateBoundary,
}
