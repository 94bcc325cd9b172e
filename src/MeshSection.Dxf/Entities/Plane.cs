using System.Runtime.InteropServices;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Entities;

/// <summary>
/// The plane that a flat entity is stated in, parallel to the drawing's and seen from above or from below. By the
/// arbitrary axis rule of the DXF reference the x axis of a plane seen from below runs against the drawing's.
/// </summary>
/// <param name="IsMirrored">True if its normal points down.</param>
internal readonly record struct Plane(bool IsMirrored)
{
    /// <summary>The greatest slope of what still counts as parallel to the drawing's plane.</summary>
    public const double Flatness = 1e-9;

    /// <summary>The plane with a normal; null if it is tilted.</summary>
    public static Plane? Of((double X, double Y, double Z) normal) =>
        double.Hypot(normal.X, normal.Y) > Flatness * Math.Abs(normal.Z) || normal.Z == 0
            ? null
            : new Plane(normal.Z < 0);

    public double Height(double z) => IsMirrored ? -z : z;

    public Point Map(Point p) => IsMirrored ? p with { X = -p.X } : p;

    public ArcEntity Arc(EntitySource source, double height, Point centre, double radius, double start, double end) =>
        IsMirrored
            ? new ArcEntity(source, height, Map(centre), radius, 180 - end, 180 - start)
            : new ArcEntity(source, height, centre, radius, start, end);

    public PolylineEntity Polyline(EntitySource source, double height, List<PolylineVertex> vertices, bool isClosed)
    {
        var mapped = new PolylineVertex[vertices.Count];
        for (var i = 0; i < mapped.Length; i++)
        {
            var bulge = vertices[i].Bulge;
            mapped[i] = new PolylineVertex(Map(vertices[i].Point), IsMirrored ? -bulge : bulge);
        }

        return new PolylineEntity(source, height, ImmutableCollectionsMarshal.AsImmutableArray(mapped), isClosed);
    }
}
