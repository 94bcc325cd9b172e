using MeshSection.Cli.Tables;
using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Units;

namespace MeshSection.Cli.Inputs;

/// <summary>Says what is wrong with a point or line that the mesh is to keep.</summary>
internal static class ConstraintWords
{
    /// <summary>The message for a person.</summary>
    public static string Of(ConstraintException fault, Outline outline, LengthUnit unit)
    {
        var lengths = new Lengths(unit);
        var place = Place(fault.Place);
        var what = fault.Line is { } line ? $"--line from {Place(line.From)} to {Place(line.To)}" : $"--point {place}";
        var box = $"It spans {Place(new Point(outline.Bounds.MinX, outline.Bounds.MinY))} to {Place(new Point(outline.Bounds.MaxX, outline.Bounds.MaxY))} {unit.Symbol}.";
        return fault.Fault switch
        {
            ConstraintFault.Outside when fault.Line is null => $"{what}: lies outside of the section. {box}",
            ConstraintFault.Outside => $"{what}: its end {place} lies outside of the section. {box}",
            ConstraintFault.MeetsBoundary => $"{what}: meets a boundary of the section at {place}. Let it end there, or inside.",
            ConstraintFault.NoLength => $"{what}: ends where it begins.",
            _ => throw new ArgumentOutOfRangeException(nameof(fault)),
        };

        string Place(Point point) => lengths.Of(outline.Origin + point, outline.Bounds.Diagonal);
    }
}
