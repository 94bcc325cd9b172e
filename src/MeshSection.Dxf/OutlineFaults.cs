using System.Collections.Immutable;
using System.Globalization;
using MeshSection.Dxf.Curves;
using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Loops;
using MeshSection.Dxf.Placing;
using MeshSection.Dxf.Selection;
using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Dxf;

/// <summary>The errors of making an outline, each with its message.</summary>
internal static class OutlineFaults
{
    public static DrawingException NoSuchLayer(string pattern, ImmutableArray<Layer> layers) => new(
        DrawingFault.NoSuchLayer,
        $"No layer matches '{pattern}'. The drawing has {string.Join(", ", layers.Take(20).Select(l => $"'{Wording.Shown(l.Name)}'"))}" +
        (layers.Length > 20 ? $" and {layers.Length - 20} more." : "."));

    public static DrawingException NothingUsed(EntitySelection selection) => new(
        DrawingFault.NoBoundary,
        selection.LeftOut.IsEmpty
            ? "The drawing has no entities. Make sure that the section is drawn in the model and was exported."
            : "The drawing has nothing that an outline can be made of: no line, curve, polyline or filled area is left. Left out: " +
                string.Join("; ", selection.LeftOut.Take(8).Select(Described)) +
                (selection.LeftOut.Length > 8 ? "; and more" : "") + "." + Unread(selection));

    public static DrawingException AllWithoutLength(EntitySource first) => new(
        DrawingFault.NoBoundary,
        $"No entity has any length, from {first} on. Draw the outline with lines, arcs, curves or polylines.")
    { Places = [new EntityPlace(first, null)] };

    public static DrawingException Tilted(List<PlacedEntity> tilted) => new(
        DrawingFault.TiltedEntity,
        $"{Wording.Names(tilted.Select(t => t.Source))} {(tilted.Count == 1 ? "does" : "do")} not lie parallel to the " +
        "drawing's xy plane, and what is drawn lies in no other plane, so that the true shape cannot be seen. Flatten the " +
        "drawing, or leave them out with --layer or --ignore.")
    { Places = [.. tilted.Select(t => new EntityPlace(t.Source, null))] };

    public static DrawingException BlockHoldsItself(EntitySource source, IEnumerable<string> chain) => new(
        DrawingFault.BlocksUnusable,
        $"{source} puts a block into itself: '{string.Join("' in '", chain.Select(Wording.Shown))}'. Delete the insertion within the block.")
    { Place = source.Place, Places = [new EntityPlace(source, null)] };

    public static DrawingException BlocksTooDeep(EntitySource source, int deepest) => new(
        DrawingFault.BlocksUnusable,
        $"{source} puts a block into the drawing that holds blocks in blocks, more than {deepest} deep. Explode the outer ones.")
    { Place = source.Place, Places = [new EntityPlace(source, null)] };

    public static DrawingException TooManyEntities(EntitySource source, long most) => new(
        DrawingFault.BlocksUnusable,
        $"With {source} the blocks that are put into the drawing come to more than {most} entities. Make the array smaller, " +
        "or delete what is no part of the section.")
    { Place = source.Place, Places = [new EntityPlace(source, null)] };

    public static DrawingException UnitUnknown(Box extents) => new(
        DrawingFault.UnitUnknown,
        $"The drawing does not say its unit. What is drawn is {Size(extents, LengthUnit.Millimetre)} if it is in mm, " +
        $"{Size(extents, LengthUnit.Metre)} if in m, {Size(extents, LengthUnit.Inch)} if in inches. " +
        "Say which with --unit mm, --unit m or --unit in, or set $INSUNITS in the drawing.")
    { Extents = extents };

    public static DrawingException ExtentsUnusable(Box extents, LengthUnit unit) => new(
        DrawingFault.ExtentsUnusable,
        $"What is drawn spans {Wording.Distance(extents.Width)} by {Wording.Distance(extents.Height)} {unit.Symbol}, " +
        "which is no cross-section. Correct or delete what lies so far away, or give another unit with --unit.")
    { Extents = extents };

    public static DrawingException ToleranceIsNoLength(double gap) => new(
        DrawingFault.ToleranceUnusable,
        $"The tolerance {gap.ToString(CultureInfo.InvariantCulture)} is no length. Give a number from 0 on, in the drawing's unit.");

    public static DrawingException ToleranceTooLarge(double gap, double shortest, Piece piece, LocalFrame frame)
    {
        var at = frame.ToDrawing(piece.Edge.Start);
        return new DrawingException(
            DrawingFault.ToleranceUnusable,
            $"The tolerance {Wording.Distance(gap)} is not below the shortest edge, {Wording.Distance(shortest)} long, of " +
            $"{piece.Entity.Source} at {Wording.At(at)}: its own two ends would be joined. Give a smaller --tolerance.")
        { Tolerance = gap, Distance = shortest, Places = [new EntityPlace(piece.Entity.Source, at)] };
    }

    public static DrawingException Crowded(Point place, LocalFrame frame, JoinGap gap) => new(
        DrawingFault.ToleranceUnusable,
        $"More than a thousand ends lie about {Wording.At(frame.ToDrawing(place))}, within a few times the tolerance " +
        $"{Wording.Distance(gap.Length / frame.Scale)}. Give a smaller --tolerance, or leave out what is no part of the outline with --layer.")
    { Tolerance = gap.Length / frame.Scale };

    public static DrawingException Open(List<FreeEnd> freeEnds, LocalFrame frame, JoinGap gap, string unread)
    {
        var places = freeEnds.Select(e => new EntityPlace(e.Source, frame.ToDrawing(e.Place))).ToImmutableArray();
        var distance = freeEnds[0].Place.DistanceTo(freeEnds[1].Place) / frame.Scale;
        var joining = RoundedUp(distance);
        double? tolerance = joining * frame.Scale < gap.Shortest ? joining : null;
        var (a, b) = (places[0], places[1]);
        var more = places.Length > 2 ? $" There are {places.Length} free ends in all." : "";
        var remedy = tolerance is { } t
            ? $"Join them in the drawing, or allow the gap with --tolerance {t.ToString(CultureInfo.InvariantCulture)}."
            : "Draw what is missing between them.";
        return new DrawingException(
            DrawingFault.OpenBoundary,
            $"A boundary is open: {a.Source} ends freely at {Wording.At(a.Point!.Value)}; the nearest that it could be joined to, " +
            $"{b.Source} at {Wording.At(b.Point!.Value)}, is {Wording.Distance(distance)} away, and ends are joined up to " +
            $"{Wording.Distance(gap.Length / frame.Scale)}.{more} {remedy} If they are no part of the outline, delete them or " +
            $"choose the layers of the outline with --layer.{unread}")
        { Places = places, Distance = distance, Tolerance = tolerance };
    }

    public static DrawingException AmbiguousGap(
        List<EntitySource> met, Point place, double spread, LocalFrame frame, JoinGap gap)
    {
        var at = frame.ToDrawing(place);
        return new DrawingException(
            DrawingFault.AmbiguousGap,
            $"{met.Count} ends lie within the tolerance of each other at {Wording.At(at)}, up to {Wording.Distance(spread / frame.Scale)} " +
            $"apart, and can be joined in more than one way: {Wording.Names(met)}. Join those that belong together in the drawing, " +
            $"or keep them apart with a smaller --tolerance than {Wording.Distance(gap.Length / frame.Scale)}. If one of them is no " +
            "part of the outline, delete it or leave out its layer with --layer.")
        { Places = [.. met.Select(m => new EntityPlace(m, at))], Distance = spread / frame.Scale };
    }

    public static DrawingException NothingLeft(JoinGap gap, LocalFrame frame) => new(
        DrawingFault.ToleranceUnusable,
        $"Ends are joined up to {Wording.Distance(gap.Length / frame.Scale)}, and that drew the two ends of every edge together. " +
        "Give a smaller --tolerance, or leave out with --layer what lies far away: the tolerance follows from the drawing's size.")
    { Tolerance = gap.Length / frame.Scale };

    public static DrawingException RunTogether(EntitySource a, EntitySource b, Point at) => new(
        DrawingFault.CrossingBoundaries,
        $"{a} and {b} run along each other near {Wording.At(at)}, but not as one: where they cross cannot be told. Delete one of " +
        "them, or draw them apart.")
    { Places = [new EntityPlace(a, at), new EntityPlace(b, at)] };

    public static DrawingException Ambiguous(List<MapFaceWords> faces, IEnumerable<EntityPlace> meetings) => new(
        DrawingFault.Ambiguous,
        $"The lines divide the drawing into {faces.Count} faces, and which of them are material cannot be told: " +
        string.Join("; ", faces.Take(8).Select(f => f.Text)) + (faces.Count > 8 ? $"; and {faces.Count - 8} more" : "") +
        ". Lines meet " + string.Join(", ", meetings.Take(3).Select(m => $"at {Wording.At(m.Point!.Value)} ({m.Source.Name})")) +
        ". Give --inside X,Y once for each face of the section, or leave lines that only divide it out with --layer or --ignore.")
    { Places = [.. meetings] };

    public static DrawingException NothingOnRegions(IReadOnlyList<string> regions) => new(
        DrawingFault.NoBoundary,
        $"Nothing that an outline can be made of lies on the layers of regions: {string.Join(", ", regions.Select(r => $"'{r}'"))}. " +
        "Name the layers on which the closed boundaries of the regions are drawn.");

    public static DrawingException NothingThere(Point place) => new(
        DrawingFault.NothingThere,
        $"--inside {Wording.Coordinate(place.X)},{Wording.Coordinate(place.Y)}: there is no closed boundary around this point. " +
        "Give a point in the drawing's own axes and unit that lies within the section.");

    public static DrawingException Unsound(OutlineException unsound, List<Loop> loops, LocalFrame frame)
    {
        // The exception tells the point in the drawing's axes, in mm.
        Point? at = unsound.Point is { } p ? p / frame.Scale : null;
        EdgePlace?[] edges = [unsound.First, unsound.Second];
        var places = edges
            .Where(e => e is not null)
            .Select(e => new EntityPlace(loops[e!.Value.Boundary].Entities[e.Value.Edge].Source, at))
            .ToImmutableArray();
        var where = (at is { } point ? $" at {Wording.At(point)}" : "") +
            (places.IsEmpty ? "" : $": {Wording.Names(places.Select(q => q.Source))}");
        var (fault, what, remedy) = unsound.Fault switch
        {
            OutlineFault.Empty => (DrawingFault.NoBoundary, "There is no closed boundary", "Close the outline."),
            OutlineFault.NotFinite => (DrawingFault.ExtentsUnusable, "A coordinate is out of range", "Draw it again."),
            OutlineFault.NoLength => (DrawingFault.ToleranceUnusable, "Joining drew both ends of an edge together", "Give a smaller --tolerance."),
            OutlineFault.NoArea => (DrawingFault.NoArea, "A boundary encloses no area", "Delete it, or draw it with its true width."),
            OutlineFault.SelfCrossing => (DrawingFault.SelfCrossing, "A boundary crosses itself", "Trim the edges where they cross."),
            OutlineFault.SelfTouching => (DrawingFault.SelfTouching, "A boundary touches itself", "Move the edges apart, or draw two boundaries."),
            OutlineFault.Crossing => (DrawingFault.CrossingBoundaries, "Two boundaries cross", "Trim them where they cross, leave one out with --layer, or say with --inside X,Y, once for each, which parts are the section."),
            OutlineFault.Touching => (DrawingFault.TouchingBoundaries, "Two boundaries touch", "Draw what is one piece as one boundary, or say with --inside X,Y, once for each, which parts are the section."),
            OutlineFault.Duplicate => (DrawingFault.DuplicateBoundary, "The same boundary is there twice", "Delete one of the two."),
            _ => throw new InvalidOperationException($"No message for {unsound.Fault}.", unsound),
        };
        return new DrawingException(fault, $"{what}{where}. {remedy}") { Places = places };
    }

    /// <summary>A sentence about the entities not read, for when something is missing; empty if there are none.</summary>
    public static string Unread(EntitySelection selection) => string.Concat(selection.LeftOut
        .Where(c => c.Reason == LeftOutReason.KindNotRead)
        .GroupBy(c => c.Kind)
        .Select(g => $" {g.Sum(c => c.Count)} {g.Key} not read: if they are part of the outline, {EntityKinds.Advice(g.Key)}."));

    private static string Described(EntityCount c) => $"{c.Count} {Wording.Shown(c.Kind)} on '{Wording.Shown(c.Layer)}' ({Reason(c.Reason)})";

    private static string Reason(LeftOutReason reason) => reason switch
    {
        LeftOutReason.None => "used",
        LeftOutReason.Annotation => "bounds nothing",
        LeftOutReason.KindNotRead => "not read",
        LeftOutReason.LayerNotAsked => "layer not asked for",
        LeftOutReason.LayerOff => "layer off",
        LeftOutReason.LayerFrozen => "layer frozen",
        LeftOutReason.LayerNotPlotted => "layer not plotted",
        LeftOutReason.PaperSpace => "on a layout sheet",
        LeftOutReason.Invisible => "invisible",
        LeftOutReason.LayerIgnored => "layer ignored",
        LeftOutReason.ColourNotAsked => "colour not asked for",
        LeftOutReason.FillBesideLines => "fill beside lines",
        LeftOutReason.NoBar => "neither circle nor point on a layer of bars",
        LeftOutReason.BlockMissing => "block missing",
        _ => throw new ArgumentOutOfRangeException(nameof(reason)),
    };

    private static string Size(Box box, LengthUnit unit)
    {
        var (width, height) = (box.Width * unit.Millimetres, box.Height * unit.Millimetres);
        return Math.Max(width, height) < 1e4
            ? $"{Wording.Distance(width)} x {Wording.Distance(height)} mm"
            : $"{Wording.Distance(width / 1000)} x {Wording.Distance(height / 1000)} m";
    }

    /// <summary>A little more than a distance, in two digits.</summary>
    private static double RoundedUp(double distance)
    {
        if (distance == 0)
        {
            return 0;
        }

        var text = (1.05 * distance).ToString("E1", CultureInfo.InvariantCulture);
        return double.Parse(text, CultureInfo.InvariantCulture);
    }
}
