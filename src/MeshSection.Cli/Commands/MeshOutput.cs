using MeshSection.Cli.Options;
using MeshSection.Files.Meshes;
using MeshSection.Meshing;
using MeshSection.Units;

namespace MeshSection.Cli.Commands;

/// <summary>Saves the mesh in the files that --out names.</summary>
internal static class MeshOutput
{
    private const string Vtu = ".vtu";
    private const string Msh = ".msh";

    /// <summary>The extensions of mesh files.</summary>
    public static string[] Extensions => [Vtu, Msh];

    /// <summary>Writes each file, and says where.</summary>
    /// <exception cref="CommandException">A file cannot be written.</exception>
    public static void Save(
        FlatOutline flat, Mesh mesh, bool isSecondOrder, LengthUnit unit, Terminal terminal, OutputRequest output)
    {
        var file = isSecondOrder
            ? MeshFile.OfSecondOrder(flat, CurvedMesh.Fit(flat, mesh), unit)
            : MeshFile.OfFirstOrder(flat, mesh, unit);
        foreach (var path in output.DataFiles)
        {
            Save(file, path);
            if (!output.IsQuiet && !output.IsJson)
            {
                terminal.Output.WriteLine($"Mesh: {path}");
            }
        }
    }

    private static void Save(MeshFile file, string path)
    {
        try
        {
            using var stream = new BufferedStream(File.Create(path), 1 << 16);
            if (Path.GetExtension(path).Equals(Vtu, StringComparison.OrdinalIgnoreCase))
            {
                VtuWriter.Write(stream, file);
            }
            else
            {
                MshWriter.Write(stream, file);
            }
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw new CommandException($"--out {path}: cannot be written: {fault.Message}");
        }
    }
}
