using System.Globalization;
using System.Text.Json;
using MeshSection.Files.Meshes;
using MeshSection.Geometry;

namespace MeshSection.Files.Tests.Meshes;

/// <summary>Mesh files read by a library that we did not write: meshio, Debian package python3-meshio.</summary>
public class OutsideReaderTests
{
    private const string Script =
        """
        import json, sys, meshio
        mesh = meshio.read(sys.argv[1])
        cells = {c.type: c.data.tolist() for c in mesh.cells}
        data = {k: [v.tolist() for v in values] for k, values in mesh.cell_data.items()}
        names = {k: v.tolist() for k, v in mesh.field_data.items()}
        json.dump({"points": mesh.points.tolist(), "cells": cells, "data": data, "names": names}, sys.stdout)
        """;

    [Theory]
    [InlineData(".vtu", 1, "triangle", "region")]
    [InlineData(".vtu", 2, "triangle6", "region")]
    [InlineData(".msh", 1, "triangle", "gmsh:physical")]
    [InlineData(".msh", 2, "triangle6", "gmsh:physical")]
    public void Meshio_reads_the_same_mesh(string extension, int order, string type, string regions)
    {
        OutsidePython.SkipWithout("meshio");
        var file = Meshed.Tube.Of(order);
        var path = Path.Combine(Path.GetTempPath(), Path.GetRandomFileName() + extension);
        try
        {
            using (var stream = File.Create(path))
            {
                if (extension == ".vtu") VtuWriter.Write(stream, file);
                else MshWriter.Write(stream, file);
            }

            using var read = JsonDocument.Parse(OutsidePython.Run(Script, path).Split('\n')[^1]);
            Point[] nodes = [.. Rows<double>(read.RootElement.GetProperty("points")).Select(r => new Point(r[0], r[1]))];
            int[][] elements = Rows<int>(read.RootElement.GetProperty("cells").GetProperty(type));
            Assert.Equal(file.Nodes, nodes);
            Assert.Equal(file.Elements, elements.SelectMany(e => e));
            Assert.Equal(Meshed.Area(file.Nodes, [.. file.Elements.Chunk(3 * order)]), Meshed.Area(nodes, elements));
            var last = read.RootElement.GetProperty("data").GetProperty(regions).EnumerateArray().Last();
            Assert.All(last.EnumerateArray(), r => Assert.Equal(1, r.GetInt32()));
            if (extension == ".msh")
            {
                Assert.Equal([2, 1], read.RootElement.GetProperty("names").GetProperty("boundary 2").EnumerateArray().Select(n => n.GetInt32()));
                Assert.Equal(file.LineGroups.Length, read.RootElement.GetProperty("cells").GetProperty(order == 1 ? "line" : "line3").GetArrayLength());
            }
        }
        finally
        {
            File.Delete(path);
        }
    }

    private static T[][] Rows<T>(JsonElement rows) =>
        [.. rows.EnumerateArray().Select(r => r.EnumerateArray().Select(n => (T)Convert.ChangeType(n.GetDouble(), typeof(T), CultureInfo.InvariantCulture)).ToArray())];
}
