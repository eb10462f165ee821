using MemberScan.Checks;
using MemberScan.Screening.Checking.Further;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Checking.Ranking;

/// <summary>The check that decides a member, for the record.</summary>
internal static class GoverningOf
{
    /// <summary>The stress criterion decides.</summary>
    /// <param name="decisive">The stress that decides.</param>
    /// <param name="other">The largest by the other shear model; null when there is none.</param>
    /// <param name="finding">Its situation.</param>
    /// <param name="yieldSource">Where the strength comes from.</param>
    public static Governing Stress(Found decisive, Found? other, SituationFindings finding, string yieldSource)
    {
        var check = decisive.Rule.Check(decisive.Point);
        return Place(decisive, other, finding) with
        {
            Utilization = check.Utilization,
            StressUtilization = check.Utilization,
            Trace = [.. Derivation.Lines(decisive, finding.Forces.Source), .. check.Trace.Select(line => Derivation.Completed(line, decisive, yieldSource))],
        };
    }

    /// <summary>A check beside the stress criterion decides; point and stress are those of the criterion in the same situation.</summary>
    public static Governing Further(PlacedCheck decisive, Found stress, SituationFindings finding)
    {
        var made = (CheckResult.Evaluated)decisive.Check.Result;
        return Place(stress, other: null, finding) with
        {
            Check = decisive.Check.Key,
            Utilization = made.Utilization,
            StressUtilization = stress.Utilization,
            Criterion = decisive.Check.Name,
            Clause = made.Clause.ToString(),
            Station = decisive.Station ?? stress.X,
            Forces = decisive.Forces ?? stress.Forces,
            StressStation = stress.X,
            StressForces = stress.Forces,
            Trace = made.Trace,
        };
    }

    private static Governing Place(Found found, Found? other, SituationFindings finding) => new()
    {
        Utilization = found.Utilization,
        Criterion = found.Rule.Words,
        Clause = found.Rule.Clause,
        Limit = found.Rule.Allowed(found.Point),
        Stress = Math.Abs(found.Point.Value),
        Situation = finding.Forces.Situation.Name,
        Kind = CheckList.Word(finding.Forces.Situation.Kind),
        Station = found.X,
        Forces = found.Forces,
        ForcesSource = finding.Forces.Source,
        Point = found.Point,
        Section = found.Field.Section.Designation,
        ShearModel = found.Field.Model.ToString().ToLowerInvariant(),
        OtherModelUtilization = other?.Utilization,
        Trace = [],
    };
}
