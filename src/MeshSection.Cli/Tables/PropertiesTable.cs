using MeshSection.Cli.Inputs;
using MeshSection.Properties;
using MeshSection.Torsion;
using Spectre.Console;

namespace MeshSection.Cli.Tables;

/// <summary>The table of <c>meshsection properties</c>.</summary>
internal static class PropertiesTable
{
    /// <summary>Writes the table.</summary>
    public static void Write(IAnsiConsole console, SectionInput input, SectionProperties p, TorsionProperties? torsion)
    {
        var lengths = new Lengths(input.Unit);
        var size = p.BoundingBox.Diagonal;
        Heading.Write(console, input);
        console.Write(Size(p, lengths, size));
        console.Write(SecondMoments(p, lengths));
        console.Write(Radii(p, lengths));
        ElasticTable.Write(console, p, lengths, size);
        Plastic(console, p, lengths, size);
        console.Write(TorsionRows(torsion, input.Section.Outline.RegionCount, lengths, size));
        console.Write(Member(p));
        console.Write(Checks(p, lengths));
    }

    private static Table Size(SectionProperties p, Lengths lengths, double size)
    {
        var table = TableStyle.Columns("Section", "", "").KeepWhole(1);
        table.AddRow("area A", lengths.Of(p.Area, 2), lengths.Symbol(2));
        table.AddRow("perimeter, outer", lengths.Of(p.OuterPerimeter), lengths.Symbol());
        table.AddRow("perimeter, inner", lengths.Of(p.InnerPerimeter), lengths.Symbol());
        table.AddRow("width", lengths.Of(p.BoundingBox.Width), lengths.Symbol());
        table.AddRow("height", lengths.Of(p.BoundingBox.Height), lengths.Symbol());
        table.AddRow("centroid x", lengths.Coordinate(p.Centroid.X, size), lengths.Symbol());
        table.AddRow("centroid y", lengths.Coordinate(p.Centroid.Y, size), lengths.Symbol());
        return table;
    }

    private static Table SecondMoments(SectionProperties p, Lengths lengths)
    {
        var table = TableStyle.Columns("Second moments, " + lengths.Symbol(4), "centroid", "datum").KeepWhole(1, 2);
        var (own, datum) = (p.SecondMoment, p.SecondMomentDatum);
        table.AddRow("Ix", lengths.Of(own.X, 4), lengths.Of(datum.X, 4));
        table.AddRow("Iy", lengths.Of(own.Y, 4), lengths.Of(datum.Y, 4));
        table.AddRow("Ixy", Product(own), Product(datum));
        table.AddRow("Ip", lengths.Of(own.Polar, 4), lengths.Of(datum.Polar, 4));
        table.AddRow("I1, major", lengths.Of(p.Principal.I1, 4));
        table.AddRow("I2, minor", lengths.Of(p.Principal.I2, 4));
        table.AddRow("angle x to 1", Digits.Near(p.Principal.Angle, 1) + "°");
        return table;

        // A product moment that is nothing beside the other two is rounding.
        string Product(SecondMoments m) => Math.Abs(m.XY) < 1e-12 * m.Polar ? "0" : lengths.Of(m.XY, 4);
    }

    private static Table Radii(SectionProperties p, Lengths lengths)
    {
        var table = TableStyle.Columns("Radii of gyration, " + lengths.Symbol(), "").KeepWhole(1);
        table.AddRow("about x", lengths.Of(p.RadiusOfGyration.X));
        table.AddRow("about y", lengths.Of(p.RadiusOfGyration.Y));
        table.AddRow("about 1", lengths.Of(p.RadiusOfGyration1));
        table.AddRow("about 2", lengths.Of(p.RadiusOfGyration2));
        return table;
    }

    private static void Plastic(IAnsiConsole console, SectionProperties p, Lengths lengths, double size)
    {
        var table = TableStyle.Columns("Plastic moduli, " + lengths.Symbol(3), "", "shape factor").KeepWhole(1, 2);
        var axes = TableStyle.Columns("Plastic neutral axes, " + lengths.Symbol(), "");
        Add("about x", "y = ", p.PlasticX);
        Add("about y", "x = ", p.PlasticY);
        Add("about 1", "along 2 from the centroid: ", p.Plastic1);
        Add("about 2", "along 1 from the centroid: ", p.Plastic2);
        console.Write(table);
        console.Write(axes);

        void Add(string axis, string place, PlasticBending bending)
        {
            table.AddRow(axis, lengths.Of(bending.Modulus, 3), Digits.Of(bending.ShapeFactor));
            axes.AddRow(axis, place + lengths.Coordinate(bending.NeutralAxis, size));
        }
    }

    private static Table TorsionRows(TorsionProperties? t, int pieces, Lengths lengths, double size)
    {
        var table = TableStyle.Columns("Torsion and shear", "");
        if (t is null)
        {
            table.AddRow("not computed", $"the section is in {pieces} separate pieces: nothing passes shear between them");
            return table;
        }

        var j = t.TorsionConstant;
        table.AddRow("torsion constant J", $"{lengths.Of(j.Value, 4)} {lengths.Symbol(4)}");
        table.AddRow("proven bounds of J", $"{lengths.Of(j.Lower, 4)} to {lengths.Of(j.Upper, 4)}, {Digits.Small(j.Gap)} of J apart");
        if (t.OutlineDeviation > 0)
        {
            table.AddRow(
                "not proven for all",
                $"some curves keep chords up to {lengths.Of(t.OutlineDeviation)} {lengths.Symbol()} off: give a finer --sag");
        }

        // Nearer to an axis than the bounds of J could tell is on it.
        table.AddRow("shear centre", lengths.Of(t.ShearCentre, Math.Max(1, 1e6 * j.Gap) * size));
        table.AddRow("warping constant", $"{lengths.Of(t.WarpingConstant, 6)} {lengths.Symbol(6)}");
        table.AddRow("shear area x, y", $"{lengths.Of(t.ShearAreaX, 2)}, {lengths.Of(t.ShearAreaY, 2)} {lengths.Symbol(2)} (nu = {Digits.Of(t.PoissonRatio)})");
        return table;
    }

    private static Table Member(SectionProperties p)
    {
        var table = TableStyle.Columns("Member", "", "").KeepWhole(2);
        table.AddRow("mass", p.MassPerLength is { } mass ? Digits.Of(1000 * mass) : "no density given", p.MassPerLength is null ? "" : "kg/m");
        table.AddRow("surface to paint, outside", Digits.Of(p.OuterPerimeter / 1000), "m²/m");
        return table;
    }

    private static Table Checks(SectionProperties p, Lengths lengths)
    {
        var worst = p.CrossChecks.MaxBy(c => c.Difference);
        var table = TableStyle.Columns("Checks", "");
        table.AddRow(
            $"{p.CrossChecks.Length} quantities by two methods",
            $"differ by at most {Digits.Small(worst.Difference)} of the value ({CheckedWords.Of(worst.Quantity)})");
        table.AddRow("mesh", $"{p.Mesh.Triangles} triangles, smallest angle {Digits.Of(p.Mesh.MinAngle)}°" +
            (p.Mesh.Unrefined == 0 ? "" : $"; {p.Mesh.Unrefined} not refined, see 'meshsection mesh'"));
        table.AddRow(
            "chords of the mesh",
            p.Chords.MaxSag == 0
                ? "no curves: the mesh is the outline"
                : $"within {Digits.Small(p.Chords.MaxSag / lengths.Unit.Millimetres)} {lengths.Symbol()} of their curves; alone they would " +
                  $"miss A by {Digits.Small(p.Chords.Area)}, Ix by {Digits.Small(p.Chords.SecondMomentX)}, Iy by {Digits.Small(p.Chords.SecondMomentY)}: " +
                  "the results are those of the curves");
        return table;
    }
}
