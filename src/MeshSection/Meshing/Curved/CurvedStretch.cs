using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// How much a triangle with the curves themselves as edges stretches the reference triangle: the place with barycentric
/// coordinates λ is Σ λᵢ xᵢ + Σ λₐ λᵦ g(t), over the edges from corner a to b, with t = (1 + λᵦ - λₐ)/2 and
/// g(t) = (curve(t) - chord(t)) / (t (1 - t)) [Zlamal1973].
/// </summary>
internal static class CurvedStretch
{
    // Places in a triangle, as steps of its sides; the three corners are left out.
    private const int Steps = 5;

    /// <summary>The least and the greatest determinant of the Jacobian at places spread over triangle t, mm².</summary>
    public static (double Least, double Greatest) Bounds(CurvedMesh mesh, int t)
    {
        var (least, greatest) = (double.PositiveInfinity, double.NegativeInfinity);
        for (var i = 0; i <= Steps; i++)
        {
            for (var j = 0; i + j <= Steps; j++)
            {
                if (i == Steps || j == Steps || i + j == 0)
                {
                    continue;
                }

                var determinant = Determinant(mesh, t, (double)i / Steps, (double)j / Steps);
                (least, greatest) = (Math.Min(least, determinant), Math.Max(greatest, determinant));
            }
        }

        return (least, greatest);
    }

    private static double Determinant(CurvedMesh mesh, int t, double xi, double eta)
    {
        ReadOnlySpan<double> lambda = [1 - xi - eta, xi, eta];
        Span<Point> byLambda = stackalloc Point[3];
        for (var k = 0; k < 3; k++)
        {
            byLambda[k] += mesh.Nodes[mesh.Elements[CurvedMesh.NodesPerTriangle * t + k]];
            if (mesh.Curves[3 * t + k] is not Edge curve)
            {
                continue;
            }

            var (a, b) = ((k + 1) % 3, (k + 2) % 3);
            var s = 0.5 * (1 + lambda[b] - lambda[a]);
            var bubble = s * (1 - s);
            var g = (curve.PointAt(s) - curve.Start - s * curve.Chord) / bubble;
            var slope = (curve.VelocityAt(s) - curve.Chord - (1 - 2 * s) * g) / bubble;
            var product = lambda[a] * lambda[b];
            byLambda[a] += lambda[b] * g - 0.5 * product * slope;
            byLambda[b] += lambda[a] * g + 0.5 * product * slope;
        }

        return (byLambda[1] - byLambda[0]).Cross(byLambda[2] - byLambda[0]);
    }
}
