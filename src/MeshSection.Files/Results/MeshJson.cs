using System.Text.Json;
using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Units;

namespace MeshSection.Files.Results;

/// <summary>
/// What there is to say of a mesh as JSON: counts, angles, the area of each region, and the triangles that could not
/// be given the quality asked for. <c>docs/results.md</c> lists the keys.
/// </summary>
public static class MeshJson
{
    /// <summary>Writes a document: one indented object and a line end.</summary>
    /// <param name="stream">Where to; left open.</param>
    /// <param name="mesh">The mesh, in local coordinates, with at least one triangle.</param>
    /// <param name="report">The report on it.</param>
    /// <param name="time">How long it took to make; null if that is not to be told.</param>
    /// <param name="origin">Where the local origin lies in the drawing's axes, mm.</param>
    /// <param name="unit">The unit of length to write in.</param>
    public static void Write(
        Stream stream, Mesh mesh, MeshReport report, TimeSpan? time, Point origin, LengthUnit unit) =>
        ResultWriter.Document(stream, json => Write(json, mesh, report, time, origin, unit));

    /// <summary>Writes one object.</summary>
    /// <param name="json">Where to; at a place where an object may begin.</param>
    /// <param name="mesh">The mesh, in local coordinates, with at least one triangle.</param>
    /// <param name="report">The report on it.</param>
    /// <param name="time">How long it took to make; null if that is not to be told.</param>
    /// <param name="origin">Where the local origin lies in the drawing's axes, mm.</param>
    /// <param name="unit">The unit of length to write in.</param>
    public static void Write(
        Utf8JsonWriter json, Mesh mesh, MeshReport report, TimeSpan? time, Point origin, LengthUnit unit)
    {
        var writer = new ResultWriter(json, unit);
        var quality = report.Quality;
        json.WriteStartObject();
        writer.Units(unit);
        json.WriteNumber("triangles", mesh.TriangleCount);
        json.WriteNumber("nodes", mesh.Nodes.Length);
        writer.Number("minAngle", quality.SmallestAngle);
        writer.Point("minAnglePlace", origin + quality.SmallestAnglePlace);
        writer.Number("maxAngle", quality.LargestAngle);
        writer.Number("largestTriangle", quality.LargestArea, 2);
        writer.Object("chords", () => writer.Number("maxSag", report.MaxSag, 1));
        WriteWall(writer, report.ThinnestWall, origin);
        json.WriteStartArray("angleHistogram");
        foreach (var count in quality.AngleHistogram)
        {
            json.WriteNumberValue(count);
        }

        json.WriteEndArray();
        writer.Number("area", report.Regions.Sum(r => r.Area), 2);
        json.WriteStartArray("regions");
        foreach (var region in report.Regions)
        {
            json.WriteStartObject();
            json.WriteNumber("triangles", region.Triangles);
            writer.Number("area", region.Area, 2);
            writer.Point("centroid", origin + region.Centroid);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("inputAngles");
        foreach (var angle in report.InputAngles)
        {
            json.WriteStartObject();
            writer.Coordinates(origin + angle.Place);
            writer.Number("angle", angle.Degrees);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("unrefined");
        foreach (var triangle in mesh.Unrefined)
        {
            json.WriteStartObject();
            json.WriteNumber("triangle", triangle.Triangle);
            writer.Coordinates(origin + triangle.Place);
            writer.Number("angle", triangle.Angle);
            json.WriteString("cause", Cause(triangle.Cause));
            json.WriteEndObject();
        }

        json.WriteEndArray();
        if (time is { } taken)
        {
            json.WriteNumber("seconds", taken.TotalSeconds);
        }

        json.WriteEndObject();
    }

    private static void WriteWall(ResultWriter writer, Wall? wall, Point origin)
    {
        if (wall is null)
        {
            writer.Json.WriteNull("thinnestWall");
            return;
        }

        writer.Object("thinnestWall", () =>
        {
            writer.Number("thickness", wall.Thickness, 1);
            writer.Json.WriteNumber("elements", wall.Elements);
            writer.Point("from", origin + wall.From);
            writer.Point("to", origin + wall.To);
        });
    }

    private static string Cause(UnrefinedCause cause) => cause switch
    {
        UnrefinedCause.InputAngle => "inputAngle",
        UnrefinedCause.NodeLimit => "nodeLimit",
        UnrefinedCause.LeastEdge => "leastEdge",
        _ => throw new ArgumentOutOfRangeException(nameof(cause)),
    };
}
