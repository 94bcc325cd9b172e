using MeshSection.Meshing;
using MeshSection.Plots.Drawing;
using MeshSection.Plots.Tests.Samples;
using MeshSection.Units;

namespace MeshSection.Plots.Tests;

public class MeshFigureTests
{
    [Fact]
    public void Every_edge_is_drawn_once()
    {
        var sample = Sample.Tube("Tube", 60, 80, 40, 5);
        var segments = MeshFigure.Of(sample.Section, sample.Mesh, sample.Report, LengthUnit.Millimetre).Marks.OfType<Segments>().ToArray();

        Assert.Equal([2 * (3 * 40 * 5 - 40), 2 * 2 * 40, 0], segments.Select(s => s.Ends.Length));
    }

    [Fact]
    public void Lines_and_points_to_be_kept_are_brought_out()
    {
        var sample = Sample.Rectangle(100, 50, 10);
        var m = sample.Mesh;
        int inner = Enumerable.Range(0, m.Segments.Length).First(e => m.Neighbours[e] >= 0);
        int twin = Enumerable.Range(3 * m.Neighbours[inner], 3).Single(e => m.Neighbours[e] == inner / 3);
        var kept = new Mesh(
            m.Nodes, m.Corners, m.Neighbours, m.Regions, m.Segments.SetItem(inner, 1000).SetItem(twin, 1000), []);
        var figure = MeshFigure.Of(sample.Section, kept, sample.Report, LengthUnit.Millimetre);
        Assert.Equal(2, Assert.Single(figure.Marks.OfType<Segments>(), s => s.Stroke.Colour == Palette.Blue).Ends.Length);
        Assert.Equal(2 + 1, figure.Marks.OfType<Disc>().Count(d => d.Fill == Palette.Blue));
        Assert.Contains(figure.Marks.OfType<Label>(), l => l.Text == "to be kept in the mesh");
    }

    [Fact]
    public void The_thinnest_wall_is_drawn_across_and_told()
    {
        var sample = Sample.Rectangle(100, 50, 10);
        var figure = MeshFigure.Of(sample.Section, sample.Mesh, sample.Report, LengthUnit.Millimetre);
        Assert.Equal(2, figure.Marks.OfType<Disc>().Count(d => d.Fill == Palette.Green));
        Assert.Contains(figure.Marks.OfType<Label>(), l => l.Text == "3 mm");
        Assert.Contains(figure.Marks.OfType<Label>(), l => l.Text == "thinnest wall, 2 elements across");
        figure = MeshFigure.Of(sample.Section, sample.Mesh, sample.Report with { ThinnestWall = null, KeptPoints = [] }, LengthUnit.Millimetre);
        Assert.DoesNotContain(figure.Marks.OfType<Label>(), l => l.Text.Contains("wall", StringComparison.Ordinal) || l.Text.Contains("kept", StringComparison.Ordinal));
    }

    [Fact]
    public void The_smallest_angle_is_found_and_pointed_out()
    {
        // Cells of 30 by 10, cut in two: atan(1/3), and a right angle.
        var sample = Sample.Rectangle(90, 10, 30);
        var figure = MeshFigure.Of(sample.Section, sample.Mesh, sample.Report, LengthUnit.Millimetre);
        Assert.Equal(2, figure.Marks.OfType<Label>().Count(l => l.Text == "18.43°"));
        Assert.Contains(figure.Marks.OfType<Label>(), l => l.Text == "150 mm²");
        Assert.Single(figure.Marks.OfType<Area>(), a => a.Fill == Palette.Orange);
    }

    [Fact]
    public void Triangles_left_unrefined_are_marked_and_counted_by_cause()
    {
        var sample = Sample.Rectangle(100, 50, 10);
        var causes = Enum.GetValues<UnrefinedCause>();
        var mesh = With(sample.Mesh, [.. causes.SelectMany((c, i) => Enumerable.Range(0, i + 1).Select(k => new UnrefinedTriangle(10 * i + k, default, 5, c)))]);
        var figure = MeshFigure.Of(sample.Section, mesh, sample.Report, LengthUnit.Millimetre);

        var lines = figure.Marks.OfType<Label>().Where(l => l.Text.Contains("unrefined", StringComparison.Ordinal)).Select(l => l.Text).ToArray();
        Assert.Equal(causes.Length, lines.Distinct().Count());
        Assert.Equal(["1", "2", "3"], lines.Select(l => l.Split(' ')[0]));
        Assert.Equal(6, Assert.Single(figure.Marks.OfType<Area>(), a => a.Fill == Palette.Blue).Loops.Length);
        Assert.Equal(6 + causes.Length, figure.Marks.OfType<Disc>().Count(d => d.Fill == Palette.Blue && d.Rim.Thickness > 0));
    }

    [Fact]
    public void A_fine_mesh_has_thin_lines()
    {
        Assert.True(Thickness(Sample.Rectangle(100, 100, 1)) < 0.6 * Thickness(Sample.Rectangle(100, 100, 10)));

        static double Thickness(Sample s) => s.Figure().Marks.OfType<Segments>().Single().Stroke.Thickness;
    }

    private static Mesh With(Mesh m, UnrefinedTriangle[] unrefined) =>
        new(m.Nodes, m.Corners, m.Neighbours, m.Regions, m.Segments, [.. unrefined]);
}
