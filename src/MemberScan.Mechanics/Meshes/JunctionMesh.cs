using MemberScan.Mechanics.Edges;

namespace MemberScan.Mechanics.Meshes;

/// <summary>Patches of sections made of straight walls that meet at right angles: columns along the walls and around each corner, layers across.</summary>
internal sealed class JunctionMesh
{
    private readonly List<Patch> _patches = [];
    private readonly Junction _at;
    private readonly double[] _layers;

    private JunctionMesh(Junction at)
    {
        _at = at;
        var wall = Math.Min(at.FirstThickness, at.SecondThickness);
        // From the inner face to the outer one.
        double[] layers = Grading.Fractions(Grading.Layers(at.Radius, wall), 1);
        _layers = layers[^2] < 1 - 1.5 * Grading.Ratio ? [.. layers[..^1], 1 - Grading.Ratio, 1] : layers;
    }

    /// <summary>The mesh of junctions whose ends meet; of the first quadrant where told so.</summary>
    public static PatchMesh Of(IEnumerable<Junction> junctions, bool isQuarter, double scale) =>
        new([.. junctions.SelectMany(junction => new JunctionMesh(junction).Build())], isQuarter, scale) { IsGraded = true };

    private List<Patch> Build()
    {
        var (r, t, w) = (_at.Radius, _at.FirstThickness, _at.SecondThickness);
        var middle = r * (1 - Math.Sqrt(0.5));
        Wall((r, 0), (_at.FirstLength, 0), (r, -t), (_at.FirstLength, -t), t, isFree: true);
        Around(Arc((r, 0), (middle, middle)), Line((r, -t), (-w, -t)), fromWall: true);
        Around(Arc((middle, middle), (0, r)), Line((-w, -t), (-w, r)), fromWall: false);
        Wall((0, r), (0, _at.SecondLength), (-w, r), (-w, _at.SecondLength), w, _at.IsSecondFree);
        return _patches;
    }

    private void Wall((double A, double B) innerFrom, (double A, double B) innerTo, (double A, double B) outerFrom, (double A, double B) outerTo, double thickness, bool isFree)
    {
        const double AtFreeEnd = 0.08;

        var length = double.Hypot(innerTo.A - innerFrom.A, innerTo.B - innerFrom.B);
        var first = _at.Radius >= Grading.RoundFrom * thickness ? Grading.Ratio * thickness : Math.Max(_at.Radius, Grading.Finest * thickness);
        var (inner, outer) = (Line(innerFrom, innerTo), Line(outerFrom, outerTo));
        List<double> pieces = Grading.Graded(isFree ? length / 2 : length, first, thickness);
        if (isFree) pieces.AddRange(Enumerable.Reverse(Grading.Graded(length / 2, AtFreeEnd * thickness, thickness)));
        pieces.Reverse();
        var cuts = Grading.Fractions(pieces, length);
        for (var k = 1; k < cuts.Length; k++) Column(inner.Piece(cuts[k - 1], cuts[k]), outer.Piece(cuts[k - 1], cuts[k]));
    }

    // Half of the way around the corner, cut near the outer corner and near the junction of arc and straight side, where the curvature jumps.
    private void Around(EdgeCurve inner, EdgeCurve outer, bool fromWall)
    {
        var isRound = _at.Radius >= Grading.RoundFrom * Math.Min(_at.FirstThickness, _at.SecondThickness);
        ReadOnlySpan<double> cuts = isRound ? [0, Grading.Ratio, 1 - Grading.Ratio, 1] : fromWall ? [0, 1 - Grading.Ratio, 1] : [0, Grading.Ratio, 1];
        for (var k = 1; k < cuts.Length; k++) Column(inner.Piece(cuts[k - 1], cuts[k]), outer.Piece(cuts[k - 1], cuts[k]));
    }

    private void Column(EdgeCurve inner, EdgeCurve outer)
    {
        for (var k = 1; k < _layers.Length; k++) _patches.Add(Patch.Ruled(inner, outer, (0, 1), (_layers[k - 1], _layers[k])));
    }

    private EdgeCurve Line((double A, double B) from, (double A, double B) to) => EdgeCurve.Line(_at.Place(from.A, from.B), _at.Place(to.A, to.B));

    // A piece of the fillet between two of its points; a point where the corner is sharp.
    private EdgeCurve Arc((double A, double B) from, (double A, double B) to)
    {
        if (_at.Radius == 0) return Line(from, to);

        var (centre, start, end) = (_at.Place(_at.Radius, _at.Radius), _at.Place(from.A, from.B), _at.Place(to.A, to.B));
        var angle = Math.Atan2(start.Z - centre.Z, start.Y - centre.Y);
        var sweep = Math.IEEERemainder(Math.Atan2(end.Z - centre.Z, end.Y - centre.Y) - angle, 2 * Math.PI);
        return EdgeCurve.Arc(centre, _at.Radius, angle, angle + sweep);
    }
}
