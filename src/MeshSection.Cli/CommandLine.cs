using System.CommandLine;
using MeshSection.Cli.Commands;
using MeshSection.Files;

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
        // A word that begins with @ is a file's name like any other.
        var parsed = root.Parse(args, new ParserConfiguration { ResponseFileTokenReplacer = null });
        try
        {
            if (parsed.Errors.Count > 0 && !IsHelpAsked(args))
            {
                throw new CommandException(Fault(parsed));
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

    private static string Fault(ParseResult parsed)
    {
        var command = parsed.CommandResult.Command;
        var path = command is RootCommand ? "" : command.Name + " ";
        var see = $"See 'meshsection {path}--help'.";
        if (parsed.UnmatchedTokens is not [var word, ..])
        {
            return string.Join(Environment.NewLine, parsed.Errors.Select(e => e.Message)) + Environment.NewLine + see;
        }

        // What was not understood is the cause; what is then missing follows from it.
        string[] known = [.. command.Subcommands.Select(c => c.Name), .. command.Options.Select(o => o.Name)];
        var isOption = word.StartsWith('-');
        return !isOption && path.Length > 0
            ? $"'{word}' is one word too many: a command reads one input. {see}"
            : $"'{word}' is no {(isOption ? "option" : "command")} here. {NearestWord.Advice(word, known)} {see}";
    }

    private static bool IsHelpAsked(IReadOnlyList<string> args) => args.Any(a => a is "-h" or "--help" or "-?");
}
