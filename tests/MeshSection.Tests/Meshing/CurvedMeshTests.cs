using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;
using MeshSection.Sections.Shapes;
using MeshSection.Tests.Torsion;

namespace MeshSection.Tests.Meshing;

public class CurvedMeshTests
{
    private static readonly Dictionary<string, Outline> Outlines = new()
    {
        ["disc"] = Outline.Create(new Circle(100).Boundaries()),
        ["eccentric tube"] = Outline.Create(Solids.Eccentric(50, 20, 20)),
        ["tube of 1"] = Outline.Create(new Tube(100, 1).Boundaries()),
        ["hole just below a face"] = Outline.Create(
            [.. new Rectangle(80, 70).Boundaries(), Boundary.Circle(new Point(0, 40), 29.98)]),
    };

    public static TheoryData<string, double, double> Cases()
    {
        var data = new TheoryData<string, double, double>();
        foreach (string name in Outlines.Keys)
        {
            data.Add(name, 1e-3, 15);
            data.Add(name, 0.5, 30);
            data.Add(name, 5, 60);
        }
        return data;
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void No_triangle_is_turned_inside_out_anywhere(string name, double sag, double turn)
    {
        CurvedMesh curved = Fit(Outlines[name], sag, turn, 200);
        for (int t = 0; t < curved.Mesh.TriangleCount; t++)
        {
            (double least, double greatest) = SecondOrderStretch.Bounds(curved, t);
            Assert.True(least > 0);
            for (int i = 0; i <= 12; i++)
            {
                for (int j = 0; i + j <= 12; j++)
                {
                    double stretch = Stretch(curved, t, i / 12.0, j / 12.0);
                    Assert.InRange(stretch, least * (1 - 1e-9), greatest * (1 + 1e-9));
                }
            }
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Nodes_along_the_outline_lie_on_it_and_those_of_straight_edges_in_the_middle(string name, double sag, double turn)
    {
        Outline outline = Outlines[name];
        CurvedMesh curved = Fit(outline, sag, turn, 200);
        for (int e = 0; e < curved.Curves.Length; e++)
        {
            (int from, int middle, int to) = Edge(curved, e);
            Point a = curved.Nodes[from], m = curved.Nodes[middle], b = curved.Nodes[to];
            if (curved.Curves[e] is not Edge curve)
            {
                Assert.Equal(0, m.DistanceTo(0.5 * (a + b)), 1e-12 * outline.Bounds.Diagonal);
                continue;
            }
            Assert.Equal(a, curve.Start);
            Assert.Equal(b, curve.End);
            Assert.Contains(outline.Boundaries, loop => loop.Boundary.Edges.Any(arc => Gap(arc, m) < 1e-12 * outline.Bounds.Diagonal));
        }
    }

    [Fact]
    public void Neighbours_share_the_node_of_their_edge()
    {
        CurvedMesh curved = Fit(Outlines["eccentric tube"], 0.1, 15, 300);
        Mesh mesh = curved.Mesh;
        var seen = new Dictionary<int, int>();
        for (int e = 0; e < mesh.Neighbours.Length; e++)
        {
            int middle = Edge(curved, e).Middle;
            seen[middle] = seen.GetValueOrDefault(middle) + (mesh.Neighbours[e] < 0 ? 2 : 1);
        }
        Assert.All(seen.Values, uses => Assert.Equal(2, uses));
        Assert.Equal(curved.Nodes.Length - mesh.Nodes.Length, seen.Count);
    }

    [Fact]
    public void The_area_comes_to_the_true_one_with_the_fourth_power_of_the_side()
    {
        double[] errors = [.. Enumerable.Range(0, 3).Select(
            i => 1 - Area(Fit(Outlines["disc"], 10, Math.ScaleB(15, -i), 50)) / (Math.PI * 2500))];
        Assert.InRange(errors[0], 1e-7, 1e-4);
        Assert.InRange(Math.Log2(errors[0] / errors[1]), 3.8, 4.2);
        Assert.InRange(Math.Log2(errors[1] / errors[2]), 3.8, 4.2);
    }

    [Fact]
    public void A_curve_that_cannot_be_followed_keeps_its_chord_and_says_so()
    {
        Outline outline = Outlines["hole just below a face"];
        FlatOutline flat = new Flattening(2, 40).Apply(outline);
        Mesh mesh = new DelaunayMesher().Triangulate(
            flat.Graph, new MeshSettings { MinAngle = 0 }, TestContext.Current.CancellationToken);
        CurvedMesh curved = CurvedMesh.Fit(flat, mesh);
        for (int t = 0; t < mesh.TriangleCount; t++) Assert.True(SecondOrderStretch.Bounds(curved, t).Least > 0);
        double exact = new BoundaryIntegrator(outline).Moments(default).Area;
        if (curved.Deviation == 0) Assert.Equal(exact, Area(curved), 1e-3 * exact);
        else Assert.InRange(curved.Deviation, 1e-3, flat.MaxSag);
    }

    private static CurvedMesh Fit(Outline outline, double sag, double turn, double triangles)
    {
        FlatOutline flat = new Flattening(sag, turn).Apply(outline);
        double area = new BoundaryIntegrator(outline).Moments(default).Area;
        Mesh mesh = new DelaunayMesher().Triangulate(flat.Graph, new MeshSettings { MaxArea = area / triangles });
        return CurvedMesh.Fit(flat, mesh);
    }

    private static (int From, int Middle, int To) Edge(CurvedMesh curved, int e) =>
        (MeshEdge.From(curved.Mesh, e), curved.Elements[6 * (e / 3) + 3 + e % 3], MeshEdge.To(curved.Mesh, e));

    /// <summary>How far a point is from an edge of the outline, by its radius if it is an arc.</summary>
    private static double Gap(Edge edge, Point p) => edge is ArcEdge arc
        ? Math.Abs(arc.Centre.DistanceTo(p) - arc.Radius)
        : Math.Abs(edge.Chord.Cross(p - edge.Start)) / edge.Length;

    /// <summary>The determinant of the Jacobian of the six shape functions, by their definition.</summary>
    private static double Stretch(CurvedMesh curved, int t, double xi, double eta)
    {
        double zeta = 1 - xi - eta;
        double[] byXi = [1 - 4 * zeta, 4 * xi - 1, 0, 4 * eta, -4 * eta, 4 * (zeta - xi)];
        double[] byEta = [1 - 4 * zeta, 0, 4 * eta - 1, 4 * xi, 4 * (zeta - eta), -4 * xi];
        Point alongXi = default, alongEta = default;
        for (int i = 0; i < 6; i++)
        {
            Point node = curved.Nodes[curved.Elements[6 * t + i]];
            alongXi += byXi[i] * node;
            alongEta += byEta[i] * node;
        }
        return alongXi.Cross(alongEta);
    }

    /// <summary>The area within the parabolas: the determinant has degree 2, so that its middles of sides give it exactly.</summary>
    private static double Area(CurvedMesh curved) => Enumerable.Range(0, curved.Mesh.TriangleCount).Sum(
        t => (Stretch(curved, t, 0.5, 0) + Stretch(curved, t, 0, 0.5) + Stretch(curved, t, 0.5, 0.5)) / 6);
}
