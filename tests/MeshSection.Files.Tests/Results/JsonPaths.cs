using System.Text.Json;
using System.Text.Json.Nodes;

namespace MeshSection.Files.Tests.Results;

/// <summary>Finds values by paths such as <c>extremeFibre.top.x</c>.</summary>
internal static class JsonPaths
{
    public static double Number(JsonNode? node, string path) =>
        path.Split('.').Aggregate(node, (inner, key) => inner?[key])?.GetValue<double>() ?? throw new KeyNotFoundException(path);

    public static IEnumerable<string> Numbers(JsonNode? node) => node switch
    {
        JsonObject members => members.SelectMany(m => Numbers(m.Value).Select(p => p.Length > 0 && p[0] != '[' ? $"{m.Key}.{p}" : m.Key + p)),
        JsonArray items => items.SelectMany((item, i) => Numbers(item).Select(p => $"[{i}].{p}")),
        JsonValue value when value.GetValueKind() == JsonValueKind.Number => [""],
        _ => [],
    };
}
