using MeshSection.Cli.Inputs;
using MeshSection.Dxf;
using MeshSection.Dxf.Selection;
using MeshSection.Geometry;
using Spectre.Console;

namespace MeshSection.Cli.Tables;

/// <summary>The table of <c>meshsection outline</c>.</summary>
internal static class OutlineTable
{
    /// <summary>Writes the table.</summary>
    public static void Write(IAnsiConsole console, SectionInput input)
    {
        var lengths = new Lengths(input.Unit);
        Heading.Write(console, input);
        if (input.Drawing is { } drawing)
        {
            console.Write(Source(drawing.Report));
        }

        console.Write(Boundaries(input, lengths));
        if (input.Drawing is { Report: var report } found)
        {
            Faces(console, found);
            Bars(console, found, lengths);
            Entities(console, "Used", report.Used, isReasoned: false);
            Entities(console, "Left out", report.LeftOut, isReasoned: true);
            Notes(console, "Repaired", report.Repairs);
            Notes(console, "Cautions", report.Cautions);
        }
    }

    private static Table Source(DrawingReport report)
    {
        var table = TableStyle.Columns("Drawing", "");
        var unit = report.Unit;
        var box = report.Extents;
        table.AddRow("release", report.Release ?? "not stated");
        table.AddRow("unit", $"{unit.Symbol}, {(report.IsUnitGiven ? "as given" : "as the drawing states")}");
        table.AddRow("extents", $"{Digits.Of(box.Width)} × {Digits.Of(box.Height)} {unit.Symbol}, from ({Digits.Near(box.MinX, box.Diagonal)}, {Digits.Near(box.MinY, box.Diagonal)})");
        table.AddRow("ends joined up to", $"{Digits.Of(report.MaxGap)} {unit.Symbol}, {(report.IsMaxGapGiven ? "as given" : "from the drawing's size")}");
        table.AddRow("pieces", $"{report.Pieces}, joined at {report.Joins} places");
        return table;
    }

    private static Table Boundaries(SectionInput input, Lengths lengths)
    {
        var boundaries = input.Section.Outline.Boundaries;
        var hasCurves = boundaries.Any(b => b.Boundary.Edges.Any(e => e is BezierEdge));
        string[] kinds = hasCurves ? ["lines", "arcs", "curves"] : ["lines", "arcs"];
        var table = TableStyle.Columns(
            "Boundary", ["role", "in", .. kinds, "length " + lengths.Symbol(), "area inside " + lengths.Symbol(2)]);
        for (var i = 0; i < boundaries.Length; i++)
        {
            var (boundary, role, parent) = (boundaries[i].Boundary, boundaries[i].Role, boundaries[i].Parent);
            List<string> cells =
            [
                TableStyle.Number(i + 1),
                role.ToString().ToLowerInvariant(),
                parent < 0 ? "" : TableStyle.Number(parent + 1),
                TableStyle.Number(boundary.Edges.Count(e => e is LineEdge)),
                TableStyle.Number(boundary.Edges.Count(e => e is ArcEdge)),
            ];
            if (hasCurves)
            {
                cells.Add(TableStyle.Number(boundary.Edges.Count(e => e is BezierEdge)));
            }

            table.AddRow([.. cells, lengths.Of(boundary.Length), lengths.Of(Math.Abs(boundary.SignedArea), 2)]);
        }

        return table;
    }

    private static void Faces(IAnsiConsole console, DrawingOutline drawing)
    {
        if (drawing.Faces.IsEmpty)
        {
            return;
        }

        var symbol = drawing.Report.Unit.Symbol;
        var table = TableStyle.Columns("Face", "layer", $"area {symbol}²", $"around {symbol}");
        for (var i = 0; i < drawing.Faces.Length; i++)
        {
            var face = drawing.Faces[i];
            var size = drawing.Report.Extents.Diagonal;
            table.AddRow(
                new Text(TableStyle.Number(i + 1)),
                new Text(face.Layer),
                new Text(Digits.Of(face.Area)),
                new Text($"({Digits.Near(face.Inside.X, size)}, {Digits.Near(face.Inside.Y, size)})"));
        }

        console.Write(table);
    }

    private static void Bars(IAnsiConsole console, DrawingOutline drawing, Lengths lengths)
    {
        if (drawing.Bars.IsEmpty)
        {
            return;
        }

        var table = TableStyle.Columns("Bars", "layer", "diameter " + lengths.Symbol(), "area " + lengths.Symbol(2));
        foreach (var alike in drawing.Bars.GroupBy(b => (b.Source.Layer, b.Diameter)))
        {
            var area = alike.Key.Diameter is { } d ? lengths.Of(alike.Count() * 0.25 * Math.PI * d * d, 2) : "";
            table.AddRow(
                new Text(TableStyle.Number(alike.Count())),
                new Text(alike.Key.Layer),
                new Text(alike.Key.Diameter is { } diameter ? lengths.Of(diameter) : "not stated"),
                new Text(area));
        }

        console.Write(table);
    }

    private static void Entities(IAnsiConsole console, string title, IReadOnlyList<EntityCount> counts, bool isReasoned)
    {
        if (counts.Count == 0)
        {
            return;
        }

        var table = isReasoned
            ? TableStyle.Columns(title, "layer", "count", "why")
            : TableStyle.Columns(title, "layer", "count");
        foreach (var count in counts)
        {
            // As text, not as markup: a layer may have any name.
            List<Text> cells = [new(count.Kind), new(count.Layer), new(TableStyle.Number(count.Count))];
            if (isReasoned)
            {
                cells.Add(new Text(LeftOutWords.Of(count.Reason)));
            }

            table.AddRow(cells);
        }

        console.Write(table);
    }

    private static void Notes(IAnsiConsole console, string title, IReadOnlyList<DrawingNote> notes)
    {
        if (notes.Count == 0)
        {
            return;
        }

        var table = TableStyle.Columns(title, "");
        foreach (var note in notes)
        {
            table.AddRow(new Text(note.Name), new Text(note.Message));
        }

        console.Write(table);
    }
}
