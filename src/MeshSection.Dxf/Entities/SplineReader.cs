namespace MeshSection.Dxf.Entities;

/// <summary>Makes a spline of the values of a SPLINE entity.</summary>
internal static class SplineReader
{
    // Bits of group 70.
    private const int IsClosed = 1;
    private const int IsPeriodic = 2;

    public static Spline Read(EntityFields fields)
    {
        var controls = fields.SpacePoints(10);
        var fitPoints = fields.SpacePoints(11);
        var isClosed = (fields.Flags & (IsClosed | IsPeriodic)) != 0;
        if (controls.Count == 0 && fitPoints.Count == 0)
        {
            throw fields.Missing(10, "control points");
        }

        return SplineCheck.Mended(
            fields.Source,
            (int)(fields.Number(71) ?? 3),
            fields.Numbers(40),
            controls,
            fields.Numbers(41),
            fitPoints,
            fields.Number(12) is null ? null : fields.SpacePoint(12, "start tangent"),
            fields.Number(13) is null ? null : fields.SpacePoint(13, "end tangent"),
            isClosed,
            fields.IsLast);
    }
}
