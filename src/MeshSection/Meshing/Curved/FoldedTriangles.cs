namespace MeshSection.Meshing;

/// <summary>Finds triangles that fitting to the curves has turned inside out.</summary>
internal static class FoldedTriangles
{
    // Least over greatest stretch of a triangle.
    private const double LeastStretch = 0.05;

    /// <summary>True if there is one.</summary>
    public static bool Exist(CurvedMesh fitted)
    {
        for (var t = 0; t < fitted.Mesh.TriangleCount; t++)
        {
            if (IsFolded(fitted, t))
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
        for (var t = 0; t < mesh.TriangleCount; t++)
        {
            if (IsFolded(fitted, t))
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

    private static bool IsFolded(CurvedMesh fitted, int t)
    {
        var (least, greatest) = SecondOrderStretch.Bounds(fitted, t);
        if (!(least > LeastStretch * greatest))
        {
            return true;
        }

        if (fitted.Curves[3 * t] is null && fitted.Curves[3 * t + 1] is null && fitted.Curves[3 * t + 2] is null)
        {
            return false;
        }

        (least, greatest) = CurvedStretch.Bounds(fitted, t);
        return !(least > LeastStretch * greatest);
    }
}
