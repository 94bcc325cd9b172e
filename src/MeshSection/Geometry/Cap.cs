namespace MeshSection.Geometry;

/// <summary>The region between an arc and its chord: the circular segment, positive to the right of the chord.</summary>
internal static class Cap
{
    /// <summary>Area r²(α - sin α cos α), with α half the sweep; signed as the bulge, so that a hole's arcs subtract.</summary>
    public static double Area(ArcEdge arc)
    {
        var c = 0.5 * arc.Chord.Length;
        var half = 0.5 * arc.Sweep;
        var sin = Math.Sin(half);
        return c * c * (Math.Abs(half) < 0.1 ? Series(half) : (half - sin * Math.Cos(half)) / (sin * sin));
    }

    private static double Series(double a) => a;
}
