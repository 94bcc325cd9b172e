using System.CommandLine;

namespace MeshSection.Cli.Commands;

/// <summary>Prints the script that teaches a shell to complete the command.</summary>
internal static class CompletionCommand
{
    // Each script hands the line typed so far to the command itself, which knows its own options.
    private const string Bash =
        """
        _meshsection() {
            local IFS=$'\n'
            COMPREPLY=($(meshsection "[suggest:$COMP_POINT]" "$COMP_LINE" 2>/dev/null))
            [[ ${#COMPREPLY[@]} -eq 1 && ${COMPREPLY[0]} == */ ]] && compopt -o nospace
        }
        complete -o default -F _meshsection meshsection
        """;

    private const string Zsh =
        """
        _meshsection() {
            local -a found
            found=("${(@f)$(meshsection "[suggest:${#BUFFER}]" "$BUFFER" 2>/dev/null)}")
            compadd -- "${found[@]}"
        }
        compdef _meshsection meshsection
        """;

    private const string Fish =
        """
        complete -f -c meshsection -a '(meshsection "[suggest:"(commandline -C)"]" (commandline -cp) 2>/dev/null)'
        """;

    private const string PowerShell =
        """
        Register-ArgumentCompleter -Native -CommandName meshsection -ScriptBlock {
            param($word, $line, $position)
            meshsection "[suggest:$position]" "$line" | ForEach-Object {
                [System.Management.Automation.CompletionResult]::new($_, $_, 'ParameterValue', $_)
            }
        }
        """;

    public static Command Create(Terminal terminal)
    {
        var shell = new Argument<string>("SHELL") { Description = "bash, zsh, fish or powershell", HelpName = "SHELL" };
        shell.AcceptOnlyFromAmong("bash", "zsh", "fish", "powershell");
        var command = new Command("completion", "Print a script that makes a shell complete this command.") { shell };
        command.SetAction(parsed => terminal.Output.WriteLine(parsed.GetRequiredValue(shell) switch
        {
            "bash" => Bash,
            "zsh" => Zsh,
            "fish" => Fish,
            _ => PowerShell,
        }));
        return command;
    }
}
