using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// How much a triangle with six nodes stretches the reference triangle: the determinant of its Jacobian, a polynomial of
/// degree 2. It lies between the least and the greatest of its coefficients in Bernstein's form, everywhere in the
/// triangle, so that a positive least coefficient proves that nothing is turned inside out [Farin2002].
/// </summary>
internal static class SecondOrderStretch
{
    /// <summary>Bounds of the determinant, mm².</summary>
    public static (double Least, double Greatest) Bounds(CurvedMesh mesh, int t)
    {
        // Control points: the corners, and those of the edges opposite them.
        Point p0 = Node(0), p1 = Node(1), p2 = Node(2);
        Point q0 = 2 * Node(3) - 0.5 * (p1 + p2), q1 = 2 * Node(4) - 0.5 * (p2 + p0), q2 = 2 * Node(5) - 0.5 * (p0 + p1);

        // The derivatives along the two sides from corner 0 are linear; here are their values at the corners.
        Point u0 = 2 * (q2 - p0), u1 = 2 * (p1 - q2), u2 = 2 * (q0 - q1);
        Point v0 = 2 * (q1 - p0), v1 = 2 * (q0 - q2), v2 = 2 * (p2 - q1);
        ReadOnlySpan<double> coefficients =
        [
            u0.Cross(v0), u1.Cross(v1), u2.Cross(v2),
            0.5 * (u0.Cross(v1) + u1.Cross(v0)), 0.5 * (u1.Cross(v2) + u2.Cross(v1)), 0.5 * (u2.Cross(v0) + u0.Cross(v2)),
        ];
        var (least, greatest) = (double.PositiveInfinity, double.NegativeInfinity);
        foreach (var c in coefficients)
        {
            (least, greatest) = (Math.Min(least, c), Math.Max(greatest, c));
        }

        return (least, greatest);

        Point Node(int i) => mesh.Nodes[mesh.Elements[CurvedMesh.NodesPerTriangle * t + i]];
    }
}
