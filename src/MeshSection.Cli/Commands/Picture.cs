using MeshSection.Cli.Options;
using MeshSection.Plots;

namespace MeshSection.Cli.Commands;

/// <summary>Saves the picture that --out asks for.</summary>
internal static class Picture
{
    /// <summary>Draws and saves a figure, and says where.</summary>
    /// <exception cref="CommandException">The file cannot be written.</exception>
    public static void Save(Figure figure, string path, Terminal terminal, OutputRequest output)
    {
        try
        {
            PngWriter.Save(figure, path);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw new CommandException($"--out {path}: cannot be written: {fault.Message}");
        }
        catch (Exception fault) when (fault is TypeInitializationException or DllNotFoundException)
        {
            throw new CommandException(
                $"--out {path}: the graphics library SkiaSharp could not be loaded on this machine. On Linux it needs the C library of a current distribution; results without a picture do not need it.");
        }

        if (!output.IsQuiet && !output.IsJson)
        {
            terminal.Output.WriteLine($"Picture: {path}");
        }
    }
}
