using System.Buffers.Binary;
using System.Buffers.Text;
using System.Globalization;
using System.Text;
using MeshSection.Geometry;

namespace MeshSection.Files.Meshes;

/// <summary>
/// Writes a mesh as an unstructured grid of the VTK XML format, version 1.0 [SchroederMartinLorensen2006], for programs that show fields:
/// triangles with three or six nodes, with the region and the smallest corner angle of each.
/// </summary>
public static class VtuWriter
{
    private const byte Triangle = 5;
    private const byte QuadraticTriangle = 22;

    /// <summary>Writes a mesh.</summary>
    /// <param name="stream">Where to; left open.</param>
    /// <param name="mesh">The mesh.</param>
    public static void Write(Stream stream, MeshFile mesh)
    {
        ArgumentNullException.ThrowIfNull(stream);
        ArgumentNullException.ThrowIfNull(mesh);
        var (nodes, count) = (mesh.Nodes.Length, mesh.ElementCount);
        Text(stream, "<?xml version=\"1.0\" encoding=\"utf-8\"?>\n");
        Text(stream, $"<!-- Coordinates in {mesh.Unit.Symbol}, angles in degrees. -->\n");
        Text(stream, "<VTKFile type=\"UnstructuredGrid\" version=\"1.0\" byte_order=\"LittleEndian\" header_type=\"UInt64\">\n");
        Text(stream, "<UnstructuredGrid>\n");
        Text(stream, $"<Piece NumberOfPoints=\"{Invariant(nodes)}\" NumberOfCells=\"{Invariant(count)}\">\n");
        Text(stream, "<Points>\n");
        Doubles(stream, "Points", 3 * nodes, i => Coordinate(mesh.Nodes[i / 3], i % 3), components: 3);
        Text(stream, "</Points>\n<Cells>\n");
        Integers(stream, "connectivity", mesh.Elements.Length, i => mesh.Elements[i]);
        Integers(stream, "offsets", count, t => mesh.NodesPerElement * (t + 1));
        Bytes(stream, "types", count, mesh.NodesPerElement == 3 ? Triangle : QuadraticTriangle);
        Text(stream, "</Cells>\n<CellData Scalars=\"region\">\n");
        Integers(stream, "region", count, t => mesh.Regions[t] + 1);
        Doubles(stream, "smallest_angle", count, t => SmallestAngle(mesh, t));
        Text(stream, "</CellData>\n</Piece>\n</UnstructuredGrid>\n</VTKFile>\n");
    }

    private static double Coordinate(Point p, int axis) => axis switch { 0 => p.X, 1 => p.Y, _ => 0 };

    private static double SmallestAngle(MeshFile mesh, int t)
    {
        var smallest = double.PositiveInfinity;
        for (var k = 0; k < 3; k++)
        {
            var a = Corner(k);
            var (b, c) = (Corner((k + 1) % 3) - a, Corner((k + 2) % 3) - a);
            smallest = Math.Min(smallest, Math.Atan2(b.Cross(c), b.Dot(c)));
        }

        return smallest * 180 / Math.PI;

        Point Corner(int k) => mesh.Nodes[mesh.Elements[mesh.NodesPerElement * t + k]];
    }

    private static void Doubles(Stream stream, string name, int count, Func<int, double> value, int components = 1)
    {
        Open(stream, "Float64", name, components);
        Values(stream, count, sizeof(double), (i, to) => BinaryPrimitives.WriteDoubleLittleEndian(to, value(i)));
    }

    private static void Integers(Stream stream, string name, int count, Func<int, int> value)
    {
        Open(stream, "Int32", name, 1);
        Values(stream, count, sizeof(int), (i, to) => BinaryPrimitives.WriteInt32LittleEndian(to, value(i)));
    }

    private static void Bytes(Stream stream, string name, int count, byte value)
    {
        Open(stream, "UInt8", name, 1);
        Values(stream, count, 1, (_, to) => to[0] = value);
    }

    private static void Open(Stream stream, string type, string name, int components)
    {
        var several = components == 1 ? "" : $" NumberOfComponents=\"{Invariant(components)}\"";
        Text(stream, $"<DataArray type=\"{type}\" Name=\"{name}\"{several} format=\"binary\">\n");
    }

    /// <summary>The values of an array in base 64, and before them their length in bytes, in base 64 of its own.</summary>
    private static void Values(Stream stream, int count, int size, Entry entry)
    {
        Span<byte> header = stackalloc byte[sizeof(ulong)];
        BinaryPrimitives.WriteUInt64LittleEndian(header, (ulong)count * (ulong)size);
        stream.Write(Encoded(header));

        // Blocks of a multiple of three bytes join without padding between them.
        const int block = 3 * 4096;
        var bytes = new byte[block * size];
        for (var first = 0; first < count; first += block)
        {
            var part = Math.Min(block, count - first);
            for (var i = 0; i < part; i++)
            {
                entry(first + i, bytes.AsSpan(i * size, size));
            }

            stream.Write(Encoded(bytes.AsSpan(0, part * size)));
        }

        Text(stream, "\n</DataArray>\n");
    }

    private static byte[] Encoded(ReadOnlySpan<byte> bytes)
    {
        var encoded = new byte[Base64.GetMaxEncodedToUtf8Length(bytes.Length)];
        Base64.EncodeToUtf8(bytes, encoded, out _, out var length);
        return length == encoded.Length ? encoded : encoded[..length];
    }

    private static void Text(Stream stream, string text) => stream.Write(Encoding.UTF8.GetBytes(text));

    private static string Invariant(int value) => value.ToString(CultureInfo.InvariantCulture);

    private delegate void Entry(int index, Span<byte> to);
}
