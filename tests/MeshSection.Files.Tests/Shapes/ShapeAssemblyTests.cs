using MeshSection.Geometry;

namespace MeshSection.Files.Tests.Shapes;

public class ShapeAssemblyTests
{
    private const string Square = """{ "type": "rectangle", "width": 100, "height": 100 }""";

    [Fact]
    public void A_hole_is_cut_out_and_an_island_stands_in_it()
    {
        var outline = Outline(
            Square,
            """{ "type": "circle", "diameter": 60, "at": [0, 50], "hole": true }""",
            """{ "type": "tube", "diameter": 40, "thickness": 5, "at": [0, 50] }""");
        Assert.Equal(
            [BoundaryRole.Outer, BoundaryRole.Hole, BoundaryRole.Island, BoundaryRole.Hole],
            outline.Boundaries.Select(b => b.Role));
        Assert.Equal(2, outline.RegionCount);
    }

    [Theory]
    [InlineData("0", false, 0, 0, 10, 40)]
    [InlineData("90", false, -40, 0, 0, 10)]
    [InlineData("180", false, -10, -40, 0, 0)]
    [InlineData("270", false, 0, -10, 40, 0)]
    [InlineData("-90", false, 0, -10, 40, 0)]
    [InlineData("450", false, -40, 0, 0, 10)]
    [InlineData("0", true, -10, 0, 0, 40)]
    [InlineData("90", true, -40, -10, 0, 0)]
    public void Quarter_turns_and_mirroring_are_exact(string turn, bool mirror, double minX, double minY, double maxX, double maxY)
    {
        var outline = Outline(
            $$"""{ "type": "angle", "height": 40, "width": 10, "thickness": 3, "turn": {{turn}}, "mirror": {{(mirror ? "true" : "false")}} }""");
        Assert.Equal(new Box(minX, minY, maxX, maxY), outline.Bounds);
    }

    [Fact]
    public void A_turned_shape_moves_with_its_origin() => SectionFileReaderTests.AssertBox(
        new Box(60, 100, 100, 110),
        Outline("""{ "type": "angle", "height": 40, "width": 10, "thickness": 3, "turn": 90, "at": [100, 100] }"""));

    [Fact]
    public void Shapes_far_from_the_origin_keep_their_digits()
    {
        var near = Outline("""{ "type": "circle", "diameter": 0.3 }""", """{ "type": "circle", "diameter": 0.1, "at": [1.1, 0] }""");
        var far = Outline(
            """{ "type": "circle", "diameter": 0.3, "at": ["10 km", "-10 km"] }""",
            """{ "type": "circle", "diameter": 0.1, "at": [10000001.1, "-10 km"] }""");
        Assert.Equal(new Point(1e7, -1e7), far.Origin);
        Assert.Equal(near.Boundaries[0].Boundary.Edges, far.Boundaries[0].Boundary.Edges);
        Assert.Equal(near.Bounds.MaxX, far.Bounds.MaxX, 2e-9);
    }

    [Theory]
    [InlineData("""{ "type": "rectangle", "width": 10, "height": 10, "at": [50, 45] }""", "shapes[0] (rectangle) and shapes[1] (rectangle) overlap: their outlines cross at (50, ")]
    [InlineData("""{ "type": "rectangle", "width": 10, "height": 10, "at": [55, 45] }""", "shapes[0] (rectangle) and shapes[1] (rectangle) touch at (50, ")]
    [InlineData("""{ "type": "circle", "diameter": 20, "at": [60, 50] }""", "shapes[0] (rectangle) and shapes[1] (circle) touch at (50, 50")]
    [InlineData(Square, "shapes[0] (rectangle) and shapes[1] (rectangle) are the same outline")]
    [InlineData("""{ "type": "circle", "diameter": 20, "at": [0, 50] }""", "shapes[1] (circle) lies in the material of shapes[0] (rectangle). Add \"hole\": true")]
    [InlineData("""{ "type": "circle", "diameter": 20, "at": [90, 50], "hole": true }""", "shapes[1] (circle) is a hole, but lies in no other shape.")]
    public void Shapes_that_do_not_fit_together_are_named_with_the_place(string shape, string part)
    {
        var fault = SectionText.Fault(SectionText.With($"{Square}, {shape}"));
        Assert.Equal("shapes[1]", fault.Path);
        Assert.Contains(part, fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_hole_in_the_empty_inside_of_a_tube_is_refused() => Assert.Contains(
        "shapes[1] (circle) is a hole, but lies in the empty inside of shapes[0] (tube).",
        SectionText.Fault(SectionText.With(
            """{ "type": "tube", "diameter": 40, "thickness": 5 }, { "type": "circle", "diameter": 10, "hole": true }""")).Message,
        StringComparison.Ordinal);

    private static Outline Outline(params string[] shapes) =>
        SectionText.Parse(SectionText.With(string.Join(", ", shapes))).Outline ?? throw new InvalidOperationException();
}
