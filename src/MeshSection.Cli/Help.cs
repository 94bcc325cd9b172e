using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Invocation;

namespace MeshSection.Cli;

/// <summary>Adds examples to the help of each command.</summary>
internal static class Help
{
    private static readonly (string Command, string Line, string Meaning)[] Examples =
    [
        ("properties", "meshsection properties dxf-samples/handrail.dxf --out handrail.png", "every property, and a picture"),
        ("properties", "meshsection properties plate.dxf --unit mm --density \"2700 kg/m3\"", "a drawing that does not say its unit; mass per length"),
        ("properties", "meshsection properties tee.json --json", "for other programs"),
        ("outline", "meshsection outline sheet.dxf --layer \"SECTION*\" --tolerance 0.05", "only some layers; ends up to 0.05 apart are joined"),
        ("mesh", "meshsection mesh frame.dxf --elements 5000 --out frame-mesh.png", "about 5000 triangles"),
        ("mesh", "meshsection mesh frame.dxf --element-size 2mm --min-angle 30", "edges of about 2 mm"),
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
