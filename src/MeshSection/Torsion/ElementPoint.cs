using System.Runtime.CompilerServices;
using MeshSection.Geometry;

namespace MeshSection.Torsion;

/// <summary>
/// Walks over the integration points of second-order triangles. Shape functions 0 to 2 belong to the corners, 3 + k to
/// the middle of the edge opposite corner k.
/// </summary>
/// <remarks>
/// On a triangle with curved edges the place is x = Σ λᵢ xᵢ + Σ λₐ λᵦ g(t), over the edges from corner a to b, with
/// t = (1 + λᵦ - λₐ)/2 and g as in <see cref="EdgeBow"/>: on the edge the curve itself, on the two others
/// nothing. With g constant it is the isoparametric triangle of second order.
/// </remarks>
/// <param name="mesh">The fitted mesh.</param>
internal sealed class ElementPoint(CentredMesh mesh)
{
    private readonly Point[] _corners = new Point[3];
    private readonly EdgeBow?[] _bows = new EdgeBow?[3];
    private readonly Point[] _byLambda = new Point[3];
    private readonly double[] _lambdaX = new double[3];
    private readonly double[] _lambdaY = new double[3];
    private TriangleRule _rule = TriangleRule.Straight;

    /// <summary>True if the triangle entered has a curved edge.</summary>
    public bool IsCurved { get; private set; }

    /// <summary>How many points the triangle has.</summary>
    public int Count => _rule.Count;

    /// <summary>Twice the area of a straight triangle; of a bent one how much it stretches the reference at the point, mm².</summary>
    public double Determinant { get; private set; }

    /// <summary>x of the point, mm.</summary>
    public double X { get; private set; }

    /// <summary>y of the point, mm.</summary>
    public double Y { get; private set; }

    /// <summary>The area that the point stands for, mm².</summary>
    public double Weight { get; private set; }

    /// <summary>The six shape functions.</summary>
    public double[] Shape { get; } = new double[6];

    /// <summary>Their derivatives along x, 1/mm.</summary>
    public double[] ShapeX { get; } = new double[6];

    /// <summary>Their derivatives along y, 1/mm.</summary>
    public double[] ShapeY { get; } = new double[6];

    /// <summary>Derivative along x of the barycentric coordinate of corner k, at the point; constant if the triangle is straight.</summary>
    public ReadOnlySpan<double> LambdaX => _lambdaX;

    /// <summary>Derivative along y of the barycentric coordinate of corner k.</summary>
    public ReadOnlySpan<double> LambdaY => _lambdaY;

    /// <summary>Goes to a triangle.</summary>
    public void Enter(int triangle)
    {
        IsCurved = false;
        for (var k = 0; k < 3; k++)
        {
            _corners[k] = mesh.Corners[mesh.Mesh.Corners[3 * triangle + k]];
            _bows[k] = mesh.Bows[3 * triangle + k];
            IsCurved |= _bows[k] is not null;
        }

        _rule = IsCurved ? TriangleRule.Curved : TriangleRule.Straight;
        if (!IsCurved)
        {
            SetGradients(_corners[1] - _corners[0], _corners[2] - _corners[0]);
        }
    }

    /// <summary>Goes to one of the triangle's points.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public void Move(int index)
    {
        var (xi, eta) = (_rule.Xi[index], _rule.Eta[index]);
        ReadOnlySpan<double> lambda = [1 - xi - eta, xi, eta];
        var place = lambda[0] * _corners[0] + xi * _corners[1] + eta * _corners[2];
        if (IsCurved)
        {
            place += Bend(index, lambda);
        }

        (X, Y) = (place.X, place.Y);
        Weight = _rule.Weights[index] * Determinant;
        for (var k = 0; k < 3; k++)
        {
            var (a, b) = ((k + 1) % 3, (k + 2) % 3);
            Shape[k] = lambda[k] * (2 * lambda[k] - 1);
            ShapeX[k] = (4 * lambda[k] - 1) * _lambdaX[k];
            ShapeY[k] = (4 * lambda[k] - 1) * _lambdaY[k];
            Shape[3 + k] = 4 * lambda[a] * lambda[b];
            ShapeX[3 + k] = 4 * (lambda[a] * _lambdaX[b] + lambda[b] * _lambdaX[a]);
            ShapeY[3 + k] = 4 * (lambda[a] * _lambdaY[b] + lambda[b] * _lambdaY[a]);
        }
    }

    /// <summary>What the curves add to the place; sets the gradients of the bent triangle.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private Point Bend(int index, ReadOnlySpan<double> lambda)
    {
        Point bend = default;
        _corners.CopyTo(_byLambda, 0);
        for (var k = 0; k < 3; k++)
        {
            if (_bows[k] is not EdgeBow bow)
            {
                continue;
            }

            var (a, b) = ((k + 1) % 3, (k + 2) % 3);
            var (g, slope) = (bow.Values[index], bow.Slopes[index]);
            var product = lambda[a] * lambda[b];
            bend += product * g;
            _byLambda[a] += lambda[b] * g - 0.5 * product * slope;
            _byLambda[b] += lambda[a] * g + 0.5 * product * slope;
        }

        SetGradients(_byLambda[1] - _byLambda[0], _byLambda[2] - _byLambda[0]);
        return bend;
    }

    private void SetGradients(Point alongXi, Point alongEta)
    {
        Determinant = alongXi.Cross(alongEta);
        (_lambdaX[1], _lambdaY[1]) = (alongEta.Y / Determinant, -alongEta.X / Determinant);
        (_lambdaX[2], _lambdaY[2]) = (-alongXi.Y / Determinant, alongXi.X / Determinant);
        (_lambdaX[0], _lambdaY[0]) = (-_lambdaX[1] - _lambdaX[2], -_lambdaY[1] - _lambdaY[2]);
    }
}
