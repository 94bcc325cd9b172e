using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Plots.Drawing;
using MeshSection.Properties;
using OxyPlot;

namespace MeshSection.Plots.Layout;

/// <summary>The axes through the centroid: x and y, and the principal ones where those lie otherwise.</summary>
internal sealed class CentroidalAxes(Box bounds, Point centroid, PrincipalAxes principal)
{
    /// <summary>How far the axes reach beyond the section.</summary>
    private const double Reach = 26;

    // Degrees that a reader could not tell from a right angle, on the picture or in the printed angle.
    private const double LeastTurn = 0.005;

    private static readonly Stroke Plain = new(Palette.Ink, 1.8, 22, 6, 4, 6);
    private static readonly Stroke Turned = new(Palette.Blue, 2.4, 12, 7);
    private static readonly Lettering Name = Lettering.Strong;
    private static readonly Lettering TurnedName = Lettering.Strong with { Colour = Palette.Blue };

    private bool IsTurned => Math.Abs(principal.Angle) is > LeastTurn and < 90 - LeastTurn;

    private bool MajorIsY => Math.Abs(principal.Angle) > 45;

    public ImmutableArray<PanelRow> Legend() => IsTurned
        ? [LegendRow.OfLine(Plain, "centroidal axes x, y"), LegendRow.OfLine(Turned, $"principal axes, 1 at {KeyValues.Angle(principal.Angle)}")]
        : [LegendRow.OfLine(Plain, "centroidal and principal axes")];

    public void Add(Sheet sheet, View view)
    {
        var box = view.Of(bounds).Grown(Reach);
        var c = view.Of(centroid);
        sheet.Add(new Polyline(Plain, new(box.MinX, c.Y), new(box.MaxX, c.Y)));
        sheet.Add(new Polyline(Plain, new(c.X, box.MaxY), new(c.X, box.MinY)));
        var (x, y) = IsTurned ? ("x", "y") : MajorIsY ? ("x = 2", "y = 1") : ("x = 1", "y = 2");
        sheet.Place(Label.LeftAt(x, box.MaxX + 6, c.Y, Name));
        sheet.Place(new Label(y, new(c.X, box.MinY - 0.5 * Name.Height - 2), Name));
        if (IsTurned)
        {
            AddTurned(sheet, box, c, principal.Angle, "1");
            AddTurned(sheet, box, c, principal.Angle + 90, "2");
            AddArc(sheet, box, c);
        }

        AddCentroid(sheet, c);
    }

    private static void AddTurned(Sheet sheet, Box box, ScreenPoint c, double degrees, string name)
    {
        var along = Point.Direction(degrees * Math.PI / 180);
        var ahead = Exit(box, c, along);
        var back = Exit(box, c, -along);
        sheet.Add(new Polyline(Turned, back, ahead));
        sheet.Place(At(ahead, along), At(back, -along));

        Label At(ScreenPoint end, Point outwards) =>
            new(name, new(end.X + 20 * outwards.X, end.Y - 22 * outwards.Y), TurnedName);
    }

    /// <summary>Where a ray from the centroid leaves a box; the direction has its y up.</summary>
    private static ScreenPoint Exit(Box box, ScreenPoint c, Point along)
    {
        var toSide = along.X == 0 ? double.PositiveInfinity : ((along.X > 0 ? box.MaxX : box.MinX) - c.X) / along.X;
        var toEnd = along.Y == 0 ? double.PositiveInfinity : ((along.Y > 0 ? box.MinY : box.MaxY) - c.Y) / -along.Y;
        var length = Math.Min(toSide, toEnd);
        return new(c.X + length * along.X, c.Y - length * along.Y);
    }

    private void AddArc(Sheet sheet, Box box, ScreenPoint c)
    {
        var radius = Math.Min(0.7 * (box.MaxX - c.X), 150);
        var points = new ScreenPoint[33];
        for (var i = 0; i < points.Length; i++)
        {
            var direction = Point.Direction(principal.Angle * Math.PI / 180 * i / (points.Length - 1));
            points[i] = new(c.X + radius * direction.X, c.Y - radius * direction.Y);
        }

        sheet.Add(new Polyline(points, new Stroke(Palette.Blue, 2)));
        if (points[0].DistanceTo(points[^1]) > 1.6 * TurnedName.Height)
        {
            var middle = points[points.Length / 2] - c;
            var text = new Label("α", c + middle * (1 + 22 / middle.Length), TurnedName);
            sheet.Add(new Disc(text.Centre, 17, Palette.Paper, Stroke.None));
            sheet.Add(text);
        }
    }

    /// <summary>The sign of a centre of gravity: a disc with two of its quarters filled.</summary>
    private static void AddCentroid(Sheet sheet, ScreenPoint c)
    {
        const double Radius = 13;
        sheet.Add(new Disc(c, Radius, Palette.Paper, Stroke.None));
        foreach (var start in (double[])[0, Math.PI])
        {
            ScreenPoint[] quarter = [c, .. Enumerable.Range(0, 17).Select(i => OnRim(start + i * Math.PI / 32))];
            sheet.Add(new Area([quarter], Palette.Ink, Stroke.None));
        }

        sheet.Add(new Disc(c, Radius, OxyColors.Undefined, new Stroke(Palette.Ink, 2.4)));

        ScreenPoint OnRim(double angle) => new(c.X + Radius * Math.Cos(angle), c.Y - Radius * Math.Sin(angle));
    }
}
