using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Units;
using MemberScan.Part21;

namespace MemberScan.Ifc.Curves;

/// <summary>
/// Straight and circular pieces of polylines, indexed poly-curves, composite curves, trimmed lines and trimmed circles. Ellipses and B-splines
/// are followed by arcs, in outlines alone.
/// </summary>
internal sealed class CurveReader(Instances instances, PlacementReader placements, ModelUnits units)
{
    /// <summary>Most pieces that a curve may have.</summary>
    public const int MaxPieces = 100_000;

    /// <summary>Deepest nesting of composite curves that is followed.</summary>
    public const int MaxNesting = 16;

    private readonly SplineReader _splines = new(instances, placements);
    private double? _followed;

    /// <summary>The pieces of a curve in its order; null when it is of another kind, damaged or beyond the limits.</summary>
    public List<CurvePiece>? Pieces(Part21Record curve)
    {
        _followed = null;
        return Pieces(curve, depth: 0) is { } pieces && _followed is null ? pieces : null;
    }

    /// <summary>The pieces of a curve that bounds an area: as <see cref="Pieces(Part21Record)"/>, and whole circles; an unclosed indexed poly-curve is not closed here.</summary>
    /// <param name="curve">The curve.</param>
    /// <param name="within">Largest distance from curves that arcs follow [m]; null where all is straight or circular.</param>
    public List<CurvePiece>? ClosedPieces(Part21Record curve, out double? within)
    {
        _followed = null;
        var pieces = curve.Keyword == "IFCCIRCLE" ? WholeCircle(curve) : Pieces(curve, depth: 0);
        within = _followed;
        return pieces;
    }

    /// <summary>Axes and radius of IfcCircle [m]; null when it is damaged.</summary>
    public (Transform3 Axes, double Radius)? CircleOf(Part21Record circle) =>
        units.Length is { } metre && placements.Axis2(circle[0]) is { } axes && Instances.Real(circle[1]) is { } r && r > 0 ? (axes, metre * r) : null;

    /// <summary>Arcs that follow an ellipse between two of its angles [rad]; null when it is damaged.</summary>
    private List<CurvePiece>? Ellipse(Part21Record ellipse, double from, double sweep)
    {
        if (units.Length is not { } metre || placements.Axis2(ellipse[0]) is not { } axes || Instances.Real(ellipse[1]) is not { } a || Instances.Real(ellipse[2]) is not { } b || !(a > 0) || !(b > 0)) return null;

        return Followed(share =>
        {
            var (sin, cos) = Math.SinCos(from + share * sweep);
            return axes.Origin + metre * a * cos * axes.X + metre * b * sin * axes.Y;
        }, [.. Enumerable.Range(0, 13).Select(i => i / 12.0)]);
    }

    private List<CurvePiece>? Followed(Func<double, Vector3> at, IReadOnlyList<double> breaks)
    {
        var pieces = SampledCurve.Arcs(at, breaks, out var deviation);
        _followed = Math.Max(_followed ?? 0, deviation);
        return pieces;
    }

    private List<CurvePiece>? WholeCircle(Part21Record circle)
    {
        if (units.Length is not { } metre || placements.Axis2(circle[0]) is not { } axes || Instances.Real(circle[1]) is not { } r || !(r > 0)) return null;

        var (radius, half) = (metre * r, Math.PI / units.Angle);
        var (right, left) = (axes.Origin + radius * axes.X, axes.Origin - radius * axes.X);
        return
        [
            new CurvePiece(right, left, axes.Y, -axes.Y, Math.PI * radius, radius, half),
            new CurvePiece(left, right, -axes.Y, axes.Y, Math.PI * radius, radius, half),
        ];
    }

    private List<CurvePiece>? Pieces(Part21Record curve, int depth)
    {
        if (depth > MaxNesting) return null;

        return curve.Keyword switch
        {
            "IFCPOLYLINE" => instances.FollowEach(curve[0]) is { } points ? Straight([.. points.Select(placements.Point)]) : null,
            "IFCINDEXEDPOLYCURVE" => Indexed(curve),
            "IFCCOMPOSITECURVE" => Composite(curve, depth),
            "IFCTRIMMEDCURVE" => TrimmedCurve(curve),
            "IFCELLIPSE" => Ellipse(curve, 0, 2 * Math.PI),
            "IFCBSPLINECURVEWITHKNOTS" or "IFCRATIONALBSPLINECURVEWITHKNOTS" => _splines.Read(curve) is { } spline ? Followed(spline.At, spline.Breaks) : null,
            _ => null,
        };
    }

    private static List<CurvePiece>? Straight(IReadOnlyList<Vector3?> points)
    {
        if (points.Count < 2 || points.Count > MaxPieces) return null;

        var pieces = new List<CurvePiece>(points.Count - 1);
        for (var i = 1; i < points.Count; i++)
        {
            if (points[i - 1] is not { } start || points[i] is not { } end) return null;

            if (CurvePiece.Line(start, end, 1) is { } piece) pieces.Add(piece);
            else pieces.Add(new CurvePiece(start, end, default, default, 0, 0, 1));   // a repeated point still counts as a parameter step
        }

        pieces.RemoveAll(p => p.Length == 0 && p.StartTangent == default && pieces.Count == 1);
        return WithTangents(pieces);
    }

    private static List<CurvePiece>? WithTangents(List<CurvePiece> pieces)
    {
        var sound = pieces.Find(p => p.Length > 0);
        if (sound.Length <= 0) return null;

        var tangent = sound.StartTangent;
        for (var i = 0; i < pieces.Count; i++)
        {
            if (pieces[i].Length > 0) tangent = pieces[i].EndTangent;
            else pieces[i] = pieces[i] with { StartTangent = tangent, EndTangent = tangent };
        }

        return pieces;
    }

    private List<CurvePiece>? Indexed(Part21Record curve)
    {
        if (!instances.TryFollow(curve[0], out var list) || PointList(list) is not { } points) return null;
        if (curve[1].IsEmpty) return Straight([.. points.Select(p => (Vector3?)p)]);

        var pieces = new List<CurvePiece>();
        foreach (var segment in curve[1].Items)
        {
            var indices = segment.Inner.Items.Select(i => i.TryInteger(out var index) && index >= 1 && index <= points.Count ? (int)index - 1 : -1).ToArray();
            if (Array.Exists(indices, i => i < 0) || indices.Length < 2 || pieces.Count > MaxPieces) return null;

            if (segment.TypeName == "IFCARCINDEX")
            {
                if (indices.Length != 3 || CurvePiece.Arc(points[indices[0]], points[indices[1]], points[indices[2]]) is not { } arc) return null;

                pieces.Add(arc);
            }
            else
            {
                for (var i = 1; i < indices.Length; i++)
                    if (CurvePiece.Line(points[indices[i - 1]], points[indices[i]], 1) is { } line)
                        pieces.Add(line);
            }
        }

        return pieces;
    }

    private List<Vector3>? PointList(Part21Record list)
    {
        if (units.Length is not { } metre) return null;

        var rows = list[0].Items;
        if (rows.Count > MaxPieces) return null;

        var points = new List<Vector3>(rows.Count);
        foreach (var row in rows)
        {
            if (Instances.Reals(row) is not { Length: 2 or 3 } c) return null;

            points.Add(metre * new Vector3(c[0], c[1], c.Length > 2 ? c[2] : 0));
        }

        return points;
    }

    private List<CurvePiece>? Composite(Part21Record curve, int depth)
    {
        if (instances.FollowEach(curve[0]) is not { } segments) return null;

        var pieces = new List<CurvePiece>();
        foreach (var segment in segments)
        {
            if (segment.Keyword != "IFCCOMPOSITECURVESEGMENT" || !instances.TryFollow(segment[2], out var parent)) return null;
            if (Pieces(parent, depth + 1) is not { } inner || pieces.Count + inner.Count > MaxPieces) return null;

            if (Instances.Literal(segment[1]) == "F")
            {
                inner.Reverse();
                pieces.AddRange(inner.Select(p => p.Reversed));
            }
            else
            {
                pieces.AddRange(inner);
            }
        }

        return pieces;
    }

    private List<CurvePiece>? TrimmedCurve(Part21Record curve)
    {
        if (!instances.TryFollow(curve[0], out var basis)) return null;

        var forward = Instances.Literal(curve[3]) != "F";
        var byPoint = Instances.Literal(curve[4]) == "CARTESIAN";
        return basis.Keyword switch
        {
            "IFCLINE" => TrimmedLine(basis, curve, forward, byPoint),
            "IFCCIRCLE" => TrimmedCircle(basis, curve, forward, byPoint),
            "IFCELLIPSE" => TrimmedEllipse(basis, curve, forward, byPoint),
            _ => null,
        };
    }

    private (double? Parameter, Vector3? Point) Trim(Part21Value set)
    {
        double? parameter = null;
        Vector3? point = null;
        foreach (var item in set.Items)
        {
            if (instances.TryFollow(item, out var record)) point = placements.Point(record);
            else if (Instances.Real(item) is { } value) parameter = value;
        }

        return (parameter, point);
    }

    private List<CurvePiece>? TrimmedLine(Part21Record line, Part21Record curve, bool forward, bool byPoint)
    {
        if (units.Length is not { } metre || !instances.TryFollow(line[0], out var pointRecord) || placements.Point(pointRecord) is not { } origin) return null;
        if (!instances.TryFollow(line[1], out var vector) || placements.Direction(vector[0]) is not { } direction || Instances.Real(vector[1]) is not { } magnitude) return null;
        if (!direction.TryNormalize(out var unit)) return null;

        Vector3? At(Part21Value set)
        {
            var (parameter, point) = Trim(set);
            Vector3? byParameter = parameter is { } u ? origin + u * magnitude * metre * unit : null;
            return byPoint ? point ?? byParameter : byParameter ?? point;
        }

        if (At(curve[1]) is not { } start || At(curve[2]) is not { } end) return null;

        _ = forward;   // a line has one way from trim to trim; the sense says the same
        var span = magnitude * metre > 0 ? (end - start).Length / (magnitude * metre) : 1;
        return CurvePiece.Line(start, end, span) is { } piece ? [piece] : null;
    }

    // The parameter of an ellipse is the angle of the circle that it is stretched from.
    private List<CurvePiece>? TrimmedEllipse(Part21Record ellipse, Part21Record curve, bool forward, bool byPoint)
    {
        if (units.Length is not { } metre || placements.Axis2(ellipse[0]) is not { } axes || Instances.Real(ellipse[1]) is not { } a || Instances.Real(ellipse[2]) is not { } b || !(a > 0) || !(b > 0)) return null;

        double? AngleAt(Part21Value set)
        {
            var (parameter, point) = Trim(set);
            double? byParameter = parameter is { } u ? u * units.Angle : null;
            double? byPlace = point is { } p ? Math.Atan2((p - axes.Origin).Dot(axes.Y) / (metre * b), (p - axes.Origin).Dot(axes.X) / (metre * a)) : null;
            return byPoint ? byPlace ?? byParameter : byParameter ?? byPlace;
        }

        if (AngleAt(curve[1]) is not { } start || AngleAt(curve[2]) is not { } end) return null;

        var sweep = forward ? end - start : start - end;
        sweep -= 2 * Math.PI * Math.Floor(sweep / (2 * Math.PI));
        if (sweep < 1e-12) sweep = 2 * Math.PI;
        return Ellipse(ellipse, start, forward ? sweep : -sweep);
    }

    private List<CurvePiece>? TrimmedCircle(Part21Record circle, Part21Record curve, bool forward, bool byPoint)
    {
        if (units.Length is not { } metre || placements.Axis2(circle[0]) is not { } axes || Instances.Real(circle[1]) is not { } r || !(r > 0)) return null;

        var radius = metre * r;
        double? AngleAt(Part21Value set)
        {
            var (parameter, point) = Trim(set);
            double? byParameter = parameter is { } u ? u * units.Angle : null;
            double? byPlace = point is { } p ? Math.Atan2((p - axes.Origin).Dot(axes.Y), (p - axes.Origin).Dot(axes.X)) : null;
            return byPoint ? byPlace ?? byParameter : byParameter ?? byPlace;
        }

        if (AngleAt(curve[1]) is not { } start || AngleAt(curve[2]) is not { } end) return null;

        var sweep = forward ? end - start : start - end;
        sweep -= 2 * Math.PI * Math.Floor(sweep / (2 * Math.PI));
        if (sweep < 1e-12) sweep = 2 * Math.PI;

        var sense = forward ? 1 : -1;
        Vector3 Place(double angle) => axes.Origin + radius * (Math.Cos(angle) * axes.X + Math.Sin(angle) * axes.Y);
        Vector3 Tangent(double angle) => sense * (-Math.Sin(angle) * axes.X + Math.Cos(angle) * axes.Y);
        var last = start + sense * sweep;
        if (sweep < 2 * Math.PI - 1e-9) return [new CurvePiece(Place(start), Place(last), Tangent(start), Tangent(last), radius * sweep, radius, sweep / units.Angle)];

        // A full turn in two halves, so that each piece has a chord.
        var half = start + sense * sweep / 2;
        return
        [
            new CurvePiece(Place(start), Place(half), Tangent(start), Tangent(half), radius * sweep / 2, radius, sweep / 2 / units.Angle),
            new CurvePiece(Place(half), Place(last), Tangent(half), Tangent(last), radius * sweep / 2, radius, sweep / 2 / units.Angle),
        ];
    }
}
