using MeshSection.Meshing;

namespace MeshSection.Torsion;

/// <summary>Finds triangles that fitting to the curves has turned inside out.</summary>
internal static class FoldedTriangles
{
    // Least over greatest stretch of a triangle at its integration points: enough to be sure of those in between.
    private const double LeastStretch = 0.05;

    /// <summary>True if there is one.</summary>
    public static bool Exist(CurvedMesh fitted)
    {
        var point = new ElementPoint(fitted);
        for (var t = 0; t < fitted.Mesh.TriangleCount; t++)
        {
            if (IsFolded(point, t))
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>
    /// Takes the curves from around every folded triangle. Returns false if there is none, so that the fit is sound.
    /// </summary>
    /// <param name="fitted">The fitted mesh.</param>
    /// <param name="isCurved">Whether each segment follows its curve; set to false where it must not.</param>
    public static bool Straighten(CurvedMesh fitted, bool[] isCurved)
    {
        var mesh = fitted.Mesh;
        var folded = new bool[mesh.Nodes.Length];
        var isAny = false;
        var point = new ElementPoint(fitted);
        for (var t = 0; t < mesh.TriangleCount; t++)
        {
            if (IsFolded(point, t))
            {
                isAny = true;
                for (var k = 0; k < 3; k++)
                {
                    folded[mesh.Corners[3 * t + k]] = true;
                }
            }
        }

        var isChanged = false;
        for (var e = 0; isAny && e < mesh.Segments.Length; e++)
        {
            var s = mesh.Segments[e];
            if (s >= 0 && isCurved[s] && (folded[MeshEdge.From(mesh, e)] || folded[MeshEdge.To(mesh, e)]))
            {
                isCurved[s] = false;
                isChanged = true;
            }
        }

        return isChanged;
    }

    private static bool IsFolded(ElementPoint point, int triangle)
    {
        point.Enter(triangle);
        var (least, greatest) = (double.PositiveInfinity, double.NegativeInfinity);
        for (var q = 0; q < (point.IsCurved ? point.Count : 1); q++)
        {
            point.Move(q);
            least = Math.Min(least, point.Determinant);
            greatest = Math.Max(greatest, point.Determinant);
        }

        return !(least > LeastStretch * greatest && least > 0);
    }
}
