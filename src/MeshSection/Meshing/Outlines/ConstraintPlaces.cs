using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>Where the points that a mesh is to keep lie on a flattened outline.</summary>
internal static class ConstraintPlaces
{
    // A part of the outline's diagonal: what is given to six digits is on a boundary if it is meant to be.
    private const double SnapPart = 1e-6;

    /// <summary>Points no farther than this from a boundary are on it, and points no farther from each other are one, mm.</summary>
    public static double Snap(Outline outline) => SnapPart * outline.Bounds.Diagonal;

    /// <summary>Every point that is to be a node, ends of lines included.</summary>
    public static IEnumerable<Point> Ends(MeshConstraints constraints) =>
        constraints.Points.Concat(constraints.Lines.SelectMany(line => new[] { line.From, line.To }));

    /// <summary>The edges whose chords pass on the wrong side of a point that the mesh is to keep.</summary>
    public static IReadOnlyCollection<EdgePlace> CutOff(FlatOutline flat, MeshConstraints constraints)
    {
        var snap = Snap(flat.Outline);
        var places = new HashSet<EdgePlace>();
        foreach (var point in Ends(constraints))
        {
            var (chord, _, distance) = Nearest(flat, point);
            if (distance > snap && flat.Chords[chord].Curve.Sag > 0 && IsInside(flat.Outline, point) != IsInside(flat.Graph, point))
            {
                places.Add(flat.Chords[chord].Place);
            }
        }

        return places;
    }

    /// <summary>The chord whose curve is nearest to a point, where along the curve, and how far.</summary>
    public static (int Chord, double Fraction, double Distance) Nearest(FlatOutline flat, Point point)
    {
        var (best, fraction, least) = (-1, 0.0, double.PositiveInfinity);
        for (var i = 0; i < flat.Chords.Length; i++)
        {
            var curve = flat.Chords[i].Curve;
            if (ChordDistance(curve, point) - curve.Sag >= least)
            {
                continue;
            }

            var at = NearestFraction(curve, point);
            var distance = curve.PointAt(at).DistanceTo(point);
            if (distance < least)
            {
                (best, fraction, least) = (i, at, distance);
            }
        }

        return (best, fraction, least);
    }

    /// <summary>True if a point off the boundaries lies in the section.</summary>
    public static bool IsInside(Outline outline, Point point) =>
        outline.Boundaries.Sum(b => WindingNumber.Of(b.Boundary, point)) > 0;

    private static bool IsInside(PlanarGraph graph, Point point)
    {
        var winding = 0;
        foreach (var s in graph.Segments)
        {
            var (a, b) = (graph.Points[s.From], graph.Points[s.To]);
            if (a.Y <= point.Y != b.Y <= point.Y && (b - a).Cross(point - a) > 0 == a.Y <= point.Y)
            {
                winding += a.Y <= point.Y ? 1 : -1;
            }
        }

        return winding > 0;
    }

    private static double ChordDistance(Edge curve, Point point)
    {
        var t = Math.Clamp((point - curve.Start).Dot(curve.Chord) / curve.Chord.Dot(curve.Chord), 0, 1);
        return (curve.Start + t * curve.Chord).DistanceTo(point);
    }

    /// <summary>
    /// Where the curve runs at right angles to the way to the point. A piece that turns little has one such place, or none
    /// and is nearest at an end: halving the interval on the sign of the scalar product finds it.
    /// </summary>
    private static double NearestFraction(Edge curve, Point point)
    {
        var (low, high) = (0.0, 1.0);
        for (var i = 0; i < 60; i++)
        {
            var middle = 0.5 * (low + high);
            if ((point - curve.PointAt(middle)).Dot(curve.TangentAt(middle)) > 0)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return low == 0 ? 0 : high == 1 ? 1 : 0.5 * (low + high);
    }
}
