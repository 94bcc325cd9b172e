using System.Collections.Immutable;

namespace MeshSection.Geometry;

/// <summary>Decides which boundary lies in which, by depth: even depths hold material, odd ones are holes.</summary>
internal static class Nesting
{
    public static ImmutableArray<NestedBoundary> Of(ImmutableArray<Boundary> loops, out int regionCount)
    {
        var areas = loops.Select(b => b.SignedArea).ToArray();
        var boxes = loops.Select(b => b.Bounds).ToArray();
        var bySize = Enumerable.Range(0, loops.Length).OrderByDescending(i => Math.Abs(areas[i])).ToArray();
        var parents = new int[loops.Length];
        var depths = new int[loops.Length];
        for (var rank = 0; rank < bySize.Length; rank++)
        {
            // Sound boundaries never cross, so one point of the loop tells, and the smallest loop around it is its parent.
            var inner = bySize[rank];
            var point = loops[inner].Edges[0].Start;
            parents[inner] = -1;
            for (var k = rank - 1; k >= 0; k--)
            {
                var outer = bySize[k];
                if (boxes[outer].Contains(point) && WindingNumber.Of(loops[outer], point) != 0)
                {
                    parents[inner] = outer;
                    depths[inner] = depths[outer] + 1;
                    break;
                }
            }
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
}
