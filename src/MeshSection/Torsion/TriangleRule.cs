namespace MeshSection.Torsion;

/// <summary>Points and weights to integrate over the reference triangle (0,0), (1,0), (0,1); the weights sum to 1/2.</summary>
internal sealed class TriangleRule
{
    private TriangleRule(double[] xi, double[] eta, double[] weights)
    {
        Xi = xi;
        Eta = eta;
        Weights = weights;
    }

    /// <summary>Six points, exact to degree 4 [Dunavant1985]: all that a straight triangle of second order asks for.</summary>
    public static TriangleRule Straight { get; } = Dunavant4();

    /// <summary>
    /// Gauss-Legendre points of two directions, the square folded onto the triangle, exact to degree 8: on a triangle
    /// with a curved edge the integrands are smooth but no polynomials.
    /// </summary>
    public static TriangleRule Curved { get; } = Folded();

    /// <summary>How many points there are.</summary>
    public int Count => Weights.Length;

    /// <summary>First reference coordinate of each point: the second barycentric one.</summary>
    public double[] Xi { get; }

    /// <summary>Second reference coordinate of each point: the third barycentric one.</summary>
    public double[] Eta { get; }

    /// <summary>The weight of each point.</summary>
    public double[] Weights { get; }

    private static TriangleRule Dunavant4()
    {
        const double a = 0.445948490915965, b = 0.091576213509771;
        const double wa = 0.5 * 0.223381589678011, wb = 0.5 * 0.109951743655322;
        return new TriangleRule(
            [a, 1 - 2 * a, a, b, 1 - 2 * b, b], [a, a, 1 - 2 * a, b, b, 1 - 2 * b], [wa, wa, wa, wb, wb, wb]);
    }

    private static TriangleRule Folded()
    {
        // Five points on (0, 1) [AbramowitzStegun1964].
        ReadOnlySpan<double> t = [0.0469100770306680, 0.2307653449471585, 0.5, 0.7692346550528415, 0.9530899229693320];
        ReadOnlySpan<double> w = [0.1184634425280945, 0.2393143352496832, 0.2844444444444444, 0.2393143352496832, 0.1184634425280945];
        var (xi, eta, weights) = (new double[25], new double[25], new double[25]);
        for (var i = 0; i < 25; i++)
        {
            var (a, b) = (i / 5, i % 5);
            xi[i] = t[a];
            eta[i] = (1 - t[a]) * t[b];
            weights[i] = w[a] * w[b] * (1 - t[a]);
        }

        return new TriangleRule(xi, eta, weights);
    }
}
