using MeshSection.Cli.Inputs;
using MeshSection.Cli.Options;
using MeshSection.Dxf;
using MeshSection.Dxf.Overlay;
using MeshSection.Properties;
using MeshSection.Torsion;

namespace MeshSection.Cli.Commands;

/// <summary>Saves results as drawings to lay over the one that they are of.</summary>
internal static class OverlayOutput
{
    /// <summary>The extension of overlays.</summary>
    public const string Extension = ".dxf";

    /// <summary>Makes sure that no overlay would take the place of the input.</summary>
    /// <exception cref="CommandException">A file that --out names is the input itself.</exception>
    public static void Check(InputRequest request, OutputRequest output)
    {
        foreach (var path in output.DataFiles)
        {
            if (Path.GetFullPath(path).Equals(Path.GetFullPath(request.Path), StringComparison.OrdinalIgnoreCase))
            {
                throw new CommandException($"--out {path}: this is the input; an overlay would take its place. Give another name.");
            }
        }
    }

    /// <summary>Writes each overlay, and says where.</summary>
    /// <exception cref="CommandException">A file cannot be written, or the section is not drawn in the xy plane.</exception>
    public static void Save(
        SectionInput input, SectionProperties properties, TorsionProperties? torsion, Terminal terminal, OutputRequest output)
    {
        foreach (var path in output.DataFiles)
        {
            if (input.Drawing?.Report.Cautions.FirstOrDefault(c => c.Code == NoteCode.OtherPlane) is { } plane)
            {
                throw new CommandException($"--out {path}: {plane.Message} Overlays are drawn in the xy plane: turn the section into it.");
            }

            var unit = input.Drawing?.Report.Unit ?? input.Unit;
            Save(path, SectionOverlay.Of(input.Section.Outline, properties, torsion, unit, input.Section.Title));
            if (!output.IsQuiet && !output.IsJson)
            {
                terminal.Output.WriteLine($"Overlay: {path}");
            }
        }
    }

    private static void Save(string path, OverlayDrawing overlay)
    {
        try
        {
            using var stream = File.Create(path);
            OverlayWriter.Write(stream, overlay);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw new CommandException($"--out {path}: cannot be written: {fault.Message}");
        }
    }
}
