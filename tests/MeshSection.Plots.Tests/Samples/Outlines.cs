using MeshSection.Geometry;

namespace MeshSection.Plots.Tests.Samples;

/// <summary>Outlines with arcs, holes and islands.</summary>
internal static class Outlines
{
    /// <summary>A rounded plate; in one hole an island, the other hole square.</summary>
    public static Outline Plate(Point origin = default)
    {
        const double B = 0.41421356237309503;
        Edge[] rim =
        [
            new LineEdge(new(20, 0), new(180, 0)), new ArcEdge(new(180, 0), new(200, 20), B),
            new LineEdge(new(200, 20), new(200, 100)), new ArcEdge(new(200, 100), new(180, 120), B),
            new LineEdge(new(180, 120), new(20, 120)), new ArcEdge(new(20, 120), new(0, 100), B),
            new LineEdge(new(0, 100), new(0, 20)), new ArcEdge(new(0, 20), new(20, 0), B),
        ];
        return Outline.Create(
            [
                Boundary.Create(rim),
                Boundary.Circle(new(60, 60), 35),
                Boundary.Circle(new(60, 60), 15),
                Boundary.Polygon([new(120, 30), new(180, 30), new(180, 90), new(120, 90)]),
            ],
            origin);
    }

    /// <summary>More boundaries than there is room for numbers.</summary>
    public static Outline Perforated() => Outline.Create(
        [
            Boundary.Polygon([new(0, 0), new(410, 0), new(410, 210), new(0, 210)]),
            .. Enumerable.Range(0, 200).Select(i => Boundary.Circle(new(10 + 20 * (i % 20), 10 + 20 * (i / 20)), 6)),
        ]);

    /// <summary>A strip that is drawn as a line.</summary>
    public static Outline Strip() => Outline.Create([Boundary.Polygon([new(0, 0), new(1000, 0), new(1000, 1), new(0, 1)])]);
}
