using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Invocation;

namespace MeshSection.Cli;

/// <summary>Adds examples to the help of each command.</summary>
internal static class Help
{
    private static readonly (string Command, string Line, string Meaning)[] Examples =
    [
        ("properties", "meshsection properties dxf-samples/handrail-channel.dxf --out handrail-channel.png", "every property, and a picture"),
        ("properties", "meshsection properties dxf-samples/eaves-angle.dxf --density \"7850 kg/m3\"", "with the mass per length"),
        ("properties", "meshsection properties docs/examples/lock-gate-rail.json --json", "a section file; for other programs"),
        ("outline", "meshsection outline dxf-samples/gate-post.dxf --layer SECTION --tolerance \"0.05 mm\"", "one layer only; ends up to 0.05 mm apart are joined"),
        ("outline", "meshsection outline dxf-samples/runway-tee.dxf --unit in", "a drawing that does not say its unit, or says it wrongly"),
        ("mesh", "meshsection mesh dxf-samples/pontoon-deck.dxf --elements 5000 --out pontoon-mesh.png", "about 5000 triangles"),
        ("mesh", "meshsection mesh dxf-samples/winch-shaft.dxf --element-size 2mm --min-angle 30", "no side longer than 2 mm"),
        ("mesh", "meshsection mesh dxf-samples/deck-plank.dxf --across 3 --order 2 --out deck-plank.vtu", "three elements across every wall; for other programs"),
        ("completion", "source <(meshsection completion bash)", "completion in this shell"),
    ];

    /// <summary>Every example, as typed.</summary>
    public static IEnumerable<string> ExampleLines => Examples.Select(e => e.Line);

    /// <summary>Makes the help option of the root command, which serves all commands, end with examples.</summary>
    public static void AddExamples(RootCommand root)
    {
        var option = root.Options.OfType<HelpOption>().Single();
        option.Action = new HelpWithExamples((HelpAction)option.Action!);
    }

    private sealed class HelpWithExamples(HelpAction help) : SynchronousCommandLineAction
    {
        public override bool ClearsParseErrors => true;

        public override int Invoke(ParseResult parseResult)
        {
            // The help calls the command by the name of its assembly, which is not the one that it is run by.
            var output = parseResult.InvocationConfiguration.Output;
            using var text = new StringWriter();
            parseResult.InvocationConfiguration.Output = text;
            help.Invoke(parseResult);
            parseResult.InvocationConfiguration.Output = output;
            output.Write(text.ToString().Replace(RootCommand.ExecutableName, "meshsection", StringComparison.Ordinal));
            var command = parseResult.CommandResult.Command;
            output.WriteLine("Examples:");
            foreach (var (name, line, meaning) in Examples)
            {
                if (command is RootCommand || command.Name == name)
                {
                    output.WriteLine($"  {line}");
                    output.WriteLine($"      {meaning}");
                }
            }

            output.WriteLine();
            return ExitStatus.Done;
        }
    }
}
