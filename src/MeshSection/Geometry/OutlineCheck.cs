using System.Collections.Immutable;

namespace MeshSection.Geometry;

internal static class OutlineCheck
{
    public static void Run(ImmutableArray<Boundary> loops, Point origin) => throw new NotImplementedException();
}
