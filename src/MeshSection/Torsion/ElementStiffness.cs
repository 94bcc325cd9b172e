namespace MeshSection.Torsion;

/// <summary>The matrix of a(v, w) = ∫ ∇v · ∇w dA on one second-order triangle, row by row.</summary>
internal static class ElementStiffness
{
    private const int Nodes = QuadraticNodes.PerTriangle;

    /// <summary>Adds what one integration point contributes to the matrix of its triangle.</summary>
    public static void AddPoint(ElementPoint point, Span<double> element)
    {
        for (var i = 0; i < Nodes; i++)
        {
            var (x, y) = (point.Weight * point.ShapeX[i], point.Weight * point.ShapeY[i]);
            for (var j = 0; j < Nodes; j++)
            {
                element[i * Nodes + j] += x * point.ShapeX[j] + y * point.ShapeY[j];
            }
        }
    }

    /// <summary>
    /// The element matrix of a straight triangle in closed form. With p(a, b) = A ∇λₐ · ∇λᵦ and m(a, b) the middle of an
    /// edge: corner-corner p(a, a) and -p(a, b)/3; corner-middle 4/3 p(a, b), 0 for the opposite edge; middle-middle
    /// 8/3 (p(a, a) + p(b, b) + p(a, b)) and, of m(a, b) with m(b, c), 8/3 p(a, c).
    /// </summary>
    public static void Straight(ElementPoint point, Span<double> element)
    {
        Span<double> p = stackalloc double[9];
        for (var i = 0; i < 9; i++)
        {
            var (a, b) = (i / 3, i % 3);
            p[i] = 0.5 * point.Determinant * (point.LambdaX[a] * point.LambdaX[b] + point.LambdaY[a] * point.LambdaY[b]);
        }

        for (var a = 0; a < 3; a++)
        {
            var (b, c) = ((a + 1) % 3, (a + 2) % 3);
            element[a * Nodes + a] = p[4 * a];
            Set(element, a, b, -p[3 * a + b] / 3);
            // Node 3 + k is the middle of the edge opposite k: from a to b it is 3 + c.
            Set(element, a, 3 + c, 4.0 / 3 * p[3 * a + b]);
            Set(element, a, 3 + b, 4.0 / 3 * p[3 * a + c]);
            Set(element, a, 3 + a, 0);
            element[(3 + c) * Nodes + 3 + c] = 8.0 / 3 * (p[4 * a] + p[4 * b] + p[3 * a + b]);
            Set(element, 3 + a, 3 + b, 8.0 / 3 * p[3 * a + b]);
        }
    }

    private static void Set(Span<double> element, int i, int j, double value) =>
        element[i * Nodes + j] = element[j * Nodes + i] = value;
}
