using System.CommandLine;
using System.Diagnostics;
using MeshSection.Cli.Inputs;
using MeshSection.Cli.Options;
using MeshSection.Cli.Tables;
using MeshSection.Files.Results;
using MeshSection.Meshing;
using MeshSection.Plots;

namespace MeshSection.Cli.Commands;

/// <summary>The mesh of a section and its quality.</summary>
internal static class MeshCommand
{
    // The mesher's arrays, the mesh and the report on it.
    private static readonly MemoryNeed Memory = new(400);

    public static Command Create(Terminal terminal)
    {
        var (input, mesh, detail, output) = (new InputOptions(), new MeshOptions(), new MeshDetailOptions(), new OutputOptions("the mesh", MeshOutput.Extensions));
        var command = new Command("mesh", "Mesh a section, show the quality of the mesh, and write it for other programs.");
        input.AddTo(command);
        mesh.AddTo(command);
        detail.AddTo(command);
        output.AddTo(command);
        command.SetAction(parsed => Run(
            terminal,
            input.Of(parsed),
            mesh.Of(parsed) with { Detail = detail.Of(parsed) },
            output.Of(parsed),
            detail.IsSecondOrder(parsed)));
        return command;
    }

    private static int Run(
        Terminal terminal, InputRequest request, MeshRequest meshRequest, OutputRequest output, bool isSecondOrder)
    {
        var input = SectionInput.Read(request);
        var started = Stopwatch.GetTimestamp();
        var (flat, mesh) = meshRequest.Apply(input.Section, input.Unit, Memory);
        var time = Stopwatch.GetElapsedTime(started);
        var report = MeshReport.Of(flat, mesh, meshRequest.MinAngle ?? new MeshSettings().MinAngle);
        foreach (var picture in output.Pictures)
        {
            Picture.Save(MeshFigure.Of(input.Section, mesh, report, input.Unit), picture, terminal, output);
        }

        if (!output.DataFiles.IsEmpty)
        {
            MeshOutput.Save(flat, mesh, isSecondOrder, input.Unit, terminal, output);
        }

        if (output.IsJson)
        {
            terminal.WriteJson(stream => MeshJson.Write(stream, mesh, report, time, input.Section.Outline.Origin, input.Unit));
        }
        else if (!output.IsQuiet)
        {
            MeshTable.Write(terminal.Tables(), input, mesh, report, time);
        }

        Cautions.Write(terminal, input, output);
        Cautions.Write(terminal, meshRequest, mesh, output);
        return ExitStatus.Done;
    }
}
