using System.Collections.Immutable;
using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Placing;

namespace MeshSection.Dxf.Selection;

/// <summary>Divides the entities of a drawing into those that make the outline, bars, and those left out.</summary>
internal sealed class EntitySelection
{
    private readonly Dictionary<(string Kind, string Layer, LeftOutReason Reason), int> _counts = [];

    private EntitySelection()
    {
    }

    /// <summary>What bounds the section.</summary>
    public List<PlacedEntity> Used { get; private set; } = [];

    /// <summary>True if what bounds it are filled areas, since there are no lines.</summary>
    public bool IsOfFills { get; private set; }

    /// <summary>Circles and points on layers of bars, with the diameter of those drawn as points.</summary>
    public List<(PlacedEntity Placed, double? Diameter)> Bars { get; } = [];

    /// <summary>What is seen in the drawing but was not chosen, by layer, colour or kind.</summary>
    public List<PlacedEntity> NotChosen { get; } = [];

    /// <summary>The entities used, by kind and layer.</summary>
    public ImmutableArray<EntityCount> UsedCounts { get; private set; }

    /// <summary>The entities left out, by reason, layer and kind.</summary>
    public ImmutableArray<EntityCount> LeftOut { get; private set; }

    public static EntitySelection Of(Drawing drawing, OutlineOptions options, List<DrawingNote> notes)
    {
        var rules = new LayerRules(drawing, options, notes);
        var selection = new EntitySelection();
        var fills = new List<PlacedEntity>();
        foreach (var placed in BlockExpansion.Of(drawing, notes))
        {
            var reason = Reason(placed, rules, options);
            if (reason != LeftOutReason.None)
            {
                selection.Count(placed, reason);
                if (reason is LeftOutReason.LayerNotAsked or LeftOutReason.LayerIgnored or LeftOutReason.ColourNotAsked or LeftOutReason.NoBar)
                {
                    selection.NotChosen.Add(placed);
                }
            }
            else if (rules.Bar(placed.Source.Layer) is { } bar)
            {
                selection.Bars.Add((placed, placed.Entity is PointEntity ? bar.Diameter : null));
                selection.Count(placed, LeftOutReason.None);
            }
            else
            {
                (placed.Entity is FillEntity ? fills : selection.Used).Add(placed);
            }
        }

        selection.Settle(fills);
        notes.AddRange(selection.LeftOut.Where(c => c.Reason == LeftOutReason.KindNotRead).Select(NotRead));
        return selection;
    }

    private static LeftOutReason Reason(PlacedEntity placed, LayerRules rules, OutlineOptions options)
    {
        var source = placed.Source;
        var isBar = rules.Bar(source.Layer) is not null;
        return source.IsOnPaper ? LeftOutReason.PaperSpace
            : source.IsInvisible ? LeftOutReason.Invisible
            : rules.Of(source) is not LeftOutReason.None and var hidden ? hidden
            : placed.Entity is UnreadEntity ? ReasonOfUnread(source.Kind)
            : !isBar && options.Colours.Count > 0 && !options.Colours.Any(rules.Colour(source).Matches) ? LeftOutReason.ColourNotAsked
            : isBar ? (placed.Entity is CircleEntity or PointEntity ? LeftOutReason.None : LeftOutReason.NoBar)
            : placed.Entity is PointEntity ? LeftOutReason.Annotation
            : LeftOutReason.None;
    }

    private static LeftOutReason ReasonOfUnread(string kind) => kind == "INSERT" ? LeftOutReason.BlockMissing
        : EntityKinds.Advice(kind) is null ? LeftOutReason.Annotation
        : LeftOutReason.KindNotRead;

    /// <summary>Fills bound the section only if no lines do: mostly they repeat the lines around them, and coarsely.</summary>
    private void Settle(List<PlacedEntity> fills)
    {
        IsOfFills = Used.Count == 0 && fills.Count > 0;
        Used = IsOfFills ? fills : Used;
        Used.ForEach(u => Count(u, LeftOutReason.None));
        if (!IsOfFills)
        {
            fills.ForEach(f => Count(f, LeftOutReason.FillBesideLines));
            NotChosen.AddRange(fills);
        }

        var sorted = _counts
            .Select(c => new EntityCount(c.Key.Kind, c.Key.Layer, c.Key.Reason, c.Value))
            .OrderBy(c => c.Reason).ThenBy(c => c.Layer, StringComparer.Ordinal).ThenBy(c => c.Kind, StringComparer.Ordinal)
            .ToImmutableArray();
        UsedCounts = [.. sorted.Where(c => c.Reason == LeftOutReason.None)];
        LeftOut = [.. sorted.Where(c => c.Reason != LeftOutReason.None)];
    }

    private void Count(PlacedEntity placed, LeftOutReason reason)
    {
        var key = (placed.Source.Kind, placed.Source.Layer, reason);
        _counts[key] = _counts.GetValueOrDefault(key) + 1;
    }

    private static DrawingNote NotRead(EntityCount count) => DrawingNote.About(
        NoteCode.KindNotRead,
        $"{count.Count} {Wording.Shown(count.Kind)} on layer '{Wording.Shown(count.Layer)}' not read: such entities are not supported. If they are " +
        $"part of the outline, {EntityKinds.Advice(count.Kind)}.");
}
