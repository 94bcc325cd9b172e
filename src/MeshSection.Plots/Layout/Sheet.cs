using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>A figure while it is laid out: the marks so far, and the places that labels have taken.</summary>
internal sealed class Sheet
{
    public const double Margin = 40;

    private const double LabelGap = 3;
    private const int Rings = 24;

    private static readonly (int X, int Y)[] Ways =
        [(0, 1), (0, -1), (1, 0), (-1, 0), (1, 1), (-1, 1), (1, -1), (-1, -1)];


    private readonly PictureSize size;
    private readonly ImmutableArray<Mark>.Builder marks = ImmutableArray.CreateBuilder<Mark>();
    private readonly List<Box> taken = [];
    private readonly Box paper;

    public Sheet(PictureSize size)
    {
        var smaller = Math.Min(size.Width, size.Height);
        var larger = Math.Max(size.Width, size.Height);
        if (smaller < PictureSize.Least || larger > PictureSize.Most)
        {
            throw new ArgumentOutOfRangeException(
                nameof(size), size, $"A picture has {PictureSize.Least} to {PictureSize.Most} pixels on a side.");
        }

        this.size = size;
        paper = new Box(0, 0, size.Width / size.Scale, size.Height / size.Scale);
        Free = paper.Grown(-Margin);
    }

    /// <summary>What is left inside the margins for whatever comes next.</summary>
    public Box Free { get; set; }

    public void Add(Mark mark)
    {
        marks.Add(mark);
        if (mark is Label label)
        {
            taken.Add(label.Box.Grown(LabelGap));
        }
    }

    /// <summary>Adds a label on a piece of blank paper, so that it reads across lines.</summary>
    public void AddOnPaper(Label label)
    {
        var box = label.Box.Grown(2);
        ScreenPoint[] corners =
            [new(box.MinX, box.MinY), new(box.MaxX, box.MinY), new(box.MaxX, box.MaxY), new(box.MinX, box.MaxY)];
        Add(new Area([corners], Palette.Paper, Stroke.None));
        Add(label);
    }

    /// <summary>Keeps labels that are placed later out of a box.</summary>
    public void Keep(Box box) => taken.Add(box);

    /// <summary>Adds the label that <see cref="Find"/> finds, if there is one.</summary>
    public void Place(params ReadOnlySpan<Label> candidates)
    {
        if (Find(candidates) is { } label)
        {
            Add(label);
        }
    }

    /// <summary>
    /// The first of the candidates that stands free; if none does, the first one moved up or down, then sideways, by as
    /// little as need be; null if there is no free place anywhere near.
    /// </summary>
    public Label? Find(params ReadOnlySpan<Label> candidates)
    {
        if (FirstFree(0, candidates) is { } free)
        {
            return free;
        }

        var first = candidates[0];
        var step = 0.5 * first.Lettering.Height;
        for (var ring = 1; ring <= Rings; ring++)
        {
            foreach (var (x, y) in Ways)
            {
                var centre = new ScreenPoint(first.Centre.X + x * ring * step, first.Centre.Y + y * ring * step);
                var moved = first with { Centre = centre };
                if (IsFree(moved.Box))
                {
                    return moved;
                }
            }
        }

        return null;
    }

    /// <summary>The first of the candidates that stands free with so much room all around; null if none does.</summary>
    public Label? FirstFree(double room, params ReadOnlySpan<Label> candidates)
    {
        foreach (var candidate in candidates)
        {
            if (IsFree(candidate.Box.Grown(room)))
            {
                return candidate;
            }
        }

        return null;
    }

    public Figure ToFigure() => new(size, marks.ToImmutable());

    private bool IsFree(Box box) =>
        box.MinX >= paper.MinX && box.MinY >= paper.MinY && box.MaxX <= paper.MaxX && box.MaxY <= paper.MaxY
        && !taken.Exists(other => other.Meets(box));
}
