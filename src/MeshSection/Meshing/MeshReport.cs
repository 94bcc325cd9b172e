using System.Collections.Immutable;
using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>What there is to say of a mesh.</summary>
/// <param name="Quality">Counts, angles and sizes.</param>
/// <param name="Regions">Each region, by its number.</param>
/// <param name="InputAngles">Angles of the outline itself below the smallest angle asked for: the mesh has to keep them.</param>
/// <param name="ThinnestWall">The thinnest wall and how many elements lie across it; null if no boundaries face each other.</param>
/// <param name="MaxSag">The greatest distance of any chord from its curve, mm.</param>
/// <param name="KeptPoints">Points off the outline that the mesh was to keep, ends of lines included, mm.</param>
public sealed record MeshReport(
    MeshQuality Quality,
    ImmutableArray<MeshRegion> Regions,
    ImmutableArray<InputAngle> InputAngles,
    Wall? ThinnestWall,
    double MaxSag,
    ImmutableArray<Point> KeptPoints)
{
    /// <summary>Reports on a mesh.</summary>
    /// <param name="flat">The flattened outline.</param>
    /// <param name="mesh">A mesh of its graph.</param>
    /// <param name="minAngle">The smallest angle that was asked for, degrees.</param>
    public static MeshReport Of(FlatOutline flat, Mesh mesh, double minAngle)
    {
        ArgumentNullException.ThrowIfNull(flat);
        ArgumentNullException.ThrowIfNull(mesh);
        return new MeshReport(
            MeshQuality.Of(mesh),
            MeshRegion.Of(mesh),
            Meshing.InputAngles.Below(flat.Graph, minAngle),
            WallSurvey.Thinnest(mesh, flat.Graph),
            flat.MaxSag,
            flat.Graph.Points[flat.Chords.Length..]);
    }
}
