using MeshSection.Dxf.Entities;

namespace MeshSection.Dxf.Placing;

/// <summary>
/// Counts what insertions come to before any is made, so that a block that holds itself, blocks nested without end and
/// arrays of millions are refused at once.
/// </summary>
internal sealed class BlockSizes
{
    private const int DeepestNesting = 64;
    private const long MostEntities = 4_000_000;

    private readonly Drawing _drawing;
    private readonly Dictionary<string, long> _sizes = new(StringComparer.OrdinalIgnoreCase);
    private readonly List<string> _open = [];

    private BlockSizes(Drawing drawing) => _drawing = drawing;

    /// <exception cref="DrawingException">The insertions cannot be made.</exception>
    public static void Check(Drawing drawing)
    {
        var sizes = new BlockSizes(drawing);
        var total = 0L;
        foreach (var entity in drawing.Entities)
        {
            total = sizes.Added(total, entity);
        }
    }

    private long Added(long total, Entity entity)
    {
        var size = entity is InsertEntity insert ? SizeOf(insert) : 1;
        return total + size <= MostEntities ? total + size : throw OutlineFaults.TooManyEntities(entity.Source, MostEntities);
    }

    private long SizeOf(InsertEntity insert)
    {
        if (!_drawing.Blocks.TryGetValue(insert.Block, out var block))
        {
            return 1;
        }

        if (!_sizes.TryGetValue(block.Name, out var size))
        {
            if (_open.Contains(block.Name, StringComparer.OrdinalIgnoreCase))
            {
                throw OutlineFaults.BlockHoldsItself(insert.Source, [.. _open, block.Name]);
            }

            if (_open.Count == DeepestNesting)
            {
                throw OutlineFaults.BlocksTooDeep(insert.Source, DeepestNesting);
            }

            _open.Add(block.Name);
            size = block.Entities.Aggregate(0L, Added);
            _open.RemoveAt(_open.Count - 1);
            _sizes.Add(block.Name, size);
        }

        // In double precision: the product of three counts may leave the range of whole numbers.
        var all = (double)size * insert.Array.Columns * insert.Array.Rows;
        var cells = (double)insert.Array.Columns * insert.Array.Rows;
        return Math.Max(all, cells) <= MostEntities ? (long)all : throw OutlineFaults.TooManyEntities(insert.Source, MostEntities);
    }
}
