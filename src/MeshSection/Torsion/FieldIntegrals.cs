namespace MeshSection.Torsion;

/// <summary>Integrals over the section of the warping and shear fields, in the notation of <see cref="WarpingFields"/>.</summary>
internal sealed record FieldIntegrals
{
    private const int Nodes = QuadraticNodes.PerTriangle;

    /// <summary>A = ∫ dA, mm².</summary>
    public double Area { get; private set; }

    /// <summary>∫ x² dA, mm⁴.</summary>
    public double XX { get; private set; }

    /// <summary>∫ y² dA, mm⁴.</summary>
    public double YY { get; private set; }

    /// <summary>∫ x y dA, mm⁴.</summary>
    public double XY { get; private set; }

    /// <summary>∫ |τ|² dA, mm⁴: no less than the torsion constant for any warping function.</summary>
    public double Torsion { get; private set; }

    /// <summary>∫ ω dA, mm⁴.</summary>
    private double FirstWarping { get; set; }

    /// <summary>∫ x ω dA, mm⁵, whatever the mean of ω, since the origin is the centroid.</summary>
    public double XWarping { get; private set; }

    /// <summary>∫ y ω dA, mm⁵.</summary>
    public double YWarping { get; private set; }

    /// <summary>∫ ω² dA, mm⁶, with ω less its mean.</summary>
    public double WarpingSquare { get; private set; }

    /// <summary>∫ τ₁·τ₁ dA, mm⁶.</summary>
    public double Energy11 { get; private set; }

    /// <summary>∫ τ₁·τ₂ dA, mm⁶.</summary>
    public double Energy12 { get; private set; }

    /// <summary>∫ τ₂·τ₂ dA, mm⁶.</summary>
    public double Energy22 { get; private set; }

    /// <summary>Moment of τ₁ about the origin, mm⁵.</summary>
    public double Moment1 { get; private set; }

    /// <summary>Moment of τ₂ about the origin, mm⁵.</summary>
    public double Moment2 { get; private set; }

    /// <summary>Integrates the fields.</summary>
    /// <param name="mesh">The fitted mesh, about its centroid.</param>
    /// <param name="nodes">Its nodes.</param>
    /// <param name="fields">The fields.</param>
    /// <param name="poissonRatio">ν for which they were solved.</param>
    public static FieldIntegrals Of(CentredMesh mesh, QuadraticNodes nodes, WarpingFields fields, double poissonRatio)
    {
        var sums = new FieldIntegrals();
        var point = new ElementPoint(mesh);
        for (var t = 0; t < mesh.Mesh.TriangleCount; t++)
        {
            var triangle = nodes.Triangles.AsSpan(Nodes * t, Nodes);
            point.Enter(t);
            for (var q = 0; q < point.Count; q++)
            {
                point.Move(q);
                sums.Add(point, triangle, fields, poissonRatio);
            }
        }

        sums.WarpingSquare -= sums.FirstWarping * sums.FirstWarping / sums.Area;
        return sums;
    }

    private void Add(ElementPoint point, ReadOnlySpan<int> triangle, WarpingFields fields, double nu)
    {
        var (x, y, area) = (point.X, point.Y, point.Weight);
        double w = 0, wx = -y, wy = x;
        var (half, product) = (0.5 * nu * (x * x - y * y), nu * x * y);
        double ax = -half, ay = -product, bx = -product, by = half;
        for (var i = 0; i < Nodes; i++)
        {
            var node = triangle[i];
            var (v, vx, vy) = (point.Shape[i], point.ShapeX[i], point.ShapeY[i]);
            var (warping, shear1, shear2) = (fields.Warping[node], fields.Shear1[node], fields.Shear2[node]);
            w += v * warping;
            wx += vx * warping;
            wy += vy * warping;
            ax += vx * shear1;
            ay += vy * shear1;
            bx += vx * shear2;
            by += vy * shear2;
        }

        Area += area;
        XX += area * x * x;
        YY += area * y * y;
        XY += area * x * y;
        Torsion += area * (wx * wx + wy * wy);
        FirstWarping += area * w;
        XWarping += area * x * w;
        YWarping += area * y * w;
        WarpingSquare += area * w * w;
        var scale = area / (2 * (1 + nu));
        Moment1 += scale * (x * ay - y * ax);
        Moment2 += scale * (x * by - y * bx);
        scale /= 2 * (1 + nu);
        Energy11 += scale * (ax * ax + ay * ay);
        Energy12 += scale * (ax * bx + ay * by);
        Energy22 += scale * (bx * bx + by * by);
    }
}
