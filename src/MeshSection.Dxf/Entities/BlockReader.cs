using System.Collections.Immutable;
using MeshSection.Dxf.Tags;

namespace MeshSection.Dxf.Entities;

/// <summary>Reads a block: a head, entities, and an end mark.</summary>
internal sealed class BlockReader(TagReader tags, TagText text, List<DrawingNote> notes)
{
    // Bits of group 70.
    private const int IsReference = 4;
    private const int IsOverlay = 8;

    private readonly EntityFields _head = new(tags, text);
    private readonly EntityReader _entities = new(tags, text, notes);

    /// <summary>Reads the block whose head is current; afterwards the first tag behind it is.</summary>
    public Block Read()
    {
        _head.Read("BLOCK", hasShape: true);
        var name = _head.Name ?? throw _head.Missing(2, "name");
        var corner = _head.Number(10) is null ? default : _head.SpacePoint(10, "base point");
        var isExternal = (_head.Flags & (IsReference | IsOverlay)) != 0;
        var entities = ImmutableArray.CreateBuilder<Entity>();
        while (tags.HasTag && !tags.Is(0, "ENDBLK"u8))
        {
            if (tags.Is(0, "BLOCK"u8) || tags.Is(0, "ENDSEC"u8) || tags.Is(0, "SECTION"u8) || tags.Is(0, "EOF"u8))
            {
                notes.Add(DrawingNote.About(
                    NoteCode.BlockMended, $"The block '{name}' has no end mark (ENDBLK) before {tags.Place}."));
                return new Block(name, corner, entities.ToImmutable(), isExternal);
            }

            if (_entities.Read() is { } entity)
            {
                entities.Add(entity);
            }
        }

        if (tags.HasTag)
        {
            _head.Read("ENDBLK", hasShape: false);
        }

        return new Block(name, corner, entities.ToImmutable(), isExternal);
    }
}
