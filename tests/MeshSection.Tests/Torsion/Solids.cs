using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Sections.Shapes;

namespace MeshSection.Tests.Torsion;

/// <summary>Sections whose torsion is known in closed form or to many digits.</summary>
internal static class Solids
{
    /// <summary>Name, boundaries, J in mm⁴ and how many parts of it the last known digit is.</summary>
    public static IReadOnlyList<Solid> All { get; } =
    [
        new("circle", new Circle(100).Boundaries(), Math.PI * Math.Pow(50, 4) / 2, 1e-13),
        new("tube", new Tube(100, 20).Boundaries(), Math.PI * (Math.Pow(50, 4) - Math.Pow(30, 4)) / 2, 1e-13),
        new("thin tube", new Tube(100, 1).Boundaries(), Math.PI * (Math.Pow(50, 4) - Math.Pow(49, 4)) / 2, 1e-13),
        new("eccentric tube 50/20/5", Eccentric(50, 20, 5), 9491051.3, 1e-8),
        new("eccentric tube 50/20/20", Eccentric(50, 20, 20), 8258784.8, 1e-8),
        new("eccentric tube 50/25/12.5", Eccentric(50, 25, 12.5), 8342430.4, 1e-8),
        new("eccentric tube 50/30/10", Eccentric(50, 30, 10), 7608005.9, 1e-8),
        new("shaft with a round keyway", Keyway(50, 10), 9157691.6118, 1e-10),
        new("semicircle", [Sector(50, 180)], (Math.PI / 2 - 4 / Math.PI) * Math.Pow(50, 4), 1e-13),
        new("sector of 45°", [Sector(1, 45)], 0.01812332, 4e-7),
        new("sector of 60°", [Sector(1, 60)], 0.03490921, 2e-7),
        new("sector of 90°", [Sector(1, 90)], 0.08232758, 1e-7),
        new("sector of 120°", [Sector(1, 120)], 0.1442122, 4e-7),
        new("sector of 270°", [Sector(1, 270)], 0.5724828, 1e-7),
        new("sector of 300°", [Sector(1, 300)], 0.6717376, 1e-7),
        new("square", Rectangle(1), RectangleConstant(1), 1e-13),
        new("rectangle 1:2", Rectangle(2), RectangleConstant(2), 1e-13),
        new("rectangle 1:10", Rectangle(10), RectangleConstant(10), 1e-13),
        new("equilateral triangle", Triangle(100), Math.Sqrt(3) * 1e8 / 80, 1e-13),
        new("right isosceles triangle", [Boundary.Polygon(default, new(1, 0), new(0, 1))], 0.02608965, 2e-7),
        new("hexagon", new RegularPolygon(6, Math.Sqrt(3)).Boundaries(), 1.035459, 5e-7),
        new("octagon", new RegularPolygon(8, 1 + Math.Sqrt(2)).Boundaries(), 3.65181, 2e-6),
        new("square tube 100×10", new HollowBox(100, 100, 10).Boundaries(), 7709341, 1e-6),
        new("square tube 100×5", new HollowBox(100, 100, 5).Boundaries(), 4394596, 1e-6),
        new("RHS 200×100×8, sharp", new HollowBox(100, 200, 8).Boundaries(), 18069781, 1e-6),
        new("L 100×10, sharp", new Angle(100, 100, 10).Boundaries(), 61957.41, 2e-7),
        new("L 150×90×10, sharp", new Angle(150, 90, 10).Boundaries(), 75290.74, 2e-7),
        new("tee, sharp", new Tee(100, 100, 10, 10).Boundaries(), 63101.64, 2e-7),
        new("I, sharp", new IBeam(200, 100, 10, 6).Boundaries(), 77258.86, 2e-7),
        new("IPE 200 without fillets", new IBeam(200, 100, 8.5, 5.6).Boundaries(), 50646.53, 2e-7),
    ];

    public static Solid Named(string name) => All.Single(s => s.Name == name);

    /// <summary>A sector from its apex, or a half disc; symmetric about x, the arc to the right.</summary>
    public static Boundary Sector(double radius, double angle)
    {
        var (start, end) = (radius * Point.Direction(-angle * Math.PI / 360), radius * Point.Direction(angle * Math.PI / 360));
        var arc = new ArcEdge(start, end, Math.Tan(angle * Math.PI / 720));
        return Boundary.Create(angle == 180
            ? [arc, new LineEdge(end, start)]
            : [arc, new LineEdge(end, default), new LineEdge(default, start)]);
    }

    public static ImmutableArray<Boundary> Eccentric(double radius, double bore, double offset) =>
        [Boundary.Circle(default, radius), Boundary.Circle(new Point(offset, 0), bore)];

    /// <summary>A rectangle of sides 1 and <paramref name="ratio"/>.</summary>
    public static ImmutableArray<Boundary> Rectangle(double ratio) => new Rectangle(1, ratio).Boundaries();

    public static ImmutableArray<Boundary> Triangle(double side) =>
        [Boundary.Polygon(default, new(side, 0), new(side / 2, side * Math.Sqrt(3) / 2))];

    /// <summary>J of a rectangle of sides 1 and b ≥ 1: the series of Timoshenko and Goodier, article 109.</summary>
    public static double RectangleConstant(double b)
    {
        var sum = 0.0;
        for (var n = 199; n > 0; n -= 2)
        {
            sum += Math.Tanh(n * Math.PI * b / 2) / Math.Pow(n, 5);
        }

        return b / 3 * (1 - 192 / (Math.Pow(Math.PI, 5) * b) * sum);
    }

    /// <summary>A shaft with a groove whose circle is centred on its surface, at the right.</summary>
    private static ImmutableArray<Boundary> Keyway(double radius, double groove)
    {
        // The two circles cross where the shaft's has turned by α, with groove = 2 radius sin α/2.
        var alpha = 2 * Math.Asin(groove / (2 * radius));
        var (top, bottom) = (radius * Point.Direction(alpha), radius * Point.Direction(-alpha));
        var inner = Math.PI - alpha;
        return
        [
            Boundary.Create(
            [
                new ArcEdge(top, bottom, Math.Tan((2 * Math.PI - 2 * alpha) / 4)),
                new ArcEdge(bottom, top, -Math.Tan(inner / 4)),
            ]),
        ];
    }
}

/// <summary>A section with a known torsion constant.</summary>
/// <param name="Name">What it is.</param>
/// <param name="Boundaries">Its boundaries.</param>
/// <param name="Constant">J, mm⁴.</param>
/// <param name="Uncertainty">How far the known J may be off, relative.</param>
internal sealed record Solid(string Name, ImmutableArray<Boundary> Boundaries, double Constant, double Uncertainty);
