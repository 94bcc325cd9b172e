namespace MeshSection.Files.Tests;

/// <summary>Where the documents of the repository lie.</summary>
internal static class Repository
{
    public static string Docs => RepositoryRoot.PathOf("docs");

    public static IEnumerable<string> Examples => Directory.EnumerateFiles(Path.Combine(Docs, "examples"), "*.json").Order(StringComparer.Ordinal);
}
