namespace MeshSection.LinearAlgebra;

/// <summary>
/// A fill-reducing order of elimination by approximate minimum degree [AmestoyDavisDuff1996], on the quotient graph: an
/// eliminated variable p lives on as an element, the clique Lp of the variables that it joined. Alike variables are
/// merged and eliminated as one; elements that lie inside a newer one are absorbed by it.
/// </summary>
internal sealed class MinimumDegree
{
    private readonly int _size;

    // Lists of variable i: its elements from _start[i], then its variables; of element p: its variables.
    private int[] _pool;
    private int _poolEnd;
    private readonly int[] _start;
    private readonly int[] _elementCount;
    private readonly int[] _length;

    // Variables merged into one, itself included; negative while in the clique of the pivot, 0 once it is gone.
    private readonly int[] _weight;
    private readonly int[] _degree;
    private readonly bool[] _isAbsorbed;
    private readonly int[] _owner;
    private readonly int[] _outside;
    private readonly int[] _mark;
    private int _stamp;
    private readonly DegreeLists _byDegree;
    private readonly int[] _hashHead;
    private readonly int[] _hashNext;
    private readonly List<int> _keptElements = [];
    private readonly List<int> _keptVariables = [];
    private int _eliminated;

    private MinimumDegree(SymmetricPattern pattern)
    {
        var n = _size = pattern.Size;
        _start = new int[n];
        _elementCount = new int[n];
        _length = new int[n];
        _weight = new int[n];
        _degree = new int[n];
        _isAbsorbed = new bool[n];
        _owner = new int[n];
        _outside = new int[n];
        _mark = new int[n];
        _hashHead = new int[n];
        _hashNext = new int[n];
        _byDegree = new DegreeLists(n);
        _pool = Adjacency(pattern);
        Array.Fill(_weight, 1);
        Array.Fill(_owner, -1);
        Array.Fill(_hashHead, -1);
        for (var i = n - 1; i >= 0; i--)
        {
            _degree[i] = _length[i];
            _byDegree.Add(i, _degree[i]);
        }
    }

    /// <summary>The unknowns in the order in which to eliminate them.</summary>
    public static int[] Order(SymmetricPattern pattern) => new MinimumDegree(pattern).Run();

    private int[] Run()
    {
        var pivots = new List<int>();
        while (_eliminated < _size)
        {
            var pivot = _byDegree.TakeLeast();
            pivots.Add(pivot);
            var size = FormElement(pivot);
            CountOutside(pivot);
            size -= UpdateLists(pivot);
            MergeAlike(pivot);
            CloseElement(pivot, size);
        }

        return Members(pivots);
    }

    private int[] Adjacency(SymmetricPattern pattern)
    {
        for (var j = 0; j < _size; j++)
        {
            foreach (var i in Below(j))
            {
                _length[i]++;
                _length[j]++;
            }
        }

        for (var i = 1; i < _size; i++)
        {
            _start[i] = _start[i - 1] + _length[i - 1];
        }

        _poolEnd = 2 * (pattern.Rows.Length - _size);
        var pool = new int[2 * _poolEnd + _size];
        var next = _start.AsSpan().ToArray();
        for (var j = 0; j < _size; j++)
        {
            foreach (var i in Below(j))
            {
                pool[next[i]++] = j;
                pool[next[j]++] = i;
            }
        }

        return pool;

        ReadOnlySpan<int> Below(int j) =>
            pattern.Rows.AsSpan(pattern.Starts[j] + 1, pattern.Starts[j + 1] - pattern.Starts[j] - 1);
    }

    private ReadOnlySpan<int> Elements(int i) => _pool.AsSpan(_start[i], _elementCount[i]);

    private ReadOnlySpan<int> Variables(int i) => _pool.AsSpan(_start[i] + _elementCount[i], _length[i] - _elementCount[i]);

    /// <summary>Lp: everything next to the pivot, directly or through its elements, which are absorbed.</summary>
    private int FormElement(int pivot)
    {
        var most = _length[pivot] - _elementCount[pivot];
        foreach (var e in Elements(pivot))
        {
            most += _length[e];
        }

        if (_poolEnd + most > _pool.Length)
        {
            Array.Resize(ref _pool, 2 * _pool.Length + most);
        }

        var first = _poolEnd;
        var size = 0;
        _eliminated += _weight[pivot];
        _weight[pivot] = 0;
        foreach (var e in Elements(pivot))
        {
            size += Gather(Variables(e));
            _isAbsorbed[e] = true;
        }

        size += Gather(Variables(pivot));
        _start[pivot] = first;
        _elementCount[pivot] = 0;
        _length[pivot] = _poolEnd - first;
        return size;
    }

    private int Gather(ReadOnlySpan<int> variables)
    {
        var size = 0;
        foreach (var i in variables)
        {
            if (_weight[i] <= 0)
            {
                continue;
            }

            _byDegree.Remove(i, _degree[i]);
            size += _weight[i];
            _weight[i] = -_weight[i];
            _pool[_poolEnd++] = i;
        }

        return size;
    }

    /// <summary>|Le \ Lp| for every element e next to a variable of Lp.</summary>
    private void CountOutside(int pivot)
    {
        _stamp++;
        foreach (var i in Variables(pivot))
        {
            foreach (var e in Elements(i))
            {
                if (_mark[e] != _stamp)
                {
                    _mark[e] = _stamp;
                    _outside[e] = _degree[e];
                }

                _outside[e] += _weight[i];
            }
        }
    }

    /// <summary>
    /// Prunes the lists of Lp's variables, bounds their degrees outside of Lp, and eliminates at once those that have no
    /// neighbour there. Returns how many these were.
    /// </summary>
    private int UpdateLists(int pivot)
    {
        var gone = 0;
        foreach (var i in Variables(pivot))
        {
            var (degree, hash) = Prune(i);
            if (degree == 0)
            {
                gone -= _weight[i];
                _weight[i] = 0;
                _owner[i] = pivot;
                continue;
            }

            _degree[i] = Math.Min(_degree[i], degree);
            Rewrite(i, pivot);
            var bucket = (int)(hash % (uint)_size);
            _hashNext[i] = _hashHead[bucket];
            _hashHead[bucket] = i;
            _outside[i] = bucket;
        }

        _eliminated += gone;
        return gone;
    }

    private (int Degree, uint Hash) Prune(int i)
    {
        _keptElements.Clear();
        _keptVariables.Clear();
        var degree = 0;
        var hash = 0u;
        foreach (var e in Elements(i))
        {
            if (_isAbsorbed[e])
            {
                continue;
            }

            if (_outside[e] == 0)
            {
                _isAbsorbed[e] = true;
                continue;
            }

            _keptElements.Add(e);
            degree += _outside[e];
            hash += (uint)e;
        }

        foreach (var j in Variables(i))
        {
            if (_weight[j] > 0)
            {
                _keptVariables.Add(j);
                degree += _weight[j];
                hash += (uint)j;
            }
        }

        return (degree, hash);
    }

    /// <summary>The pruned lists, with the new element; they fit, since the pivot or an element of it was dropped.</summary>
    private void Rewrite(int i, int pivot)
    {
        var next = _start[i];
        foreach (var e in _keptElements)
        {
            _pool[next++] = e;
        }

        _pool[next++] = pivot;
        _elementCount[i] = next - _start[i];
        foreach (var j in _keptVariables)
        {
            _pool[next++] = j;
        }

        _length[i] = next - _start[i];
    }

    private void MergeAlike(int pivot)
    {
        foreach (var first in Variables(pivot))
        {
            if (_weight[first] == 0)
            {
                continue;
            }

            // Each bucket is walked once, at the first of its variables that is met, and then emptied.
            var bucket = _outside[first];
            var head = _hashHead[bucket];
            _hashHead[bucket] = -1;
            for (var i = head; i >= 0 && _hashNext[i] >= 0; i = _hashNext[i])
            {
                if (_weight[i] != 0)
                {
                    MergeInto(i);
                }
            }
        }
    }

    private void MergeInto(int i)
    {
        _stamp++;
        foreach (var k in _pool.AsSpan(_start[i], _length[i]))
        {
            _mark[k] = _stamp;
        }

        for (var j = _hashNext[i]; j >= 0; j = _hashNext[j])
        {
            if (_weight[j] != 0 && IsAlike(i, j))
            {
                _weight[i] += _weight[j];
                _weight[j] = 0;
                _owner[j] = i;
            }
        }
    }

    private bool IsAlike(int i, int j)
    {
        if (_length[i] != _length[j] || _elementCount[i] != _elementCount[j])
        {
            return false;
        }

        foreach (var k in _pool.AsSpan(_start[j], _length[j]))
        {
            if (_mark[k] != _stamp)
            {
                return false;
            }
        }

        return true;
    }

    private void CloseElement(int pivot, int size)
    {
        var kept = _start[pivot];
        foreach (var i in Variables(pivot))
        {
            if (_weight[i] == 0)
            {
                continue;
            }

            var weight = _weight[i] = -_weight[i];
            _degree[i] = Math.Min(_degree[i] + size - weight, _size - _eliminated - weight);
            _byDegree.Add(i, _degree[i]);
            _pool[kept++] = i;
        }

        _length[pivot] = kept - _start[pivot];
        _poolEnd = kept;
        _degree[pivot] = size;
    }

    /// <summary>Every variable beside the pivot with which it was eliminated.</summary>
    private int[] Members(List<int> pivots)
    {
        var rank = new int[_size];
        var starts = new int[pivots.Count + 1];
        for (var k = 0; k < pivots.Count; k++)
        {
            rank[pivots[k]] = k;
        }

        var pivotOf = new int[_size];
        for (var i = 0; i < _size; i++)
        {
            var p = i;
            while (_owner[p] >= 0)
            {
                p = _owner[p];
            }

            pivotOf[i] = rank[p];
            starts[rank[p] + 1]++;
        }

        for (var k = 0; k < pivots.Count; k++)
        {
            starts[k + 1] += starts[k];
        }

        var order = new int[_size];
        for (var i = 0; i < _size; i++)
        {
            order[starts[pivotOf[i]]++] = i;
        }

        return order;
    }
}
