using System.Runtime.CompilerServices;
using MeshSection.Geometry;

namespace MeshSection.Sections.Shapes;

/// <summary>A corner of a polygon, to be rounded with a radius.</summary>
internal readonly record struct Corner
{
    public Corner(double x, double y, double radius = 0, [CallerArgumentExpression(nameof(radius))] string radiusName = "")
    {
        Place = new Point(x, y);
        Radius = radius;
        RadiusName = radiusName;
    }

    /// <summary>Where the corner would be if it were sharp.</summary>
    public Point Place { get; }

    /// <summary>0 for a sharp corner.</summary>
    public double Radius { get; }

    /// <summary>The dimension that a radius too large is reported as.</summary>
    public string RadiusName { get; }
}
