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
    /// <param name="origin">Where the local origin lies in the drawing's axes, mm.</param>
    /// <param name="unit">The unit of length to write in.</param>
    public static void Write(Stream stream, Mesh mesh, Point origin, LengthUnit unit) =>
        ResultWriter.Document(stream, json => Write(json, mesh, origin, unit));

    /// <summary>Writes one object.</summary>
    /// <param name="json">Where to; at a place where an object may begin.</param>
    /// <param name="mesh">The mesh, in local coordinates, with at least one triangle.</param>
    /// <param name="origin">Where the local origin lies in the drawing's axes, mm.</param>
    /// <param name="unit">The unit of length to write in.</param>
    public static void Write(Utf8JsonWriter json, Mesh mesh, Point origin, LengthUnit unit)
    {
        var writer = new ResultWriter(json, unit);
        var quality = MeshQuality.Of(mesh);
        var regions = RegionAreas(mesh);
        json.WriteStartObject();
        writer.Units(unit);
        json.WriteNumber("triangles", mesh.TriangleCount);
        json.WriteNumber("nodes", mesh.Nodes.Length);
        writer.Number("minAngle", quality.SmallestAngle);
        writer.Point("minAnglePlace", origin + quality.SmallestAnglePlace);
        writer.Number("maxAngle", quality.LargestAngle);
        writer.Number("largestTriangle", quality.LargestArea, 2);
        json.WriteStartArray("angleHistogram");
        foreach (var count in quality.AngleHistogram)
        {
            json.WriteNumberValue(count);
        }

        json.WriteEndArray();
        writer.Number("area", regions.Sum(), 2);
        json.WriteStartArray("regions");
        foreach (var area in regions)
        {
            json.WriteStartObject();
            writer.Number("area", area, 2);
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
        json.WriteEndObject();
    }

    private static double[] RegionAreas(Mesh mesh)
    {
        var areas = new double[mesh.Regions.Max() + 1];
        for (var t = 0; t < mesh.TriangleCount; t++)
        {
            var a = mesh.Nodes[mesh.Corners[3 * t]];
            var b = mesh.Nodes[mesh.Corners[3 * t + 1]];
            var c = mesh.Nodes[mesh.Corners[3 * t + 2]];
            areas[mesh.Regions[t]] += 0.5 * (b - a).Cross(c - a);
        }

        return areas;
    }

    private static string Cause(UnrefinedCause cause) => cause switch
    {
        UnrefinedCause.InputAngle => "inputAngle",
        UnrefinedCause.NodeLimit => "nodeLimit",
        UnrefinedCause.LeastEdge => "leastEdge",
        _ => throw new ArgumentOutOfRangeException(nameof(cause)),
    };
}
