using OxyPlot;

namespace MeshSection.Plots.Drawing;

/// <summary>
/// Few and calm colours. The three accents keep apart for every kind of colour vision, and none is the only sign of
/// what it marks, so that a grey print says the same.
/// </summary>
internal static class Palette
{
    public static readonly OxyColor Paper = OxyColors.White;
    public static readonly OxyColor Ink = OxyColor.FromRgb(0x1D, 0x27, 0x33);
    public static readonly OxyColor Quiet = OxyColor.FromRgb(0x5B, 0x67, 0x75);
    public static readonly OxyColor Rule = OxyColor.FromRgb(0xC3, 0xCB, 0xD4);
    public static readonly OxyColor MeshLine = OxyColor.FromRgb(0x8C, 0xA0, 0xB3);
    public static readonly OxyColor Blue = OxyColor.FromRgb(0x00, 0x5F, 0x99);
    public static readonly OxyColor Orange = OxyColor.FromRgb(0xC2, 0x4E, 0x00);
    public static readonly OxyColor Green = OxyColor.FromRgb(0x00, 0x7A, 0x5E);

    private static readonly OxyColor[] Tints =
    [
        OxyColor.FromRgb(0xE3, 0xEA, 0xF1),
        OxyColor.FromRgb(0xF2, 0xE8, 0xD5),
        OxyColor.FromRgb(0xDD, 0xEC, 0xE4),
        OxyColor.FromRgb(0xEB, 0xE2, 0xEF),
    ];

    /// <summary>The light fill of a region.</summary>
    public static OxyColor Tint(int region) => Tints[region % Tints.Length];
}
