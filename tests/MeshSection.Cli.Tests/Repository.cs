namespace MeshSection.Cli.Tests;

/// <summary>The files of the repository that tests run on.</summary>
internal static class Repository
{
    /// <summary>Every sample drawing and example section file, with the options that it needs.</summary>
    public static IReadOnlyList<string[]> Samples { get; } =
    [
        .. Directory.GetFiles(PathOf("dxf-samples"), "*.dxf")
            .Concat(Directory.GetFiles(PathOf("docs/examples"), "*.json"))
            .Select(path => Path.GetRelativePath(RepositoryRoot.Path, path).Replace('\\', '/'))
            .Order(StringComparer.Ordinal)
            .Select(path => path.EndsWith("gate-post.dxf", StringComparison.Ordinal) ? new[] { path, "--layer", "SECTION" } : [path]),
    ];

    public static string PathOf(string relative) => RepositoryRoot.PathOf(relative);

    /// <summary>The same words with files of the repository named by their full path.</summary>
    public static string[] Resolve(IEnumerable<string> words) =>
        [.. words.Select(w => w.StartsWith("dxf-samples/", StringComparison.Ordinal) || w.StartsWith("docs/", StringComparison.Ordinal) ? PathOf(w) : w)];
}
