using System.Collections.Immutable;
using MeshSection.Dxf.Tags;
using MeshSection.Units;

namespace MeshSection.Dxf.Entities;

/// <summary>Walks through the sections of a drawing and hands each to its reader.</summary>
internal sealed class SectionReader(TagReader tags)
{
    private readonly HeaderReader _header = new(tags);
    private readonly List<DrawingNote> _notes = [];
    private readonly List<Layer> _layers = [];
    private readonly Dictionary<string, Block> _blocks = new(StringComparer.OrdinalIgnoreCase);
    private readonly ImmutableArray<Entity>.Builder _entities = ImmutableArray.CreateBuilder<Entity>();
    private TagText? _text;
    private bool _sawEntities;
    private string? _openSection;

    private TagText Text => _text ??= new TagText(_header.Release, _header.CodePage, tags.HasByteOrderMark);

    public Drawing Read()
    {
        if (!tags.Read())
        {
            throw ReadingFaults.Empty();
        }

        if (tags.Code != 0)
        {
            throw ReadingFaults.NotDxf(tags.CodePlace, $"'{tags.Code}'");
        }

        while (tags.HasTag && !tags.Is(0, "EOF"u8))
        {
            if (tags.Is(0, "SECTION"u8))
            {
                ReadSection();
            }
            else if (tags.Code == 0 && !tags.Is(0, "ENDSEC"u8))
            {
                _notes.Add(DrawingNote.About(
                    NoteCode.BareEntities, $"Entities from {tags.Place} on stand in no section; they were read."));
                ReadEntities();
            }
            else
            {
                tags.Read();
            }
        }

        CheckEnd();
        NoteAssumptions();
        return new Drawing(
            _header.Release,
            _header.Unit ?? AssumedUnit(),
            AllLayers(),
            _blocks.ToImmutableDictionary(StringComparer.OrdinalIgnoreCase),
            _entities.ToImmutable(),
            [.. _notes]);
    }

    private void ReadSection()
    {
        var place = tags.Place;
        tags.Read();
        var name = tags.HasTag && tags.Code == 2 ? NameOf(tags) : "";
        _openSection = name.Length > 0 ? name : $"at {place}";
        switch (name)
        {
            case "HEADER":
                _header.Read();
                break;
            case "TABLES":
                new LayerTableReader(tags, Text).Read(_layers);
                break;
            case "BLOCKS":
                ReadBlocks();
                break;
            case "ENTITIES":
                ReadEntities();
                break;
            default:
                while (!AtSectionEnd(tags))
                {
                    tags.Read();
                }

                break;
        }

        if (tags.Is(0, "ENDSEC"u8))
        {
            _openSection = null;
            tags.Read();
        }
        else if (tags.HasTag)
        {
            _notes.Add(DrawingNote.About(
                NoteCode.NoEndOfSection, $"The section {_openSection} has no end mark (ENDSEC) before {tags.Place}."));
            _openSection = null;
        }
    }

    private void ReadEntities()
    {
        _sawEntities = true;
        var reader = new EntityReader(tags, Text, _notes);
        while (!AtSectionEnd(tags))
        {
            if (tags.Code != 0)
            {
                tags.Read();
            }
            else if (reader.Read() is { } entity)
            {
                _entities.Add(entity);
            }
        }
    }

    private void ReadBlocks()
    {
        var reader = new BlockReader(tags, Text, _notes);
        while (!AtSectionEnd(tags))
        {
            if (!tags.Is(0, "BLOCK"u8))
            {
                tags.Read();
            }
            else if (reader.Read() is var block && !_blocks.TryAdd(block.Name, block))
            {
                _notes.Add(DrawingNote.About(
                    NoteCode.BlockMended, $"The block '{block.Name}' is there twice; the first was taken."));
            }
        }
    }

    private void CheckEnd()
    {
        if (tags.HasTag)
        {
            if (tags.HasMoreText())
            {
                _notes.Add(DrawingNote.About(
                    NoteCode.TextAfterEnd, $"What follows the end mark (EOF) at {tags.Place} was not read."));
            }

            return;
        }

        if (tags.UnterminatedValue is { } value && value != "ENDSEC")
        {
            throw ReadingFaults.CutValue(tags.Place, $"'{value}'");
        }

        if (!_sawEntities)
        {
            throw ReadingFaults.CutSection(tags.Place, _openSection ?? "before ENTITIES");
        }

        var last = _entities.Count > 0 ? $" The last entity read is {_entities[^1].Source.Name}." : "";
        _notes.Add(DrawingNote.About(
            NoteCode.NoEndOfFile,
            $"The file ends at {tags.Place} without the end mark (EOF): make sure that nothing was cut off.{last}"));
    }

    /// <summary>A drawing without a unit may still say whether it is metric.</summary>
    private LengthUnit? AssumedUnit()
    {
        if (_header.IsMetric is not { } isMetric)
        {
            return null;
        }

        var unit = isMetric ? LengthUnit.Millimetre : LengthUnit.Inch;
        _notes.Add(DrawingNote.About(
            NoteCode.UnitAssumed,
            $"The drawing does not state its unit, only that it is {(isMetric ? "metric" : "in English units")} ($MEASUREMENT): it " +
            $"was read in {unit.Symbol}. If that is wrong, say which with --unit."));
        return unit;
    }

    private void NoteAssumptions()
    {
        if (_header.UnknownUnitCode is { } code)
        {
            _notes.Add(DrawingNote.About(
                NoteCode.UnitCodeUnknown, $"The drawing's unit code $INSUNITS = {code} is none that the format knows."));
        }

        if (_header.Release is null)
        {
            _notes.Add(DrawingNote.About(
                NoteCode.ReleaseUnknown, "The drawing does not name its release; it was read as release 12."));
        }
        else if (!_header.IsReleaseKnown)
        {
            _notes.Add(DrawingNote.About(
                NoteCode.ReleaseUnknown, $"The drawing's release '{_header.Release}' is not known; it was read all the same."));
        }

        if (_text?.Assumption is { } assumption)
        {
            _notes.Add(DrawingNote.About(NoteCode.CodePageAssumed, assumption));
        }
    }

    private ImmutableArray<Layer> AllLayers()
    {
        var names = new HashSet<string>(_layers.Select(l => l.Name), StringComparer.OrdinalIgnoreCase);
        foreach (var entity in _entities.Concat(_blocks.Values.SelectMany(b => b.Entities)))
        {
            if (names.Add(entity.Source.Layer))
            {
                _layers.Add(new Layer(entity.Source.Layer, IsOff: false, IsFrozen: false, IsPlotted: true, DrawingColour.Plain));
            }
        }

        return [.. _layers];
    }

    private static bool AtSectionEnd(TagReader tags) =>
        !tags.HasTag || (tags.Code == 0 && (tags.Is(0, "ENDSEC"u8) || tags.Is(0, "SECTION"u8) || tags.Is(0, "EOF"u8)));

    private static string NameOf(TagReader tags) => System.Text.Encoding.Latin1.GetString(tags.Value);
}
