using System.Text.Encodings.Web;
using System.Text.Json;
using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Files.Results;

/// <summary>Writes results as JSON objects, lengths in the unit that they are shown in.</summary>
internal readonly struct ResultWriter(Utf8JsonWriter json, LengthUnit unit)
{
    public Utf8JsonWriter Json { get; } = json;

    /// <summary>Writes one object to a stream, indented, with a line end behind it.</summary>
    public static void Document(Stream stream, Action<Utf8JsonWriter> write)
    {
        var options = new JsonWriterOptions
        {
            Indented = true,
            NewLine = "\n",
            Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        };
        using (var json = new Utf8JsonWriter(stream, options))
        {
            write(json);
        }

        stream.WriteByte((byte)'\n');
    }

    public void Object(string key, Action write)
    {
        Json.WriteStartObject(key);
        write();
        Json.WriteEndObject();
    }

    public void Units(LengthUnit length)
    {
        Json.WriteStartObject("units");
        Json.WriteString("length", length.Symbol);
        Json.WriteString("mass", "kg");
        Json.WriteString("angle", "deg");
        Json.WriteEndObject();
    }

    /// <summary>A number in mm to a power; 0 for one without unit. A negative zero loses its sign.</summary>
    public void Number(string key, double value, int power = 0) =>
        Json.WriteNumber(key, unit.FromMillimetres(value, power) + 0.0);

    public void PerLength(string key, double value) => Json.WriteNumber(key, value * unit.Millimetres);

    public void Point(string key, Point point)
    {
        Json.WriteStartObject(key);
        Coordinates(point);
        Json.WriteEndObject();
    }

    public void Coordinates(Point point)
    {
        Number("x", point.X, 1);
        Number("y", point.Y, 1);
    }
}
