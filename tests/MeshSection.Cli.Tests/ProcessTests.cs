using System.Diagnostics;

namespace MeshSection.Cli.Tests;

/// <summary>The command as a process of its own.</summary>
public class ProcessTests
{
    [Fact]
    public void Standard_output_holds_json_alone_and_the_status_is_the_processs()
    {
        var (status, output, error) = Run("properties", Repository.PathOf("dxf-samples/gate-post.dxf"), "--layer", "SECTION", "--json");
        Assert.Equal(0, status);
        Assert.Contains("DR401", error, StringComparison.Ordinal);
        using var document = System.Text.Json.JsonDocument.Parse(output);
        Assert.Equal("mm", document.RootElement.GetProperty("units").GetProperty("length").GetString());
        Assert.Equal((2, ""), (Run("properties", "nowhere.dxf").Status, Run("properties", "nowhere.dxf").Output));
    }

    [Fact]
    public void Two_runs_give_the_same_bytes()
    {
        var args = new[] { "properties", Repository.PathOf("dxf-samples/deck-plank.dxf"), "--json" };
        Assert.Equal(Run(args), Run(args));
    }

    private static (int Status, string Output, string Error) Run(params string[] args)
    {
        var start = new ProcessStartInfo("dotnet") { RedirectStandardOutput = true, RedirectStandardError = true };
        start.ArgumentList.Add(Path.Combine(AppContext.BaseDirectory, "MeshSection.Cli.dll"));
        Array.ForEach(args, start.ArgumentList.Add);
        using var process = Process.Start(start)!;
        var error = process.StandardError.ReadToEndAsync();
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return (process.ExitCode, output, error.GetAwaiter().GetResult());
    }
}
