using System.Collections.Immutable;

namespace MeshSection.Files.Tree;

/// <summary>The plain values that a node may hold.</summary>
internal static class NodeValues
{
    public static string FilledText(this Node node, string example) => node.Kind == NodeKind.Text && node.Text.Trim().Length > 0
        ? node.Text
        : throw node.Fault(
            $"Expected a text, but found {node.Described}.",
            $"Write it in quotes, for example \"{example}\".");

    public static double FiniteNumber(this Node node, string what) => node.Kind == NodeKind.Number && double.IsFinite(node.Number)
        ? node.Number
        : throw node.Fault($"Expected {what}, but found {node.Described}.", "Write a plain number without quotes.");

    public static int WholeNumber(this Node node) =>
        node.Kind == NodeKind.Number && node.Number == Math.Truncate(node.Number) && Math.Abs(node.Number) <= int.MaxValue
            ? (int)node.Number
            : throw node.Fault(
                $"Expected a whole number, but found {node.Described}.",
                "Write it without quotes, for example 6.");

    public static bool TrueOrFalse(this Node node) => node.Kind == NodeKind.Flag
        ? node.Flag
        : throw node.Fault(
            $"Expected true or false, but found {node.Described}.",
            "Write true or false without quotes.");

    public static ImmutableArray<Node> FilledList(this Node node, string what) => node.Kind == NodeKind.List && node.Items.Length > 0
        ? node.Items
        : throw node.Fault(
            $"Expected a list of {what}, but found {(node.Kind == NodeKind.List ? "an empty one" : node.Described)}.",
            "Write at least one, in brackets [ ].");
}
