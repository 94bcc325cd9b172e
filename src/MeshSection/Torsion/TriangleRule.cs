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
    /// Gauss-Legendre points of two directions, the square folded onto the triangle, exact to degree 14: on a triangle
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
        // Eight points on (0, 1) (Abramowitz and Stegun, Table 25.4).
        ReadOnlySpan<double> half = [0.1834346424956498, 0.5255324099163290, 0.7966664774136267, 0.9602898564975363];
        ReadOnlySpan<double> halfWeights = [0.3626837833783620, 0.3137066458778873, 0.2223810344533745, 0.1012285362903763];
        var (t, w) = (new double[8], new double[8]);
        for (var i = 0; i < 4; i++)
        {
            (t[2 * i], t[2 * i + 1]) = (0.5 * (1 - half[i]), 0.5 * (1 + half[i]));
            w[2 * i] = w[2 * i + 1] = 0.5 * halfWeights[i];
        }

        var (xi, eta, weights) = (new double[64], new double[64], new double[64]);
        for (var i = 0; i < 8; i++)
        {
            for (var j = 0; j < 8; j++)
            {
                xi[8 * i + j] = t[i];
                eta[8 * i + j] = (1 - t[i]) * t[j];
                weights[8 * i + j] = w[i] * w[j] * (1 - t[i]);
            }
        }

        return new TriangleRule(xi, eta, weights);
    }
}
