using System.Collections.Immutable;
using MeshSection.Dxf.Curves;
using MeshSection.Dxf.Loops;
using MeshSection.Dxf.Selection;
using MeshSection.Geometry;

namespace MeshSection.Dxf.Faces;

/// <summary>
/// Decides which faces of the linework are the section. Nesting decides if the linework closes by itself; layers of
/// regions, filled areas and points that lie in the section decide if they are given, also where boundaries touch or cross.
/// </summary>
internal sealed class SectionLoops
{
    private readonly OutlineOptions _options;
    private readonly LocalFrame _frame;
    private readonly BoundaryFinder _finder;
    private readonly List<DrawingNote> _notes;

    private SectionLoops(OutlineOptions options, LocalFrame frame, BoundaryFinder finder, List<DrawingNote> notes)
    {
        _options = options;
        _frame = frame;
        _finder = finder;
        _notes = notes;
    }

    /// <summary>
    /// The outline of the section with its loops, and the faces that were told apart; none if nesting is left to decide.
    /// </summary>
    /// <exception cref="DrawingException">A boundary is open, or it cannot be told which faces are the section.</exception>
    public static (Outline Outline, List<Loop> Loops, ImmutableArray<DrawnFace> Faces) Find(
        List<Piece> pieces, EntitySelection selection, OutlineOptions options, LocalFrame frame, BoundaryFinder finder, List<DrawingNote> notes)
    {
        var section = new SectionLoops(options, frame, finder, notes);
        if (options.Regions.Count > 0 || selection.IsOfFills)
        {
            var covers = options.Regions.Count > 0 ? section.OfLayers(pieces) : section.OfFills(pieces);
            return section.Chosen(Linework.Of(covers.SelectMany(c => c.Loops)), covers);
        }

        var linework = finder.Closed(pieces);
        return options.Inside.Count > 0 ? section.Chosen(linework, []) : section.Nested(linework);
    }

    /// <summary>Loops for nesting to decide; where boundaries touch, together if that leaves no question.</summary>
    private (Outline Outline, List<Loop> Loops, ImmutableArray<DrawnFace> Faces) Nested(Linework linework)
    {
        var loops = linework.IsClosed ? LoopWalk.Of(linework) : Together(linework);
        try
        {
            return (Outline.Create(loops.Select(l => Boundary.Create(l.Edges)), _frame.Scale * _frame.Origin), loops, []);
        }
        catch (OutlineException unsound)
        {
            var faces = unsound.Fault == OutlineFault.Touching && linework.IsClosed ? TogetherIfClear(_finder.Map(linework)) : null;
            return faces is null ? throw OutlineFaults.Unsound(unsound, loops, _frame) : (Sound(faces), faces, []);
        }
    }

    private Outline Sound(List<Loop> loops)
    {
        try
        {
            return Outline.Create(loops.Select(l => Boundary.Create(l.Edges)), _frame.Scale * _frame.Origin);
        }
        catch (OutlineException unsound)
        {
            throw OutlineFaults.Unsound(unsound, loops, _frame);
        }
    }

    private List<Loop> Together(Linework linework)
    {
        var divided = _finder.Map(linework);
        return TogetherIfClear(divided) ?? throw Ambiguous(linework, divided.Map);
    }

    /// <summary>
    /// Faces that lines divide, but none of which another surrounds, are one section: a line between two of them is a joint
    /// or a centre line. If some face does not border the outside it could be a hole, and faces of different layers could
    /// be of different materials: then nothing is decided.
    /// </summary>
    private List<Loop>? TogetherIfClear((PlanarMap Map, IReadOnlyList<Strand> Strands) divided)
    {
        var (map, strands) = divided;
        var bordersOutside = new bool[map.Faces.Length];
        for (var e = 0; e < map.Edges.Length; e++)
        {
            var (left, right) = map.FacesBeside(e);
            if (Math.Min(left, right) == PlanarMap.Outside)
            {
                bordersOutside[Math.Max(left, right)] = true;
            }
        }

        var isOfOneLayer = strands.Select(s => s.Entity.Source.Layer).Distinct(StringComparer.OrdinalIgnoreCase).Count() == 1;
        if (!isOfOneLayer || !Array.TrueForAll(bordersOutside, b => b))
        {
            return null;
        }

        var faces = map.Faces.Select(f => MapFaceWords.Of(f, _frame).Text);
        _notes.Add(DrawingNote.About(
            NoteCode.FacesTogether,
            $"Lines divide the section into {map.Faces.Length} faces, none within the others; they were taken as one: " +
            string.Join("; ", faces.Take(8)) + (map.Faces.Length > 8 ? "; and more" : "") + ". To choose some of them, give --inside."));
        return LoopWalk.Of(map, strands, [.. bordersOutside]);
    }

    private List<Cover> OfLayers(List<Piece> pieces)
    {
        var covers = new List<Cover>();
        foreach (var pattern in _options.Regions.Select(r => new LayerPattern(r)))
        {
            foreach (var layer in pieces.Where(p => pattern.Matches(p.Entity.Source.Layer)).GroupBy(p => p.Entity.Source.Layer))
            {
                covers.Add(CoverOf(layer.Key, [.. layer]));
            }
        }

        return covers.Count > 0 ? covers : throw OutlineFaults.NothingOnRegions(_options.Regions);
    }

    private List<Cover> OfFills(List<Piece> pieces) =>
        [.. pieces.GroupBy(p => p.Entity).Select(fill => CoverOf(fill.Key.Source.Layer, [.. fill]))];

    private Cover CoverOf(string layer, List<Piece> pieces)
    {
        var linework = _finder.Closed(pieces);
        return new Cover(layer, linework.IsClosed ? LoopWalk.Of(linework) : Together(linework));
    }

    private (Outline Outline, List<Loop> Loops, ImmutableArray<DrawnFace> Faces) Chosen(Linework linework, List<Cover> covers)
    {
        var (map, strands) = _finder.Map(linework);
        var asked = FacesAsked(map);
        var faces = ImmutableArray.CreateBuilder<DrawnFace>();
        var isChosen = new bool[map.Faces.Length];
        for (var i = 0; i < isChosen.Length; i++)
        {
            var face = map.Faces[i];
            List<Cover> around = covers.FindAll(c => c.Holds(face.Inside));
            isChosen[i] = (covers.Count == 0 || around.Count > 0) && (_options.Inside.Count == 0 || asked.Contains(i));
            if (isChosen[i])
            {
                var layer = around.Count > 0 ? around[^1].Layer : strands[face.Loops[0][0].Edge].Entity.Source.Layer;
                var area = face.Area / _frame.Scale / _frame.Scale;
                faces.Add(new DrawnFace(layer, _frame.ToDrawing(face.Inside), area, [.. face.Loops.Select(l => BoundaryOf(map, l))]));
                NoteOverlap(around, faces[^1]);
            }
        }

        var loops = LoopWalk.Of(map, strands, isChosen);
        return (Sound(loops), loops, faces.ToImmutable());
    }

    /// <summary>The faces that hold the points asked for.</summary>
    private HashSet<int> FacesAsked(PlanarMap map)
    {
        var asked = new HashSet<int>();
        foreach (var place in _options.Inside)
        {
            var local = _frame.ToLocal(place);
            var face = Enumerable.Range(0, map.Faces.Length).Where(i => Holds(map, map.Faces[i], local)).DefaultIfEmpty(PlanarMap.Outside).First();
            if (!(face != PlanarMap.Outside))
            {
                throw OutlineFaults.NothingThere(place);
            }

            asked.Add(face);
        }

        return asked;
    }

    private static bool Holds(PlanarMap map, MapFace face, Point point) =>
        face.Loops.Sum(loop => WindingNumber.Of(BoundaryOf(map, loop), point)) > 0;

    private static Boundary BoundaryOf(PlanarMap map, ImmutableArray<DirectedEdge> loop) =>
        Boundary.Create(loop.Select(d => d.IsForward ? map.Edges[d.Edge] : map.Edges[d.Edge].Reversed()));

    private void NoteOverlap(List<Cover> around, DrawnFace face)
    {
        if (_options.Regions.Count > 0 && around.Count > 1)
        {
            _notes.Add(new DrawingNote(
                NoteCode.RegionsOverlap,
                $"The regions {string.Join(", ", around.Select(c => $"'{Wording.Shown(c.Layer)}'"))} overlap around {Wording.At(face.Inside)}; " +
                $"'{Wording.Shown(face.Layer)}' has the place, since it is named last.",
                [], face.Inside));
        }
    }

    private DrawingException Ambiguous(Linework linework, PlanarMap map)
    {
        var degrees = linework.Degrees();
        var meetings = linework.Strands
            .Where(s => degrees[s.From] > 2 || degrees[s.To] > 2)
            .Select(s => (Source: s.Entity.Source, Node: degrees[s.From] > 2 ? s.From : s.To))
            .DistinctBy(m => m.Node)
            .OrderBy(m => linework.Nodes[m.Node].X).ThenBy(m => linework.Nodes[m.Node].Y)
            .Select(m => new EntityPlace(m.Source, _frame.ToDrawing(linework.Nodes[m.Node])));
        return OutlineFaults.Ambiguous([.. map.Faces.OrderByDescending(f => f.Area).Select(f => MapFaceWords.Of(f, _frame))], meetings);
    }
}
