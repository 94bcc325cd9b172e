using CsCheck;
using MeshSection.LinearAlgebra;

namespace MeshSection.Tests.LinearAlgebra;

public class SparseCholeskyTests
{
    [Fact]
    public void Random_systems_are_solved_as_by_dense_elimination() => Gen.Select(Matrices.PositiveDefinite, Gen.Bool).Sample(
        (matrix, isOrdered) =>
        {
            var side = Side(matrix.Pattern.Size);
            var expected = DenseReference.Solve(DenseReference.Of(matrix), side);
            var actual = (double[])side.Clone();
            var order = isOrdered ? MinimumDegree.Order(matrix.Pattern) : null;
            SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern, order), matrix).Solve(actual);
            var scale = expected.Max(Math.Abs);
            for (var i = 0; i < side.Length; i++)
            {
                Assert.Equal(expected[i], actual[i], 1e-9 * scale);
            }
        },
        iter: 300);

    [Theory]
    [InlineData(1)]
    [InlineData(7)]
    [InlineData(40)]
    [InlineData(90)]
    public void The_residual_on_a_grid_is_rounding(int n)
    {
        var matrix = Matrices.Grid(n);
        var side = Side(n * n);
        var x = (double[])side.Clone();
        SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern, MinimumDegree.Order(matrix.Pattern)), matrix).Solve(x);
        var back = matrix.Times(x);
        var largest = x.Max(Math.Abs);
        for (var i = 0; i < side.Length; i++)
        {
            Assert.Equal(side[i], back[i], 1e-14 * largest);
        }
    }

    [Fact]
    public void Several_sides_are_solved_as_one_by_one()
    {
        var matrix = Matrices.Grid(20);
        var factor = SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern), matrix);
        double[][] together = [Side(400), [.. Side(400).Reverse()], new double[400]];
        var alone = together.Select(side => (double[])side.Clone()).ToArray();
        factor.Solve(together);
        foreach (var side in alone)
        {
            factor.Solve(side);
        }

        Assert.Equal(alone, together);
    }

    [Fact]
    public void One_analysis_serves_other_values()
    {
        var matrix = Matrices.Grid(15);
        var symbolic = SymbolicCholesky.Of(matrix.Pattern, MinimumDegree.Order(matrix.Pattern));
        var (first, second) = (Side(225), Side(225));
        SparseCholesky.Factor(symbolic, matrix).Solve(first);
        for (var p = 0; p < matrix.Values.Length; p++)
        {
            matrix.Values[p] *= 4;
        }

        SparseCholesky.Factor(symbolic, matrix).Solve(second);
        Assert.Equal(first, second.Select(x => 4 * x));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(137)]
    [InlineData(399)]
    public void A_negative_diagonal_entry_is_named(int unknown)
    {
        var matrix = Matrices.Grid(20);
        matrix.Add([unknown], [-1000]);
        var order = MinimumDegree.Order(matrix.Pattern);
        var fault = Assert.Throws<NotPositiveDefiniteException>(
            () => SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern, order), matrix));
        Assert.Equal(unknown, fault.Unknown);
        Assert.Equal(-996, fault.Diagonal);
        Assert.True(fault.Pivot < 0);
    }

    [Fact]
    public void An_indefinite_pair_fails_at_its_second_unknown()
    {
        var matrix = new SparseSymmetric(SymmetricPattern.OfElements([0, 1], 2, 2));
        matrix.Add([0, 1], [1, 2, 2, 1]);
        var fault = Assert.Throws<NotPositiveDefiniteException>(
            () => SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern), matrix));
        Assert.Equal((1, -3), (fault.Unknown, fault.Pivot));
    }

    [Fact]
    public void A_system_that_is_held_nowhere_is_refused()
    {
        // Springs between neighbours of a 12 × 12 grid, none to the ground: any constant is a solution.
        var matrix = new SparseSymmetric(Matrices.Grid(12).Pattern);
        for (var i = 0; i < 144; i++)
        {
            foreach (var j in new[] { i % 12 < 11 ? i + 1 : -1, i + 12 })
            {
                if (j is >= 0 and < 144)
                {
                    matrix.Add([i, j], [1 / 3.0, -1 / 3.0, -1 / 3.0, 1 / 3.0]);
                }
            }
        }

        Assert.Throws<NotPositiveDefiniteException>(
            () => SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern, MinimumDegree.Order(matrix.Pattern)), matrix));
    }

    [Fact]
    public void A_value_that_is_no_number_is_refused()
    {
        var matrix = Matrices.Grid(5);
        matrix.Values[3] = double.NaN;
        Assert.Throws<NotPositiveDefiniteException>(
            () => SparseCholesky.Factor(SymbolicCholesky.Of(matrix.Pattern), matrix));
    }

    private static double[] Side(int size) => [.. Enumerable.Range(0, size).Select(i => Math.Sin(1 + 3.7 * i))];
}
