using System.Globalization;
using System.Text;

namespace MeshSection.Cli.Tests;

/// <summary>Writes small drawings as text.</summary>
internal static class DxfText
{
    public static string Drawing(string entities, int? unit = 4)
    {
        var header = unit is { } code
            ? $"0\nSECTION\n2\nHEADER\n9\n$INSUNITS\n70\n{code}\n0\nENDSEC\n"
            : "";
        return $"{header}0\nSECTION\n2\nENTITIES\n{entities}0\nENDSEC\n0\nEOF\n";
    }

    public static string Line(double x0, double y0, double x1, double y1, string handle = "A1", string layer = "FRAME") =>
        string.Create(
            CultureInfo.InvariantCulture,
            $"0\nLINE\n5\n{handle}\n8\n{layer}\n10\n{x0}\n20\n{y0}\n11\n{x1}\n21\n{y1}\n");

    public static string Circle(double x, double y, double radius, string handle = "C1", string layer = "FRAME") =>
        string.Create(CultureInfo.InvariantCulture, $"0\nCIRCLE\n5\n{handle}\n8\n{layer}\n10\n{x}\n20\n{y}\n40\n{radius}\n");

    public static string Polyline(string handle, params ReadOnlySpan<(double X, double Y)> corners)
    {
        var text = new StringBuilder($"0\nLWPOLYLINE\n5\n{handle}\n8\nFRAME\n90\n{corners.Length}\n70\n1\n");
        foreach (var (x, y) in corners)
        {
            text.Append(CultureInfo.InvariantCulture, $"10\n{x}\n20\n{y}\n");
        }

        return text.ToString();
    }

    public static string Square(double x, double y, double side, string handle = "B1") =>
        Polyline(handle, (x, y), (x + side, y), (x + side, y + side), (x, y + side));
}
