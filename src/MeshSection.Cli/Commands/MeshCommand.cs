using System.CommandLine;
using MeshSection.Cli.Inputs;
using MeshSection.Cli.Options;
using MeshSection.Cli.Tables;
using MeshSection.Files.Results;
using MeshSection.Plots;

namespace MeshSection.Cli.Commands;

/// <summary>The mesh of a section and its quality.</summary>
internal static class MeshCommand
{
    public static Command Create(Terminal terminal)
    {
        var (input, mesh, output) = (new InputOptions(), new MeshOptions(), new OutputOptions());
        var command = new Command("mesh", "Mesh a section and show the quality of the mesh.");
        input.AddTo(command);
        mesh.AddTo(command);
        output.AddTo(command);
        command.SetAction(parsed => Run(terminal, input.Of(parsed), mesh.Of(parsed), output.Of(parsed)));
        return command;
    }

    private static int Run(Terminal terminal, InputRequest request, MeshRequest meshRequest, OutputRequest output)
    {
        var input = SectionInput.Read(request);
        var (flat, mesh) = meshRequest.Apply(input.Section, input.Unit);
        if (output.Picture is { } picture)
        {
            Picture.Save(MeshFigure.Of(input.Section, mesh, input.Unit), picture, terminal, output);
        }

        if (output.IsJson)
        {
            terminal.WriteJson(stream => MeshJson.Write(stream, mesh, input.Section.Outline.Origin, input.Unit));
        }
        else if (!output.IsQuiet)
        {
            MeshTable.Write(terminal.Tables(), input, flat, mesh);
        }

        Cautions.Write(terminal, input, output);
        return ExitStatus.Done;
    }
}
