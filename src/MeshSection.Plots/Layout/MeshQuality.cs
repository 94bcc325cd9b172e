using MeshSection.Meshing;

namespace MeshSection.Plots.Layout;

/// <summary>The extremes of a mesh.</summary>
/// <param name="LeastAngle">Smallest angle of any triangle, degrees.</param>
/// <param name="GreatestAngle">Largest angle of any triangle, degrees.</param>
/// <param name="Sharpest">The first triangle that has the smallest angle.</param>
/// <param name="LeastArea">Area of the smallest triangle, mm².</param>
/// <param name="GreatestArea">Area of the largest triangle, mm².</param>
internal sealed record MeshQuality(
    double LeastAngle, double GreatestAngle, int Sharpest, double LeastArea, double GreatestArea)
{
    public static MeshQuality Of(Mesh mesh)
    {
        var (least, greatest) = (double.PositiveInfinity, 0.0);
        var (smallest, largest) = (double.PositiveInfinity, 0.0);
        var sharpest = 0;
        for (var i = 0; i < mesh.Corners.Length; i++)
        {
            var t = i / 3;
            var corner = mesh.Nodes[mesh.Corners[i]];
            var next = mesh.Nodes[mesh.Corners[3 * t + (i + 1) % 3]] - corner;
            var last = mesh.Nodes[mesh.Corners[3 * t + (i + 2) % 3]] - corner;
            var angle = Math.Atan2(next.Cross(last), next.Dot(last)) * 180 / Math.PI;
            if (angle < least)
            {
                (least, sharpest) = (angle, t);
            }

            var area = 0.5 * next.Cross(last);
            greatest = Math.Max(greatest, angle);
            smallest = Math.Min(smallest, area);
            largest = Math.Max(largest, area);
        }

        return new MeshQuality(least, greatest, sharpest, smallest, largest);
    }
}
