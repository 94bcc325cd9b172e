using System.Collections.Immutable;
using MeshSection.Dxf.Curves;
using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Faces;
using MeshSection.Dxf.Loops;
using MeshSection.Dxf.Placing;
using MeshSection.Dxf.Selection;
using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Dxf;

/// <summary>Makes the outline of a drawing: chooses entities, turns them into edges, joins those into boundaries.</summary>
public static class DrawingOutliner
{
    // Sections beyond these, in mm, are possible, but a wrong unit is likelier.
    private const double VeryLarge = 100_000;
    private const double VerySmall = 1;

    // Coarser steps between neighbouring numbers, over the size of what is drawn, are worth a word.
    private const double CoarseSpacing = 1e-10;

    /// <summary>Makes the outline of a drawing. The order and direction in which it was drawn do not matter.</summary>
    /// <param name="drawing">What was read.</param>
    /// <param name="options">Unit, layers and joining.</param>
    /// <returns>The outline in mm, the report, and the entity behind each edge.</returns>
    /// <exception cref="DrawingException">No sound outline can be made; the message says why and what to do.</exception>
    public static DrawingOutline Outline(Drawing drawing, OutlineOptions options)
    {
        ArgumentNullException.ThrowIfNull(drawing);
        ArgumentNullException.ThrowIfNull(options);
        List<DrawingNote> notes = [.. drawing.Notes];
        var selection = EntitySelection.Of(drawing, options, notes);
        if (selection.Used.Count == 0)
        {
            throw OutlineFaults.NothingUsed(selection);
        }

        var plane = DrawingPlane.Of(selection.Used);
        var drawn = selection.Used.ConvertAll(e => DrawnEntity.Of(e, plane));
        var unit = Unit(drawing, options, drawn, notes);
        var frame = LocalFrame.Of(drawn, unit);
        NoteSize(frame, notes);
        NotePlane(selection.Used, plane, frame, notes);

        var pieces = PieceList.Of(drawn, frame, notes);
        if (pieces.Count == 0)
        {
            throw OutlineFaults.AllWithoutLength(selection.Used[0].Source);
        }

        var gap = JoinGap.Of(pieces, frame, options.Joining.MaxGap);
        var joined = new JoinNotes(frame);
        var finder = new BoundaryFinder(frame, gap, OutlineFaults.Unread(selection), joined);
        var (outline, loops, faces) = SectionLoops.Find(pieces, selection, options, frame, finder, notes);
        foreach (var loop in loops.Where(l => l.Entities[0].IsOpenPolyline && l.Entities.All(e => e == l.Entities[0])))
        {
            joined.Closed(loop.Entities[0]);
        }

        notes.AddRange(joined.All());
        NoteNesting(outline, loops, frame, notes);
        var bars = BarList.Of(selection, plane, frame, outline, notes);
        var report = new DrawingReport
        {
            Release = drawing.Release,
            Unit = unit,
            IsUnitGiven = options.Unit is not null,
            Extents = frame.Extents,
            MaxGap = gap.Length / frame.Scale,
            IsMaxGapGiven = gap.IsGiven,
            Used = selection.UsedCounts,
            LeftOut = selection.LeftOut,
            Pieces = loops.Sum(l => l.Edges.Count),
            Joins = Joins(loops),
            Repairs = Sorted(notes.Where(n => n.IsRepair)),
            Cautions = Sorted(notes.Where(n => !n.IsRepair)),
        };
        return new DrawingOutline(
            outline, report, Sources(outline, loops), faces, bars, LeftOutEdges.Of(selection, plane, frame, joined));
    }

    private static LengthUnit Unit(Drawing drawing, OutlineOptions options, List<DrawnEntity> used, List<DrawingNote> notes)
    {
        if (options.Unit is not { } given)
        {
            return drawing.Unit
                ?? throw OutlineFaults.UnitUnknown(LocalFrame.Of(used, LengthUnit.Millimetre).Extents);
        }

        if (drawing.Unit is { } stated && stated != given)
        {
            notes.Add(DrawingNote.About(
                NoteCode.UnitOverridden,
                $"The drawing states its unit as {stated.Symbol}; it was read in {given.Symbol}, as asked for."));
        }

        return given;
    }

    private static void NoteSize(LocalFrame frame, List<DrawingNote> notes)
    {
        var size = Math.Max(frame.Extents.Width, frame.Extents.Height) * frame.Scale;
        if (size > VeryLarge)
        {
            notes.Add(DrawingNote.About(
                NoteCode.VeryLarge, $"What is drawn spans {Wording.Distance(size / 1000)} m: make sure that the unit is right."));
        }
        else if (size < VerySmall)
        {
            notes.Add(DrawingNote.About(
                NoteCode.VerySmall, $"What is drawn spans only {Wording.Distance(size)} mm: make sure that the unit is right."));
        }

        if (frame.Spacing > CoarseSpacing * frame.Extents.Diagonal)
        {
            notes.Add(DrawingNote.About(
                NoteCode.FewDigits,
                $"So far from the drawing's origin, coordinates come in steps of {Wording.Distance(frame.Spacing)}: " +
                "move the section to the origin to keep its shape exact."));
        }
    }

    private static void NotePlane(List<PlacedEntity> used, DrawingPlane plane, LocalFrame frame, List<DrawingNote> notes)
    {
        if (plane.Name is { } name)
        {
            notes.Add(DrawingNote.About(NoteCode.OtherPlane, $"What is drawn lies in another plane than the drawing's: {name}."));
            return;
        }

        var lowest = used.MinBy(plane.Height)!;
        var highest = used.MaxBy(plane.Height)!;
        var (low, high) = (plane.Height(lowest), plane.Height(highest));
        if (high - low > 1e-6 * frame.Extents.Diagonal)
        {
            notes.Add(DrawingNote.About(
                NoteCode.DifferentHeights,
                $"Entities lie at heights from z = {Wording.Coordinate(low)} ({lowest.Source.Name}) to z = " +
                $"{Wording.Coordinate(high)} ({highest.Source.Name}); they were projected to the xy plane.",
                lowest.Source,
                highest.Source));
        }
    }

    private static void NoteNesting(Outline outline, List<Loop> loops, LocalFrame frame, List<DrawingNote> notes)
    {
        for (var b = 0; b < outline.Boundaries.Length; b++)
        {
            if (outline.Boundaries[b] is { Role: BoundaryRole.Island, Boundary: var island })
            {
                var at = frame.ToDrawing(island.Edges[0].Start);
                notes.Add(new DrawingNote(
                    NoteCode.NestedOuter,
                    $"The boundary at {Wording.At(at)} lies in a hole: it was taken as a piece of the section by itself. If it is none, " +
                    "leave it out with --layer, or choose with --inside.",
                    [], at));
            }
            else if (outline.Boundaries[b] is { Role: BoundaryRole.Hole, Parent: var parent, Boundary: var hole })
            {
                NoteOtherLayer(loops[b].Entities[0].Source, loops[parent].Entities[0].Source, frame.ToDrawing(hole.Edges[0].Start), notes);
            }
        }
    }

    private static void NoteOtherLayer(EntitySource hole, EntitySource outer, Point at, List<DrawingNote> notes)
    {
        if (!hole.Layer.Equals(outer.Layer, StringComparison.OrdinalIgnoreCase))
        {
            notes.Add(new DrawingNote(
                NoteCode.HoleOnOtherLayer,
                $"{hole} lies within {outer} at {Wording.At(at)}: it was taken as a hole. If it is another material, name both " +
                $"layers: --region '{Wording.Shown(outer.Layer)}' --region '{Wording.Shown(hole.Layer)}'.",
                [hole, outer], at));
        }
    }

    /// <summary>The number of places at which edges of different entities follow each other.</summary>
    private static int Joins(List<Loop> loops) => loops.Sum(
        l => Enumerable.Range(0, l.Entities.Count).Count(i => l.Entities[i] != l.Entities[(i + 1) % l.Entities.Count]));

    private static ImmutableArray<DrawingNote> Sorted(IEnumerable<DrawingNote> notes) => [.. notes.OrderBy(n => n.Code)];

    /// <summary>The entity behind each edge; nesting may have turned a boundary round, its edges too.</summary>
    private static ImmutableArray<ImmutableArray<EntitySource>> Sources(Outline outline, List<Loop> loops)
    {
        var sources = ImmutableArray.CreateBuilder<ImmutableArray<EntitySource>>(loops.Count);
        for (var b = 0; b < loops.Count; b++)
        {
            var ofLoop = loops[b].Entities.Select(e => e.Source);
            var isTurned = outline.Boundaries[b].Boundary.Edges[0] != loops[b].Edges[0];
            sources.Add([.. isTurned ? ofLoop.Reverse() : ofLoop]);
        }

        return sources.MoveToImmutable();
    }
}
