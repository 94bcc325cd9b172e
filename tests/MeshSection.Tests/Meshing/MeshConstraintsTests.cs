using MeshSection.Geometry;
using MeshSection.Integration;
using MeshSection.Meshing;
using MeshSection.Sections.Shapes;

namespace MeshSection.Tests.Meshing;

public class MeshConstraintsTests
{
    private static readonly Outline Disc = Outline.Create(new Circle(100).Boundaries());
    private static readonly Outline Frame = Outline.Create(
        [Boundary.Polygon(new(-50, -30), new(50, -30), new(50, 30), new(-50, 30)), Boundary.Circle(Point.Origin, 20)]);

    [Fact]
    public void Points_and_lines_become_nodes_and_edges()
    {
        var constraints = new MeshConstraints(
            [new(-40, 20), new(-40, -20), new(-40, 20.5)],
            [new(new(-45, 0), new(-25, 0)), new(new(-35, -10), new(-35, 10)), new(new(30, -30), new(30, 30))]);
        (FlatOutline flat, Mesh mesh) = Mesh(Frame, new Flattening(0.1), constraints);
        foreach (Point point in constraints.Points) Assert.Contains(point, mesh.Nodes);
        foreach (ConstraintLine line in constraints.Lines) Assert.Equal(line.From.DistanceTo(line.To), Covered(mesh, line), 1e-9);
        Assert.Contains(new Point(-35, 0), mesh.Nodes);

        // The chords keep their places, and what is integrated stays the same.
        Assert.All(mesh.Segments.Where(s => s >= flat.Chords.Length), s => Assert.Equal(flat.Graph.Segments[s].Left, flat.Graph.Segments[s].Right));
        AreaMoments exact = new BoundaryIntegrator(Frame).Moments(default);
        Assert.Equal(exact.Area, new FiberIntegrator(mesh, flat).Moments(default).Area, 1e-12 * exact.Area);
        Assert.Equal(0, CurvedMesh.Fit(flat, mesh).Deviation);
    }

    [Theory]
    [InlineData(0.3)]
    [InlineData(1.234)]
    [InlineData(4)]
    public void A_point_on_a_curve_cuts_it_there(double angle)
    {
        Point point = 50 * Point.Direction(angle);
        (FlatOutline flat, Mesh mesh) = Mesh(Disc, new Flattening(1, 40), new MeshConstraints([point], []));
        int node = mesh.Nodes.IndexOf(mesh.Nodes.MinBy(n => n.DistanceTo(point)));
        Assert.Equal(0, mesh.Nodes[node].DistanceTo(point), 1e-10);
        Assert.Equal(50, mesh.Nodes[node].Length, 1e-12);
        Assert.Contains(flat.Graph.Segments, s => s.From == node);
        Assert.Equal(Math.PI * 2500, new FiberIntegrator(mesh, flat).Moments(default).Area, 1e-8);
    }

    [Fact]
    public void A_point_between_a_chord_and_its_curve_lets_the_chords_give_way()
    {
        Point point = 49.5 * Point.Direction(0.35);
        (FlatOutline flat, Mesh mesh) = Mesh(Disc, new Flattening(5, 60), new MeshConstraints([point], []));
        Assert.Contains(point, mesh.Nodes);
        Assert.True(flat.Chords.Length > new Flattening(5, 60).Apply(Disc).Chords.Length);

        // In the hollow of a hole's chord there is material, though the polygon has none.
        Point hollow = 20.2 * Point.Direction(0.35);
        (flat, mesh) = Mesh(Frame, new Flattening(2, 60), new MeshConstraints([hollow], []));
        Assert.Contains(hollow, mesh.Nodes);
    }

    [Fact]
    public void What_is_given_twice_is_kept_once()
    {
        var line = new ConstraintLine(new(-40, 25), new(40, 25));
        var constraints = new MeshConstraints(
            [new(0, 25), new(0, 25 + 1e-7), new(-50, -30)],
            [line, line, new(new(10, 25), new(20, 25)), new(line.To, line.From)]);
        (FlatOutline flat, Mesh mesh) = Mesh(Frame, new Flattening(0.1), constraints);
        Assert.Equal(80, Covered(mesh, line), 1e-9);
        Assert.Equal(4, flat.Graph.Segments.Length - flat.Chords.Length);
    }

    [Fact]
    public void What_cannot_be_kept_is_refused_with_its_place()
    {
        Refused(ConstraintFault.Outside, new(new(0, 0), new(60, 0)), new(0, 0));
        Refused(ConstraintFault.Outside, new(new(40, 0), new(60, 0)), new(60, 0));
        Refused(ConstraintFault.MeetsBoundary, new(new(-40, 0), new(40, 0)), new(-20, 0));
        Refused(ConstraintFault.MeetsBoundary, new(new(40, 1), new(-40, 2)), new(20, 1.25));
        Refused(ConstraintFault.MeetsBoundary, new(new(-50, -30), new(50, -30)), new(0, -30));
        Refused(ConstraintFault.NoLength, new(new(-40, 0), new(-40, 1e-8)), new(-40, 0));
        var fault = Assert.Throws<ConstraintException>(
            () => new Flattening(0.1).Apply(Frame, new MeshConstraints([new(0, 5)], [])));
        Assert.Equal(ConstraintFault.Outside, fault.Fault);
        Assert.Null(fault.Line);

        static void Refused(ConstraintFault expected, ConstraintLine line, Point place)
        {
            var fault = Assert.Throws<ConstraintException>(() => new Flattening(0.1).Apply(Frame, new MeshConstraints([], [line])));
            Assert.Equal(expected, fault.Fault);
            Assert.Equal(line, fault.Line);
            Assert.InRange(fault.Place.DistanceTo(place), 0, 0.2);
        }
    }

    private static (FlatOutline Flat, Mesh Mesh) Mesh(Outline outline, Flattening flattening, MeshConstraints constraints)
    {
        FlatOutline flat = flattening.Apply(outline, constraints);
        Mesh mesh = DelaunayMesherTests.Sound(flat.Graph, new MeshSettings { MaxSide = 20 });
        return (flat, mesh);
    }

    /// <summary>How much of a line edges of the mesh run along.</summary>
    private static double Covered(Mesh mesh, ConstraintLine line)
    {
        Point along = line.To - line.From;
        double sum = 0;
        for (int e = 0; e < mesh.Segments.Length; e++)
        {
            if (mesh.Neighbours[e] > e / 3) continue;
            Point a = mesh.Nodes[MeshEdge.From(mesh, e)], b = mesh.Nodes[MeshEdge.To(mesh, e)];
            double off = Math.Abs(along.Cross(a - line.From)) + Math.Abs(along.Cross(b - line.From));
            bool isWithin = along.Dot(a - line.From) >= -1e-9 && along.Dot(b - line.From) >= -1e-9
                && along.Dot(a - line.To) <= 1e-9 && along.Dot(b - line.To) <= 1e-9;
            if (off < 1e-7 * along.Dot(along) && isWithin) sum += a.DistanceTo(b);
        }
        return sum;
    }
}
