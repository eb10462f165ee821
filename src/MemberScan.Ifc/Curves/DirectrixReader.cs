using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Ifc.Units;
using MemberScan.Model;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Curves;

/// <summary>Centre lines from the pieces of their curves.</summary>
internal sealed class DirectrixReader(Instances instances, CurveReader curves, ModelUnits units)
{
    /// <summary>Reads the centre line between two parameters of its curve.</summary>
    /// <param name="curve">Reference to the curve.</param>
    /// <param name="startParam">Start parameter; may be unset.</param>
    /// <param name="endParam">End parameter; may be unset.</param>
    /// <param name="filletRadius">Radius that rounds every corner [m]; 0 for none.</param>
    public Finding<Directrix> Read(Part21Value curve, Part21Value startParam, Part21Value endParam, double filletRadius)
    {
        if (units.Length is null) return Missing(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");
        if (!instances.TryFollow(curve, out var record)) return Missing(ReasonCode.DamagedRecord, "the centre line refers to nothing");
        if (curves.Pieces(record) is not { Count: > 0 } pieces)
            return Missing(ReasonCode.LengthAmbiguous, string.Create(CultureInfo.InvariantCulture, $"the centre line {record.Keyword} #{record.Id} is not read or is damaged"));

        // Since IFC4X3 both ends may be lengths along the curve instead of its parameters.
        var byLength = startParam.TypeName == "IFCLENGTHMEASURE" || endParam.TypeName == "IFCLENGTHMEASURE";
        if (byLength && (startParam.TypeName == "IFCPARAMETERVALUE" || endParam.TypeName == "IFCPARAMETERVALUE"))
            return Missing(ReasonCode.LengthAmbiguous, string.Create(CultureInfo.InvariantCulture, $"the centre line {record.Keyword} #{record.Id} is trimmed by a length and by a parameter; its length is ambiguous"));
        if (byLength) pieces = [.. pieces.Select(p => p with { ParameterSpan = p.Length / units.Length.Value })];
        if (Trimmed(pieces, Instances.Real(startParam), Instances.Real(endParam)) is not { } kept)
            return Missing(ReasonCode.LengthAmbiguous, string.Create(CultureInfo.InvariantCulture, $"the centre line {record.Keyword} #{record.Id} is trimmed beyond its parameters, or from 0 to 1 although it has more; its length is ambiguous"));

        return new Finding<Directrix>.Found(Joined(kept, filletRadius), string.Create(CultureInfo.InvariantCulture, $"{record.Keyword} #{record.Id}"));
    }

    private static Directrix Joined(List<CurvePiece> pieces, double filletRadius)
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

    private static List<CurvePiece>? Trimmed(List<CurvePiece> pieces, double? startParam, double? endParam)
    {
        var total = pieces.Sum(p => p.ParameterSpan);
        var from = startParam ?? 0;
        var to = endParam ?? total;
        var slack = 1e-6 * Math.Max(1, total);
        if (from < -slack || to > total + slack || to - from <= slack) return null;

        // 0 to 1 on a longer curve is its first piece by the standard and the whole of it by some exporters: not to be guessed.
        if (startParam == 0 && endParam == 1 && total > 1 + slack) return null;

        var kept = new List<CurvePiece>();
        var at = 0.0;
        foreach (var piece in pieces)
        {
            var (a, b) = (Math.Max(from, at) - at, Math.Min(to, at + piece.ParameterSpan) - at);
            at += piece.ParameterSpan;
            if (b - a <= slack && piece.ParameterSpan > slack) continue;

            if (a <= slack && b >= piece.ParameterSpan - slack) kept.Add(piece);
            else if (piece.IsArc) return null;                  // part of an arc: not needed so far, never guessed
            else if (CurvePiece.Line(piece.Start + a / piece.ParameterSpan * (piece.End - piece.Start), piece.Start + b / piece.ParameterSpan * (piece.End - piece.Start), b - a) is { } part) kept.Add(part);
        }

        return kept.Count > 0 && kept.Exists(p => p.Length > 0) ? kept : null;
    }

    private static Finding<Directrix> Missing(ReasonCode code, string message) => new Finding<Directrix>.Missing(new Reason(code, message));
}
