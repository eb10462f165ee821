using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Outlines;

namespace MemberScan.Ifc.Meshes.Runs;

/// <summary>
/// Straight runs of a mesh whose bars are joined: mitred, bent in many facets, or ending on the side of another. Each face must belong to a
/// straight piece or lie across its end, each corner on a line along a piece; what tapers, twists, is notched or curved is refused.
/// </summary>
internal sealed class RunSearch
{
    /// <summary>Longest face between pieces, over the extent of a piece that it touches [-].</summary>
    private const double LongestCap = 1.5;

    /// <summary>Longest bend made of short pieces, along its middle, over its section's extent [-].</summary>
    private const double LongestBend = 10;

    /// <summary>Largest distance of the ends of side and bore, over the section's extent [-].</summary>
    private const double BoreEnds = 0.5;

    private readonly ClosedSurface _surface;
    private readonly Func<Vector3, Vector3> _towardsY;
    private readonly Func<Vector3, double> _along;
    private readonly Dictionary<int, HashSet<int>> _patchesAt = [];

    private RunSearch(ClosedSurface surface, Func<Vector3, Vector3> towardsY, Func<Vector3, double> along)
    {
        (_surface, _towardsY, _along) = (surface, towardsY, along);
        foreach (var edge in surface.Edges)
            foreach (var point in new[] { edge.From, edge.To })
            {
                if (!_patchesAt.TryGetValue(point, out var patches)) _patchesAt[point] = patches = [];
                patches.Add(edge.Left);
                patches.Add(edge.Right);
            }
    }

    /// <summary>The straight runs of a closed mesh in the order of its faces; empty, with the reason, when it is not made of such.</summary>
    /// <param name="mesh">The mesh, one part.</param>
    /// <param name="towardsY">Gives, for an axis, the direction that the plane's y is nearest to.</param>
    /// <param name="along">Gives a direction its sense: positive where the axis should point.</param>
    /// <param name="fault">Why there is none; empty when there are some, or when nothing of the mesh is straight.</param>
    public static ImmutableArray<Prism> Of(Mesh mesh, Func<Vector3, Vector3> towardsY, Func<Vector3, double> along, out string fault)
    {
        if (ClosedSurface.Of(mesh, out fault) is not { } surface) return [];

        var search = new RunSearch(surface, towardsY, along);
        var pieces = search.Pieces(out fault);
        if (pieces.Count == 0) return [];

        if (fault.Length == 0) fault = search.Fault(pieces);
        if (fault.Length > 0) return [];

        return [.. pieces.Where(p => p.IsRun).OrderBy(p => p.Side.Patches[0]).Select(p => search.Run(p, pieces))];
    }

    /// <summary>Recognised pieces, the longest first; none has a patch of another.</summary>
    private List<RunPiece> Pieces(out string fault)
    {
        var rings = new RingSearch(_surface).All();
        var bores = rings.FindAll(r => r.IsBore);
        var free = bores.ToHashSet();
        var taken = new HashSet<int>();
        var pieces = new List<RunPiece>();
        foreach (var side in rings.Where(r => !r.IsBore).OrderByDescending(r => r.Length).ThenBy(r => r.Patches[0]))
        {
            if (side.Patches.Any(taken.Contains)) continue;

            var inside = bores.FindAll(b => (b.Axis - side.Axis).Length < 1e-9 && IsWithin(b, side));
            if (Piece(side, inside) is not { } piece) continue;

            pieces.Add(piece);
            taken.UnionWith(piece.Patches);
            free.ExceptWith(inside);
        }

        fault = free.Count > 0 && pieces.Count > 0 ? "a hole in it is not the bore of a straight run from end to end" : "";
        return pieces;
    }

    private static bool IsWithin(Ring bore, Ring side)
    {
        var (u, v) = (bore.Lines.Average(l => l.U), bore.Lines.Average(l => l.V));
        var away = double.Hypot(u - side.Lines.Average(l => l.U), v - side.Lines.Average(l => l.V));
        var close = BoreEnds * side.Extent;
        return bore.Extent < side.Extent && away < side.Extent / 4 && Math.Abs(bore.AtStart - side.AtStart) <= close && Math.Abs(bore.AtEnd - side.AtEnd) <= close;
    }

    private RunPiece? Piece(Ring side, List<Ring> bores)
    {
        var z = _along(side.Axis) >= 0 ? side.Axis : -side.Axis;
        var hint = _towardsY(z);
        if (!(hint - hint.Dot(z) * z).TryNormalize(out var y)) return null;

        var frame = new Transform3(Vector3.Zero, y.Cross(z), y, z);
        if (Outline(side, frame) is not { } outer) return null;

        var voids = bores.ConvertAll(b => Outline(b, frame));
        if (voids.Exists(v => v is null) || RecognisedSection.Of(outer, [.. voids.OfType<ClosedOutline>()]) is not { } section) return null;

        var spread = Math.Max(side.Spread, bores.Count > 0 ? bores.Max(b => b.Spread) : 0);
        return 2 * spread > PrismFit.Allowed(section.Shapes[0])
            ? null
            : new RunPiece(side, [.. side.Patches, .. bores.SelectMany(b => b.Patches)], frame, section, Math.Max(spread, section.Deviation));
    }

    private static ClosedOutline? Outline(Ring ring, Transform3 frame)
    {
        var v = ring.Axis.Cross(ring.U);
        var corners = ring.Lines.Select(l => l.U * ring.U + l.V * v).Select(p => new Vector3(p.Dot(frame.X), p.Dot(frame.Y), 0)).ToList();
        return ClosedOutline.From(corners.Select((c, i) => OutlineEdge.Straight(c, corners[(i + 1) % corners.Count])), out _);
    }

    private string Fault(List<RunPiece> pieces) =>
        !pieces.Exists(p => p.IsRun) ? "no straight piece of it is three times as long as its section"
        : OffLines(pieces) is { Length: > 0 } off ? off
        : LongCap(pieces) is { Length: > 0 } cap ? cap
        : OpenEnd(pieces) is { Length: > 0 } end ? end
        : Curved(pieces);

    private string OffLines(List<RunPiece> pieces)
    {
        var on = pieces.SelectMany(p => p.Patches.Count == p.Side.Patches.Length ? PointsOf(p.Side) : PointsOf(p.Side).Concat(BorePoints(p))).ToHashSet();
        var off = _patchesAt.Keys.Where(p => !on.Contains(p)).Order().ToList();
        if (off.Count == 0) return "";

        var at = _surface.Points[off[0]];
        return string.Create(CultureInfo.InvariantCulture, $"{off.Count} of its corners lie on no straight piece, the first at {at.X:0.####}, {at.Y:0.####}, {at.Z:0.####} m");
    }

    private static IEnumerable<int> PointsOf(Ring ring) => ring.Lines.SelectMany(l => l.Points);

    // A bore's patches have all their corners on its lines.
    private IEnumerable<int> BorePoints(RunPiece piece)
    {
        var bore = piece.Patches.Except(piece.Side.Patches);
        return _surface.Edges.Where(e => bore.Contains(e.Left) || bore.Contains(e.Right)).SelectMany(e => new[] { e.From, e.To });
    }

    private string LongCap(List<RunPiece> pieces)
    {
        var sides = pieces.SelectMany(p => p.Patches).ToHashSet();
        var largest = pieces.Max(p => p.Extent);
        foreach (var patch in _surface.Edges.SelectMany(e => new[] { (Patch: e.Left, Edge: e), (Patch: e.Right, Edge: e) }).Where(p => !sides.Contains(p.Patch)).GroupBy(p => p.Patch))
        {
            var points = patch.SelectMany(p => new[] { p.Edge.From, p.Edge.To }).Distinct().Select(i => _surface.Points[i]).ToList();
            var reach = points.Max(p => (p - points[0]).Length);
            if (reach > LongestCap * largest) return string.Create(CultureInfo.InvariantCulture, $"a face of it that belongs to no straight piece is {reach * 1e3:0.#} mm long");
        }

        return "";
    }

    private string OpenEnd(List<RunPiece> pieces)
    {
        foreach (var piece in pieces)
            foreach (var end in new[] { false, true })
                if (piece.Side.OutOfPlane(end) > PrismFit.Tolerance * piece.LeastExtent && !JoinedAt(piece, end, pieces).Any())
                    return string.Create(CultureInfo.InvariantCulture, $"an end of it is neither plane nor on another bar (out of plane by {piece.Side.OutOfPlane(end) * 1e3:0.###} mm)");
        return "";
    }

    private IEnumerable<RunPiece> JoinedAt(RunPiece piece, bool end, List<RunPiece> pieces)
    {
        var patches = piece.EndPoints(end).SelectMany(p => _patchesAt[p]).ToHashSet();
        return pieces.Where(other => other != piece && other.Patches.Overlaps(patches));
    }

    /// <summary>Short pieces in a row are a bend; a long one is a curved bar.</summary>
    private static string Curved(List<RunPiece> pieces)
    {
        var bends = pieces.FindAll(p => !p.IsRun);
        var groups = new DisjointSets(bends.Count);
        var first = new Dictionary<int, int>();
        for (var i = 0; i < bends.Count; i++)
            foreach (var point in PointsOf(bends[i].Side))
                if (!first.TryAdd(point, i))
                    groups.Join(first[point], i);

        foreach (var bend in bends.Select((b, i) => (Piece: b, Group: groups.Of(i))).GroupBy(b => b.Group))
        {
            var (length, extent) = (bend.Sum(b => b.Piece.Side.Length), bend.Max(b => b.Piece.Extent));
            if (length > LongestBend * extent) return string.Create(CultureInfo.InvariantCulture, $"{bend.Count()} short pieces of it in a row, {length * 1e3:0} mm long, are curved");
        }

        return "";
    }

    private Prism Run(RunPiece piece, List<RunPiece> pieces)
    {
        var (atStart, atEnd) = (ToJoint(piece, false, pieces), ToJoint(piece, true, pieces));
        var (from, to) = (piece.Side.AtStart - atStart, piece.Side.AtEnd + atEnd);
        var z = piece.Frame.Z;
        var height = z.Dot(piece.Side.Axis) > 0 ? from : -to;
        var isOblique = IsOblique(piece, false) || IsOblique(piece, true);
        return new Prism(piece.Frame with { Origin = height * z }, to - from, piece.Section, piece.Residual, isOblique) { IsRun = true, ShortPieces = pieces.Count(p => !p.IsRun) };
    }

    private double ToJoint(RunPiece piece, bool end, List<RunPiece> pieces) =>
        JoinedAt(piece, end, pieces).Select(other => piece.ToAxisOf(other, end)).DefaultIfEmpty(0).Max();

    private static bool IsOblique(RunPiece piece, bool end)
    {
        var heights = piece.Side.Lines.Select(l => end ? l.To : l.From).ToList();
        return heights.Max() - heights.Min() > PrismFit.Tolerance * piece.LeastExtent;
    }
}
