namespace MeshSection.LinearAlgebra;

/// <summary>
/// What supernodes leave over for their parents: square matrices on a stack, since children in postorder are wanted in
/// the reverse of the order in which they were made.
/// </summary>
internal sealed class RestStack
{
    private readonly Stack<(int Owner, int Start, int Length)> _entries = new();
    private double[] _values = [];
    private double[] _scratch = [];
    private int _end;

    /// <summary>A matrix of zeros to work on; it stays valid until the next call.</summary>
    public Span<double> Clear(int length)
    {
        if (_scratch.Length < length)
        {
            _scratch = new double[2 * length];
        }

        var scratch = _scratch.AsSpan(0, length);
        scratch.Clear();
        return scratch;
    }

    /// <summary>Keeps a copy of what a supernode leaves.</summary>
    public void Push(int owner, ReadOnlySpan<double> rest)
    {
        if (_values.Length < _end + rest.Length)
        {
            Array.Resize(ref _values, 2 * (_end + rest.Length));
        }

        rest.CopyTo(_values.AsSpan(_end));
        _entries.Push((owner, _end, rest.Length));
        _end += rest.Length;
    }

    /// <summary>Takes the last one back; it stays valid until the next push.</summary>
    public (int Owner, ReadOnlyMemory<double> Values) Pop()
    {
        var (owner, start, length) = _entries.Pop();
        _end = start;
        return (owner, _values.AsMemory(start, length));
    }
}
