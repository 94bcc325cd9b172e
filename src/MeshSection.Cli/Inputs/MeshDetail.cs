using System.Collections.Immutable;
using MeshSection.Geometry;
using MeshSection.Meshing;
using MeshSection.Sections;
using MeshSection.Units;

namespace MeshSection.Cli.Inputs;

/// <summary>What the command line says of single places of the mesh.</summary>
/// <param name="Points">Points to make nodes: x, y.</param>
/// <param name="Lines">Lines to make chains of edges: x and y of one end, then of the other.</param>
/// <param name="Sizes">Places with the longest side there: x, y, side.</param>
/// <param name="RegionSizes">The longest side in pieces of the section, by their number from 1.</param>
internal sealed record MeshDetail(
    ImmutableArray<double[]> Points,
    ImmutableArray<double[]> Lines,
    ImmutableArray<double[]> Sizes,
    ImmutableArray<(int Region, GivenLength Side)> RegionSizes)
{
    /// <summary>Nothing said.</summary>
    public static MeshDetail None { get; } = new([], [], [], []);

    /// <summary>The points and lines to keep; null if there are none.</summary>
    public MeshConstraints? Constraints(Outline outline, LengthUnit unit)
    {
        if (Points.IsEmpty && Lines.IsEmpty)
        {
            return null;
        }

        return new MeshConstraints(
            [.. Points.Select(p => GivenPoint.In(p[0], p[1], unit, outline))],
            [.. Lines.Select(l => new ConstraintLine(
                GivenPoint.In(l[0], l[1], unit, outline), GivenPoint.In(l[2], l[3], unit, outline)))]);
    }

    /// <summary>The sides around places; null if none are given.</summary>
    public ISizeField? SizeField(Outline outline, LengthUnit unit) => Sizes.IsEmpty
        ? null
        : new PlaceSize([.. Sizes.Select(s => (GivenPoint.In(s[0], s[1], unit, outline), s[2] * unit.Millimetres))]);

    /// <summary>The longest side in each piece of the section.</summary>
    /// <exception cref="CommandException">There is no piece of a number given.</exception>
    public ImmutableArray<double> RegionMaxSides(Section section, LengthUnit unit)
    {
        if (RegionSizes.IsEmpty)
        {
            return [];
        }

        var count = section.Outline.RegionCount;
        var sides = new double[count];
        Array.Fill(sides, double.PositiveInfinity);
        foreach (var (region, side) in RegionSizes)
        {
            if (region < 1 || region > count)
            {
                throw new CommandException(
                    $"--region-size {region}: the section has {(count == 1 ? "one region, number 1" : $"regions 1 to {count}")}; 'meshsection mesh' lists them.");
            }

            sides[region - 1] = side.In(LengthUnit.Millimetre, unit);
        }

        return [.. sides];
    }
}
