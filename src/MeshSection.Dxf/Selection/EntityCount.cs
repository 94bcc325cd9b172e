namespace MeshSection.Dxf.Selection;

/// <summary>Why entities take no part in the outline.</summary>
public enum LeftOutReason
{
    /// <summary>They take part.</summary>
    None,

    /// <summary>They are of a kind that never bounds a section: text, dimensions, points.</summary>
    Annotation,

    /// <summary>They are of a kind that may bound a section but is not read.</summary>
    KindNotRead,

    /// <summary>They lie on a layer that was not asked for.</summary>
    LayerNotAsked,

    /// <summary>Their layer is off.</summary>
    LayerOff,

    /// <summary>Their layer is frozen.</summary>
    LayerFrozen,

    /// <summary>Their layer is never plotted.</summary>
    LayerNotPlotted,

    /// <summary>They lie on a layout sheet, not in the model.</summary>
    PaperSpace,

    /// <summary>They are marked as invisible.</summary>
    Invisible,

    /// <summary>Their layer was asked to be left out.</summary>
    LayerIgnored,

    /// <summary>They have a colour that was not asked for.</summary>
    ColourNotAsked,

    /// <summary>They fill an area, and lines are there to bound the section.</summary>
    FillBesideLines,

    /// <summary>They lie on a layer of bars and are neither circles nor points.</summary>
    NoBar,

    /// <summary>Their block is not in the file.</summary>
    BlockMissing,
}

/// <summary>How many entities of one kind on one layer were used, or left out for one reason.</summary>
/// <param name="Kind">What they are, as the format names it.</param>
/// <param name="Layer">Their layer.</param>
/// <param name="Reason">Why they were left out, if they were.</param>
/// <param name="Count">How many there are.</param>
public sealed record EntityCount(string Kind, string Layer, LeftOutReason Reason, int Count);
