using MeshSection.Geometry;

namespace MeshSection.Dxf.Curves;

/// <summary>Angles in degrees, as drawings state them.</summary>
internal static class Degrees
{
    /// <summary>The unit vector at an angle; quarter turns and mirror images are exact.</summary>
    public static Point Direction(double angle)
    {
        var turned = Math.IEEERemainder(angle, 360);
        var quarter = Math.Round(turned / 90);
        var (sin, cos) = Math.SinCos((turned - 90 * quarter) * (Math.PI / 180));
        return (int)quarter switch
        {
            0 => new Point(cos, sin),
            1 => new Point(-sin, cos),
            -1 => new Point(sin, -cos),
            _ => new Point(-cos, -sin),
        };
    }

    /// <summary>The way from one angle counter-clockwise to another, in [0, 360).</summary>
    public static double Sweep(double from, double to)
    {
        var sweep = (to - from) % 360;
        return sweep < 0 ? sweep + 360 : sweep;
    }
}
