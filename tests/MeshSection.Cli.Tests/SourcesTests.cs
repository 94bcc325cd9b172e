using System.Text.RegularExpressions;

namespace MeshSection.Cli.Tests;

public partial class SourcesTests
{
    private static readonly string[] Folders = ["src", "docs", "tests"];

    [Fact]
    public void Every_source_that_code_or_documents_name_is_listed_and_every_one_listed_is_named()
    {
        var list = Repository.PathOf("docs/sources.md");
        var listed = Keys(File.ReadAllText(list)).ToHashSet();
        var named = Folders
            .SelectMany(folder => Directory.EnumerateFiles(Repository.PathOf(folder), "*.*", SearchOption.AllDirectories))
            .Where(path => path.EndsWith(".cs", StringComparison.Ordinal) || path.EndsWith(".md", StringComparison.Ordinal))
            .Where(path => path != list && !path.Split(Path.DirectorySeparatorChar).Any(part => part is "obj" or "bin"))
            .SelectMany(path => Keys(File.ReadAllText(path)))
            .ToHashSet();
        Assert.Empty(named.Except(listed));
        Assert.Empty(listed.Except(named));
    }

    private static IEnumerable<string> Keys(string text) => Key().Matches(text).Select(m => m.Value);

    [GeneratedRegex(@"\[[A-Z][A-Za-z]+(18|19|20)\d\d\]")]
    private static partial Regex Key();
}
