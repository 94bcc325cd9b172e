using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Space;

namespace MeshSection.Dxf.Placing;

/// <summary>
/// Replaces insertions by what their blocks hold. What lies on layer 0 there takes the insertion's layer, what has the
/// colour of its block takes the insertion's colour; an insertion on paper or invisible makes all of it so.
/// </summary>
internal sealed class BlockExpansion
{
    private const string LayerOfBlock = "0";

    private readonly Drawing _drawing;
    private readonly List<PlacedEntity> _placed = [];
    private readonly HashSet<string> _missing = new(StringComparer.OrdinalIgnoreCase);
    private readonly List<DrawingNote> _notes;

    private BlockExpansion(Drawing drawing, List<DrawingNote> notes)
    {
        _drawing = drawing;
        _notes = notes;
    }

    /// <summary>Every entity of the drawing where it lies.</summary>
    /// <param name="drawing">The drawing.</param>
    /// <param name="notes">What is missing is added here.</param>
    /// <exception cref="DrawingException">A block holds itself, or there would be too many entities.</exception>
    public static List<PlacedEntity> Of(Drawing drawing, List<DrawingNote> notes)
    {
        BlockSizes.Check(drawing);
        var expansion = new BlockExpansion(drawing, notes);
        foreach (var entity in drawing.Entities)
        {
            expansion.Place(entity, null, SpaceMap.Identity);
        }

        return expansion._placed;
    }

    private void Place(Entity entity, EntitySource? inserted, SpaceMap map)
    {
        var source = inserted is null ? entity.Source : Within(inserted, entity.Source);
        if (entity is not InsertEntity insert)
        {
            _placed.Add(new PlacedEntity(entity, source, map));
            return;
        }

        if (!_drawing.Blocks.TryGetValue(insert.Block, out var block) || block.IsExternal)
        {
            _placed.Add(new PlacedEntity(new UnreadEntity(source), source, map));
            NoteMissing(source, insert.Block, block is not null);
            return;
        }

        foreach (var cell in Cells(insert, block))
        {
            var composed = map.After(cell);
            foreach (var part in block.Entities)
            {
                Place(part, source, composed);
            }
        }
    }

    private void NoteMissing(EntitySource source, string block, bool isExternal)
    {
        if (_missing.Add(block))
        {
            _notes.Add(DrawingNote.About(
                NoteCode.BlockMissing,
                $"{source} puts the block '{Wording.Shown(block)}' into the drawing, which " +
                (isExternal ? "lies in another file (an external reference): bind it in the drawing." : "is not in the file: export the drawing again."),
                source));
        }
    }

    private static EntitySource Within(EntitySource inserted, EntitySource own) => own with
    {
        Layer = own.Layer == LayerOfBlock ? inserted.Layer : own.Layer,
        Colour = own.Colour.IsByBlock || (own.Colour.IsByLayer && own.Layer == LayerOfBlock) ? inserted.Colour : own.Colour,
        IsOnPaper = inserted.IsOnPaper,
        IsInvisible = own.IsInvisible || inserted.IsInvisible,
        Inserted = inserted,
    };

    /// <summary>From the block's coordinates to the insertion's, for each of its rows and columns.</summary>
    private static IEnumerable<SpaceMap> Cells(InsertEntity insert, Block block)
    {
        var plane = SpaceMap.OfPlane(insert.Normal);
        var along = Curves.Degrees.Direction(insert.Rotation);
        var turned = new SpaceMap(
            insert.Scale.X * new SpacePoint(along.X, along.Y, 0),
            insert.Scale.Y * new SpacePoint(-along.Y, along.X, 0),
            new SpacePoint(0, 0, insert.Scale.Z),
            default);
        var array = insert.Array;
        for (var row = 0; row < array.Rows; row++)
        {
            for (var column = 0; column < array.Columns; column++)
            {
                var shift = column * array.ColumnSpacing * along + row * array.RowSpacing * along.Left();
                var corner = insert.Place + new SpacePoint(shift.X, shift.Y, 0) - turned.Turn(block.Base);
                yield return plane.After(turned with { Shift = corner });
            }
        }
    }
}
