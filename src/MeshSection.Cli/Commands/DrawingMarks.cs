using System.Collections.Immutable;
using MeshSection.Cli.Inputs;
using MeshSection.Plots;

namespace MeshSection.Cli.Commands;

/// <summary>The repairs of a drawing that have a place, as marks on its picture.</summary>
internal static class DrawingMarks
{
    /// <summary>A mark for each repair and caution that has a place.</summary>
    public static ImmutableArray<OutlineMark> Of(SectionInput input) => input.Drawing is not { Report: var report }
        ? []
        :
        [
            .. report.Repairs.Concat(report.Cautions)
                .Where(note => note.Point is not null)
                .Select(note => new OutlineMark(report.Unit.Millimetres * note.Point!.Value, note.Name)),
        ];
}
