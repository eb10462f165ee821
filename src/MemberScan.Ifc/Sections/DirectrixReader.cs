using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Units;
using MemberScan.Model;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Sections;

/// <summary>Centre lines from polylines, indexed poly-curves, composite curves, trimmed lines and trimmed circles.</summary>
internal sealed class DirectrixReader(Instances instances, PlacementReader placements, ModelUnits units)
{
    /// <summary>Most pieces that a centre line may have.</summary>
    public const int MaxPieces = 100_000;

    // A straight or circular piece with its range of curve parameter, in curve order.
    private readonly record struct Piece(Vector3 Start, Vector3 End, Vector3 StartTangent, Vector3 EndTangent, double Length, double BendRadius, double ParameterSpan)
    {
        public bool IsArc => BendRadius > 0;

        public Piece Reversed => new(End, Start, -EndTangent, -StartTangent, Length, BendRadius, ParameterSpan);
    }

    /// <summary>Reads the centre line between two parameters of its curve.</summary>
    /// <param name="curve">Reference to the curve.</param>
    /// <param name="startParam">Start parameter; may be unset.</param>
    /// <param name="endParam">End parameter; may be unset.</param>
    /// <param name="filletRadius">Radius that rounds every corner [m]; 0 for none.</param>
    public Finding<Directrix> Read(Part21Value curve, Part21Value startParam, Part21Value endParam, double filletRadius)
    {
        if (units.Length is null) return Missing(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");
        if (!instances.TryFollow(curve, out var record)) return Missing(ReasonCode.DamagedRecord, "the centre line refers to nothing");
        if (Pieces(record, depth: 0) is not { Count: > 0 } pieces)
            return Missing(ReasonCode.LengthAmbiguous, string.Create(CultureInfo.InvariantCulture, $"the centre line {record.Keyword} #{record.Id} is not read or is damaged"));
        if (Trimmed(pieces, Instances.Real(startParam), Instances.Real(endParam)) is not { } kept)
            return Missing(ReasonCode.LengthAmbiguous, string.Create(CultureInfo.InvariantCulture, $"the centre line {record.Keyword} #{record.Id} is trimmed beyond its parameters, or from 0 to 1 although it has more; its length is ambiguous"));

        return new Finding<Directrix>.Found(Joined(kept, filletRadius), string.Create(CultureInfo.InvariantCulture, $"{record.Keyword} #{record.Id}"));
    }

    private static Directrix Joined(List<Piece> pieces, double filletRadius)
    {
        var bends = ImmutableArray.CreateBuilder<double>();
        var length = 0.0;
        var corners = 0;
        for (var i = 0; i < pieces.Count; i++)
        {
            length += pieces[i].Length;
            if (pieces[i].IsArc) bends.Add(pieces[i].BendRadius);
            if (i == 0) continue;

            var angle = Math.Acos(Math.Clamp(pieces[i - 1].EndTangent.Dot(pieces[i].StartTangent), -1, 1));
            if (angle < 1e-3) continue;

            if (filletRadius > 0)
            {
                bends.Add(filletRadius);
                length -= filletRadius * (2 * Math.Tan(Math.Min(angle, 3) / 2) - angle);
            }
            else
            {
                corners++;
            }
        }

        return new Directrix(pieces[0].Start, pieces[0].StartTangent, length, bends.ToImmutable(), corners);
    }

    private List<Piece>? Pieces(Part21Record curve, int depth)
    {
        if (depth > 16) return null;

        return curve.Keyword switch
        {
            "IFCPOLYLINE" => instances.FollowEach(curve[0]) is { } points ? Straight([.. points.Select(placements.Point)]) : null,
            "IFCINDEXEDPOLYCURVE" => Indexed(curve),
            "IFCCOMPOSITECURVE" => Composite(curve, depth),
            "IFCTRIMMEDCURVE" => TrimmedCurve(curve),
            _ => null,
        };
    }

    private static List<Piece>? Straight(IReadOnlyList<Vector3?> points)
    {
        if (points.Count < 2 || points.Count > MaxPieces) return null;

        var pieces = new List<Piece>(points.Count - 1);
        for (var i = 1; i < points.Count; i++)
        {
            if (points[i - 1] is not { } start || points[i] is not { } end) return null;

            if (Line(start, end, 1) is { } piece) pieces.Add(piece);
            else pieces.Add(new Piece(start, end, default, default, 0, 0, 1));   // a repeated point still counts as a parameter step
        }

        pieces.RemoveAll(p => p.Length == 0 && p.StartTangent == default && pieces.Count == 1);
        return WithTangents(pieces);
    }

    private static List<Piece>? WithTangents(List<Piece> pieces)
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

    private List<Piece>? Indexed(Part21Record curve)
    {
        if (!instances.TryFollow(curve[0], out var list) || PointList(list) is not { } points) return null;
        if (curve[1].IsEmpty) return Straight([.. points.Select(p => (Vector3?)p)]);

        var pieces = new List<Piece>();
        foreach (var segment in curve[1].Items)
        {
            var indices = segment.Inner.Items.Select(i => i.TryInteger(out var index) && index >= 1 && index <= points.Count ? (int)index - 1 : -1).ToArray();
            if (Array.Exists(indices, i => i < 0) || indices.Length < 2 || pieces.Count > MaxPieces) return null;

            if (segment.TypeName == "IFCARCINDEX")
            {
                if (indices.Length != 3 || Arc(points[indices[0]], points[indices[1]], points[indices[2]]) is not { } arc) return null;

                pieces.Add(arc);
            }
            else
            {
                for (var i = 1; i < indices.Length; i++)
                    if (Line(points[indices[i - 1]], points[indices[i]], 1) is { } line)
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

    private List<Piece>? Composite(Part21Record curve, int depth)
    {
        if (instances.FollowEach(curve[0]) is not { } segments) return null;

        var pieces = new List<Piece>();
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

    private List<Piece>? TrimmedCurve(Part21Record curve)
    {
        if (!instances.TryFollow(curve[0], out var basis)) return null;

        var forward = Instances.Literal(curve[3]) != "F";
        var byPoint = Instances.Literal(curve[4]) == "CARTESIAN";
        return basis.Keyword switch
        {
            "IFCLINE" => TrimmedLine(basis, curve, forward, byPoint),
            "IFCCIRCLE" => TrimmedCircle(basis, curve, forward, byPoint),
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

    private List<Piece>? TrimmedLine(Part21Record line, Part21Record curve, bool forward, bool byPoint)
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
        return Line(start, end, span) is { } piece ? [piece] : null;
    }

    private List<Piece>? TrimmedCircle(Part21Record circle, Part21Record curve, bool forward, bool byPoint)
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
        return [new Piece(Place(start), Place(last), Tangent(start), Tangent(last), radius * sweep, radius, sweep / units.Angle)];
    }

    private static Piece? Line(Vector3 start, Vector3 end, double span)
    {
        var along = end - start;
        return along.TryNormalize(out var unit) ? new Piece(start, end, unit, unit, along.Length, 0, span) : null;
    }

    private static Piece? Arc(Vector3 start, Vector3 middle, Vector3 end)
    {
        // Centre of the circle through three points, by barycentric weights of the triangle.
        var (a, b) = (start - end, middle - end);
        var cross = a.Cross(b);
        var square = cross.Dot(cross);
        if (!(square > 1e-30)) return null;

        var centre = end + 1 / (2 * square) * (a.Dot(a) * b - b.Dot(b) * a).Cross(cross);
        var radius = (start - centre).Length;
        if (!(middle - start).Cross(end - middle).TryNormalize(out var normal)) return null;

        // Counter-clockwise about that normal the arc runs start, middle, end.
        var sweep = Math.Atan2((start - centre).Cross(end - centre).Dot(normal), (start - centre).Dot(end - centre));
        if (sweep <= 0) sweep += 2 * Math.PI;

        _ = normal.Cross(start - centre).TryNormalize(out var startTangent);
        _ = normal.Cross(end - centre).TryNormalize(out var endTangent);
        return new Piece(start, end, startTangent, endTangent, radius * sweep, radius, 1);
    }

    private static List<Piece>? Trimmed(List<Piece> pieces, double? startParam, double? endParam)
    {
        var total = pieces.Sum(p => p.ParameterSpan);
        var from = startParam ?? 0;
        var to = endParam ?? total;
        var slack = 1e-6 * Math.Max(1, total);
        if (from < -slack || to > total + slack || to - from <= slack) return null;

        // 0 to 1 on a longer curve is its first piece by the standard and the whole of it by some exporters: not to be guessed.
        if (startParam == 0 && endParam == 1 && total > 1 + slack) return null;

        var kept = new List<Piece>();
        var at = 0.0;
        foreach (var piece in pieces)
        {
            var (a, b) = (Math.Max(from, at) - at, Math.Min(to, at + piece.ParameterSpan) - at);
            at += piece.ParameterSpan;
            if (b - a <= slack && piece.ParameterSpan > slack) continue;

            if (a <= slack && b >= piece.ParameterSpan - slack) kept.Add(piece);
            else if (piece.IsArc) return null;                  // part of an arc: not needed so far, never guessed
            else if (Line(piece.Start + a / piece.ParameterSpan * (piece.End - piece.Start), piece.Start + b / piece.ParameterSpan * (piece.End - piece.Start), b - a) is { } part) kept.Add(part);
        }

        return kept.Count > 0 && kept.Exists(p => p.Length > 0) ? kept : null;
    }

    private static Finding<Directrix> Missing(ReasonCode code, string message) => new Finding<Directrix>.Missing(new Reason(code, message));
}
