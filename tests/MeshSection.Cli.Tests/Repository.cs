namespace MeshSection.Cli.Tests;

/// <summary>The files of the repository that tests run on.</summary>
internal static class Repository
{
    public static string Root { get; } = FindRoot();

    /// <summary>Every sample drawing and example section file, with the options that it needs.</summary>
    public static IReadOnlyList<string[]> Samples { get; } =
    [
        .. Directory.GetFiles(Path.Combine(Root, "dxf-samples"), "*.dxf")
            .Concat(Directory.GetFiles(Path.Combine(Root, "docs", "examples"), "*.json"))
            .Select(path => Path.GetRelativePath(Root, path).Replace('\\', '/'))
            .Order(StringComparer.Ordinal)
            .Select(path => path.EndsWith("gate-post.dxf", StringComparison.Ordinal) ? new[] { path, "--layer", "SECTION" } : [path]),
    ];

    public static string PathOf(string relative) => Path.Combine(Root, relative);

    /// <summary>The same words with files of the repository named by their full path.</summary>
    public static string[] Resolve(IEnumerable<string> words) =>
        [.. words.Select(w => w.StartsWith("dxf-samples/", StringComparison.Ordinal) || w.StartsWith("docs/", StringComparison.Ordinal) ? PathOf(w) : w)];

    private static string FindRoot()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "MeshSection.sln")))
            {
                return folder.FullName;
            }
        }

        throw new DirectoryNotFoundException("The tests run outside of the repository.");
    }
}
