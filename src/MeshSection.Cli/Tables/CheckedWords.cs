using MeshSection.Properties;

namespace MeshSection.Cli.Tables;

/// <summary>Names the quantities that are computed twice.</summary>
internal static class CheckedWords
{
    /// <summary>A few words.</summary>
    public static string Of(CheckedQuantity quantity) => quantity switch
    {
        CheckedQuantity.Area => "area",
        CheckedQuantity.CentroidX => "centroid x",
        CheckedQuantity.CentroidY => "centroid y",
        CheckedQuantity.SecondMomentX => "Ix",
        CheckedQuantity.SecondMomentY => "Iy",
        CheckedQuantity.SecondMomentXY => "Ixy",
        CheckedQuantity.PlasticModulusX => "plastic modulus about x",
        CheckedQuantity.PlasticModulusY => "plastic modulus about y",
        CheckedQuantity.PlasticModulus1 => "plastic modulus about 1",
        CheckedQuantity.PlasticModulus2 => "plastic modulus about 2",
        _ => throw new ArgumentOutOfRangeException(nameof(quantity)),
    };
}
