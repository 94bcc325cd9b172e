using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;
using MeshSection.Sections.Shapes;
using MeshSection.Torsion;

namespace MeshSection.Tests.Torsion;

public class CentredMeshTests
{
    [Theory]
    [InlineData(1e-4, 15)]
    [InlineData(0.02, 30)]
    [InlineData(0.1, 60)]
    public void The_triangles_fill_the_true_outline_however_coarse_the_chords(double sag, double turn)
    {
        var outline = Outline.Create(Solids.Eccentric(50, 20, 10));
        var fitted = Fit(outline, new Flattening(sag * 100, turn), 40);
        var exact = new BoundaryIntegrator(outline).Moments(default);
        Assert.Equal(0, fitted.Curved.Deviation);
        var byTriangles = ByTriangles(fitted);
        Assert.Equal(exact.Area, byTriangles.Area, 1e-9 * exact.Area);
        Assert.Equal(exact.XX, byTriangles.XX, 1e-9 * exact.XX);
        Assert.Equal(exact.YY, byTriangles.YY, 1e-9 * exact.YY);
        var enclosed = fitted.EnclosedMoments();
        Assert.Equal(Math.PI * 2500, enclosed[0].Area, 1e-8);
        Assert.Equal(-Math.PI * 400, enclosed[1].Area, 1e-8);
        Assert.Equal(exact.XX, enclosed[0].XX + enclosed[1].XX, 1e-10 * exact.XX);
    }

    [Fact]
    public void Nodes_between_the_ends_of_a_chord_move_onto_the_curve()
    {
        var fitted = Fit(Outline.Create(new Circle(100).Boundaries()), new Flattening(2, 40), 2000);
        var onBoundary = Enumerable.Range(0, fitted.Boundaries.Length).Where(e => fitted.Boundaries[e] == 0)
            .Select(e => fitted.Corners[MeshEdge.From(fitted.Mesh, e)]).ToArray();
        Assert.True(onBoundary.Length > 50);
        Assert.All(onBoundary, p => Assert.Equal(50, p.Length, 1e-12));
    }

    [Fact]
    public void Another_origin_shifts_the_moments()
    {
        var home = Fit(Outline.Create(Solids.Eccentric(50, 20, 10)), new Flattening(1), 60);
        var away = home.About(new Point(3, -4));
        var (a, b) = (ByTriangles(home), ByTriangles(away));
        Assert.Equal(a.X - 3 * a.Area, b.X, 1e-9 * a.Area);
        Assert.Equal(a.Y + 4 * a.Area, b.Y, 1e-9 * a.Area);
        Assert.Equal(b.YY, away.EnclosedMoments().Sum(m => m.YY), 1e-10 * b.YY);
    }

    [Fact]
    public void Curves_that_would_fold_their_triangles_keep_their_chords()
    {
        // A hole 0.02 under the top face, where the middle of a chord cuts 1.5 off its curve, and no nodes inside that
        // could give way.
        var (centre, radius) = (new Point(0, 40), 29.98);
        var (start, end) = (centre + radius * Point.Direction(0.6 * Math.PI), centre - radius * Point.Direction(0.6 * Math.PI));
        var outline = Outline.Create(
        [
            .. new Rectangle(80, 70).Boundaries(),
            Boundary.Create([new ArcEdge(start, end, 1), new ArcEdge(end, start, 1)]),
        ]);
        var flat = new Flattening(2, 40).Apply(outline);
        var mesh = new DelaunayMesher().Triangulate(flat.Graph, new MeshSettings { MinAngle = 0 }, TestContext.Current.CancellationToken);
        var fitted = CentredMesh.Of(flat, CurvedMesh.Fit(flat, mesh));
        Assert.InRange(fitted.Curved.Deviation, 1, flat.MaxSag);
        var p = TorsionAnalysis.Of(flat, mesh);
        Assert.Equal(fitted.Curved.Deviation, p.OutlineDeviation);
        Assert.True(p.TorsionConstant.Lower < p.TorsionConstant.Upper);
        Assert.Equal(p.Area, ByTriangles(fitted).Area, 1e-9 * p.Area);
    }

    [Fact]
    public void Triangles_much_smaller_than_their_chord_follow_the_curve()
    {
        var outline = Outline.Create(Solids.Eccentric(50, 20, 20));
        var flat = new Flattening(5, 30).Apply(outline);
        var mesh = new DelaunayMesher().Triangulate(
            flat.Graph, new MeshSettings { MaxArea = 0.3 }, TestContext.Current.CancellationToken);
        var fitted = CentredMesh.Of(flat, CurvedMesh.Fit(flat, mesh));
        Assert.Equal(0, fitted.Curved.Deviation);
        Assert.Equal(Math.PI * 2100, ByTriangles(fitted).Area, 1e-8);
    }

    [Fact]
    public void The_matrix_of_a_straight_triangle_is_its_integral()
    {
        var fitted = Fit(Outline.Create(Solids.Triangle(10)), new Flattening(1), 3);
        var point = new ElementPoint(fitted);
        double[] closed = new double[36], integrated = new double[36];
        for (var t = 0; t < fitted.Mesh.TriangleCount; t++)
        {
            point.Enter(t);
            ElementStiffness.Straight(point, closed);
            Array.Clear(integrated);
            for (var q = 0; q < point.Count; q++)
            {
                point.Move(q);
                ElementStiffness.AddPoint(point, integrated);
            }

            for (var i = 0; i < 36; i++)
            {
                Assert.Equal(integrated[i], closed[i], 1e-13);
            }
        }
    }

    [Fact]
    public void Shape_functions_and_their_derivatives_fit_together_on_bent_triangles()
    {
        // On any triangle the shape functions sum to 1 and their derivatives to 0; λ's are exact: Σ over edges of half.
        var point = new ElementPoint(Fit(Outline.Create(new Tube(100, 30).Boundaries()), new Flattening(2, 40), 30));
        for (var t = 0; t < 30; t++)
        {
            point.Enter(t);
            for (var q = 0; q < point.Count; q++)
            {
                point.Move(q);
                Assert.Equal(1, point.Shape.Sum(), 1e-14);
                Assert.Equal(0, point.ShapeX.Sum(), 1e-14);
                Assert.Equal(0, point.ShapeY.Sum(), 1e-14);
                Assert.True(point.Weight > 0);
            }
        }
    }

    private static CentredMesh Fit(Outline outline, Flattening flattening, double triangles)
    {
        var flat = flattening.Apply(outline);
        var area = new BoundaryIntegrator(outline).Moments(default).Area;
        var mesh = new DelaunayMesher().Triangulate(flat.Graph, new MeshSettings { MaxArea = area / triangles });
        return CentredMesh.Of(flat, CurvedMesh.Fit(flat, mesh));
    }

    private static AreaMoments ByTriangles(CentredMesh mesh)
    {
        var point = new ElementPoint(mesh);
        var sum = default(AreaMoments);
        for (var t = 0; t < mesh.Mesh.TriangleCount; t++)
        {
            point.Enter(t);
            for (var q = 0; q < point.Count; q++)
            {
                point.Move(q);
                var (x, y, a) = (point.X, point.Y, point.Weight);
                sum += new AreaMoments(a, a * x, a * y, a * x * x, a * y * y, a * x * y);
            }
        }

        return sum;
    }
}
