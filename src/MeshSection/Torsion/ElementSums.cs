using MeshSection.LinearAlgebra;

namespace MeshSection.Torsion;

/// <summary>
/// What one walk over the triangles yields for both problems, that of the warping and that of the stress function: the
/// matrix of every triangle, and loads at every node. With v the shape function of a node and gᵢ as in
/// <see cref="WarpingFields"/>.
/// </summary>
internal sealed class ElementSums
{
    private const int Nodes = QuadraticNodes.PerTriangle;
    private const int Entries = Nodes * Nodes;
    private readonly QuadraticNodes _nodes;
    private readonly double[] _matrices;

    private ElementSums(QuadraticNodes nodes)
    {
        _nodes = nodes;
        _matrices = new double[nodes.Triangles.Length * Nodes];
        (Area, Warping, Shear1, Shear2) =
            (new double[nodes.Count], new double[nodes.Count], new double[nodes.Count], new double[nodes.Count]);
    }

    /// <summary>∫ v dA at each node, mm².</summary>
    public double[] Area { get; }

    /// <summary>∫ (y ∂v/∂x - x ∂v/∂y) dA at each node, mm².</summary>
    public double[] Warping { get; }

    /// <summary>∫ (2 (1 + ν) x v + ν g₁ · ∇v) dA at each node, mm³.</summary>
    public double[] Shear1 { get; }

    /// <summary>∫ (2 (1 + ν) y v + ν g₂ · ∇v) dA at each node, mm³.</summary>
    public double[] Shear2 { get; }

    /// <summary>Walks over the triangles.</summary>
    /// <param name="mesh">The fitted mesh, about its centroid.</param>
    /// <param name="nodes">Its nodes.</param>
    /// <param name="poissonRatio">ν.</param>
    public static ElementSums Of(CentredMesh mesh, QuadraticNodes nodes, double poissonRatio)
    {
        var sums = new ElementSums(nodes);
        var point = new ElementPoint(mesh);
        for (var t = 0; t < mesh.Mesh.TriangleCount; t++)
        {
            var triangle = nodes.Triangles.AsSpan(Nodes * t, Nodes);
            var matrix = sums._matrices.AsSpan(Entries * t, Entries);
            point.Enter(t);
            for (var q = 0; q < point.Count; q++)
            {
                point.Move(q);
                sums.AddLoads(point, triangle, poissonRatio);
                if (point.IsCurved)
                {
                    ElementStiffness.AddPoint(point, matrix);
                }
            }

            if (!point.IsCurved)
            {
                ElementStiffness.Straight(point, matrix);
            }
        }

        return sums;
    }

    /// <summary>The matrix of a(v, w) = ∫ ∇v · ∇w dA.</summary>
    /// <param name="unknowns">The unknown of each node, or -1 if it is held at 0; nodes may share one.</param>
    /// <param name="count">How many unknowns there are.</param>
    public SparseSymmetric Assemble(int[] unknowns, int count)
    {
        var slots = new int[_nodes.Triangles.Length];
        for (var slot = 0; slot < slots.Length; slot++)
        {
            slots[slot] = unknowns[_nodes.Triangles[slot]];
        }

        var matrix = new SparseSymmetric(SymmetricPattern.OfElements(slots, Nodes, count));
        for (var slot = 0; slot < slots.Length; slot += Nodes)
        {
            matrix.Add(slots.AsSpan(slot, Nodes), _matrices.AsSpan(slot * Nodes, Entries));
        }

        return matrix;
    }

    private void AddLoads(ElementPoint point, ReadOnlySpan<int> triangle, double nu)
    {
        var (x, y, area) = (point.X, point.Y, point.Weight);
        var (growth, half, product) = (2 * (1 + nu), 0.5 * nu * (x * x - y * y), nu * x * y);
        for (var i = 0; i < Nodes; i++)
        {
            var (node, v, vx, vy) = (triangle[i], point.Shape[i], point.ShapeX[i], point.ShapeY[i]);
            Area[node] += area * v;
            Warping[node] += area * (y * vx - x * vy);
            Shear1[node] += area * (growth * x * v + half * vx + product * vy);
            Shear2[node] += area * (growth * y * v + product * vx - half * vy);
        }
    }
}
