using System.Text;

namespace MeshSection.Cli.Tests;

/// <summary>Every command that the documents and the help show does what they say.</summary>
public class DocumentedCommandsTests
{
    private const string Prompt = "$ meshsection ";
    private const string FromSource = "dotnet run -c Release --project src/MeshSection.Cli -- ";

    public static TheoryData<string> Lines => [.. Documented().Distinct()];

    [Theory]
    [MemberData(nameof(Lines))]
    public void It_runs(string line)
    {
        using var folder = new TemporaryFolder();
        var words = Words(line);
        int[] files = [.. Enumerable.Range(0, words.Count).Where(i => i > 0 && words[i - 1] == "--out")];
        foreach (var i in files)
        {
            words[i] = folder.PathOf(words[i]);
        }

        var run = CommandRun.Of(Repository.Resolve(words));
        Assert.True(run.Status == 0, run.Error);
        Assert.All(files, i => AssertWritten(words[i]));
    }

    private static void AssertWritten(string path)
    {
        if (!path.EndsWith(".png", StringComparison.Ordinal))
        {
            var start = Path.GetExtension(path) switch { ".vtu" => "<?xml", ".dxf" => "0\nSECTION", _ => "$MeshFormat" };
            Assert.StartsWith(start, File.ReadAllText(path), StringComparison.Ordinal);
            return;
        }

        var png = File.ReadAllBytes(path);
        Assert.Equal([0x89, (byte)'P', (byte)'N', (byte)'G'], png[..4]);
        Assert.Equal((1600, 1200), ((png[18] << 8) + png[19], (png[22] << 8) + png[23]));
    }

    [Fact]
    public void The_readme_shows_the_main_job_and_the_tests()
    {
        var readme = File.ReadAllText(Repository.PathOf("README.md"));
        Assert.Contains(FromSource + "properties dxf-samples/", readme, StringComparison.Ordinal);
        Assert.Contains("\ndotnet test -c Release\n", readme, StringComparison.Ordinal);
        Assert.Contains("\ndotnet test -c Release 2>&1", File.ReadAllText(Repository.PathOf(".ci/run")), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("")]
    [InlineData("properties")]
    [InlineData("outline")]
    [InlineData("mesh")]
    [InlineData("completion")]
    public void Help_calls_the_command_by_its_name_and_ends_with_examples(string command)
    {
        var run = CommandRun.Of(command.Length == 0 ? ["--help"] : [command, "--help"]);
        Assert.Equal(0, run.Status);
        Assert.Contains($"meshsection {command}".TrimEnd(), run.Output, StringComparison.Ordinal);
        Assert.Contains("Examples:", run.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("testhost", run.Output, StringComparison.OrdinalIgnoreCase);
    }

    private static IEnumerable<string> Documented()
    {
        string[] pages =
        [
            Repository.PathOf("README.md"),
            Repository.PathOf("dxf-samples/README.md"),
            .. Directory.GetFiles(Repository.PathOf("docs"), "*.md"),
        ];
        foreach (var line in pages.SelectMany(File.ReadAllLines).Select(l => l.Trim()))
        {
            if (line.StartsWith(Prompt, StringComparison.Ordinal))
            {
                yield return line[Prompt.Length..];
            }
            else if (line.StartsWith(FromSource, StringComparison.Ordinal))
            {
                yield return line[FromSource.Length..];
            }
        }

        foreach (var example in Help.ExampleLines.Where(l => l.StartsWith("meshsection ", StringComparison.Ordinal)))
        {
            yield return example["meshsection ".Length..];
        }
    }

    private static List<string> Words(string line)
    {
        List<string> words = [];
        var word = new StringBuilder();
        var isQuoted = false;
        foreach (var c in line + " ")
        {
            if (c == '"')
            {
                isQuoted = !isQuoted;
            }
            else if (c == ' ' && !isQuoted)
            {
                if (word.Length > 0)
                {
                    words.Add(word.ToString());
                }

                word.Clear();
            }
            else
            {
                word.Append(c);
            }
        }

        return words;
    }
}
