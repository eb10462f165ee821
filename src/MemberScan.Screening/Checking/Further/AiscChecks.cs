using MemberScan.Checks;
using MemberScan.Checks.Aisc360;
using MemberScan.Checks.Aisc360.Sections;
using MemberScan.Checks.Aisc360.Stresses;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Limits;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Checking.Further;

/// <summary>AISC 360-22: strength of section and member by chapters D to H at each station; H3.3(c) of open sections.</summary>
/// <remarks>H3.3(a) and (b) of sections other than hollow ones are the stress criterion itself; first yield is that of hollow sections.</remarks>
internal static class AiscChecks
{
    /// <summary>Makes the checks.</summary>
    public static void Make(SituationFindings findings, CheckedLine line, BucklingLengths lengths)
    {
        if (!FurtherChecks.IsSteel(line.Subject))
        {
            line.Compression.Bar();
            findings.Bar(ReasonCode.CheckNotEvaluated, $"AISC 360-22 holds for steel; the material '{line.Subject.Material.Name}' is not known to be one");
            return;
        }

        FurtherChecks.BarIfOff(findings, line, "aisc-e3");
        var method = line.Limit.Criterion == Criterion.Aisc360Asd ? DesignMethod.Asd : DesignMethod.Lrfd;
        var length = lengths.Of(line);
        foreach (var (x, forces) in line.States)
        {
            if (forces == default) continue;

            FurtherChecks.Take(findings, line, MemberStrength.Check(new AiscCase
            {
                Section = line.Shape,
                Properties = line.Properties,
                WallBasis = line.Subject.WallWords(line.Shape),
                Forces = forces,
                Kind = findings.Forces.Situation.Kind,
                Method = method,
                Yield = line.Subject.Yield,
                Modulus = line.Compression.Modulus ?? Si.Ksi(29_000),
                LengthY = length,
                LengthZ = length,
                Length = line.Compression.Length,
                YieldSource = line.Subject.YieldFound.Source,
            }), x, forces);
        }

        if (!line.IsBarOrHollow) Take(findings, line, method);
    }

    // Buckling of open sections under combined stress is not evaluated; it says so once.
    private static void Take(SituationFindings findings, CheckedLine line, DesignMethod method)
    {
        var set = NonHollowStress.Check(line.Shape, new StressState(0, 0, 0), line.Subject.Yield, method, findings.Forces.Situation.Kind);
        FurtherChecks.Take(findings, line, set with { Checks = [.. set.Checks.Where(c => c.Result is CheckResult.NotEvaluated)] }, station: null, line.States[^1].Forces);
    }
}
