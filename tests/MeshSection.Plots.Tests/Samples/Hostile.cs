using MeshSection.Geometry;

namespace MeshSection.Plots.Tests.Samples;

/// <summary>Sections that are hard to draw well.</summary>
internal static class Hostile
{
    private const string LongTitle =
        "Edge girder GX-17 between axes B and C, repaired after corrosion of the bottom flange and strengthened with a welded "
        + "cover plate 240 × 15 on the underside, state of the survey of spring, second revision, "
        + "including the notch for the drain pipe at mid span";

    public static IReadOnlyList<(string Name, Sample Sample)> All { get; } =
    [
        ("square", Sample.Rectangle(100, 100, 20)),
        ("flat 1000 to 1", Sample.Rectangle(1000, 1, 1, "Strip")),
        ("tall 1000 to 1", Sample.Rectangle(1, 1000, 1, "Strip on edge")),
        ("flat 20 to 1", Sample.Rectangle(1000, 50, 10, "Plank")),
        ("tall 20 to 1", Sample.Rectangle(50, 1000, 10, "Blade")),
        ("huge", Sample.Rectangle(3e9, 2e9, 2e8, "Three thousand kilometres")),
        ("tiny", Sample.Rectangle(3e-6, 2e-6, 3e-7, "Three nanometres")),
        ("long title", Sample.Angle().Titled(LongTitle)),
        ("title without spaces", Sample.Angle().Titled(new string('W', 400))),
        ("title of many lines", Sample.Angle().Titled("First line\nsecond\tline\r\n\0third\u0007")),
        ("no title", Sample.Angle().Titled("")),
        ("angle", Sample.Angle()),
        ("angle turned a little", Sample.Angle(0.32)),
        ("angle turned", Sample.Angle(1.9)),
        ("tube", Sample.Tube("Tube 168.3 × 20", 64.15, 84.15, 60, 4)),
        ("far off centroid", Sample.Rectilinear("Tee", 40, Placement.Moved(0, 0), [[
            new(-600, 0), new(600, 0), new(600, 20), new(6, 20), new(6, 300), new(-6, 300), new(-6, 20), new(-600, 20)]])),
        ("hollow", Sample.Rectilinear("Two cells", 10, Placement.Moved(-50, 20), [
            [new(0, 0), new(200, 0), new(200, 120), new(0, 120)],
            [new(10, 10), new(10, 110), new(90, 110), new(90, 10)],
            [new(100, 10), new(100, 100), new(190, 100), new(190, 10)]])),
    ];

    public static TheoryData<string> Names => [.. All.Select(h => h.Name)];

    public static Sample Named(string name) => All.First(h => h.Name == name).Sample;
}
