using MeshSection.Dxf.Entities;

namespace MeshSection.Dxf.Selection;

/// <summary>Which layers are read, and why others are not.</summary>
internal sealed class LayerRules
{
    private readonly Dictionary<string, Layer> _layers;
    private readonly Dictionary<string, LeftOutReason> _reasons = new(StringComparer.OrdinalIgnoreCase);
    private readonly Dictionary<string, BarLayer> _bars = new(StringComparer.OrdinalIgnoreCase);

    /// <exception cref="DrawingException">A layer is named that the drawing does not have.</exception>
    public LayerRules(Drawing drawing, OutlineOptions options, List<DrawingNote> notes)
    {
        _layers = drawing.Layers.GroupBy(l => l.Name, StringComparer.OrdinalIgnoreCase)
            .ToDictionary(g => g.Key, g => g.First(), StringComparer.OrdinalIgnoreCase);
        var asked = Patterns(drawing, options.Layers.Count > 0 ? options.Layers : options.Regions);
        var ignored = Patterns(drawing, options.Ignored);
        var bars = options.Bars.Zip(Patterns(drawing, [.. options.Bars.Select(b => b.Layers)])).ToArray();
        foreach (var layer in _layers.Values)
        {
            if (bars.FirstOrDefault(b => b.Second.Matches(layer.Name)).First is { } bar)
            {
                _bars.Add(layer.Name, bar);
            }

            _reasons[layer.Name] = Reason(layer, asked, ignored, notes);
        }
    }

    /// <summary>Why what lies on a layer is left out; <see cref="LeftOutReason.None"/> if it is read.</summary>
    public LeftOutReason Of(EntitySource source)
    {
        var bar = Bar(source.Layer);
        var own = _reasons[source.Layer];
        if (own != LeftOutReason.None && !(bar is not null && own == LeftOutReason.LayerNotAsked))
        {
            return own;
        }

        // What is inserted on a frozen layer is not seen, whatever layer it lies on itself.
        for (var inserted = source.Inserted; inserted is not null; inserted = inserted.Inserted)
        {
            if (_reasons[inserted.Layer] == LeftOutReason.LayerFrozen)
            {
                return LeftOutReason.LayerFrozen;
            }
        }

        return LeftOutReason.None;
    }

    /// <summary>What a layer says about its bars; null if it is none of bars.</summary>
    public BarLayer? Bar(string layer) => _bars.GetValueOrDefault(layer);

    /// <summary>The colour that an entity has in the end.</summary>
    public DrawingColour Colour(EntitySource source) => source.Colour.IsByLayer ? _layers[source.Layer].Colour : source.Colour;

    private static LeftOutReason Reason(Layer layer, LayerPattern[] asked, LayerPattern[] ignored, List<DrawingNote> notes)
    {
        var matching = asked.Where(p => p.Matches(layer.Name)).ToArray();
        var isNamed = matching.Any(p => p.IsFullName);
        if (ignored.Any(p => p.Matches(layer.Name)))
        {
            return LeftOutReason.LayerIgnored;
        }

        if (isNamed && layer.IsHidden)
        {
            notes.Add(DrawingNote.About(
                NoteCode.HiddenLayerRead,
                $"The layer '{Wording.Shown(layer.Name)}' is off, frozen or not plotted; it was read since it was asked for by name."));
        }

        return asked.Length > 0 && matching.Length == 0 ? LeftOutReason.LayerNotAsked
            : isNamed ? LeftOutReason.None
            : layer.IsFrozen ? LeftOutReason.LayerFrozen
            : layer.IsOff ? LeftOutReason.LayerOff
            : !layer.IsPlotted ? LeftOutReason.LayerNotPlotted
            : LeftOutReason.None;
    }

    private static LayerPattern[] Patterns(Drawing drawing, IReadOnlyList<string> names)
    {
        var patterns = names.Select(n => new LayerPattern(n)).ToArray();
        for (var i = 0; i < patterns.Length; i++)
        {
            if (!drawing.Layers.Any(l => patterns[i].Matches(l.Name)))
            {
                throw OutlineFaults.NoSuchLayer(names[i], drawing.Layers);
            }
        }

        return patterns;
    }
}
