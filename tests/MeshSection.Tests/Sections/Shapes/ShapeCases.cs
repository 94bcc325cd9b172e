using CsCheck;
using MeshSection.Geometry;
using MeshSection.Sections.Shapes;

namespace MeshSection.Tests.Sections.Shapes;

/// <summary>Every kind of shape, with dimensions drawn at random within their bounds. A new shape joins this list.</summary>
internal static class ShapeCases
{
    private static readonly Gen<double> Size = Gen.Double[20, 400];

    /// <summary>A fraction that reaches neither 0 nor 1.</summary>
    private static readonly Gen<double> Part = Gen.Double[0.05, 0.9];

    public static IReadOnlyDictionary<string, Gen<Shape>> All { get; } = new Dictionary<string, Gen<Shape>>
    {
        ["rectangle"] = Gen.Select(Size, Size, Part).Select((b, h, r) =>
            (Shape)new Rectangle(b, h, r * Math.Min(b, h) / 2)),
        ["circle"] = Size.Select(d => (Shape)new Circle(d)),
        ["tube"] = Gen.Select(Size, Part).Select((d, t) => (Shape)new Tube(d, t * d / 2)),
        ["box"] = Gen.Select(Size, Size, Part, Part, Part, Part).Select(
            (b, h, tf, tw, inner, outer) =>
            {
                var (flange, web) = (tf * h / 2, tw * b / 2);
                var innerRadius = inner * Math.Min(h / 2 - flange, b / 2 - web);
                var outerRadius = outer * Math.Min(Math.Min(b, h) / 2, flange + web + innerRadius);
                return (Shape)new HollowBox(b, h, flange, web, outerRadius, innerRadius);
            }),
        ["tee"] = Gen.Select(Size, Size, Part, Part, Part, Part).Select(
            (h, b, tf, tw, root, toe) =>
            {
                var room = Math.Min((b - tw * b) / 2, h - tf * h);
                return (Shape)new Tee(h, b, tf * h, tw * b, root * room / 2, toe * Math.Min(tf * h, room / 2));
            }),
        ["I"] = Gen.Select(Gen.Select(Size, Size, Size), Gen.Select(Part, Part, Part), Gen.Select(Part, Part, Part)).Select(
            (sizes, thicknesses, curves) =>
            {
                var (h, b, bottom) = sizes;
                var (top, under, tw) = (thicknesses.Item1 * h / 3, thicknesses.Item2 * h / 3, thicknesses.Item3 * Math.Min(b, bottom));
                var outstand = (Math.Max(b, bottom) - tw) / 2;
                var slope = curves.Item3 * Math.Min(0.3, Math.Min(top, under) / outstand);
                var room = Math.Min((Math.Min(b, bottom) - tw) / 2, h - top - under - slope * outstand);
                return (Shape)new IBeam(
                    h, b, top, tw, curves.Item1 * room / 2, curves.Item2 * Math.Min(room, Math.Min(top, under)) / 2, slope, bottom, under);
            }),
        ["channel"] = Gen.Select(Gen.Select(Size, Size), Gen.Select(Part, Part), Gen.Select(Part, Part, Part, Part)).Select(
            (sizes, thicknesses, curves) =>
            {
                var (h, b) = sizes;
                var (tf, tw) = (thicknesses.Item1 * h / 3, thicknesses.Item2 * b);
                var slope = curves.Item3 * Math.Min(0.3, tf / (b - tw));
                var room = Math.Min(b - tw, h - 2 * tf - slope * (b - tw));
                return (Shape)new Channel(
                    h, b, tf, tw, curves.Item1 * room / 2, curves.Item2 * Math.Min(room, tf) / 2, slope, curves.Item4 * Math.Min(tf, tw));
            }),
        ["angle"] = Gen.Select(Size, Size, Part, Part, Part, Part).Select(
            (a, b, t, root, toe, outer) =>
            {
                var thickness = t * Math.Min(a, b);
                var room = Math.Min(a, b) - thickness;
                return (Shape)new Angle(
                    a, b, thickness, root * room / 2, toe * Math.Min(thickness, room / 2), outer * thickness);
            }),
        ["zed"] = Gen.Select(Gen.Select(Size, Size, Size), Gen.Select(Part, Part), Gen.Select(Part, Part, Part)).Select(
            (sizes, thicknesses, curves) =>
            {
                var (h, b, bottom) = sizes;
                var (t, tw) = (thicknesses.Item1 * h / 3, thicknesses.Item2 * Math.Min(b, bottom));
                var room = Math.Min(Math.Min(b, bottom) - tw, h - 2 * t);
                return (Shape)new Zed(
                    h, b, t, tw, bottom, curves.Item1 * room / 2, curves.Item2 * Math.Min(t, room / 2), curves.Item3 * Math.Min(t, tw));
            }),
        ["regular polygon"] = Gen.Select(Gen.Int[3, 24], Size, Part).Select((n, across, r) =>
            (Shape)new RegularPolygon(n, across, r * across / 2)),
        ["polygon"] = Gen.Select(Gen.Double[0.2, 1].Array[3, 12], Size).Select((radii, size) =>
            (Shape)new Polygon([.. radii.Select((r, k) => r * size * Point.Direction(k * Math.Tau / radii.Length))])),
    };

    public static TheoryData<string> Names => [.. All.Keys];
}
