using MeshSection.Dxf.Selection;

namespace MeshSection.Cli.Tables;

/// <summary>Says why entities were left out.</summary>
internal static class LeftOutWords
{
    /// <summary>A few words; empty for what was used.</summary>
    public static string Of(LeftOutReason reason) => reason switch
    {
        LeftOutReason.None => "",
        LeftOutReason.Annotation => "never bounds a section",
        LeftOutReason.KindNotRead => "kind not read: explode it, or convert it to a polyline",
        LeftOutReason.LayerNotAsked => "layer not asked for",
        LeftOutReason.LayerOff => "layer is off",
        LeftOutReason.LayerFrozen => "layer is frozen",
        LeftOutReason.LayerNotPlotted => "layer is not plotted",
        LeftOutReason.PaperSpace => "on a layout sheet",
        LeftOutReason.Invisible => "marked invisible",
        LeftOutReason.LayerIgnored => "layer ignored, as asked for",
        LeftOutReason.ColourNotAsked => "colour not asked for",
        LeftOutReason.FillBesideLines => "fill beside the lines that bound it",
        LeftOutReason.NoBar => "neither circle nor point, on a layer of bars",
        LeftOutReason.BlockMissing => "its block is not in the file",
        _ => throw new ArgumentOutOfRangeException(nameof(reason)),
    };
}
