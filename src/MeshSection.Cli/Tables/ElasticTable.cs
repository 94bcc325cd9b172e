using MeshSection.Properties;
using Spectre.Console;

namespace MeshSection.Cli.Tables;

/// <summary>
/// The elastic section moduli, two for each axis, with the governing one marked. On a narrow terminal the distances
/// get a table of their own.
/// </summary>
internal static class ElasticTable
{
    private const int LeastWidthForAll = 70;

    /// <summary>Writes the table.</summary>
    public static void Write(IAnsiConsole console, SectionProperties p, Lengths lengths, double size)
    {
        const string Moduli = "Elastic moduli";
        if (console.Profile.Width >= LeastWidthForAll)
        {
            var table = TableStyle.Columns(Moduli, lengths.Symbol(3), "", "distance " + lengths.Symbol(), "at (x, y)").KeepWhole(1, 2, 3);
            foreach (var side in Sides(p))
            {
                table.AddRow(side.Name, Modulus(side), side.Verdict, Distance(side), Place(side));
            }

            console.Write(table);
        }
        else
        {
            var table = TableStyle.Columns(Moduli, lengths.Symbol(3), "").KeepWhole(1, 2);
            var places = TableStyle.Columns("Extreme fibres", "distance " + lengths.Symbol(), "at (x, y)").KeepWhole(1);
            foreach (var side in Sides(p))
            {
                table.AddRow(side.Name, Modulus(side), side.Verdict);
                places.AddRow(side.Name, Distance(side), Place(side));
            }

            console.Write(table);
            console.Write(places);
        }

        console.WriteLine("  Each side of an axis has a modulus of its own; the smaller governs.");

        string Modulus(Side side) => lengths.Of(side.Fibre.Modulus, 3);
        string Distance(Side side) => lengths.Of(side.Fibre.Distance);
        string Place(Side side) => lengths.Of(side.Fibre.Point, size);
    }

    private static IEnumerable<Side> Sides(SectionProperties p) =>
    [
        new("x, top", p.ElasticX, p.ElasticX.Positive),
        new("x, bottom", p.ElasticX, p.ElasticX.Negative),
        new("y, right", p.ElasticY, p.ElasticY.Positive),
        new("y, left", p.ElasticY, p.ElasticY.Negative),
        new("1, side +2", p.Elastic1, p.Elastic1.Positive),
        new("1, side -2", p.Elastic1, p.Elastic1.Negative),
        new("2, side +1", p.Elastic2, p.Elastic2.Positive),
        new("2, side -1", p.Elastic2, p.Elastic2.Negative),
    ];

    private sealed record Side(string Name, ExtremeFibres Both, ExtremeFibre Fibre)
    {
        public string Verdict =>
            Both.PositiveGoverns && Both.NegativeGoverns ? "both equal"
            : Fibre == Both.Governing ? "◄ governs"
            : "";
    }
}
