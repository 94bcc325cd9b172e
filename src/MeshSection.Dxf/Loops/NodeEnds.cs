using MeshSection.Dxf.Curves;

namespace MeshSection.Dxf.Loops;

/// <summary>Which pieces end at each node.</summary>
internal sealed class NodeEnds
{
    private readonly int[] _firstOfNode;
    private readonly int[] _pieces;

    public NodeEnds(List<Piece> pieces, bool[] dropped, EndNodes nodes)
    {
        _firstOfNode = new int[nodes.Count + 1];
        for (var i = 0; i < pieces.Count; i++)
        {
            if (!dropped[i])
            {
                _firstOfNode[nodes.Start(i) + 1]++;
                _firstOfNode[nodes.End(i) + 1]++;
            }
        }

        for (var node = 0; node < nodes.Count; node++)
        {
            _firstOfNode[node + 1] += _firstOfNode[node];
        }

        _pieces = new int[_firstOfNode[nodes.Count]];
        var next = _firstOfNode.AsSpan(0, nodes.Count).ToArray();
        for (var i = 0; i < pieces.Count; i++)
        {
            if (!dropped[i])
            {
                _pieces[next[nodes.Start(i)]++] = i;
                _pieces[next[nodes.End(i)]++] = i;
            }
        }
    }

    /// <summary>The number of nodes.</summary>
    public int Count => _firstOfNode.Length - 1;

    /// <summary>The number of ends at a node; a piece that starts and ends there counts twice.</summary>
    public int Degree(int node) => _firstOfNode[node + 1] - _firstOfNode[node];

    /// <summary>The piece of one of the ends at a node.</summary>
    public int Piece(int node, int end) => _pieces[_firstOfNode[node] + end];

    /// <summary>The pieces of all ends at a node.</summary>
    public ReadOnlySpan<int> Pieces(int node) => _pieces.AsSpan(_firstOfNode[node], Degree(node));
}
