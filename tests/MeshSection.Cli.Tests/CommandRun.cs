namespace MeshSection.Cli.Tests;

/// <summary>What one run of the command gave.</summary>
internal sealed record CommandRun(int Status, string Output, string Error)
{
    /// <summary>Runs the command in this process.</summary>
    public static CommandRun Of(params IReadOnlyList<string> args) => At(80, args);

    /// <summary>The same without how long it took.</summary>
    public CommandRun WithoutTime() => this with
    {
        Output = string.Join('\n', Output.Split('\n').Where(l => !l.StartsWith("  time ", StringComparison.Ordinal))),
    };

    /// <summary>Runs the command on a terminal of some width.</summary>
    public static CommandRun At(int width, params IReadOnlyList<string> args)
    {
        using var output = new StringWriter { NewLine = "\n" };
        using var error = new StringWriter { NewLine = "\n" };
        var status = CommandLine.Run(args, new Terminal(output, error, width, IsInteractive: false));
        return new CommandRun(status, output.ToString(), error.ToString());
    }
}
