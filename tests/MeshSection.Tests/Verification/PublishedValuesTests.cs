namespace MeshSection.Tests.Verification;

public class PublishedValuesTests
{
    public static TheoryData<string> Ids => [.. PublishedCase.All.Select(c => c.Id)];

    [Theory]
    [MemberData(nameof(Ids))]
    public void Published_values_are_met_by_both_integrators(string id)
    {
        var published = PublishedCase.All.Single(c => c.Id == id);
        var computed = Pipeline.Properties(PublishedSections.Outline(id));
        foreach (var quantity in published.Quantities)
        {
            var value = Quantities.Of(computed, quantity.Quantity, quantity.Unit);
            Assert.True(
                Math.Abs(value - quantity.Value) <= quantity.Tolerance,
                $"{quantity.Quantity}: expected {quantity.Value} ± {quantity.Tolerance} {quantity.Unit}, computed {value}");
        }

        Assert.All(computed.CrossChecks, check => Assert.True(check.Difference < 1e-12, $"{check}"));
    }
}
