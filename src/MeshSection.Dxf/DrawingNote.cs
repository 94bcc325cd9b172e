using System.Collections.Immutable;
using MeshSection.Dxf.Entities;
using MeshSection.Geometry;

namespace MeshSection.Dxf;

/// <summary>
/// What a note is about. The numbers last: 1xx the file, 2xx unit and size, 3xx entities, 4xx joining.
/// </summary>
public enum NoteCode
{
    /// <summary>The file has no end mark.</summary>
    NoEndOfFile = 101,

    /// <summary>A section has no end mark.</summary>
    NoEndOfSection = 102,

    /// <summary>Entities stand in no section.</summary>
    BareEntities = 103,

    /// <summary>Something follows the end mark.</summary>
    TextAfterEnd = 104,

    /// <summary>The drawing does not name its release, or one that is not known.</summary>
    ReleaseUnknown = 105,

    /// <summary>Text was read in another code page than the drawing should have.</summary>
    CodePageAssumed = 106,

    /// <summary>A polyline lacks its end mark, or has another number of vertices than it says.</summary>
    PolylineMended = 107,

    /// <summary>A block lacks its end mark, or is there twice.</summary>
    BlockMended = 108,

    /// <summary>The unit asked for is not the one that the drawing states.</summary>
    UnitOverridden = 201,

    /// <summary>The drawing states a unit code that the format does not know.</summary>
    UnitCodeUnknown = 202,

    /// <summary>The section would be very large.</summary>
    VeryLarge = 203,

    /// <summary>The section would be very small.</summary>
    VerySmall = 204,

    /// <summary>The coordinates are so far from the origin that few digits are left for the section.</summary>
    FewDigits = 205,

    /// <summary>The unit follows from the system of units alone.</summary>
    UnitAssumed = 206,

    /// <summary>What is drawn lies in another plane than the drawing's.</summary>
    OtherPlane = 207,

    /// <summary>An entity has no length.</summary>
    NoLength = 301,

    /// <summary>An edge is so short that its two ends are one point.</summary>
    Sliver = 302,

    /// <summary>Entities that may carry outlines are not read.</summary>
    KindNotRead = 303,

    /// <summary>Entities lie at different heights and were projected.</summary>
    DifferentHeights = 304,

    /// <summary>A layer that is off, frozen or not plotted was read since it was asked for by name.</summary>
    HiddenLayerRead = 305,

    /// <summary>A block that is to be put into the drawing is not in the file.</summary>
    BlockMissing = 306,

    /// <summary>A spline states only points that it runs through.</summary>
    SplineInterpolated = 307,

    /// <summary>A gap between two ends was bridged.</summary>
    GapBridged = 401,

    /// <summary>A polyline not marked as closed was closed, since its ends meet.</summary>
    PolylineClosed = 402,

    /// <summary>Edges that were there twice were dropped.</summary>
    DuplicateDropped = 403,

    /// <summary>Pieces that lead nowhere were left out.</summary>
    DanglingLeftOut = 404,

    /// <summary>Lines were split where they meet.</summary>
    LinesSplit = 405,

    /// <summary>A boundary lies in a hole of another: a piece of the section by itself.</summary>
    NestedOuter = 406,

    /// <summary>Regions overlap; the order decided.</summary>
    RegionsOverlap = 407,

    /// <summary>A bar lies outside of the section.</summary>
    BarOutside = 408,

    /// <summary>Lines divide the section into faces that were taken as one.</summary>
    FacesTogether = 409,

    /// <summary>A hole lies on another layer than the boundary around it: it may be another material.</summary>
    HoleOnOtherLayer = 410,
}

/// <summary>Something that a person should know about how a drawing was understood.</summary>
/// <param name="Code">What it is about.</param>
/// <param name="Message">What was found and what was done, with coordinates in the drawing's unit.</param>
/// <param name="Sources">The entities concerned, if any.</param>
/// <param name="Point">Where, in the drawing's axes and unit, if at one place.</param>
/// <param name="Distance">How far something was moved, in the drawing's unit, if it was.</param>
public sealed record DrawingNote(
    NoteCode Code,
    string Message,
    ImmutableArray<EntitySource> Sources,
    Point? Point = null,
    double? Distance = null)
{
    /// <summary>The lasting name of the code, such as "DR401".</summary>
    public string Name => $"DR{(int)Code}";

    /// <summary>True for what was mended; false for what only calls for attention.</summary>
    public bool IsRepair => Code is NoteCode.NoEndOfFile or NoteCode.NoEndOfSection or NoteCode.BareEntities
        or NoteCode.PolylineMended or NoteCode.BlockMended or NoteCode.NoLength or NoteCode.Sliver or NoteCode.GapBridged
        or NoteCode.PolylineClosed or NoteCode.DuplicateDropped or NoteCode.DanglingLeftOut or NoteCode.LinesSplit;

    internal static DrawingNote About(NoteCode code, string message, params ReadOnlySpan<EntitySource> sources) =>
        new(code, message, [.. sources]);
}
