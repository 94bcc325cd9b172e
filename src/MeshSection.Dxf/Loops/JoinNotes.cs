using MeshSection.Dxf.Curves;
using MeshSection.Dxf.Entities;
using MeshSection.Dxf.Placing;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Loops;

/// <summary>Collects what was mended while joining, in the words of a note.</summary>
/// <param name="frame">Where the linework lies.</param>
internal sealed class JoinNotes(LocalFrame frame)
{
    // Ends closer than this part of the diagonal differ by rounding only; joining them is not worth a note.
    private const double RoundingOverDiagonal = 1e-9;

    private readonly List<DrawingNote> _notes = [];
    private readonly List<Strand> _leadingNowhere = [];
    private readonly Dictionary<(PlacedEntity Dropped, PlacedEntity Kept), int> _duplicates = [];

    /// <summary>What was left out since it bounds nothing.</summary>
    public IReadOnlyList<Strand> LeadingNowhere => _leadingNowhere;

    /// <summary>Distances below this are rounding, mm.</summary>
    public double Rounding => RoundingOverDiagonal * frame.Diagonal + 4 * frame.Scale * frame.Spacing;

    public void Sliver(EntitySource source, Point place, double length)
    {
        var (at, drawn) = (frame.ToDrawing(place), length / frame.Scale);
        _notes.Add(new DrawingNote(
            NoteCode.Sliver,
            $"An edge of {source} at {Wording.At(at)} is only {Wording.Distance(drawn)} long; it was taken as a point.",
            [source], at, drawn));
    }

    public void Duplicate(PlacedEntity dropped, PlacedEntity kept) =>
        _duplicates[(dropped, kept)] = _duplicates.GetValueOrDefault((dropped, kept)) + 1;

    public void Gap(Point place, double width, IEnumerable<EntitySource> sources)
    {
        if (width > Rounding)
        {
            var (at, drawn) = (frame.ToDrawing(place), width / frame.Scale);
            EntitySource[] distinct = [.. sources.Distinct()];
            _notes.Add(new DrawingNote(
                NoteCode.GapBridged,
                $"A gap of {Wording.Distance(drawn)} at {Wording.At(at)} was closed: {Wording.Names(distinct)}.",
                [.. distinct], at, drawn));
        }
    }

    /// <summary>Notes what leads nowhere: an entity of which nothing is left once, parts of others each by itself.</summary>
    /// <param name="chains">What was left out.</param>
    /// <param name="rest">What stays.</param>
    public void Dangling(List<Chain> chains, Linework rest)
    {
        var stays = rest.Strands.Select(s => s.Entity).ToHashSet();
        var isNoted = new HashSet<PlacedEntity>();
        foreach (var chain in chains)
        {
            _leadingNowhere.AddRange(chain.Strands);
            var at = frame.ToDrawing(chain.Strands[0].Edge.Start);
            foreach (var entity in chain.Strands.Select(s => s.Entity).Where(e => !stays.Contains(e) && isNoted.Add(e)))
            {
                _notes.Add(new DrawingNote(
                    NoteCode.DanglingLeftOut,
                    $"{entity.Source} bounds nothing and was left out: it leads from a free end at {Wording.At(at)} on.",
                    [entity.Source], at));
            }

            EntitySource[] parts = [.. chain.Strands.Where(s => stays.Contains(s.Entity)).Select(s => s.Entity.Source).Distinct()];
            if (parts.Length > 0)
            {
                _notes.Add(new DrawingNote(
                    NoteCode.DanglingLeftOut,
                    $"{Wording.Distance(chain.Length / frame.Scale)} of {Wording.Names(parts)} from the free end at {Wording.At(at)} on " +
                    "bound nothing and were left out.",
                    [.. parts], at));
            }
        }
    }

    public void Bridge(Strand strand)
    {
        _leadingNowhere.Add(strand);
        var at = frame.ToDrawing(strand.Edge.PointAt(0.5));
        _notes.Add(new DrawingNote(
            NoteCode.DanglingLeftOut,
            $"{strand.Entity.Source} has the same on both sides at {Wording.At(at)}: it bounds nothing there and was left out.",
            [strand.Entity.Source], at));
    }

    public void Split(int crossings, int tees)
    {
        string[] places = [Count(crossings, "crossing"), Count(tees, "place") + " where others end on them"];
        _notes.Add(DrawingNote.About(
            NoteCode.LinesSplit, $"Lines were split at {string.Join(" and ", places.Where(p => p[0] != '0'))}."));
    }

    public void Closed(PlacedEntity polyline) => _notes.Add(DrawingNote.About(
        NoteCode.PolylineClosed,
        $"{polyline.Source} is not marked as closed, but its ends meet; it was taken as closed.",
        polyline.Source));

    /// <summary>The refusal of two curves that lie on each other in part, so near to it that they cannot be told apart.</summary>
    public DrawingException RunTogether(Strand a, Strand b) => OutlineFaults.RunTogether(
        a.Entity.Source, b.Entity.Source, frame.ToDrawing(a.Edge.PointAt(NearestOnEdge.Parameter(a.Edge, b.Edge.PointAt(0.5)))));

    /// <summary>All notes.</summary>
    public IEnumerable<DrawingNote> All() => _notes.Concat(_duplicates.Select(d => DuplicateNote(d.Key.Dropped, d.Key.Kept, d.Value)));

    private static DrawingNote DuplicateNote(PlacedEntity dropped, PlacedEntity kept, int count)
    {
        var what = count == 1 ? "An edge" : $"{count} edges";
        return DrawingNote.About(
            NoteCode.DuplicateDropped,
            $"{what} of {dropped.Source} lay on {(count == 1 ? "one" : "those")} of {kept.Source} and " +
            $"{(count == 1 ? "was" : "were")} left out.",
            dropped.Source,
            kept.Source);
    }

    private static string Count(int count, string what) => count == 1 ? $"1 {what}" : $"{count} {what}s";
}
