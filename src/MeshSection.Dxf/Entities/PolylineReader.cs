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
        var plane = (flags & IsSpatial) != 0 ? new Plane(false) : Plane.Of(fields.Normal);
        var height = fields.Number(30) ?? 0;
        var isMesh = (flags & IsMesh) != 0;
        var vertices = new List<PolylineVertex>();
        var lowest = double.PositiveInfinity;
        var highest = double.NegativeInfinity;
        while (tags.Is(0, "VERTEX"u8))
        {
            fields.Read("VERTEX", hasShape: !isMesh);
            if (isMesh || (fields.Flags & IsFrameControlPoint) != 0)
            {
                continue;
            }

            var z = fields.Number(30) ?? 0;
            lowest = Math.Min(lowest, z);
            highest = Math.Max(highest, z);
            vertices.Add(new PolylineVertex(fields.Point(10, "vertex coordinates"), fields.Number(42) ?? 0));
        }

        ReadEnd(source);
        if (isMesh)
        {
            return new UnreadEntity(source with { Kind = "POLYLINE (mesh)" });
        }

        if ((flags & IsSpatial) != 0)
        {
            height = vertices.Count > 0 ? lowest : 0;
            if (highest - lowest > Plane.Flatness * Extent(vertices))
            {
                return new TiltedEntity(source);
            }
        }

        return plane is { } flat
            ? flat.Polyline(source, flat.Height(height), vertices, (flags & IsClosed) != 0)
            : new TiltedEntity(source);
    }

    private void ReadEnd(EntitySource source)
    {
        if (!tags.HasTag)
        {
            throw ReadingFaults.CutEntity(tags.Line, source, "its end mark (SEQEND)");
        }

        if (tags.Is(0, "SEQEND"u8))
        {
            fields.Read("SEQEND", hasShape: false);
            return;
        }

        notes.Add(DrawingNote.About(
            NoteCode.PolylineMended, $"{source} has no end mark (SEQEND) before line {tags.Line}.", source));
    }

    private static double Extent(List<PolylineVertex> vertices)
    {
        var extent = 0.0;
        foreach (var vertex in vertices)
        {
            extent = Math.Max(extent, vertex.Point.DistanceTo(vertices[0].Point));
        }

        return extent;
    }
}
