using MeshSection.Dxf;
using MeshSection.Dxf.Entities;
using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Cli.Inputs;

/// <summary>How to read a drawing.</summary>
internal sealed record DrawingRequest
{
    /// <summary>The unit of its coordinates, if given.</summary>
    public LengthUnit? Unit { get; init; }

    /// <summary>The layers to read; empty for the default.</summary>
    public IReadOnlyList<string> Layers { get; init; } = [];

    /// <summary>The layers to leave out.</summary>
    public IReadOnlyList<string> Ignored { get; init; } = [];

    /// <summary>The colours to read; empty for all.</summary>
    public IReadOnlyList<DrawingColour> Colours { get; init; } = [];

    /// <summary>The layers of regions, in order; empty if nesting decides.</summary>
    public IReadOnlyList<string> Regions { get; init; } = [];

    /// <summary>The layers of bars, with the diameter of those drawn as points.</summary>
    public IReadOnlyList<(string Layers, GivenLength? Diameter)> Bars { get; init; } = [];

    /// <summary>Points that lie in the section, in the drawing's axes and unit; empty if nesting decides.</summary>
    public IReadOnlyList<Point> Inside { get; init; } = [];

    /// <summary>The greatest gap to join, if given.</summary>
    public GivenLength? Tolerance { get; init; }

    /// <summary>The option that only a drawing has and that is given, for an error; null if there is none.</summary>
    public string? FirstOption => Unit is not null ? "--unit"
        : Layers.Count > 0 ? "--layer"
        : Ignored.Count > 0 ? "--ignore"
        : Colours.Count > 0 ? "--colour"
        : Regions.Count > 0 ? "--region"
        : Bars.Count > 0 ? "--bars"
        : Inside.Count > 0 ? "--inside"
        : Tolerance is not null ? "--tolerance"
        : null;

    /// <summary>The options for a drawing whose own unit is known, or is not.</summary>
    public OutlineOptions Options(LengthUnit? stated)
    {
        var own = Unit ?? stated;
        return new OutlineOptions
        {
            Unit = Unit,
            Layers = Layers,
            Ignored = Ignored,
            Colours = Colours,
            Regions = Regions,
            Bars = [.. Bars.Select(b => new BarLayer(b.Layers, In(b.Diameter, own)))],
            Inside = Inside,
            Joining = new Joining { MaxGap = In(Tolerance, own) },
        };
    }

    private static double? In(GivenLength? length, LengthUnit? own) => own is null ? length?.Value : length?.In(own, own);
}
