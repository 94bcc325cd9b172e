namespace MeshSection.Tests.Verification;

public class PublishedTorsionTests
{
    public static TheoryData<string> Ids => [.. PublishedCase.Torsion.Select(c => c.Id)];

    [Theory]
    [MemberData(nameof(Ids))]
    public void Published_values_of_torsion_and_shear_are_met(string id)
    {
        var published = PublishedCase.Torsion.Single(c => c.Id == id);
        var computed = PublishedTorsionSections.Compute(id);
        Assert.All(published.Quantities, quantity =>
        {
            var value = PublishedTorsionSections.Value(computed, quantity.Quantity, quantity.Unit);
            Assert.True(
                Math.Abs(value - quantity.Value) <= quantity.Tolerance,
                $"{quantity.Quantity}: expected {quantity.Value} ± {quantity.Tolerance} {quantity.Unit}, computed {value}");
        });
    }
}
