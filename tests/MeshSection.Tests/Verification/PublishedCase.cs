using System.Text.Json;
using System.Text.Json.Serialization;

namespace MeshSection.Tests.Verification;

/// <summary>A section with published properties, as in the published-*.json files.</summary>
public sealed record PublishedCase(
    string Id, string Title, string Source, string Basis, IReadOnlyList<PublishedQuantity> Quantities, string? Note = null)
{
    private static readonly JsonSerializerOptions Format = new(JsonSerializerDefaults.Web)
    {
        UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
    };

    /// <summary>Every case of area properties, in the order of the file.</summary>
    public static IReadOnlyList<PublishedCase> All { get; } = Read("published-values.json");

    /// <summary>Every case of torsion and shear, in the order of the file.</summary>
    public static IReadOnlyList<PublishedCase> Torsion { get; } = Read("published-torsion.json");

    private static List<PublishedCase> Read(string name)
    {
        using var file = File.OpenRead(Path.Combine(AppContext.BaseDirectory, "Verification", name));
        return JsonSerializer.Deserialize<List<PublishedCase>>(file, Format)!;
    }
}

/// <summary>One published figure and how near the computed one must come.</summary>
public sealed record PublishedQuantity(
    string Quantity,
    double Value,
    string Unit,
    double? RelativeTolerance = null,
    double? AbsoluteTolerance = null,
    string? Printed = null,
    string? Basis = null,
    string? Note = null)
{
    /// <summary>The largest difference allowed, in the figure's own unit.</summary>
    public double Tolerance => AbsoluteTolerance ?? RelativeTolerance!.Value * Math.Abs(Value);
}
