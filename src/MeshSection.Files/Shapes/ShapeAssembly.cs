using System.Collections.Immutable;
using System.Globalization;
using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Files.Shapes;

/// <summary>Puts placed shapes together to one outline.</summary>
internal static class ShapeAssembly
{
    private const string Apart = "Move one of the two, or draw both as one polygon.";

    public static Outline Outline(ImmutableArray<PlacedShape> shapes, LengthUnit unit)
    {
        // Local coordinates begin at the first shape, so that shapes far from the origin lose no digits.
        var origin = shapes[0].Placement.Shift;
        var owners = shapes.SelectMany((s, i) => s.Boundaries.Select(_ => i)).ToArray();
        Outline outline;
        try
        {
            outline = Geometry.Outline.Create(
                shapes.SelectMany(s => s.Boundaries.Select(b => b.Placed(s.Placement with { Shift = s.Placement.Shift - origin }))),
                origin);
        }
        catch (OutlineException fault)
        {
            throw Translated(fault, shapes, owners, unit);
        }

        CheckRoles(outline, shapes, owners);
        return outline;
    }

    /// <summary>Nesting says what is a hole; the file must say the same.</summary>
    private static void CheckRoles(Outline outline, ImmutableArray<PlacedShape> shapes, int[] owners)
    {
        for (var i = 0; i < shapes.Length; i++)
        {
            var shape = shapes[i];
            var nested = outline.Boundaries[Array.IndexOf(owners, i)];
            if (shape.IsHole && nested.Role == BoundaryRole.Outer)
            {
                throw shape.Node.Fault(
                    $"{shape.Name} is a hole, but lies in no other shape.", "Move it into one, or leave \"hole\" out.");
            }

            if (shape.IsHole == (nested.Role == BoundaryRole.Hole))
            {
                continue;
            }

            var around = shapes[owners[nested.Parent]];
            throw shape.Node.Fault(
                shape.IsHole
                    ? $"{shape.Name} is a hole, but lies in the empty inside of {around.Name}."
                    : $"{shape.Name} lies in the material of {around.Name}.",
                shape.IsHole ? "Leave \"hole\" out, or move it into material." : "Add \"hole\": true to cut it out, or move it.");
        }
    }

    private static SectionFileException Translated(
        OutlineException fault, ImmutableArray<PlacedShape> shapes, int[] owners, LengthUnit unit)
    {
        var first = shapes[owners[fault.First?.Boundary ?? 0]];
        var second = fault.Second is { } place ? shapes[owners[place.Boundary]] : first;
        var at = fault.Point is { } p
            ? string.Create(
                CultureInfo.InvariantCulture,
                $" at ({p.X / unit.Millimetres:g9}, {p.Y / unit.Millimetres:g9}) {unit}")
            : "";
        var (problem, remedy) = Told(fault.Fault, first.Name, second.Name, at);
        return second.Node.Fault(problem, remedy);
    }

    private static (string Problem, string Remedy) Told(OutlineFault fault, string first, string second, string at) => fault switch
    {
        OutlineFault.Crossing => ($"{first} and {second} overlap: their outlines cross{at}.", Apart),
        OutlineFault.Touching => ($"{first} and {second} touch{at}.", Apart),
        OutlineFault.Duplicate => ($"{first} and {second} are the same outline{at}.", "Remove one of the two."),
        OutlineFault.SelfCrossing => ($"{second} crosses itself{at}.", "Give its points in running order."),
        OutlineFault.SelfTouching => ($"{second} touches itself{at}.", "Leave a gap there, or join the two sides."),
        OutlineFault.NoArea => ($"{second} encloses no area{at}.", "Check its dimensions."),
        OutlineFault.NoLength => ($"{second} has a side without length{at}.", "Check its dimensions."),
        OutlineFault.NotFinite => ($"{second} has a coordinate that is no finite number.", "Check its dimensions."),
        OutlineFault.Empty => ("There is no shape.", "Add one."),
        _ => throw new ArgumentOutOfRangeException(nameof(fault)),
    };
}
