using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Curves;
using MemberScan.Model;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>The course of a curve member as straight stretches; an arc is a chain of chords.</summary>
/// <param name="Points">Its corners from start to end [m], project coordinates; at least two.</param>
/// <param name="IsCurved">Whether arcs were replaced by chords.</param>
internal sealed record Course(ImmutableArray<Vector3> Points, bool IsCurved)
{
    /// <summary>Largest turn of an arc within one chord [rad]: 5°, the chord's sagitta then being under 1/4000 of the radius.</summary>
    public const double TurnOfChord = 5 * Math.PI / 180;

    /// <summary>Turn from which an arc closes on itself and its ends no longer tell its centre [rad].</summary>
    private const double FullTurn = 2 * Math.PI - 1e-6;

    /// <summary>Most stretches of one member.</summary>
    public const int MostStretches = 2000;

    /// <summary>Length of all stretches [m].</summary>
    public double Length => Points.Zip(Points.Skip(1), (a, b) => (b - a).Length).Sum();

    /// <summary>Reads the course of a member.</summary>
    public static Finding<Course> Read(Part21Record member, AnalyticalMember line, Instances instances, CurveReader curves)
    {
        if (line.Line.TryGet(out var straight, out var why)) return new Finding<Course>.Found(new Course([straight.Value.Start, straight.Value.End], false), straight.Source);
        if (CurveOf(member, instances) is not { } edge || curves.Pieces(edge.Curve) is not { Count: > 0 } pieces) return new Finding<Course>.Missing(why);

        if (pieces.Exists(p => p.Sweep > FullTurn)) return new Finding<Course>.Missing(new Reason(ReasonCode.LengthAmbiguous, $"the curve of the analytical member #{member.Id} is a full circle"));

        var points = ImmutableArray.CreateBuilder<Vector3>();
        points.Add(line.ToProject.Point(pieces[0].Start));
        foreach (var piece in pieces)
            foreach (var point in Chords(piece))
                if (line.ToProject.Point(point) is var next && (next - points[^1]).Length > 0)
                    points.Add(next);
        if (points.Count is < 2 or > MostStretches) return new Finding<Course>.Missing(new Reason(ReasonCode.LengthAmbiguous, $"the curve of the analytical member #{member.Id} has no length, or more than {MostStretches} stretches"));

        return new Finding<Course>.Found(new Course(points.ToImmutable(), pieces.Exists(p => p.IsArc)), $"edge #{edge.Edge} of the analytical member #{member.Id}");
    }

    private static (ulong Edge, Part21Record Curve)? CurveOf(Part21Record member, Instances instances)
    {
        if (!instances.TryFollow(member[6], out var shape)) return null;

        foreach (var representation in instances.FollowAll(shape[2]))
            foreach (var item in instances.FollowAll(representation[3]))
                if (item.Keyword == "IFCEDGECURVE" && instances.TryFollow(item[2], out var curve))
                    return (item.Id, curve);
        return null;
    }

    /// <summary>Ends of the chords of a piece, its start left out.</summary>
    private static IEnumerable<Vector3> Chords(CurvePiece piece)
    {
        if (!piece.IsArc)
        {
            yield return piece.End;
            yield break;
        }

        // Start − centre and the tangent span the plane of the arc.
        var count = Math.Min(MostStretches, (int)Math.Ceiling(piece.Sweep / TurnOfChord));
        var inward = Inward(piece);
        var centre = piece.Start + piece.BendRadius * inward;
        for (var i = 1; i < count; i++)
        {
            var (sin, cos) = Math.SinCos(piece.Sweep * i / count);
            yield return centre + piece.BendRadius * (sin * piece.StartTangent - cos * inward);
        }

        yield return piece.End;
    }

    /// <summary>From the start towards the centre, a unit vector.</summary>
    private static Vector3 Inward(CurvePiece piece)
    {
        // End = start + r·(sin s·t + (1 − cos s)·n), end tangent = cos s·t + sin s·n: n from whichever is not near zero.
        var (sin, cos) = Math.SinCos(piece.Sweep);
        var across = Math.Abs(sin) > 1 - cos
            ? 1 / sin * (piece.EndTangent - cos * piece.StartTangent)
            : 1 / ((1 - cos) * piece.BendRadius) * (piece.End - piece.Start - piece.BendRadius * sin * piece.StartTangent);
        return across.TryNormalize(out var unit) ? unit : Vector3.UnitZ;
    }
}
