using MeshSection.Dxf.Curves;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>Makes sure that every node has two ends, and says exactly where one has not.</summary>
internal static class EndCheck
{
    public static void Run(
        List<Piece> pieces, NodeEnds ends, Point[] places, EndNodes nodes, LocalFrame frame, JoinGap gap, string unread)
    {
        var branches = new List<int>();
        var free = new List<int>();
        for (var node = 0; node < ends.Count; node++)
        {
            switch (ends.Degree(node))
            {
                case 0:
                    break;
                case 1:
                    free.Add(node);
                    break;
                case 2 when ends.Piece(node, 0) != ends.Piece(node, 1):
                    break;
                default:
                    branches.Add(node);
                    break;
            }
        }

        if (branches.Count > 0)
        {
            var node = branches.MinBy(n => (places[n].X, places[n].Y));
            var isBridged = Enumerable.Range(0, nodes.Count).Count(p => nodes.Find(p) == node) > 1;
            var met = ends.Pieces(node).ToArray().Select(i => pieces[i]).ToList();
            throw OutlineFaults.Branch(met, places[node], isBridged, branches.Count, frame, gap);
        }

        if (free.Count > 0)
        {
            var (a, b) = NearestPair.Of(free, places);
            var others = free.Where(n => n != a && n != b).Prepend(b).Prepend(a);
            var freeEnds = others.Select(n => (pieces[ends.Piece(n, 0)], places[n])).ToList();
            throw OutlineFaults.Open(freeEnds, frame, gap, unread);
        }
    }
}
