using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Dxf.Curves;

/// <summary>
/// Axes near the drawing's entities, in mm. The origin is a multiple of a power of two, chosen from the extents alone,
/// so that subtracting it is exact: a drawing and its copy moved by such multiples have the same local geometry in
/// every bit, wherever they lie.
/// </summary>
/// <param name="Origin">The local origin in the drawing's axes and unit.</param>
/// <param name="Extents">What the entities span, in the drawing's axes and unit.</param>
/// <param name="Scale">Millimetres per unit of the drawing.</param>
internal sealed record LocalFrame(Point Origin, Box Extents, double Scale)
{
    // The origin lies within this part of the extents' diagonal from their centre.
    private const double Coarseness = 1.0 / 64;

    // Beyond these, squares of lengths leave the range of double precision.
    private const double Least = 1e-100;
    private const double Greatest = 1e100;

    /// <summary>The diagonal of the extents, mm.</summary>
    public double Diagonal => Scale * Extents.Diagonal;

    /// <summary>The spacing of the numbers by which the drawing states its farthest coordinate.</summary>
    public double Spacing => SpacingAt(Farthest(Extents));

    public static LocalFrame Of(List<DrawnEntity> entities, LengthUnit unit)
    {
        var stated = Stated(entities);
        var reach = entities.SelectMany(e => e.Curves).Aggregate(Farthest(stated), (most, curve) => Math.Max(most, Reach(curve)));
        if (stated != Box.Empty && !(reach < Greatest))
        {
            throw OutlineFaults.ExtentsUnusable(stated, unit);
        }

        var anchor = new Point(stated.MinX, stated.MinY);
        var box = BoundsFrom(anchor, entities);
        if (box == Box.Empty)
        {
            throw OutlineFaults.AllWithoutLength(entities[0].Placed.Source);
        }

        var size = box.Diagonal * unit.Millimetres;
        var extents = new Box(box.MinX + anchor.X, box.MinY + anchor.Y, box.MaxX + anchor.X, box.MaxY + anchor.Y);
        if (!(size is > Least and < Greatest && Farthest(extents) * unit.Millimetres < Greatest))
        {
            throw OutlineFaults.ExtentsUnusable(extents, unit);
        }

        var step = Math.Max(Math.ScaleB(1, Math.ILogB(box.Diagonal * Coarseness)), SpacingAt(Farthest(extents)));
        var origin = new Point(Rounded(anchor.X, box.Centre.X, step), Rounded(anchor.Y, box.Centre.Y, step));
        return new LocalFrame(origin, extents, unit.Millimetres);
    }

    /// <summary>A point of the drawing in local axes, mm.</summary>
    public Point ToLocal(Point p) => Scale * (p - Origin) + Point.Origin; // + 0 turns -0 into 0

    /// <summary>A local point in the drawing's axes and unit.</summary>
    public Point ToDrawing(Point p) => Origin + p / Scale;

    private static double Farthest(Box box) => Math.Max(
        Math.Max(Math.Abs(box.MinX), Math.Abs(box.MaxX)), Math.Max(Math.Abs(box.MinY), Math.Abs(box.MaxY)));

    private static double SpacingAt(double coordinate) => Math.BitIncrement(coordinate) - coordinate;

    /// <summary>anchor + offset, rounded to a multiple of the step without first losing digits of the offset.</summary>
    private static double Rounded(double anchor, double offset, double step)
    {
        var whole = Math.Floor(anchor / step) * step;
        return whole + Math.Round((anchor - whole + offset) / step) * step;
    }

    /// <summary>What the coordinates that the entities state span.</summary>
    private static Box Stated(List<DrawnEntity> entities)
    {
        var box = Box.Empty;
        foreach (var curve in entities.SelectMany(e => e.Curves))
        {
            switch (curve)
            {
                case StraightCurve straight:
                    foreach (var point in straight.Points)
                    {
                        box = box.With(point);
                    }

                    break;
                case BulgedCurve bulged:
                    box = box.With(bulged.Start).With(bulged.End);
                    break;
                case EllipticCurve elliptic:
                    box = box.With(elliptic.Centre);
                    break;
                case FreeCurve free:
                    box = free.Controls.Aggregate(box, (b, c) => b.With(c));
                    break;
            }
        }

        return box;
    }

    /// <summary>How far curves may reach from what they state: the half axes of ellipses, the rise of bulges.</summary>
    private static double Reach(PlaneCurve curve) => curve switch
    {
        EllipticCurve elliptic => elliptic.U.Length + elliptic.V.Length,
        BulgedCurve bulged => bulged.Start.DistanceTo(bulged.End) * (1 + Math.Abs(bulged.Bulge)),
        _ => 0,
    };

    private static Box BoundsFrom(Point anchor, List<DrawnEntity> entities)
    {
        var frame = new LocalFrame(anchor, default, 1);
        var box = Box.Empty;
        var edges = new List<Edge>();
        foreach (var curve in entities.SelectMany(e => e.Curves))
        {
            edges.Clear();
            CurveEdges.Append(curve, frame, edges);
            foreach (var edge in edges)
            {
                box = box.With(edge.Bounds);
            }
        }

        return box;
    }
}
