using System.Collections.Immutable;
using System.Globalization;

namespace MeshSection.Files.Tree;

internal enum NodeKind
{
    Object,
    List,
    Text,
    Number,
    Flag,
    Null,
}

/// <summary>A member of an object, with the place of its key.</summary>
internal sealed record Member(string Key, TextPlace Place, Node Value);

/// <summary>A value of a section file that knows where it stands, so that whoever finds it wrong can say so.</summary>
internal sealed record Node(string File, string Path, TextPlace Place, NodeKind Kind)
{
    public string Text { get; init; } = "";

    public double Number { get; init; }

    public bool Flag { get; init; }

    public ImmutableArray<Node> Items { get; init; } = [];

    public ImmutableArray<Member> Members { get; init; } = [];

    public SectionFileException Fault(string problem, string remedy) => new(File, Place, Path, problem, remedy);

    /// <summary>The path of a member or an item of this node.</summary>
    public string PathOf(string key) => Path.Length == 0 ? key : $"{Path}.{key}";

    /// <summary>What the node is, for a message.</summary>
    public string Described => Kind switch
    {
        NodeKind.Object => "an object { }",
        NodeKind.List => "a list [ ]",
        NodeKind.Text => $"the text \"{Text}\"",
        NodeKind.Number => string.Create(CultureInfo.InvariantCulture, $"the number {Number}"),
        NodeKind.Flag => Flag ? "true" : "false",
        NodeKind.Null => "null",
        _ => throw new ArgumentOutOfRangeException(nameof(Kind)),
    };
}
