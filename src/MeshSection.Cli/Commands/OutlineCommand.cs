using System.CommandLine;
using MeshSection.Cli.Inputs;
using MeshSection.Cli.Options;
using MeshSection.Cli.Tables;
using MeshSection.Files.Results;
using MeshSection.Plots;

namespace MeshSection.Cli.Commands;

/// <summary>What was found in a drawing: boundaries, repairs, and what was left out.</summary>
internal static class OutlineCommand
{
    public static Command Create(Terminal terminal)
    {
        var (input, output) = (new InputOptions(), new OutputOptions());
        var command = new Command("outline", "Show what was found in a drawing, what was joined, repaired and left out.");
        input.AddTo(command);
        output.AddTo(command);
        command.SetAction(parsed => Run(terminal, input.Of(parsed), output.Of(parsed)));
        return command;
    }

    private static int Run(Terminal terminal, InputRequest request, OutputRequest output)
    {
        var input = SectionInput.Read(request);
        foreach (var picture in output.Pictures)
        {
            Picture.Save(OutlineFigure.Of(input.Section.Outline, input.Section.Title, input.Unit, DrawingFindings.Of(input)), picture, terminal, output);
        }

        if (output.IsJson)
        {
            terminal.WriteJson(stream => OutlineJson.Write(stream, input.Section.Outline, input.Drawing, input.Unit));
        }
        else if (!output.IsQuiet)
        {
            OutlineTable.Write(terminal.Tables(), input);
        }

        return ExitStatus.Done;
    }
}
