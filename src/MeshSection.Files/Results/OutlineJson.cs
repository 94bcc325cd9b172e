using MeshSection.Dxf;
using MeshSection.Dxf.Selection;
using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Files.Results;

/// <summary>
/// What was found in a drawing, as JSON: boundaries, repairs, cautions, entities used and left out. <c>docs/results.md</c>
/// lists the keys.
/// </summary>
public static class OutlineJson
{
    /// <summary>Writes a document: one indented object and a line end.</summary>
    /// <param name="stream">Where to; left open.</param>
    /// <param name="outline">The outline.</param>
    /// <param name="drawing">How the drawing was understood; null if the outline is not of a drawing.</param>
    /// <param name="unit">The unit of length to write in.</param>
    public static void Write(Stream stream, Outline outline, DrawingOutline? drawing, LengthUnit unit) =>
        ResultWriter.Document(stream, json =>
        {
            var writer = new ResultWriter(json, unit);
            json.WriteStartObject();
            writer.Units(unit);
            json.WriteNumber("regions", outline.RegionCount);
            Boundaries(writer, outline);
            if (drawing is not null)
            {
                Faces(writer, drawing);
                Bars(writer, drawing);
                Drawing(writer, drawing.Report);
            }

            json.WriteEndObject();
        });

    private static void Boundaries(ResultWriter writer, Outline outline)
    {
        writer.Json.WriteStartArray("boundaries");
        foreach (var nested in outline.Boundaries)
        {
            var edges = nested.Boundary.Edges;
            writer.Json.WriteStartObject();
            writer.Json.WriteString("role", nested.Role.ToString().ToLowerInvariant());
            writer.Json.WriteNumber("region", nested.Region);
            if (nested.Parent >= 0)
            {
                writer.Json.WriteNumber("parent", nested.Parent);
            }

            writer.Json.WriteNumber("lines", edges.Count(e => e is LineEdge));
            writer.Json.WriteNumber("arcs", edges.Count(e => e is ArcEdge));
            writer.Json.WriteNumber("curves", edges.Count(e => e is BezierEdge));
            writer.Number("length", nested.Boundary.Length, 1);
            writer.Number("area", Math.Abs(nested.Boundary.SignedArea), 2);
            writer.Json.WriteEndObject();
        }

        writer.Json.WriteEndArray();
    }

    private static void Faces(ResultWriter writer, DrawingOutline drawing)
    {
        if (drawing.Faces.IsEmpty)
        {
            return;
        }

        writer.Json.WriteStartArray("faces");
        var unit = drawing.Report.Unit.Millimetres;
        foreach (var face in drawing.Faces)
        {
            writer.Json.WriteStartObject();
            writer.Json.WriteString("layer", face.Layer);
            writer.Number("area", face.Area * unit * unit, 2);
            writer.Number("x", face.Inside.X * unit, 1);
            writer.Number("y", face.Inside.Y * unit, 1);
            writer.Json.WriteEndObject();
        }

        writer.Json.WriteEndArray();
    }

    private static void Bars(ResultWriter writer, DrawingOutline drawing)
    {
        if (drawing.Bars.IsEmpty)
        {
            return;
        }

        writer.Json.WriteStartArray("bars");
        foreach (var bar in drawing.Bars)
        {
            var place = bar.Place + drawing.Outline.Origin;
            writer.Json.WriteStartObject();
            writer.Json.WriteString("layer", bar.Source.Layer);
            writer.Number("x", place.X, 1);
            writer.Number("y", place.Y, 1);
            if (bar.Diameter is { } diameter)
            {
                writer.Number("diameter", diameter, 1);
                writer.Number("area", 0.25 * Math.PI * diameter * diameter, 2);
            }

            writer.Json.WriteEndObject();
        }

        writer.Json.WriteEndArray();
    }

    private static void Drawing(ResultWriter writer, DrawingReport report) => writer.Object("drawing", () =>
    {
        writer.Json.WriteString("release", report.Release);
        writer.Json.WriteString("unit", report.Unit.Symbol);
        writer.Json.WriteBoolean("unitGiven", report.IsUnitGiven);
        writer.Json.WriteNumber("tolerance", report.MaxGap);
        writer.Json.WriteBoolean("toleranceGiven", report.IsMaxGapGiven);
        writer.Json.WriteNumber("pieces", report.Pieces);
        writer.Json.WriteNumber("joins", report.Joins);
        Counts(writer, "used", report.Used);
        Counts(writer, "leftOut", report.LeftOut);
        Notes(writer, "repairs", report.Repairs);
        Notes(writer, "cautions", report.Cautions);
    });

    private static void Counts(ResultWriter writer, string key, IReadOnlyList<EntityCount> counts)
    {
        writer.Json.WriteStartArray(key);
        foreach (var count in counts)
        {
            writer.Json.WriteStartObject();
            writer.Json.WriteString("kind", count.Kind);
            writer.Json.WriteString("layer", count.Layer);
            writer.Json.WriteNumber("count", count.Count);
            if (count.Reason != LeftOutReason.None)
            {
                writer.Json.WriteString("reason", char.ToLowerInvariant(count.Reason.ToString()[0]) + count.Reason.ToString()[1..]);
            }

            writer.Json.WriteEndObject();
        }

        writer.Json.WriteEndArray();
    }

    private static void Notes(ResultWriter writer, string key, IReadOnlyList<DrawingNote> notes)
    {
        writer.Json.WriteStartArray(key);
        foreach (var note in notes)
        {
            writer.Json.WriteStartObject();
            writer.Json.WriteString("code", note.Name);
            writer.Json.WriteString("message", note.Message);
            writer.Json.WriteStartArray("entities");
            foreach (var source in note.Sources)
            {
                writer.Json.WriteStringValue(source.ToString());
            }

            writer.Json.WriteEndArray();
            if (note.Point is { } point)
            {
                // Notes are in the drawing's own unit already.
                writer.Json.WriteNumber("x", point.X);
                writer.Json.WriteNumber("y", point.Y);
            }

            writer.Json.WriteEndObject();
        }

        writer.Json.WriteEndArray();
    }
}
