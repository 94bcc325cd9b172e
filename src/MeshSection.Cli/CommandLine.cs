using System.CommandLine;
using MeshSection.Cli.Commands;

namespace MeshSection.Cli;

/// <summary>Parses the command line and runs what it asks for.</summary>
internal static class CommandLine
{
    private const string Description =
        """
        Section properties of any cross-section: from a drawing (.dxf) or a section file (.json) to every area
        property, each checked by a second method, with a picture.

        Results support a qualified engineer's judgement and do not replace it.
        """;

    /// <summary>Runs the command.</summary>
    /// <param name="args">The words after the command's name.</param>
    /// <param name="terminal">Where to write.</param>
    /// <returns>The exit status.</returns>
    public static int Run(IReadOnlyList<string> args, Terminal terminal)
    {
        var root = Root(terminal);
        var parsed = root.Parse(args);
        try
        {
            if (parsed.Errors.Count > 0 && !IsHelpAsked(args))
            {
                throw new CommandException(
                    string.Join(Environment.NewLine, parsed.Errors.Select(e => e.Message)) + Environment.NewLine +
                    $"See 'meshsection {CommandPath(parsed)}--help'.");
            }

            return parsed.Invoke(new InvocationConfiguration
            {
                Output = terminal.Output,
                Error = terminal.Error,
                EnableDefaultExceptionHandler = false,
            });
        }
        catch (CommandException fault)
        {
            terminal.Error.WriteLine($"meshsection: {fault.Message}");
            return ExitStatus.WrongInput;
        }
        finally
        {
            terminal.Output.Flush();
        }
    }

    private static RootCommand Root(Terminal terminal)
    {
        var root = new RootCommand(Description)
        {
            PropertiesCommand.Create(terminal),
            OutlineCommand.Create(terminal),
            MeshCommand.Create(terminal),
            CompletionCommand.Create(terminal),
        };
        Help.AddExamples(root);
        return root;
    }

    private static bool IsHelpAsked(IReadOnlyList<string> args) => args.Any(a => a is "-h" or "--help" or "-?");

    private static string CommandPath(ParseResult parsed) =>
        parsed.CommandResult.Command is RootCommand ? "" : parsed.CommandResult.Command.Name + " ";
}
