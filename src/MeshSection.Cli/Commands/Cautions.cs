using MeshSection.Cli.Inputs;
using MeshSection.Cli.Options;

namespace MeshSection.Cli.Commands;

/// <summary>Tells on standard error what a person should know about how the drawing was understood.</summary>
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
}
