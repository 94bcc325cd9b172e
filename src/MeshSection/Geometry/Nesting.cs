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

    /// <summary>The smallest loop around each: sound boundaries never cross, so that one point of a loop tells.</summary>
    private static int[] Parents(ImmutableArray<Boundary> loops, double[] areas)
    {
        var tree = new BoxTree([.. loops.Select(b => b.Bounds)]);
        var parents = new int[loops.Length];
        var around = new List<int>();
        for (var inner = 0; inner < parents.Length; inner++)
        {
            var point = loops[inner].Edges[0].Start;
            around.Clear();
            tree.Query(Box.Of(point, point), around);
            parents[inner] = -1;
            var least = double.PositiveInfinity;
            foreach (var outer in around)
            {
                var area = Math.Abs(areas[outer]);
                if (outer != inner && area < least && WindingNumber.Of(loops[outer], point) != 0)
                {
                    (parents[inner], least) = (outer, area);
                }
            }
        }

        return parents;
    }
}
