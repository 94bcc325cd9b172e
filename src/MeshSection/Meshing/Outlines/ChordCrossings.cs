using MeshSection.Geometry;

namespace MeshSection.Meshing;

/// <summary>Finds the curves whose chords cross, or come so near that a mesh between them would have no room.</summary>
internal static class ChordCrossings
{
    // Two chords that come nearer than this part of the sag between them are in each other's way.
    private const double Clearance = 0.5;

    /// <summary>The curved edges with a chord that crosses, or nearly touches, a chord which is no neighbour of it.</summary>
    public static IReadOnlyCollection<EdgePlace> Find(FlatOutline flat)
    {
        var places = new SortedSet<EdgePlace>(Comparer<EdgePlace>.Create(
            (a, b) => a.Boundary != b.Boundary ? a.Boundary.CompareTo(b.Boundary) : a.Edge.CompareTo(b.Edge)));
        if (flat.MaxSag == 0)
        {
            return places;
        }

        var segments = flat.Graph.Segments;
        var points = flat.Graph.Points;
        var boxes = new Box[segments.Length];
        var sags = new double[segments.Length];
        var order = new int[segments.Length];
        for (var i = 0; i < segments.Length; i++)
        {
            sags[i] = flat.Chords[i].Curve.Sag;
            boxes[i] = Box.Of(points[segments[i].From], points[segments[i].To]).Grown(sags[i]);
            order[i] = i;
        }

        Array.Sort(order, (i, j) => boxes[i].MinX.CompareTo(boxes[j].MinX) is var c && c != 0 ? c : i.CompareTo(j));
        var active = new List<int>();
        foreach (var i in order)
        {
            active.RemoveAll(j => boxes[j].MaxX < boxes[i].MinX);
            foreach (var j in active)
            {
                if (sags[i] + sags[j] > 0 && boxes[i].Meets(boxes[j]) && AreInTheWay(i, j))
                {
                    AddCurved(i);
                    AddCurved(j);
                }
            }

            active.Add(i);
        }

        return places;

        bool AreInTheWay(int i, int j)
        {
            var (a, b) = (segments[i], segments[j]);
            if (a.To == b.From || b.To == a.From)
            {
                return false;
            }

            var distance = EdgeContact.ChordDistance(points[a.From], points[a.To], points[b.From], points[b.To]);
            return distance <= Clearance * (sags[i] + sags[j]);
        }

        void AddCurved(int i)
        {
            if (sags[i] > 0)
            {
                places.Add(flat.Chords[i].Place);
            }
        }
    }
}
