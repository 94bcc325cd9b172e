using CsCheck;
using MeshSection.LinearAlgebra;

namespace MeshSection.Tests.LinearAlgebra;

public class OrderingTests
{
    [Fact]
    public void The_order_holds_every_unknown_once() => Matrices.PositiveDefinite.Sample(
        matrix => Assert.Equal(
            Enumerable.Range(0, matrix.Pattern.Size), MinimumDegree.Order(matrix.Pattern).Order()),
        iter: 300);

    [Fact]
    public void The_supernodes_hold_the_whole_factor() => Matrices.PositiveDefinite.Sample(
        matrix =>
        {
            var symbolic = SymbolicCholesky.Of(matrix.Pattern, MinimumDegree.Order(matrix.Pattern));
            var filled = DenseReference.FactorPattern(matrix.Pattern, symbolic.Order);
            var nodes = symbolic.Supernodes;
            for (var s = 0; s < nodes.Count; s++)
            {
                var rows = nodes.RowsOf(s).ToArray();
                Assert.Equal(rows.Order(), rows);
                for (var j = nodes.FirstColumns[s]; j < nodes.FirstColumns[s + 1]; j++)
                {
                    var column = Enumerable.Range(j, matrix.Pattern.Size - j).Where(i => filled[i, j]);
                    Assert.Empty(column.Except(rows));
                }
            }
        },
        iter: 100);

    [Fact]
    public void Column_counts_are_those_of_the_eliminated_graph() => Matrices.PositiveDefinite.Sample(
        matrix =>
        {
            var symbolic = SymbolicCholesky.Of(matrix.Pattern);
            var n = matrix.Pattern.Size;
            var filled = DenseReference.FactorPattern(matrix.Pattern, symbolic.Order);
            var expected = Enumerable.Range(0, n).Select(j => Enumerable.Range(j, n - j).Count(i => filled[i, j]));
            var parents = Enumerable.Range(0, n)
                .Select(j => Enumerable.Range(j + 1, n - j - 1).FirstOrDefault(i => filled[i, j], -1)).ToArray();
            Assert.Equal(expected, EliminationTree.ColumnCounts(parents, symbolic.Starts, symbolic.Rows));
        },
        iter: 100);

    [Fact]
    public void A_star_is_eliminated_from_its_rays()
    {
        // The hub first would fill everything; from the rays, nothing fills.
        var pairs = Enumerable.Range(1, 50).SelectMany(i => new[] { 0, i }).ToArray();
        var pattern = SymmetricPattern.OfElements(pairs, 2, 51);
        var order = MinimumDegree.Order(pattern);
        Assert.Equal(51 + 50, Entries(pattern, order));
        Assert.Equal(51 * 52 / 2, Entries(pattern, [.. Enumerable.Range(0, 51)]));
    }

    [Fact]
    public void A_grid_keeps_little_fill()
    {
        // Row by row, n = 30 · 30 unknowns fill a band of about 30³ entries; a good order grows as n log₂ n = 8,800.
        var pattern = Matrices.Grid(30).Pattern;
        Assert.InRange(Entries(pattern, MinimumDegree.Order(pattern)), 900, 11_000);
        Assert.InRange(Entries(pattern, [.. Enumerable.Range(0, 900)]), 25_000, 30_000);
    }

    [Fact]
    public void Unknowns_that_stand_twice_in_an_element_are_summed()
    {
        var matrix = new SparseSymmetric(SymmetricPattern.OfElements([1, -1, 1, 0], 4, 2));
        matrix.Add([1, -1, 1, 0], [1, 2, 3, 4, 2, 5, 6, 7, 3, 6, 8, 9, 4, 7, 9, 10]);
        var dense = DenseReference.Of(matrix);
        Assert.Equal((10, 4 + 9, 1 + 3 + 3 + 8), (dense[0, 0], dense[1, 0], dense[1, 1]));
    }

    private static int Entries(SymmetricPattern pattern, int[] order)
    {
        var filled = DenseReference.FactorPattern(pattern, order);
        return filled.Cast<bool>().Count(entry => entry);
    }
}
