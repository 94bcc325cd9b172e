using System.Text;

namespace MeshSection.Files.Tests;

/// <summary>Section files as text, for tests.</summary>
internal static class SectionText
{
    public const string Plate = """{ "type": "rectangle", "width": 20, "height": 10 }""";

    public static SectionFile Parse(string json) => SectionFileReader.Parse(Encoding.UTF8.GetBytes(json), "rail.json");

    public static SectionFileException Fault(string json) => Assert.Throws<SectionFileException>(() => Parse(json));

    /// <summary>A file in mm with one shape.</summary>
    public static string With(string shape) => $$"""{ "units": { "length": "mm" }, "shapes": [ {{shape}} ] }""";
}
