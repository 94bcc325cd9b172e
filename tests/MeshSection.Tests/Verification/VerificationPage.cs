using System.Globalization;
using System.Text;

namespace MeshSection.Tests.Verification;

/// <summary>Writes docs/verification.md from the checks themselves.</summary>
internal static class VerificationPage
{
    // Below this an error is rounding, of the published figure or of ours, and differs from one processor to the next.
    private const double Rounding = 1e-9;

    private const string Opening =
        """
        # Verification

        Written by the tests from their own data; not edited by hand. Every figure was computed by the way that the
        command goes: outline, flattening, mesh, both integrators. The error is relative to the expected figure; `allowed`
        is what the test accepts: a billionth for a closed form, half a unit in the last printed place for a table.
        `basis` says how the expected figure is known: a closed form, a published table, or a table recalled from memory
        of which every figure was computed again.

        To write this page anew: `MESHSECTION_WRITE=1 dotnet test --project tests/MeshSection.Tests -c Release`.

        """;

    public static string Text(IEnumerable<PublishedCase> cases)
    {
        var page = new StringBuilder(Opening.ReplaceLineEndings("\n"));
        foreach (var published in cases)
        {
            page.Append(CultureInfo.InvariantCulture, $"\n## {published.Title}\n\nSource: {published.Source}. ");
            page.Append(CultureInfo.InvariantCulture, $"Basis: {published.Basis}.");
            page.Append(published.Note is null ? "\n\n" : $" Note: {published.Note}.\n\n");
            page.Append("| quantity | expected | computed | unit | error | allowed |\n|---|---:|---:|---|---:|---:|\n");
            var computed = Pipeline.Properties(PublishedSections.Outline(published.Id));
            foreach (var quantity in published.Quantities)
            {
                page.Append(Row(quantity, Quantities.Of(computed, quantity.Quantity, quantity.Unit)));
            }
        }

        return page.ToString();
    }

    private static string Row(PublishedQuantity quantity, double value)
    {
        var error = Math.Abs(value - quantity.Value) / Math.Abs(quantity.Value);
        var notes = new[] { quantity.Basis, quantity.Note }.OfType<string>().ToArray();
        var name = notes.Length == 0 ? quantity.Quantity : $"{quantity.Quantity} ({string.Join("; ", notes)})";
        return string.Create(
            CultureInfo.InvariantCulture,
            $"| {name} | {quantity.Printed ?? Digits(quantity.Value)} | {Digits(value)} | {quantity.Unit} " +
            $"| {(error < Rounding ? "< 1e-9" : error.ToString("0e-0", CultureInfo.InvariantCulture))} " +
            $"| {(quantity.Tolerance / Math.Abs(quantity.Value)).ToString("0e-0", CultureInfo.InvariantCulture)} |\n");
    }

    private static string Digits(double value) => value.ToString("G7", CultureInfo.InvariantCulture);
}
