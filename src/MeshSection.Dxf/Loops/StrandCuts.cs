namespace MeshSection.Dxf.Loops;

/// <summary>Where strands are to be cut.</summary>
internal sealed class StrandCuts
{
    private readonly Dictionary<int, List<(double At, int Node)>> _cuts = [];

    /// <summary>How many cuts there are.</summary>
    public int Count { get; private set; }

    /// <summary>Adds a cut, unless the strand is cut at that node already.</summary>
    /// <param name="strand">The number of the strand.</param>
    /// <param name="at">The parameter on it.</param>
    /// <param name="node">The node that lies there.</param>
    public void Add(int strand, double at, int node)
    {
        if (!_cuts.TryGetValue(strand, out var ofStrand))
        {
            _cuts.Add(strand, ofStrand = []);
        }

        if (!ofStrand.Exists(c => c.Node == node))
        {
            ofStrand.Add((at, node));
            Count++;
        }
    }

    /// <summary>The cuts of a strand, along it.</summary>
    public IEnumerable<(double At, int Node)> Of(int strand) => _cuts.TryGetValue(strand, out var cuts) ? cuts.Order() : [];
}
