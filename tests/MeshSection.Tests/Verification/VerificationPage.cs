using System.Globalization;
using System.Text;
using MeshSection.Integration;

namespace MeshSection.Tests.Verification;

/// <summary>Writes docs/verification.md from the checks themselves.</summary>
internal static class VerificationPage
{
    // Below this an error is rounding, of the published figure or of ours, and differs from one processor to the next.
    private const double Rounding = 1e-9;

    private const string Head = "| quantity | expected | computed | unit | error | allowed |\n|---|---:|---:|---|---:|---:|\n";

    private const string Opening =
        """
        # Verification

        Written by the tests from their own data; not edited by hand. Every figure was computed by the way that the
        command goes: outline, flattening, mesh, both integrators. The error is relative to the expected figure; `allowed`
        is what the test accepts: a billionth for a closed form of an area property, half a unit in the last printed place
        for a table, and where a table rests on other assumptions a wider one with the reason. `basis` says how the
        expected figure is known: a closed form, a published table, a worked example, or a table recalled from memory of
        which every figure was computed again.

        To write this page anew: `MESHSECTION_WRITE=1 dotnet test --project tests/MeshSection.Tests -c Release`.

        - [Area properties](#area-properties)
        - [Torsion, warping and shear](#torsion-warping-and-shear)
        - [A general-purpose geometry library](#a-general-purpose-geometry-library)

        """;

    private const string TorsionOpening =
        """

        ## Torsion, warping and shear
        On meshes of about 1000 triangles. The torsion constant is the mean of its two bounds, so a part of the error is half of
        their distance, which the command prints with every result.

        """;

    private const string OutsideOpening =
        """

        ## A general-purpose geometry library
        Area and centroid of the polygon of the mesh's chords. Source of the expected figures: NetTopologySuite 2.6.0, `Area` and
        `Centroid`, at the time of the test. Computed: by the fibers. The error of a centroid is relative to the section's
        diagonal.


        """;

    public static string Text()
    {
        var page = new StringBuilder(Opening.ReplaceLineEndings("\n"));
        page.Append("\n## Area properties\n");
        foreach (var published in PublishedCase.All)
        {
            var computed = Pipeline.Properties(PublishedSections.Outline(published.Id));
            Case(page, published, q => Quantities.Of(computed, q.Quantity, q.Unit), digits: 7);
        }

        page.Append(TorsionOpening.ReplaceLineEndings("\n"));
        foreach (var published in PublishedCase.Torsion)
        {
            var computed = PublishedTorsionSections.Compute(published.Id);
            Case(page, published, q => PublishedTorsionSections.Value(computed, q.Quantity, q.Unit), digits: 6);
        }

        page.Append(OutsideOpening.ReplaceLineEndings("\n"));
        page.Append("| section | quantity | expected | computed | unit | error | allowed |\n|---|---|---:|---:|---|---:|---:|\n");
        foreach (var id in new[] { "geo-hollow-circle", "geo-fillet", "rs-upe200", "rs-l150x90x10", "rs-rhs200x100x8", "rs-hss6x4x1-4" })
        {
            Outside(page, PublishedCase.All.Single(c => c.Id == id));
        }

        return page.ToString();
    }

    private static void Case(StringBuilder page, PublishedCase published, Func<PublishedQuantity, double> compute, int digits)
    {
        page.Append(CultureInfo.InvariantCulture, $"\n### {published.Title}\n\nSource: {published.Source}. Basis: {published.Basis}.");
        page.Append(published.Note is null ? "\n\n" : $" Note: {published.Note.TrimEnd('.')}.\n\n").Append(Head);
        foreach (var quantity in published.Quantities)
        {
            var notes = new[] { quantity.Basis, quantity.Note }.OfType<string>().ToArray();
            var name = notes.Length == 0 ? quantity.Quantity : $"{quantity.Quantity} ({string.Join("; ", notes)})";
            var value = compute(quantity);
            page.Append(CultureInfo.InvariantCulture, $"| {name} | {quantity.Printed ?? Digits(quantity.Value, digits)} | {Digits(value, digits)} ");
            page.Append(CultureInfo.InvariantCulture, $"| {quantity.Unit} | {Error(value - quantity.Value, quantity.Value)} ");
            page.Append(CultureInfo.InvariantCulture, $"| {Small(quantity.Tolerance / Scale(quantity.Value))} |\n");
        }
    }

    private static void Outside(StringBuilder page, PublishedCase published)
    {
        var (flat, mesh) = Pipeline.Mesh(PublishedSections.Outline(published.Id));
        var outside = OutsidePolygons.Of(flat);
        var about = flat.Outline.Bounds.Centre;
        var ours = new FiberIntegrator(mesh).Moments(about);
        var (centroid, size) = (about + ours.Centroid, flat.Outline.Bounds.Diagonal);
        Row("area", outside.Area, ours.Area, "mm²", ours.Area);
        Row("centroid.x", outside.Centroid.X, centroid.X, "mm", size);
        Row("centroid.y", outside.Centroid.Y, centroid.Y, "mm", size);

        void Row(string name, double expected, double value, string unit, double scale) => page.Append(
            CultureInfo.InvariantCulture,
            $"| {published.Title} | {name} | {Near(expected, size)} | {Near(value, size)} | {unit} | {Error(value - expected, scale)} | 1e-12 |\n");
    }

    // A zero is the scale of its own error: an absolute one.
    private static double Scale(double expected) => expected == 0 ? 1 : Math.Abs(expected);

    private static string Error(double difference, double expected)
    {
        var error = Math.Abs(difference) / Scale(expected);
        return error < Rounding ? "< 1e-9" : Small(error);
    }

    private static string Small(double value) => value.ToString("0e-0", CultureInfo.InvariantCulture);

    private static string Near(double value, double size) => Digits(Math.Abs(value) < Rounding * size ? 0 : value, 7);

    private static string Digits(double value, int count) =>
        value.ToString("G" + count.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
}
