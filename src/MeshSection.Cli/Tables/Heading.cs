using MeshSection.Cli.Inputs;
using Spectre.Console;

namespace MeshSection.Cli.Tables;

/// <summary>The line over a table: what the section is called, and the unit of its lengths.</summary>
internal static class Heading
{
    /// <summary>Writes the line.</summary>
    public static void Write(IAnsiConsole console, SectionInput input)
    {
        var title = input.Section.Title.Length > 0 ? input.Section.Title : "Section";
        console.Write(new Text($"{title} ({input.Unit.Symbol})", new Style(decoration: Decoration.Bold)));
        console.WriteLine();
        console.WriteLine();
    }
}
