namespace MeshSection.Cli.Inputs;

/// <summary>Finds files that the command reads.</summary>
internal static class InputFiles
{
    /// <summary>The extension of drawings.</summary>
    public const string Drawing = ".dxf";

    /// <summary>The extension of section files.</summary>
    public const string SectionFile = ".json";

    /// <summary>Opens a file to read.</summary>
    /// <exception cref="CommandException">There is none, or it cannot be read.</exception>
    public static FileStream Open(string path)
    {
        try
        {
            return File.OpenRead(path);
        }
        catch (Exception fault) when (fault is FileNotFoundException or DirectoryNotFoundException or ArgumentException)
        {
            throw new CommandException($"{path}: there is no such file.{Suggestion(path)}");
        }
        catch (UnauthorizedAccessException)
        {
            throw new CommandException(
                Directory.Exists(path) ? $"{path}: is a folder; give a file in it." : $"{path}: may not be read.");
        }
        catch (IOException fault)
        {
            throw new CommandException($"{path}: cannot be read: {fault.Message}");
        }
    }

    /// <summary>Drawings, section files and folders whose path begins with some text, for completion.</summary>
    public static IEnumerable<string> StartingWith(string text)
    {
        var folder = Path.GetDirectoryName(text) ?? "";
        try
        {
            return new DirectoryInfo(folder.Length == 0 ? "." : folder)
                .EnumerateFileSystemInfos(Path.GetFileName(text) + "*")
                .Where(entry => entry is DirectoryInfo || IsReadable(entry.Extension))
                .Select(entry => Path.Combine(folder, entry.Name) + (entry is DirectoryInfo ? "/" : ""))
                .Order(StringComparer.Ordinal)
                .ToArray();
        }
        catch (IOException)
        {
            return [];
        }
        catch (UnauthorizedAccessException)
        {
            return [];
        }
    }

    private static bool IsReadable(string extension) =>
        extension.Equals(Drawing, StringComparison.OrdinalIgnoreCase) ||
        extension.Equals(SectionFile, StringComparison.OrdinalIgnoreCase);

    private static string Suggestion(string path)
    {
        // The commonest slips: another extension, other capitals, another folder just above.
        var name = Path.GetFileNameWithoutExtension(path);
        var near = StartingWith(Path.Combine(Path.GetDirectoryName(path) ?? "", name.Length > 3 ? name[..3] : name))
            .Where(p => !p.EndsWith('/'))
            .Take(3)
            .ToArray();
        return near.Length == 0 ? "" : $" Near it: {string.Join(", ", near)}.";
    }
}
