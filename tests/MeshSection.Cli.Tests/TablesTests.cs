namespace MeshSection.Cli.Tests;

/// <summary>What a person sees, stored and compared; numbers are checked elsewhere.</summary>
public class TablesTests
{
    [Theory]
    [InlineData(80, "properties dxf-samples/eaves-angle.dxf")]
    [InlineData(44, "properties dxf-samples/eaves-angle.dxf")]
    [InlineData(80, "properties docs/examples/crane-runway-channels.json")]
    [InlineData(80, "outline dxf-samples/gate-post.dxf --layer SECTION")]
    [InlineData(80, "mesh dxf-samples/winch-shaft.dxf")]
    [InlineData(44, "mesh dxf-samples/winch-shaft.dxf")]
    public void The_table_is_the_one_that_was_looked_at(int width, string line)
    {
        var run = CommandRun.At(width, Repository.Resolve(line.Split(' '))).WithoutTime();
        Assert.Equal(0, run.Status);
        Assert.All(run.Output.Split('\n'), l => Assert.True(l.Length <= width, $"{l.Length} columns: {l}"));
        var words = line.Split(' ');
        var name = $"{words[0]}-{Path.GetFileNameWithoutExtension(words[1])}-{width}.txt";
        var path = Repository.PathOf($"tests/MeshSection.Cli.Tests/Expected/{name}");
        if (Environment.GetEnvironmentVariable("MESHSECTION_WRITE") == "1")
        {
            Directory.CreateDirectory(Path.GetDirectoryName(path)!);
            File.WriteAllText(path, run.Output);
        }

        // The last digit of a rounding error differs from one processor to the next.
        Assert.Equal(WithoutRoundingErrors(File.ReadAllText(path).ReplaceLineEndings("\n")), WithoutRoundingErrors(run.Output));
    }

    [Theory]
    [InlineData(40)]
    [InlineData(60)]
    public void On_a_narrow_terminal_no_number_is_broken(int width)
    {
        var wide = CommandRun.At(200, "properties", Repository.PathOf("dxf-samples/eaves-angle.dxf"));
        var narrow = CommandRun.At(width, "properties", Repository.PathOf("dxf-samples/eaves-angle.dxf"));
        Assert.All(
            ["53292.2", "106.717×10³", "20975.4", "95834.3", "102.245×10³", "47.9849", "5.33144×10⁶"],
            (string number) =>
            {
                Assert.Contains(number, wide.Output, StringComparison.Ordinal);
                Assert.Contains(number, narrow.Output, StringComparison.Ordinal);
            });
    }

    [Fact]
    public void Quiet_prints_nothing()
    {
        foreach (var command in new[] { "outline", "mesh", "properties" })
        {
            Assert.Equal(
                new CommandRun(0, "", ""),
                CommandRun.Of(command, Repository.PathOf("dxf-samples/gate-post.dxf"), "--layer", "SECTION", "--quiet"));
        }
    }

    [Fact]
    public void Outline_and_mesh_have_their_json()
    {
        var outline = CommandRun.Of("outline", Repository.PathOf("dxf-samples/gate-post.dxf"), "--layer", "SECTION", "--json");
        using var found = System.Text.Json.JsonDocument.Parse(outline.Output);
        Assert.Equal(4, found.RootElement.GetProperty("boundaries").GetArrayLength());
        var drawing = found.RootElement.GetProperty("drawing");
        Assert.Equal("DR401", drawing.GetProperty("repairs")[0].GetProperty("code").GetString());
        Assert.Equal("layerNotAsked", drawing.GetProperty("leftOut")[0].GetProperty("reason").GetString());
        var mesh = CommandRun.Of("mesh", Repository.PathOf("dxf-samples/winch-shaft.dxf"), "--elements", "2000", "--json");
        using var meshed = System.Text.Json.JsonDocument.Parse(mesh.Output);
        Assert.InRange(meshed.RootElement.GetProperty("triangles").GetInt32(), 1960, 2040);
    }

    [Theory]
    [InlineData("[suggest:16]", "meshsection prop", "properties")]
    [InlineData("[suggest:30]", "meshsection properties x --uni", "--unit")]
    [InlineData("[suggest:24]", "meshsection completion f", "fish")]
    [InlineData("[suggest:25]", "meshsection mesh --quiet ", "--elements")]
    public void A_shell_completes_commands_and_options(string directive, string typed, string expected) =>
        Assert.Contains(expected, CommandRun.Of(directive, typed).Output.Split('\n', '\r'));

    [Theory]
    [InlineData("bash", "-F _meshsection meshsection")]
    [InlineData("zsh", "compdef")]
    [InlineData("fish", "complete -f -c meshsection")]
    [InlineData("powershell", "Register-ArgumentCompleter")]
    public void Each_shell_has_its_script(string shell, string part) =>
        Assert.Contains(part, CommandRun.Of("completion", shell).Output, StringComparison.Ordinal);

    private static string WithoutRoundingErrors(string text) =>
        string.Join('\n', text.Split('\n').Where(l => !l.Contains("differ by", StringComparison.Ordinal)));
}
