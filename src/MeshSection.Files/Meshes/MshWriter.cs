using System.Globalization;
using System.Text;

namespace MeshSection.Files.Meshes;

/// <summary>
/// Writes a mesh in the MSH text format, version 2.2 [GeuzaineRemacle2009]: the one that most finite element programs
/// read. Regions are physical surfaces, boundaries of the outline physical lines.
/// </summary>
public static class MshWriter
{
    private const int Lines = 1;
    private const int Surfaces = 2;

    /// <summary>Writes a mesh.</summary>
    /// <param name="stream">Where to; left open.</param>
    /// <param name="mesh">The mesh.</param>
    public static void Write(Stream stream, MeshFile mesh)
    {
        ArgumentNullException.ThrowIfNull(mesh);
        using var text = new StreamWriter(stream, new UTF8Encoding(false), 1 << 16, leaveOpen: true) { NewLine = "\n" };
        text.WriteLine("$MeshFormat");
        text.WriteLine("2.2 0 8");
        text.WriteLine("$EndMeshFormat");
        text.WriteLine("$Comments");
        text.WriteLine($"Coordinates in {mesh.Unit.Symbol}.");
        text.WriteLine("$EndComments");
        WriteNames(text, mesh);
        WriteNodes(text, mesh);
        WriteElements(text, mesh);
    }

    private static void WriteNames(StreamWriter text, MeshFile mesh)
    {
        var regions = mesh.Regions.Distinct().Order().ToArray();
        var groups = mesh.LineGroups.Distinct().Order().ToArray();
        text.WriteLine("$PhysicalNames");
        text.WriteLine(Invariant(regions.Length + groups.Length));
        foreach (var group in groups)
        {
            text.WriteLine($"{Lines} {Invariant(group + 1)} \"{mesh.GroupNames[group]}\"");
        }

        foreach (var region in regions)
        {
            text.WriteLine($"{Surfaces} {Invariant(region + 1)} \"region {Invariant(region + 1)}\"");
        }

        text.WriteLine("$EndPhysicalNames");
    }

    private static void WriteNodes(StreamWriter text, MeshFile mesh)
    {
        text.WriteLine("$Nodes");
        text.WriteLine(Invariant(mesh.Nodes.Length));
        Span<char> digits = stackalloc char[32];
        for (var i = 0; i < mesh.Nodes.Length; i++)
        {
            Write(text, i + 1, digits);
            Write(text, mesh.Nodes[i].X, digits);
            Write(text, mesh.Nodes[i].Y, digits);
            text.Write("0\n");
        }

        text.WriteLine("$EndNodes");
    }

    private static void WriteElements(StreamWriter text, MeshFile mesh)
    {
        var (line, triangle) = mesh.NodesPerElement == 3 ? (1, 2) : (8, 9);
        text.WriteLine("$Elements");
        text.WriteLine(Invariant(mesh.LineGroups.Length + mesh.ElementCount));
        Span<char> digits = stackalloc char[32];
        var number = 1;
        for (var i = 0; i < mesh.LineGroups.Length; i++)
        {
            WriteElement(text, number++, line, mesh.LineGroups[i] + 1, mesh.Lines.AsSpan(i * mesh.NodesPerLine, mesh.NodesPerLine), digits);
        }

        for (var t = 0; t < mesh.ElementCount; t++)
        {
            WriteElement(text, number++, triangle, mesh.Regions[t] + 1, mesh.Elements.AsSpan(t * mesh.NodesPerElement, mesh.NodesPerElement), digits);
        }

        text.WriteLine("$EndElements");
    }

    /// <summary>Number, kind, two tags (physical and geometric entity, here the same), nodes.</summary>
    private static void WriteElement(
        StreamWriter text, int number, int kind, int tag, ReadOnlySpan<int> nodes, Span<char> digits)
    {
        Write(text, number, digits);
        Write(text, kind, digits);
        text.Write("2 ");
        Write(text, tag, digits);
        Write(text, tag, digits);
        foreach (var node in nodes)
        {
            Write(text, node + 1, digits);
        }

        text.Write('\n');
    }

    private static void Write(StreamWriter text, int value, Span<char> digits)
    {
        value.TryFormat(digits, out var length, provider: CultureInfo.InvariantCulture);
        text.Write(digits[..length]);
        text.Write(' ');
    }

    private static void Write(StreamWriter text, double value, Span<char> digits)
    {
        value.TryFormat(digits, out var length, "R", CultureInfo.InvariantCulture);
        text.Write(digits[..length]);
        text.Write(' ');
    }

    private static string Invariant(int value) => value.ToString(CultureInfo.InvariantCulture);
}
