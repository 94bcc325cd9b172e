using System.Diagnostics;

namespace MeshSection.Cli.Tests;

public class CompletionTests
{
    [Fact]
    public void Files_that_can_be_read_are_completed()
    {
        using var folder = new TemporaryFolder();
        foreach (var name in new[] { "beam.dxf", "beam.json", "beam.txt", "other.dxf" })
        {
            folder.Write(name, "");
        }

        Directory.CreateDirectory(folder.PathOf("beams"));
        var typed = "meshsection properties " + folder.PathOf("be");
        var found = CommandRun.Of($"[suggest:{typed.Length}]", typed).Output.Split(['\n', '\r'], StringSplitOptions.RemoveEmptyEntries);
        Assert.Equal([folder.PathOf("beam.dxf"), folder.PathOf("beam.json"), folder.PathOf("beams/")], found);
    }

    [Fact]
    public void After_a_switch_the_input_is_completed()
    {
        using var folder = new TemporaryFolder();
        var drawing = folder.Write("beam.dxf", "");
        var typed = "meshsection properties --quiet " + drawing[..^3];
        Assert.Contains(drawing, CommandRun.Of($"[suggest:{typed.Length}]", typed).Output.Split('\n', '\r'));
    }

    [Fact]
    public void Bash_completes_with_the_script()
    {
        Assert.SkipUnless(File.Exists("/bin/bash"), "There is no bash here.");
        var command = Path.Combine(AppContext.BaseDirectory, "MeshSection.Cli.dll");
        var script = CommandRun.Of("completion", "bash").Output;
        var typed = "meshsection prop";
        var start = new ProcessStartInfo("/bin/bash") { RedirectStandardInput = true, RedirectStandardOutput = true };
        using var bash = Process.Start(start)!;
        bash.StandardInput.Write(
            $"""
            set -e
            meshsection() (dotnet "{command}" "$@")
            {script}
            complete -p meshsection
            COMP_LINE="{typed}"
            COMP_POINT={typed.Length}
            _meshsection || true
            echo "$COMPREPLY"

            """);
        bash.StandardInput.Close();
        var output = bash.StandardOutput.ReadToEnd().Split('\n');
        bash.WaitForExit();
        Assert.Equal(["complete -o default -F _meshsection meshsection", "properties", ""], output);
    }
}
