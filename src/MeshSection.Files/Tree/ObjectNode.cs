namespace MeshSection.Files.Tree;

/// <summary>An object whose keys are known; what each holds is read through it.</summary>
internal sealed class ObjectNode
{
    private readonly Node _node;
    private readonly string _what;

    /// <param name="node">The object.</param>
    /// <param name="what">What it describes, with its article, such as "a tee".</param>
    /// <param name="keys">Every key that it may have.</param>
    /// <exception cref="SectionFileException">The node is no object, or has a key that is not known.</exception>
    public ObjectNode(Node node, string what, IReadOnlyCollection<string> keys)
    {
        _node = node;
        _what = what;
        foreach (var member in AnyObject(node, what).Members)
        {
            if (!keys.Contains(member.Key))
            {
                throw new SectionFileException(
                    node.File,
                    member.Place,
                    node.PathOf(member.Key),
                    $"There is no key \"{member.Key}\" in {what}.",
                    NearestWord.Advice(member.Key, keys));
            }
        }
    }

    /// <summary>Makes sure that a node is an object, with whatever keys.</summary>
    public static Node AnyObject(Node node, string what) => node.Kind == NodeKind.Object
        ? node
        : throw node.Fault($"Expected {what}, an object {{ }}, but found {node.Described}.", "Write it in braces.");

    public Node? Find(string key) => _node.Members.FirstOrDefault(m => m.Key == key)?.Value;

    public Node Require(string key) => Find(key)
        ?? throw _node.Fault($"\"{key}\" is missing from {_what}.", $"Add \"{key}\": ….");
}
