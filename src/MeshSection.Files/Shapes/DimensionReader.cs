using System.Collections.Immutable;
using MeshSection.Files.Quantities;
using MeshSection.Files.Tree;
using MeshSection.Geometry;

namespace MeshSection.Files.Shapes;

/// <summary>Reads the dimensions of one shape.</summary>
internal sealed record DimensionReader(ObjectNode Node, QuantityReader Quantities)
{
    /// <summary>A length that must be there, mm.</summary>
    public double Length(string key) => Quantities.Length(Node.Require(key));

    /// <summary>A length that may be left out, mm.</summary>
    public double? Optional(string key) => Node.Find(key) is { } node ? Quantities.Length(node) : null;

    /// <summary>A radius, 0 if left out, mm.</summary>
    public double Radius(string key) => Optional(key) ?? 0;

    /// <summary>Rise over run, 0 if left out.</summary>
    public double Slope(string key) => Node.Find(key) is { } node ? QuantityReader.Slope(node) : 0;

    public int Count(string key) => Node.Require(key).WholeNumber();

    public ImmutableArray<Point> Points(string key) => [.. Node.Require(key).FilledList("points").Select(Point)];

    /// <summary>A point as a list of its two coordinates.</summary>
    public Point Point(Node node) => node.Kind == NodeKind.List && node.Items is [var x, var y]
        ? new Point(Quantities.Length(x), Quantities.Length(y))
        : throw node.Fault(
            $"Expected a point, but found {node.Described}.",
            "Write its two coordinates, for example [120, 0].");
}
