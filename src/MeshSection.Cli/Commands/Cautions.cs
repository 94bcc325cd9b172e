using MeshSection.Cli.Inputs;
using MeshSection.Cli.Options;
using MeshSection.Meshing;

namespace MeshSection.Cli.Commands;

/// <summary>Tells on standard error what a person should know about how the drawing was understood, and of the mesh.</summary>
internal static class Cautions
{
    /// <summary>Writes repairs and cautions, a line each.</summary>
    public static void Write(Terminal terminal, SectionInput input, OutputRequest output)
    {
        if (output.IsQuiet || input.Drawing is not { } drawing)
        {
            return;
        }

        foreach (var note in drawing.Report.Repairs.Concat(drawing.Report.Cautions))
        {
            terminal.Error.WriteLine($"{note.Name}: {note.Message}");
        }
    }

    /// <summary>Says what of the drawing takes no part in results for one material.</summary>
    public static void WriteOneMaterial(Terminal terminal, SectionInput input, OutputRequest output)
    {
        if (output.IsQuiet || input.Drawing is not { } drawing)
        {
            return;
        }

        string[] layers = [.. drawing.Faces.Select(f => f.Layer).Distinct(StringComparer.OrdinalIgnoreCase)];
        if (layers.Length > 1)
        {
            terminal.Error.WriteLine(
                $"caution: the regions on {string.Join(", ", layers)} were taken as one material: properties by modular ratios are not computed yet.");
        }

        if (drawing.Bars.Length > 0)
        {
            terminal.Error.WriteLine(FormattableString.Invariant(
                $"caution: the {drawing.Bars.Length} bars take no part in these properties, which are those of the gross section."));
        }
    }

    /// <summary>Writes what to know of a mesh, a line each.</summary>
    public static void Write(Terminal terminal, MeshRequest request, Mesh mesh, OutputRequest output)
    {
        if (output.IsQuiet)
        {
            return;
        }

        if (request.MinAngle > MeshRequest.ProvenMinAngle)
        {
            terminal.Error.WriteLine(FormattableString.Invariant(
                $"caution: --min-angle {request.MinAngle}: refinement is proven to end for up to {MeshRequest.ProvenMinAngle} degrees. Above, it may end at its limit of nodes, with smaller angles left."));
        }

        var left = mesh.Unrefined.Count(u => u.Cause == UnrefinedCause.NodeLimit);
        if (left > 0)
        {
            terminal.Error.WriteLine(FormattableString.Invariant(
                $"caution: the mesh ended at its limit of {mesh.Nodes.Length} nodes, with {left} triangles left below what was asked for; 'meshsection mesh' lists them. A wall far thinner than it is long takes that many, and so do sizes far smaller than the section: leave the wall out of the drawing, or ask for less."));
        }
    }
}
