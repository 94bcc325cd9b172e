using System.CommandLine;
using MeshSection.Cli.Inputs;
using MeshSection.Cli.Options;
using MeshSection.Cli.Tables;
using MeshSection.Files.Results;
using MeshSection.Plots;
using MeshSection.Properties;
using MeshSection.Torsion;

namespace MeshSection.Cli.Commands;

/// <summary>Every area property of a section, each by two methods.</summary>
internal static class PropertiesCommand
{
    // Torsion solves for a number at each corner and each side.
    private static readonly MemoryNeed Memory = new(4000);

    public static Command Create(Terminal terminal)
    {
        var (input, mesh, output) = (new InputOptions(), new MeshOptions(), new OutputOptions("an overlay for the drawing", OverlayOutput.Extension));
        var density = new DensityOption();
        var command = new Command("properties", "Compute every area property of a section.");
        input.AddTo(command);
        density.AddTo(command);
        mesh.AddTo(command);
        output.AddTo(command);
        command.SetAction(parsed => Run(
            terminal,
            input.Of(parsed) with { Density = density.Of(parsed) },
            mesh.Of(parsed),
            output.Of(parsed)));
        return command;
    }

    private static int Run(Terminal terminal, InputRequest request, MeshRequest meshRequest, OutputRequest output)
    {
        OverlayOutput.Check(request, output);
        var input = SectionInput.Read(request);
        var (flat, mesh) = meshRequest.Apply(input.Section, input.Unit, Memory);
        var isConnected = input.Section.Outline.RegionCount == 1;
        var torsionTask = Task.Run(() => isConnected ? TorsionAnalysis.Of(flat, mesh) : null);
        var properties = PropertiesAnalysis.Of(input.Section, flat, mesh);
        var torsion = torsionTask.GetAwaiter().GetResult();
        foreach (var picture in output.Pictures)
        {
            Picture.Save(SectionFigure.Of(input.Section, mesh, properties, input.Unit), picture, terminal, output);
        }

        OverlayOutput.Save(input, properties, torsion, terminal, output);
        if (output.IsJson)
        {
            terminal.WriteJson(stream => PropertiesJson.Write(stream, properties, torsion, input.Unit));
        }
        else if (!output.IsQuiet)
        {
            PropertiesTable.Write(terminal.Tables(), input, properties, torsion);
        }

        Cautions.Write(terminal, input, output);
        Cautions.WriteOneMaterial(terminal, input, output);
        Cautions.Write(terminal, meshRequest, mesh, output);
        return CrossCheckVerdict.Status(terminal, properties);
    }
}
