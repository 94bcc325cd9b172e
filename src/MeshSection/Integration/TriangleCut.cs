namespace MeshSection.Integration;

/// <summary>A triangle cut by a line, from its area and the signed distances of its corners.</summary>
internal static class TriangleCut
{
    /// <summary>The part on the positive side, exactly.</summary>
    /// <param name="area">The whole triangle's area.</param>
    /// <param name="a">Signed distance of a corner from the line.</param>
    /// <param name="b">That of the next.</param>
    /// <param name="c">That of the last.</param>
    public static PartBeyond Beyond(double area, double a, double b, double c)
    {
        var above = (a > 0 ? 1 : 0) + (b > 0 ? 1 : 0) + (c > 0 ? 1 : 0);
        var moment = area * (a + b + c) / 3;
        return above switch
        {
            3 => new PartBeyond(area, moment),
            0 => default,
            1 => a > 0 ? Tip(area, a, b, c) : b > 0 ? Tip(area, b, c, a) : Tip(area, c, a, b),
            _ => Rest(area, moment, a <= 0 ? Tip(area, -a, -b, -c) : b <= 0 ? Tip(area, -b, -c, -a) : Tip(area, -c, -a, -b)),
        };
    }

    // The corner alone on its side, at distance d > 0: a triangle similar to the whole along both of its edges.
    private static PartBeyond Tip(double area, double d, double e, double f)
    {
        var part = area * (d / (d - e)) * (d / (d - f));
        return new PartBeyond(part, part * d / 3);
    }

    // The moment of the tip on the other side counts negative there.
    private static PartBeyond Rest(double area, double moment, PartBeyond tip) =>
        new(area - tip.Area, moment + tip.Moment);
}
