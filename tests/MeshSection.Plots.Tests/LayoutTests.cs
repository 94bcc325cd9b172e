using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using MeshSection.Plots.Tests.Samples;
using MeshSection.Units;

namespace MeshSection.Plots.Tests;

public class LayoutTests
{
    private static readonly PictureSize[] Sizes =
        [PictureSize.Standard, new(800, 600), new(2400, 900), new(900, 1600), new(300, 300), new(4000, 300), new(300, 4000)];

    public static TheoryData<string> Names => Hostile.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Labels_of_a_section_stay_on_the_picture_and_apart(string name)
    {
        foreach (var size in Sizes)
        {
            CheckLabels(Hostile.Named(name).Figure(size));
            CheckLabels(Hostile.Named(name).Figure(size, LengthUnit.Inch));
        }
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Labels_of_a_mesh_stay_on_the_picture_and_apart(string name)
    {
        var sample = Hostile.Named(name);
        foreach (var size in Sizes)
        {
            CheckLabels(MeshFigure.Of(sample.Section, sample.Mesh, sample.Report, LengthUnit.Millimetre, size));
        }
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Labels_of_an_outline_stay_on_the_picture_and_apart(string name)
    {
        var sample = Hostile.Named(name);
        foreach (var size in Sizes)
        {
            CheckLabels(OutlineFigure.Of(sample.Section.Outline, sample.Section.Title, LengthUnit.Millimetre, OutlineFindings.None, size));
        }
    }

    [Fact]
    public void Labels_of_a_crowded_outline_stay_on_the_picture_and_apart()
    {
        OutlineMark[] marks = [.. Enumerable.Range(0, 60).Select(i => new OutlineMark(new Point(7 * i, 3 * i), "duplicate left out"))];
        CheckLabels(OutlineFigure.Of(Outlines.Perforated(), "Perforated", LengthUnit.Millimetre, new OutlineFindings([.. marks], [], [], [])));
        CheckLabels(OutlineFigure.Of(Outlines.Plate(), "Plate", LengthUnit.Millimetre, new OutlineFindings([.. marks], [], [], [])));
        CheckLabels(OutlineFigure.Of(Outlines.Strip(), "Strip", LengthUnit.Millimetre, new OutlineFindings([.. marks], [], [], [])));
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Every_dimension_and_axis_is_named(string name)
    {
        var sample = Hostile.Named(name);
        var properties = sample.Properties;
        foreach (var size in Sizes)
        {
            var labels = sample.Figure(size).Marks.OfType<Label>().ToList();
            var texts = labels.Select(l => l.Text).ToList();
            var bounds = sample.Section.Outline.Bounds;
            var lengths = new Layout.LengthScale(LengthUnit.Millimetre, Math.Max(bounds.Width, bounds.Height));
            double[] expected =
            [
                properties.ElasticX.Positive.Distance, properties.ElasticX.Negative.Distance,
                properties.ElasticY.Positive.Distance, properties.ElasticY.Negative.Distance,
                bounds.Width, bounds.Height,
            ];
            Assert.All(
                expected.GroupBy(lengths.Format),
                same => Assert.True(texts.Count(t => t.Split(' ')[^1] == same.Key) >= same.Count(), $"{name}, {size}: {same.Key}"));
            Assert.Single(labels, l => l.Lettering.IsBold && (l.Text is "x" or "x = 1" or "x = 2"));
            Assert.Single(labels, l => l.Lettering.IsBold && (l.Text is "y" or "y = 1" or "y = 2"));
        }
    }

    [Fact]
    public void A_long_title_is_cut_with_an_ellipsis_and_a_short_one_is_whole()
    {
        Assert.Contains(Hostile.Named("long title").Figure().Marks.OfType<Label>(), l => l.Text.EndsWith('…'));
        Assert.Contains(Hostile.Named("angle").Figure().Marks.OfType<Label>(), l => l.Text == "Unequal angle 150 × 90 × 12");
        Assert.Contains(
            Hostile.Named("title of many lines").Figure().Marks.OfType<Label>(), l => l.Text == "First line second line third");
    }

    private static void CheckLabels(Figure figure)
    {
        var labels = figure.Marks.OfType<Label>().ToArray();
        var boxes = labels.Select(l => l.Box).ToArray();
        var sheet = new Box(0, 0, figure.Size.Width / figure.UnitScale, figure.Size.Height / figure.UnitScale);
        Assert.NotEmpty(labels);
        for (var i = 0; i < labels.Length; i++)
        {
            var box = boxes[i];
            Assert.True(
                sheet.Contains(new Point(box.MinX, box.MinY)) && sheet.Contains(new Point(box.MaxX, box.MaxY)),
                $"{figure.Size}: '{labels[i].Text}' at {box} leaves {sheet}");
            for (var k = 0; k < i; k++)
            {
                // A symbol and its index share a corner of their boxes by intent, side by side.
                Assert.False(
                    boxes[k].Meets(box.Grown(-1e-6)), $"{figure.Size}: '{labels[i].Text}' lies on '{labels[k].Text}'");
            }
        }
    }
}
