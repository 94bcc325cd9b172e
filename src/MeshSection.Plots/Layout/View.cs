using MeshSection.Geometry;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>Section plane to sheet: the same scale both ways, y turned to run down.</summary>
/// <param name="Scale">Sheet units per mm.</param>
/// <param name="Centre">The point of the section plane, mm, that comes to lie at <paramref name="Target"/>.</param>
/// <param name="Target">Where it lies on the sheet.</param>
internal sealed record View(double Scale, Point Centre, ScreenPoint Target)
{
    // A chord may leave its curve by a twentieth of a sheet unit: half a hundredth of a millimetre in print.
    private const double CurveSag = 0.05;

    /// <summary>The largest view of a box of the section plane in the middle of a box of the sheet.</summary>
    public static View Fit(Box section, Box area) => new(
        ScaleFor(section, area),
        section.Centre,
        new ScreenPoint(0.5 * (area.MinX + area.MaxX), 0.5 * (area.MinY + area.MaxY)));

    public static double ScaleFor(Box section, Box area) =>
        Math.Min(area.Width / section.Width, area.Height / section.Height);

    public ScreenPoint Of(Point p) =>
        new(Target.X + Scale * (p.X - Centre.X), Target.Y - Scale * (p.Y - Centre.Y));

    public Box Of(Box b)
    {
        var topLeft = Of(new Point(b.MinX, b.MaxY));
        var bottomRight = Of(new Point(b.MaxX, b.MinY));
        return new Box(topLeft.X, topLeft.Y, bottomRight.X, bottomRight.Y);
    }

    /// <summary>A curve as so many chords that it looks smooth; both ends included.</summary>
    public ScreenPoint[] Of(Edge edge)
    {
        var pieces = Math.Clamp((int)Math.Ceiling(Math.Sqrt(2 * edge.Sag * Scale / CurveSag)), 1, 400);
        var points = new ScreenPoint[pieces + 1];
        for (var i = 0; i <= pieces; i++)
        {
            points[i] = Of(edge.PointAt((double)i / pieces));
        }

        return points;
    }

    public ScreenPoint[] Of(Boundary boundary) => [.. boundary.Edges.SelectMany(e => Of(e).SkipLast(1))];
}
