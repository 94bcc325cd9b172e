namespace MeshSection.Cli.Tests;

/// <summary>Every command does its work on every sample.</summary>
public class SamplesTests
{
    public static TheoryData<string, string> Runs
    {
        get
        {
            var runs = new TheoryData<string, string>();
            foreach (var sample in Repository.Samples)
            {
                runs.Add("outline", string.Join(' ', sample));
                runs.Add("mesh", string.Join(' ', sample));
                runs.Add("properties", string.Join(' ', sample));
            }

            return runs;
        }
    }

    [Theory]
    [MemberData(nameof(Runs))]
    public void It_fits_the_terminal_and_says_the_same_twice(string command, string sample)
    {
        var words = Repository.Resolve(sample.Split(' '));
        var run = CommandRun.Of([command, .. words]);
        Assert.Equal(0, run.Status);
        Assert.NotEmpty(run.Output);
        Assert.All(run.Output.Split('\n'), line => Assert.True(line.Length <= 80, line));
        Assert.Equal(run.WithoutTime(), CommandRun.Of([command, .. words]).WithoutTime());
    }

    [Theory]
    [InlineData("outline")]
    [InlineData("mesh")]
    [InlineData("properties")]
    public void Each_command_draws_its_picture_even_when_quiet(string command)
    {
        using var folder = new TemporaryFolder();
        var picture = folder.PathOf("picture.png");
        var run = CommandRun.Of(command, Repository.PathOf("dxf-samples/winch-shaft.dxf"), "--quiet", "--out", picture);
        Assert.Equal(new CommandRun(0, "", ""), run);
        var png = File.ReadAllBytes(picture);
        Assert.Equal((1600, 1200), ((png[18] << 8) + png[19], (png[22] << 8) + png[23]));
    }

    [Fact]
    public void A_picture_that_cannot_be_written_is_told()
    {
        using var folder = new TemporaryFolder();
        Directory.CreateDirectory(folder.PathOf("taken.png"));
        var run = CommandRun.Of("outline", Repository.PathOf("dxf-samples/winch-shaft.dxf"), "--quiet", "--out", folder.PathOf("taken.png"));
        Assert.Equal((2, ""), (run.Status, run.Output));
        Assert.Contains("taken.png: cannot be written", run.Error, StringComparison.Ordinal);
    }
}
