using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>
/// The strip of a region that one edge of its boundary sweeps when it moves straight inward. Along is measured in the
/// edge's direction from its beginning, height at right angles to it into the region.
/// </summary>
internal sealed class WallStrip(Mesh mesh, PlanarGraph graph)
{
    /// <summary>
    /// Of two faces of a wall, the cosine of the angle between their inward normals: at least 150 degrees, so that walls may
    /// taper by 30, and rounded ends look little thinner than they are.
    /// </summary>
    private const double FacingCosine = -0.8660254037844386;

    /// <summary>The part of a length that may be rounding.</summary>
    private const double Rounding = 1e-9;

    private readonly int[] visits = new int[mesh.TriangleCount];
    private readonly List<int> pending = [];
    private readonly List<int> triangles = [];
    private readonly double[] alongs = new double[3];
    private readonly double[] heights = new double[3];
    private int visit;
    private Point begin;
    private Point along;
    private double length;
    private int face;

    /// <summary>True if edge e bounds its region: beyond it lies nothing, or another region.</summary>
    public bool IsFace(int e) =>
        mesh.Segments[e] >= 0 && (mesh.Neighbours[e] < 0 || mesh.Regions[mesh.Neighbours[e]] != mesh.Regions[e / 3]);

    /// <summary>The least height at which a facing boundary lies above edge e; the limit if none lies lower.</summary>
    public double Thickness(int e, double limit = double.PositiveInfinity)
    {
        Enter(e);
        return SweepToWall(limit, out _);
    }

    /// <summary>The triangles over edge e up to a height; valid until the next call.</summary>
    public IReadOnlyList<int> Triangles(int e, double height)
    {
        Enter(e);
        Sweep(height);
        return triangles;
    }

    /// <summary>The wall over edge e, where it is thinnest.</summary>
    public Wall WallAt(int e)
    {
        Enter(e);
        double thickness = SweepToWall(double.PositiveInfinity, out double place);
        Sweep(thickness);
        double elements = Math.Max(1, Math.Ceiling((1 - Rounding) * thickness / triangles.Max(LongestSide)));
        Point from = begin + place * along;
        return new Wall(thickness, from, from + thickness * along.Left(), (int)elements);
    }

    /// <summary>The longest side of triangle t, mm.</summary>
    public double LongestSide(int t) => TriangleShape.LongestSide(
        mesh.Nodes[mesh.Corners[3 * t]], mesh.Nodes[mesh.Corners[3 * t + 1]], mesh.Nodes[mesh.Corners[3 * t + 2]]);

    private void Enter(int e)
    {
        face = e;
        begin = mesh.Nodes[MeshEdge.From(mesh, e)];
        Point chord = mesh.Nodes[MeshEdge.To(mesh, e)] - begin;
        length = chord.Length;
        along = chord / length;
    }

    /// <summary>Collects the triangles of the strip up to a height.</summary>
    private void Sweep(double limit)
    {
        Begin();
        while (Next(out int t))
        {
            triangles.Add(t);
            for (int k = 0; k < 3; k++)
            {
                int e = 3 * t + k;
                if (!IsFace(e) && IsOver(k, out double height, out _) && height < limit) Visit(mesh.Neighbours[e]);
            }
        }
    }

    /// <summary>The least height of a facing boundary, and its place, without a look at what lies higher.</summary>
    private double SweepToWall(double limit, out double place)
    {
        double lowest = limit;
        place = 0;
        Begin();
        while (Next(out int t))
        {
            for (int k = 0; k < 3; k++)
            {
                int e = 3 * t + k;
                if (e == face || !IsOver(k, out double height, out double at) || height >= lowest) continue;
                if (!IsFace(e)) Visit(mesh.Neighbours[e]);
                else if (height > 0 && IsAcross(e)) (lowest, place) = (height, at);
            }
        }
        return lowest;
    }

    private void Begin()
    {
        visit++;
        triangles.Clear();
        pending.Clear();
        Visit(face / 3);
    }

    /// <summary>Takes the next triangle of the strip, and finds where its corners lie in it.</summary>
    private bool Next(out int t)
    {
        t = -1;
        if (pending.Count == 0) return false;
        t = pending[^1];
        pending.RemoveAt(pending.Count - 1);
        for (int k = 0; k < 3; k++)
        {
            Point p = mesh.Nodes[mesh.Corners[3 * t + k]] - begin;
            alongs[k] = along.Dot(p);
            heights[k] = along.Cross(p);
        }
        return true;
    }

    private void Visit(int t)
    {
        if (visits[t] == visit) return;
        visits[t] = visit;
        pending.Add(t);
    }

    /// <summary>
    /// The lowest point of the part that lies in the strip of the edge opposite corner k of the triangle taken; false if
    /// none does.
    /// </summary>
    private bool IsOver(int k, out double height, out double at)
    {
        int from = k == 2 ? 0 : k + 1;
        int to = k == 0 ? 2 : k - 1;
        (double s0, double h0, double s1, double h1) = (alongs[from], heights[from], alongs[to], heights[to]);
        double first = Math.Max(0, Math.Min(s0, s1));
        double last = Math.Min(length, Math.Max(s0, s1));
        (height, at) = (0, 0);
        if (!(last - first > Rounding * length)) return false;
        double atFirst = h0 + (first - s0) / (s1 - s0) * (h1 - h0);
        double atLast = h0 + (last - s0) / (s1 - s0) * (h1 - h0);
        (height, at) = atFirst <= atLast ? (atFirst, first) : (atLast, last);
        return true;
    }

    /// <summary>Whether edge e is the other face of the wall: turned against it, and on no segment that meets its own.</summary>
    private bool IsAcross(int e)
    {
        Point chord = mesh.Nodes[MeshEdge.To(mesh, e)] - mesh.Nodes[MeshEdge.From(mesh, e)];
        if (chord.Dot(along) > FacingCosine * chord.Length) return false;
        Segment own = graph.Segments[mesh.Segments[face]];
        Segment other = graph.Segments[mesh.Segments[e]];
        return own.From != other.From && own.From != other.To && own.To != other.From && own.To != other.To;
    }
}
