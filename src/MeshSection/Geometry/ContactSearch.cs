using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>
/// Finds the first place from the left at which two edges of a set of boundaries meet other than as neighbours. Only edges
/// whose boxes overlap are compared.
/// </summary>
/// <param name="loops">The boundaries.</param>
/// <param name="tolerance">The distance at which two edges touch, mm.</param>
/// <param name="origin">Where the local origin lies in the drawing's axes, for the message.</param>
internal sealed class ContactSearch(ImmutableArray<Boundary> loops, double tolerance, Point origin)
{
    // Neighbours share a point. Near it they are left out, over this part of their length; beyond it they must not
    // cross, but may run together at any angle that the coordinates can tell from zero.
    private const double SharedPart = 1e-3;
    private const double NeighbourTolerance = 1e-4;

    /// <summary>Does the search.</summary>
    /// <exception cref="OutlineException">Two edges cross or touch.</exception>
    public void Run()
    {
        var places = new List<EdgePlace>();
        var boxes = new List<Box>();
        for (var b = 0; b < loops.Length; b++)
        {
            for (var e = 0; e < loops[b].Edges.Length; e++)
            {
                places.Add(new EdgePlace(b, e));
                boxes.Add(loops[b].Edges[e].Bounds.Grown(0.5 * tolerance));
            }
        }

        // From left to right, so that of several places the leftmost is told.
        var order = Enumerable.Range(0, places.Count).ToArray();
        Array.Sort(order, (i, j) => boxes[i].MinX.CompareTo(boxes[j].MinX) is var c && c != 0 ? c : i.CompareTo(j));
        var ranks = new int[order.Length];
        for (var rank = 0; rank < order.Length; rank++)
        {
            ranks[order[rank]] = rank;
        }

        var tree = new BoxTree([.. boxes]);
        var near = new List<int>();
        foreach (var i in order)
        {
            near.Clear();
            tree.Query(boxes[i], near);
            near.RemoveAll(j => ranks[j] >= ranks[i]);
            near.Sort((j, k) => ranks[j].CompareTo(ranks[k]));
            foreach (var j in near)
            {
                Compare(places[Math.Min(i, j)], places[Math.Max(i, j)]);
            }
        }
    }

    private void Compare(EdgePlace first, EdgePlace second)
    {
        var a = loops[first.Boundary].Edges[first.Edge];
        var b = loops[second.Boundary].Edges[second.Edge];
        Contact? contact;
        if (first.Boundary != second.Boundary)
        {
            contact = EdgeContact.Find(a, b, tolerance);
        }
        else
        {
            var count = loops[first.Boundary].Edges.Length;
            var follows = second.Edge == first.Edge + 1;
            var wraps = first.Edge == 0 && second.Edge == count - 1;
            if (!follows && !wraps)
            {
                contact = EdgeContact.Find(a, b, tolerance);
            }
            else
            {
                // One of the two is cut back: a touch near the shared point would need both.
                var cut = a.Part(wraps ? SharedPart : 0, follows ? 1 - SharedPart : 1);
                contact = EdgeContact.Find(cut, b, NeighbourTolerance * tolerance);
            }
        }

        if (contact is { } found)
        {
            throw new OutlineException(Fault(first, second, found), origin + found.Point, first, second);
        }
    }

    private OutlineFault Fault(EdgePlace first, EdgePlace second, Contact contact)
    {
        if (first.Boundary == second.Boundary)
        {
            return contact.Crosses ? OutlineFault.SelfCrossing
                : OutlineCheck.HasNoArea(loops[first.Boundary]) ? OutlineFault.NoArea
                : OutlineFault.SelfTouching;
        }

        var (a, b) = (loops[first.Boundary], loops[second.Boundary]);
        if (SameBox(a.Bounds, b.Bounds) && Math.Abs(a.Length - b.Length) <= tolerance * a.Edges.Length)
        {
            return OutlineFault.Duplicate;
        }

        return contact.Crosses ? OutlineFault.Crossing : OutlineFault.Touching;
    }

    private bool SameBox(Box a, Box b) =>
        Math.Abs(a.MinX - b.MinX) <= tolerance && Math.Abs(a.MaxX - b.MaxX) <= tolerance &&
        Math.Abs(a.MinY - b.MinY) <= tolerance && Math.Abs(a.MaxY - b.MaxY) <= tolerance;
}
