using System.Text.Json;
using MeshSection.Properties;
using MeshSection.Torsion;
using MeshSection.Units;

namespace MeshSection.Files.Results;

/// <summary>
/// Section properties as JSON: keys in a fixed order, numbers in the unit named under <c>units</c> (to the power that
/// the quantity has), with all digits that a double needs. <c>docs/results.md</c> lists the keys.
/// </summary>
public static class PropertiesJson
{
    /// <summary>Writes the properties as a document: one indented object and a line end.</summary>
    /// <param name="stream">Where to; left open.</param>
    /// <param name="properties">The area properties.</param>
    /// <param name="torsion">Torsion and shear; null for a section in separate pieces, which has no one torsion constant.</param>
    /// <param name="unit">The unit of length to write them in.</param>
    public static void Write(Stream stream, SectionProperties properties, TorsionProperties? torsion, LengthUnit unit) =>
        ResultWriter.Document(stream, json => Write(json, properties, torsion, unit));

    /// <summary>Writes the properties as one object.</summary>
    /// <param name="json">Where to; at a place where an object may begin.</param>
    /// <param name="properties">The area properties.</param>
    /// <param name="torsion">Torsion and shear; null for a section in separate pieces, which has no one torsion constant.</param>
    /// <param name="unit">The unit of length to write them in.</param>
    public static void Write(
        Utf8JsonWriter json, SectionProperties properties, TorsionProperties? torsion, LengthUnit unit)
    {
        var writer = new ResultWriter(json, unit);
        json.WriteStartObject();
        writer.Units(unit);
        Shape(writer, properties);
        SecondMoments(writer, properties);
        Elastic(writer, properties);
        Plastic(writer, properties);
        if (torsion is not null)
        {
            Torsion(writer, torsion);
        }

        Member(writer, properties);
        Checks(writer, properties);
        json.WriteEndObject();
    }

    private static void Shape(ResultWriter writer, SectionProperties p)
    {
        writer.Number("area", p.Area, 2);
        writer.Number("perimeter", p.Perimeter, 1);
        writer.Number("outerPerimeter", p.OuterPerimeter, 1);
        writer.Number("innerPerimeter", p.InnerPerimeter, 1);
        writer.Object("boundingBox", () =>
        {
            writer.Number("minX", p.BoundingBox.MinX, 1);
            writer.Number("minY", p.BoundingBox.MinY, 1);
            writer.Number("maxX", p.BoundingBox.MaxX, 1);
            writer.Number("maxY", p.BoundingBox.MaxY, 1);
        });
        writer.Point("centroid", p.Centroid);
    }

    private static void SecondMoments(ResultWriter writer, SectionProperties p)
    {
        Pair(writer, "firstMomentDatum", p.FirstMomentDatum, 3);
        Moments(writer, "secondMomentDatum", p.SecondMomentDatum);
        Moments(writer, "secondMoment", p.SecondMoment);
        writer.Object("principal", () =>
        {
            writer.Number("I1", p.Principal.I1, 4);
            writer.Number("I2", p.Principal.I2, 4);
            writer.Number("angle", p.Principal.Angle);
        });
        writer.Object("radiusOfGyration", () =>
        {
            writer.Number("x", p.RadiusOfGyration.X, 1);
            writer.Number("y", p.RadiusOfGyration.Y, 1);
            writer.Number("r1", p.RadiusOfGyration1, 1);
            writer.Number("r2", p.RadiusOfGyration2, 1);
        });
    }

    private static void Elastic(ResultWriter writer, SectionProperties p)
    {
        writer.Object("sectionModulus", () =>
        {
            writer.Number("top", p.ElasticX.Positive.Modulus, 3);
            writer.Number("bottom", p.ElasticX.Negative.Modulus, 3);
            writer.Number("left", p.ElasticY.Negative.Modulus, 3);
            writer.Number("right", p.ElasticY.Positive.Modulus, 3);
            writer.Number("x", p.ElasticX.Governing.Modulus, 3);
            writer.Number("y", p.ElasticY.Governing.Modulus, 3);
        });
        writer.Object("governing", () =>
        {
            writer.Json.WriteString("x", Governing(p.ElasticX, "top", "bottom"));
            writer.Json.WriteString("y", Governing(p.ElasticY, "right", "left"));
        });
        writer.Object("extremeFibre", () =>
        {
            Fibre(writer, "top", p.ElasticX.Positive);
            Fibre(writer, "bottom", p.ElasticX.Negative);
            Fibre(writer, "left", p.ElasticY.Negative);
            Fibre(writer, "right", p.ElasticY.Positive);
        });
        writer.Object("sectionModulusPrincipal", () =>
        {
            PrincipalModuli(writer, "1", p.Elastic1);
            PrincipalModuli(writer, "2", p.Elastic2);
        });
        writer.Object("extremeFibrePrincipal", () =>
        {
            PrincipalFibres(writer, "1", p.Elastic1);
            PrincipalFibres(writer, "2", p.Elastic2);
        });
    }

    private static void Plastic(ResultWriter writer, SectionProperties p)
    {
        Axes("plasticModulus", b => b.Modulus, 3);
        Axes("plasticNeutralAxis", b => b.NeutralAxis, 1);
        Axes("shapeFactor", b => b.ShapeFactor, 0);

        void Axes(string key, Func<PlasticBending, double> value, int power) => writer.Object(key, () =>
        {
            writer.Number("x", value(p.PlasticX), power);
            writer.Number("y", value(p.PlasticY), power);
            writer.Number("1", value(p.Plastic1), power);
            writer.Number("2", value(p.Plastic2), power);
        });
    }

    private static void Torsion(ResultWriter writer, TorsionProperties t)
    {
        writer.Object("torsionConstant", () =>
        {
            writer.Number("value", t.TorsionConstant.Value, 4);
            writer.Number("lower", t.TorsionConstant.Lower, 4);
            writer.Number("upper", t.TorsionConstant.Upper, 4);
        });
        writer.Point("shearCentre", t.ShearCentre);
        writer.Number("warpingConstant", t.WarpingConstant, 6);
        writer.Object("shearArea", () =>
        {
            writer.Number("x", t.ShearAreaX, 2);
            writer.Number("y", t.ShearAreaY, 2);
            writer.Number("poissonRatio", t.PoissonRatio);
        });
        writer.Number("outlineDeviation", t.OutlineDeviation, 1);
    }

    private static void Member(ResultWriter writer, SectionProperties p)
    {
        if (p.MassPerLength is { } mass)
        {
            writer.PerLength("massPerLength", mass);
        }

        writer.Number("paintedSurface", p.PaintedSurfacePerLength, 1);
    }

    private static void Checks(ResultWriter writer, SectionProperties p)
    {
        writer.Json.WriteStartArray("crossCheck");
        foreach (var check in p.CrossChecks)
        {
            var (path, power) = Checked(check.Quantity);
            writer.Json.WriteStartObject();
            writer.Json.WriteString("quantity", path);
            writer.Number("fiber", check.Fiber, power);
            writer.Number("boundary", check.Boundary, power);
            writer.Number("difference", check.Difference);
            writer.Json.WriteEndObject();
        }

        writer.Json.WriteEndArray();
        writer.Object("chords", () =>
        {
            writer.Number("maxSag", p.Chords.MaxSag, 1);
            writer.Number("area", p.Chords.Area);
            writer.Number("secondMomentX", p.Chords.SecondMomentX);
            writer.Number("secondMomentY", p.Chords.SecondMomentY);
        });
        writer.Object("mesh", () =>
        {
            writer.Json.WriteNumber("triangles", p.Mesh.Triangles);
            writer.Json.WriteNumber("nodes", p.Mesh.Nodes);
            writer.Number("minAngle", p.Mesh.MinAngle);
        });
    }

    /// <summary>Where the checked quantity itself stands in the document, and its power of length.</summary>
    private static (string Path, int Power) Checked(CheckedQuantity quantity) => quantity switch
    {
        CheckedQuantity.Area => ("area", 2),
        CheckedQuantity.CentroidX => ("centroid.x", 1),
        CheckedQuantity.CentroidY => ("centroid.y", 1),
        CheckedQuantity.SecondMomentX => ("secondMoment.x", 4),
        CheckedQuantity.SecondMomentY => ("secondMoment.y", 4),
        CheckedQuantity.SecondMomentXY => ("secondMoment.xy", 4),
        CheckedQuantity.PlasticModulusX => ("plasticModulus.x", 3),
        CheckedQuantity.PlasticModulusY => ("plasticModulus.y", 3),
        CheckedQuantity.PlasticModulus1 => ("plasticModulus.1", 3),
        CheckedQuantity.PlasticModulus2 => ("plasticModulus.2", 3),
        _ => throw new ArgumentOutOfRangeException(nameof(quantity)),
    };

    private static void Pair(ResultWriter writer, string key, AxisPair pair, int power) => writer.Object(key, () =>
    {
        writer.Number("x", pair.X, power);
        writer.Number("y", pair.Y, power);
    });

    private static void Moments(ResultWriter writer, string key, SecondMoments moments) => writer.Object(key, () =>
    {
        writer.Number("x", moments.X, 4);
        writer.Number("y", moments.Y, 4);
        writer.Number("xy", moments.XY, 4);
        writer.Number("polar", moments.Polar, 4);
    });

    private static string Governing(ExtremeFibres fibres, string positive, string negative) =>
        !fibres.NegativeGoverns ? positive : !fibres.PositiveGoverns ? negative : "both";

    private static void Fibre(ResultWriter writer, string key, ExtremeFibre fibre) => writer.Object(key, () =>
    {
        writer.Number("distance", fibre.Distance, 1);
        writer.Coordinates(fibre.Point);
    });

    private static void PrincipalModuli(ResultWriter writer, string key, ExtremeFibres fibres) => writer.Object(key, () =>
    {
        writer.Number("positive", fibres.Positive.Modulus, 3);
        writer.Number("negative", fibres.Negative.Modulus, 3);
        writer.Number("governing", fibres.Governing.Modulus, 3);
    });

    private static void PrincipalFibres(ResultWriter writer, string key, ExtremeFibres fibres) => writer.Object(key, () =>
    {
        Fibre(writer, "positive", fibres.Positive);
        Fibre(writer, "negative", fibres.Negative);
    });
}
