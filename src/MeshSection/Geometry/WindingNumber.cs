namespace MeshSection.Geometry;

/// <summary>How many times a loop runs around a point.</summary>
internal static class WindingNumber
{
    public static int Of(Boundary loop, Point p) => throw new NotImplementedException();
}
