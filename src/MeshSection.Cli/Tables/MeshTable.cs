using System.Collections.Immutable;
using MeshSection.Cli.Inputs;
using MeshSection.Meshing;
using Spectre.Console;

namespace MeshSection.Cli.Tables;

/// <summary>The table of <c>meshsection mesh</c>.</summary>
internal static class MeshTable
{
    private const int LongestBar = 30;

    // What stands before the bars, and around them.
    private const int BesideBars = 28;
    private const int MostListed = 12;

    /// <summary>Writes the table.</summary>
    public static void Write(IAnsiConsole console, SectionInput input, Mesh mesh, MeshReport report, TimeSpan time)
    {
        var lengths = new Lengths(input.Unit);
        Heading.Write(console, input);
        console.Write(Summary(input, mesh, report, time, lengths));
        if (report.Regions.Length > 1)
        {
            console.Write(Regions(input, report, lengths));
        }

        console.Write(Histogram(report.Quality, Math.Clamp(console.Profile.Width - BesideBars, 1, LongestBar)));
        if (!report.InputAngles.IsEmpty)
        {
            console.Write(InputAngles(input, report.InputAngles, lengths));
        }

        if (!mesh.Unrefined.IsEmpty)
        {
            console.Write(Unrefined(input, mesh, lengths));
        }
    }

    private static Table Summary(
        SectionInput input, Mesh mesh, MeshReport report, TimeSpan time, Lengths lengths)
    {
        var quality = report.Quality;
        var origin = input.Section.Outline.Origin;
        var size = input.Section.Outline.Bounds.Diagonal;
        var table = TableStyle.Columns("Mesh", "");
        table.AddRow("triangles", TableStyle.Number(quality.Triangles));
        table.AddRow("nodes", TableStyle.Number(quality.Nodes));
        table.AddRow("regions", TableStyle.Number(input.Section.Outline.RegionCount));
        table.AddRow(
            "smallest angle", $"{Digits.Of(quality.SmallestAngle)}° at {lengths.Of(origin + quality.SmallestAnglePlace, size)}");
        table.AddRow("largest angle", $"{Digits.Of(quality.LargestAngle)}°");
        table.AddRow("largest triangle", $"{lengths.Of(quality.LargestArea, 2)} {lengths.Symbol(2)}");
        if (report.ThinnestWall is { } wall)
        {
            table.AddRow(
                "thinnest wall",
                $"{lengths.Of(wall.Thickness)} {lengths.Symbol()} at {lengths.Of(origin + wall.From, size)}, {wall.Elements} {(wall.Elements == 1 ? "element" : "elements")} across");
        }

        table.AddRow(
            "chords",
            report.MaxSag == 0 ? "no curves" : $"within {lengths.Of(report.MaxSag)} {lengths.Symbol()} of their curves");
        table.AddRow("not refined", mesh.Unrefined.IsEmpty ? "none" : TableStyle.Number(mesh.Unrefined.Length));
        table.AddRow("time", FormattableString.Invariant($"{Math.Ceiling(time.TotalMilliseconds):F0} ms"));
        return table;
    }

    private static Table Histogram(MeshQuality quality, int longest)
    {
        var table = TableStyle.Columns("Angles", "count", "");
        var most = quality.AngleHistogram.Max();
        for (var bin = 0; bin < quality.AngleHistogram.Length; bin++)
        {
            var count = quality.AngleHistogram[bin];
            if (count > 0)
            {
                table.AddRow(
                    $"{10 * bin} to {10 * (bin + 1)}°",
                    TableStyle.Number(count),
                    new string('#', (int)Math.Ceiling((double)longest * count / most)));
            }
        }

        return table;
    }

    private static Table Regions(SectionInput input, MeshReport report, Lengths lengths)
    {
        var (origin, size) = (input.Section.Outline.Origin, input.Section.Outline.Bounds.Diagonal);
        var table = TableStyle.Columns("Region", "triangles", $"area {lengths.Symbol(2)}", "centroid");
        for (var r = 0; r < Math.Min(report.Regions.Length, MostListed); r++)
        {
            var region = report.Regions[r];
            table.AddRow(
                TableStyle.Number(r + 1),
                TableStyle.Number(region.Triangles),
                lengths.Of(region.Area, 2),
                lengths.Of(origin + region.Centroid, size));
        }

        if (report.Regions.Length > MostListed)
        {
            table.AddRow($"and {report.Regions.Length - MostListed} more", "", "", "");
        }

        return table;
    }

    private static Table InputAngles(SectionInput input, ImmutableArray<InputAngle> angles, Lengths lengths)
    {
        var outline = input.Section.Outline;
        var table = TableStyle.Columns("Sharp corners of the outline", "angle");
        foreach (var angle in angles.Take(MostListed))
        {
            table.AddRow(lengths.Of(outline.Origin + angle.Place, outline.Bounds.Diagonal), Digits.Of(angle.Degrees) + "°");
        }

        if (angles.Length > MostListed)
        {
            table.AddRow($"and {angles.Length - MostListed} more", "");
        }

        return table;
    }

    private static Table Unrefined(SectionInput input, Mesh mesh, Lengths lengths)
    {
        var outline = input.Section.Outline;
        var table = TableStyle.Columns("Not refined", "angle", "cause");
        foreach (var triangle in mesh.Unrefined.OrderBy(u => u.Angle).Take(MostListed))
        {
            table.AddRow(
                lengths.Of(outline.Origin + triangle.Place, outline.Bounds.Diagonal),
                Digits.Of(triangle.Angle) + "°",
                Cause(triangle.Cause));
        }

        if (mesh.Unrefined.Length > MostListed)
        {
            table.AddRow($"and {mesh.Unrefined.Length - MostListed} more", "", "");
        }

        return table;
    }

    private static string Cause(UnrefinedCause cause) => cause switch
    {
        UnrefinedCause.InputAngle => "a small angle of the outline itself",
        UnrefinedCause.NodeLimit => "the limit on nodes was reached",
        UnrefinedCause.LeastEdge => "the coordinates' digits end here",
        _ => throw new ArgumentOutOfRangeException(nameof(cause)),
    };
}
