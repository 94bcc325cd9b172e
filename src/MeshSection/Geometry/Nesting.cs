using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>Decides which boundary lies in which, by depth: even depths hold material, odd ones are holes.</summary>
internal static class Nesting
{
    public static ImmutableArray<NestedBoundary> Of(ImmutableArray<Boundary> loops, out int regionCount)
    {
        var areas = loops.Select(b => b.SignedArea).ToArray();
        var parents = Parents(loops, areas);
        var depths = new int[loops.Length];
        foreach (var inner in Enumerable.Range(0, loops.Length).OrderByDescending(i => Math.Abs(areas[i])))
        {
            depths[inner] = parents[inner] < 0 ? 0 : depths[parents[inner]] + 1;
        }

        var regions = new int[loops.Length];
        regionCount = 0;
        for (var i = 0; i < loops.Length; i++)
        {
            if (depths[i] % 2 == 0)
            {
                regions[i] = regionCount++;
            }
        }

        var nested = ImmutableArray.CreateBuilder<NestedBoundary>(loops.Length);
        for (var i = 0; i < loops.Length; i++)
        {
            var isHole = depths[i] % 2 == 1;
            var loop = areas[i] > 0 == isHole ? loops[i].Reversed() : loops[i];
            var role = isHole ? BoundaryRole.Hole : depths[i] == 0 ? BoundaryRole.Outer : BoundaryRole.Island;
            nested.Add(new NestedBoundary(loop, role, parents[i], regions[isHole ? parents[i] : i]));
        }

        return nested.MoveToImmutable();
    }

    /// <summary>
    /// The smallest loop around each: sound boundaries never cross, so that one point of a loop tells. A sweep from left to
    /// right looks only at loops that reach past the point.
    /// </summary>
    private static int[] Parents(ImmutableArray<Boundary> loops, double[] areas)
    {
        var boxes = loops.Select(b => b.Bounds).ToArray();
        var byLeft = Enumerable.Range(0, loops.Length).OrderBy(i => boxes[i].MinX).ToArray();
        var parents = new int[loops.Length];
        var active = new List<int>();
        var next = 0;
        foreach (var inner in Enumerable.Range(0, loops.Length).OrderBy(i => loops[i].Edges[0].Start.X))
        {
            var point = loops[inner].Edges[0].Start;
            for (; next < byLeft.Length && boxes[byLeft[next]].MinX <= point.X; next++)
            {
                active.Add(byLeft[next]);
            }

            active.RemoveAll(i => boxes[i].MaxX < point.X);
            parents[inner] = -1;
            var least = double.PositiveInfinity;
            foreach (var outer in active)
            {
                var area = Math.Abs(areas[outer]);
                if (outer != inner && area < least && boxes[outer].Contains(point) && WindingNumber.Of(loops[outer], point) != 0)
                {
                    (parents[inner], least) = (outer, area);
                }
            }
        }

        return parents;
    }
}
