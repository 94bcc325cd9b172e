using CsCheck;
using MeshSection.Geometry;

namespace MeshSection.Tests.Geometry;

public class BernsteinTests
{
    [Fact]
    public void Roots_of_a_product_of_factors_are_found_apart() =>
        Gen.Double[0.001, 0.999].Array[1, 7].Where(roots => roots.Order().Zip(roots.Order().Skip(1)).All(p => p.Second - p.First > 0.01))
            .Sample(roots =>
            {
                double[] product = [1];
                foreach (var root in roots)
                {
                    product = Bernstein.Product(product, [-root, 1 - root]);
                }

                var found = Bernstein.SignChanges(product);
                Assert.Equal(roots.Length, found.Count);
                foreach (var (expected, actual) in roots.Order().Zip(found))
                {
                    Assert.Equal(expected, actual, 1e-8);
                }
            });

    [Theory]
    [InlineData(new double[] { 1, -1, 1 }, 0)]                                // (1 - 2t)²: touches zero, stays positive
    [InlineData(new double[] { 1, -1, 1, -1 }, 1)]                            // (1 - 2t)³
    [InlineData(new double[] { 0, 1, 1 }, 0)]                                 // zero at the end only
    [InlineData(new double[] { 0, 0, 0 }, 0)]
    [InlineData(new double[] { -1, 0, 1 }, 1)]                                // zero exactly in the middle
    [InlineData(new double[] { 3, 2, 1 }, 0)]
    public void Only_changes_of_sign_inside_count(double[] coefficients, int count)
    {
        var roots = Bernstein.SignChanges(coefficients);
        Assert.Equal(count, roots.Count);
        Assert.All(roots, t => Assert.Equal(0.5, t, 1e-5));
    }

    [Fact]
    public void Split_derivative_and_product_are_what_they_say() =>
        Gen.Select(Gen.Double[-9, 9].Array[2, 8], Gen.Double[-9, 9].Array[1, 8], Gen.Double[0.1, 0.9], Gen.Double[0.1, 0.9]).Sample(
            (a, b, at, t) =>
            {
                var (left, right) = Bernstein.Split(a, at);
                Assert.Equal(Bernstein.Value(a, at * t), Bernstein.Value(left, t), 1e-12);
                Assert.Equal(Bernstein.Value(a, at + (1 - at) * t), Bernstein.Value(right, t), 1e-12);
                Assert.Equal(Bernstein.Value(a, t) * Bernstein.Value(b, t), Bernstein.Value(Bernstein.Product(a, b), t), 1e-11);
                const double Step = 1e-6;
                var slope = (Bernstein.Value(a, t + Step) - Bernstein.Value(a, t - Step)) / (2 * Step);
                Assert.Equal(slope, Bernstein.Value(Bernstein.Derivative(a), t), 1e-6);
            });
}
