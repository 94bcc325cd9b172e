namespace MeshSection.Dxf.Loops;

/// <summary>Which strands end at each node.</summary>
internal sealed class NodeEnds
{
    private readonly int[] _firstOfNode;
    private readonly int[] _strands;

    public NodeEnds(int nodes, List<Strand> strands)
    {
        _firstOfNode = new int[nodes + 1];
        foreach (var strand in strands)
        {
            _firstOfNode[strand.From + 1]++;
            _firstOfNode[strand.To + 1]++;
        }

        for (var node = 0; node < nodes; node++)
        {
            _firstOfNode[node + 1] += _firstOfNode[node];
        }

        _strands = new int[_firstOfNode[nodes]];
        var next = _firstOfNode.AsSpan(0, nodes).ToArray();
        for (var s = 0; s < strands.Count; s++)
        {
            _strands[next[strands[s].From]++] = s;
            _strands[next[strands[s].To]++] = s;
        }
    }

    /// <summary>The number of nodes.</summary>
    public int Count => _firstOfNode.Length - 1;

    /// <summary>The strands that end at a node; one that begins and ends there is there twice.</summary>
    public ReadOnlySpan<int> this[int node] => _strands.AsSpan(_firstOfNode[node], _firstOfNode[node + 1] - _firstOfNode[node]);
}
