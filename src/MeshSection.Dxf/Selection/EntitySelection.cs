using System.Collections.Immutable;
using MeshSection.Dxf.Entities;

namespace MeshSection.Dxf.Selection;

/// <summary>Divides the entities of a drawing into those that make the outline and those left out.</summary>
internal sealed class EntitySelection
{
    private EntitySelection(
        List<Entity> used, ImmutableArray<EntityCount> usedCounts, ImmutableArray<EntityCount> leftOut, List<DrawingNote> notes)
    {
        Used = used;
        UsedCounts = usedCounts;
        LeftOut = leftOut;
        Notes = notes;
    }

    public List<Entity> Used { get; }

    public ImmutableArray<EntityCount> UsedCounts { get; }

    public ImmutableArray<EntityCount> LeftOut { get; }

    public List<DrawingNote> Notes { get; }

    public static EntitySelection Of(Drawing drawing, IReadOnlyList<string> layers)
    {
        var notes = new List<DrawingNote>();
        var layerReasons = LayerReasons(drawing, layers, notes);
        var used = new List<Entity>();
        var counts = new Dictionary<(string Kind, string Layer, LeftOutReason Reason), int>();
        foreach (var entity in drawing.Entities)
        {
            var source = entity.Source;
            var reason = source.IsOnPaper ? LeftOutReason.PaperSpace
                : source.IsInvisible ? LeftOutReason.Invisible
                : layerReasons[source.Layer] is not LeftOutReason.None and var hidden ? hidden
                : entity is not UnreadEntity ? LeftOutReason.None
                : EntityKinds.Advice(source.Kind) is null ? LeftOutReason.Annotation
                : LeftOutReason.KindNotRead;
            var key = (source.Kind, source.Layer, reason);
            counts[key] = counts.GetValueOrDefault(key) + 1;
            if (reason == LeftOutReason.None)
            {
                used.Add(entity);
            }
        }

        var sorted = counts
            .Select(c => new EntityCount(c.Key.Kind, c.Key.Layer, c.Key.Reason, c.Value))
            .OrderBy(c => c.Reason).ThenBy(c => c.Layer, StringComparer.Ordinal).ThenBy(c => c.Kind, StringComparer.Ordinal)
            .ToImmutableArray();
        ImmutableArray<EntityCount> leftOut = [.. sorted.Where(c => c.Reason != LeftOutReason.None)];
        notes.AddRange(leftOut.Where(c => c.Reason == LeftOutReason.KindNotRead).Select(NotRead));
        return new EntitySelection(used, [.. sorted.Where(c => c.Reason == LeftOutReason.None)], leftOut, notes);
    }

    private static DrawingNote NotRead(EntityCount count) => DrawingNote.About(
        NoteCode.KindNotRead,
        $"{count.Count} {count.Kind} on layer '{count.Layer}' not read: such entities are not supported. If they are " +
        $"part of the outline, {EntityKinds.Advice(count.Kind)}.");

    private static Dictionary<string, LeftOutReason> LayerReasons(
        Drawing drawing, IReadOnlyList<string> layers, List<DrawingNote> notes)
    {
        var patterns = layers.Select(l => new LayerPattern(l)).ToArray();
        for (var i = 0; i < patterns.Length; i++)
        {
            if (!drawing.Layers.Any(l => patterns[i].Matches(l.Name)))
            {
                throw OutlineFaults.NoSuchLayer(layers[i], drawing.Layers);
            }
        }

        var reasons = new Dictionary<string, LeftOutReason>(StringComparer.OrdinalIgnoreCase);
        foreach (var layer in drawing.Layers)
        {
            var matching = patterns.Where(p => p.Matches(layer.Name)).ToArray();
            var isNamed = matching.Any(p => p.IsFullName);
            reasons[layer.Name] = patterns.Length > 0 && matching.Length == 0 ? LeftOutReason.LayerNotAsked
                : isNamed ? LeftOutReason.None
                : layer.IsFrozen ? LeftOutReason.LayerFrozen
                : layer.IsOff ? LeftOutReason.LayerOff
                : !layer.IsPlotted ? LeftOutReason.LayerNotPlotted
                : LeftOutReason.None;
            if (isNamed && layer.IsHidden)
            {
                notes.Add(DrawingNote.About(
                    NoteCode.HiddenLayerRead,
                    $"The layer '{layer.Name}' is off, frozen or not plotted; it was read since it was asked for by name."));
            }
        }

        return reasons;
    }
}
