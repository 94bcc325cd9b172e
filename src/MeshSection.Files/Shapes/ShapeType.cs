using System.Collections.Immutable;
using MeshSection.Sections.Shapes;

namespace MeshSection.Files.Shapes;

/// <summary>A kind of shape as a section file writes it.</summary>
internal sealed record ShapeType(string Name, ImmutableArray<Dimension> Dimensions, Func<DimensionReader, Shape> Make)
{
    /// <summary>Every kind there is.</summary>
    public static ImmutableArray<ShapeType> All { get; } =
    [
        new("rectangle", [Must("width"), Must("height"), May("cornerRadius")],
            d => new Rectangle(d.Length("width"), d.Length("height"), d.Radius("cornerRadius"))),
        new("circle", [Must("diameter")],
            d => new Circle(d.Length("diameter"))),
        new("tube", [Must("diameter"), Must("thickness")],
            d => new Tube(d.Length("diameter"), d.Length("thickness"))),
        new("box",
            [Must("width"), Must("height"), Must("thickness"), May("webThickness"), May("outerRadius"), May("innerRadius")],
            d => new HollowBox(
                d.Length("width"),
                d.Length("height"),
                d.Length("thickness"),
                d.Optional("webThickness"),
                d.Radius("outerRadius"),
                d.Radius("innerRadius"))),
        new("tee",
            [Must("height"), Must("width"), Must("flangeThickness"), Must("webThickness"), May("rootRadius"), May("toeRadius")],
            d => new Tee(
                d.Length("height"),
                d.Length("width"),
                d.Length("flangeThickness"),
                d.Length("webThickness"),
                d.Radius("rootRadius"),
                d.Radius("toeRadius"))),
        new("I",
            [
                Must("height"), Must("width"), Must("flangeThickness"), Must("webThickness"), May("rootRadius"),
                May("toeRadius"), Slope("flangeSlope"), May("bottomWidth"), May("bottomFlangeThickness"),
            ],
            d => new IBeam(
                d.Length("height"),
                d.Length("width"),
                d.Length("flangeThickness"),
                d.Length("webThickness"),
                d.Radius("rootRadius"),
                d.Radius("toeRadius"),
                d.Slope("flangeSlope"),
                d.Optional("bottomWidth"),
                d.Optional("bottomFlangeThickness"))),
        new("channel",
            [
                Must("height"), Must("width"), Must("flangeThickness"), Must("webThickness"), May("rootRadius"),
                May("toeRadius"), Slope("flangeSlope"), May("outerRadius"),
            ],
            d => new Channel(
                d.Length("height"),
                d.Length("width"),
                d.Length("flangeThickness"),
                d.Length("webThickness"),
                d.Radius("rootRadius"),
                d.Radius("toeRadius"),
                d.Slope("flangeSlope"),
                d.Radius("outerRadius"))),
        new("angle",
            [Must("height"), Must("width"), Must("thickness"), May("rootRadius"), May("toeRadius"), May("outerRadius")],
            d => new Angle(
                d.Length("height"),
                d.Length("width"),
                d.Length("thickness"),
                d.Radius("rootRadius"),
                d.Radius("toeRadius"),
                d.Radius("outerRadius"))),
        new("zed",
            [
                Must("height"), Must("width"), Must("thickness"), May("webThickness"), May("bottomWidth"),
                May("rootRadius"), May("toeRadius"), May("outerRadius"),
            ],
            d => new Zed(
                d.Length("height"),
                d.Length("width"),
                d.Length("thickness"),
                d.Optional("webThickness"),
                d.Optional("bottomWidth"),
                d.Radius("rootRadius"),
                d.Radius("toeRadius"),
                d.Radius("outerRadius"))),
        new("regularPolygon",
            [new("sides", IsRequired: true, DimensionKind.Count), Must("acrossFlats"), May("cornerRadius")],
            d => new RegularPolygon(d.Count("sides"), d.Length("acrossFlats"), d.Radius("cornerRadius"))),
        new("polygon", [new("points", IsRequired: true, DimensionKind.Points)],
            d => new Polygon(d.Points("points"))),
    ];

    /// <summary>The name with its article, for messages.</summary>
    public string WithArticle => Name is "I" or "angle" ? $"an {Name}" : $"a {Name}";

    private static Dimension Must(string key) => new(key, IsRequired: true);

    private static Dimension May(string key) => new(key, IsRequired: false);

    private static Dimension Slope(string key) => new(key, IsRequired: false, DimensionKind.Slope);
}
