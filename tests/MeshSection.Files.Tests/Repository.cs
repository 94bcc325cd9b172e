using System.Runtime.CompilerServices;

namespace MeshSection.Files.Tests;

/// <summary>Where the files of the repository lie.</summary>
internal static class Repository
{
    public static string Docs => Path.Combine(Root(), "docs");

    public static IEnumerable<string> Examples => Directory.EnumerateFiles(Path.Combine(Docs, "examples"), "*.json").Order(StringComparer.Ordinal);

    private static string Root([CallerFilePath] string here = "") =>
        Path.GetFullPath(Path.Combine(Path.GetDirectoryName(here) ?? "", "..", ".."));
}
