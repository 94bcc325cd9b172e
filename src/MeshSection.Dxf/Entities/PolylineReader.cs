using System.Collections.Immutable;
using MeshSection.Dxf.Space;
using MeshSection.Dxf.Tags;

namespace MeshSection.Dxf.Entities;

/// <summary>Reads a polyline of the older kind: a head, a VERTEX for each vertex, and a SEQEND.</summary>
internal sealed class PolylineReader(TagReader tags, EntityFields fields, List<DrawingNote> notes)
{
    // Bits of group 70 of the head and of a vertex.
    private const int IsClosed = 1;
    private const int IsSpatial = 8;
    private const int IsMesh = 16 | 64;
    private const int IsFrameControlPoint = 16;

    /// <summary>Reads on from a head whose fields are read.</summary>
    public Entity Read()
    {
        var source = fields.Source;
        var flags = fields.Flags;
        var normal = fields.Normal;
        var elevation = fields.Number(30) ?? 0;
        var isMesh = (flags & IsMesh) != 0;
        var isSpatial = (flags & IsSpatial) != 0;
        var points = ImmutableArray.CreateBuilder<SpacePoint>();
        var vertices = ImmutableArray.CreateBuilder<PolylineVertex>();
        while (tags.Is(0, "VERTEX"u8))
        {
            fields.Read("VERTEX", hasShape: !isMesh);
            if (isMesh || (fields.Flags & IsFrameControlPoint) != 0)
            {
                continue;
            }

            if (isSpatial)
            {
                points.Add(fields.SpacePoint(10, "vertex coordinates"));
            }
            else
            {
                vertices.Add(new PolylineVertex(fields.Point(10, "vertex coordinates"), fields.Number(42) ?? 0));
            }
        }

        ReadEnd(source);
        return isMesh ? new UnreadEntity(source with { Kind = "POLYLINE (mesh)" })
            : isSpatial ? new SpatialPolylineEntity(source, points.ToImmutable(), (flags & IsClosed) != 0)
            : new PolylineEntity(source, normal, elevation, vertices.ToImmutable(), (flags & IsClosed) != 0);
    }

    private void ReadEnd(EntitySource source)
    {
        if (!tags.HasTag)
        {
            throw ReadingFaults.CutEntity(tags.Place, source, "its end mark (SEQEND)");
        }

        if (tags.Is(0, "SEQEND"u8))
        {
            fields.Read("SEQEND", hasShape: false);
            return;
        }

        notes.Add(DrawingNote.About(
            NoteCode.PolylineMended, $"{source} has no end mark (SEQEND) before {tags.Place}.", source));
    }
}
