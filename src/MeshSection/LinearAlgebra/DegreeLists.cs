namespace MeshSection.LinearAlgebra;

/// <summary>Variables in doubly linked lists by degree, the least of which is taken next.</summary>
internal sealed class DegreeLists
{
    private readonly int[] _head;
    private readonly int[] _next;
    private readonly int[] _previous;
    private int _least;

    public DegreeLists(int size)
    {
        _head = new int[size];
        _next = new int[size];
        _previous = new int[size];
        Array.Fill(_head, -1);
    }

    public void Add(int variable, int degree)
    {
        var next = _head[degree];
        _next[variable] = next;
        _previous[variable] = -1;
        if (next >= 0)
        {
            _previous[next] = variable;
        }

        _head[degree] = variable;
        _least = Math.Min(_least, degree);
    }

    public void Remove(int variable, int degree)
    {
        var (previous, next) = (_previous[variable], _next[variable]);
        if (previous >= 0)
        {
            _next[previous] = next;
        }
        else
        {
            _head[degree] = next;
        }

        if (next >= 0)
        {
            _previous[next] = previous;
        }
    }

    public int TakeLeast()
    {
        while (_head[_least] < 0)
        {
            _least++;
        }

        var variable = _head[_least];
        Remove(variable, _least);
        return variable;
    }
}
