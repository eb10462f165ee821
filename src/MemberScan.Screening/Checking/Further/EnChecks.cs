using MemberScan.Checks;
using MemberScan.Checks.En1993;
using MemberScan.Checks.En1993.Members;
using MemberScan.Checks.En1993.Sections;
using MemberScan.Checks.Materials;
using MemberScan.Checks.Stability;
using MemberScan.Model;
using MemberScan.Model.Limits;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Checking.Further;

/// <summary>EN 1993-1-1: section resistance at each station, stability of the member.</summary>
/// <remarks>
/// The yield criterion of 6.2.1(5) may stand for the resistances of 6.2 (6.2.1(6), from memory): where those are not evaluated for a kind of
/// section, they only inform. Class 4 and slender webs bar a verdict. Stability has no such stand-in.
/// </remarks>
internal static class EnChecks
{
    /// <summary>Makes the checks.</summary>
    public static void Make(SituationFindings findings, CheckedLine line, BucklingLengths lengths)
    {
        if (!FurtherChecks.IsSteel(line.Subject))
        {
            line.Compression.Bar();
            return;
        }

        foreach (var (x, forces) in line.States)
            FurtherChecks.Take(findings, line, WithStandIn(SectionResistance.Check(SectionOf(line, forces, findings))), x, forces);

        if (!line.IsBarOrHollow) return;

        FurtherChecks.BarIfOff(findings, line, "en-6.3");
        var member = MemberOf(line, lengths, findings);
        var set = MemberResistance.Check(member);
        if (!line.Compression.NeedsStability && member.LengthY is Finding<BucklingLength>.Found { Value.IsAssumed: true }) set = AtAssumedLength(findings, line, set);
        FurtherChecks.Take(findings, line, set, station: null, line.States[^1].Forces);
    }

    // Without compression to speak of, an assumed length makes a member neither overstressed nor within its limit.
    private static CheckSet AtAssumedLength(SituationFindings findings, CheckedLine line, CheckSet set)
    {
        if (set.Without(line.Subject.Limits.ChecksOff).Worst is { Utilization: > 1 } over)
            findings.Bar(ReasonCode.StabilityNotChecked, $"{over.Name} is over its limit at an assumed length; give the buckling length in the settings (stability)");
        return FurtherChecks.Informing(set);
    }

    private static CheckSet WithStandIn(CheckSet set) =>
        set.Barred is { Why.Code: not ReasonCode.SlenderWall } ? FurtherChecks.Informing(set) : set;

    private static SectionCase SectionOf(CheckedLine line, Mechanics.Forces.SectionForces forces, SituationFindings findings) => new()
    {
        Section = line.Shape,
        Properties = line.Properties,
        Forces = forces,
        Kind = findings.Forces.Situation.Kind,
        Yield = line.Subject.Yield,
        Modulus = line.Compression.Modulus ?? 210e9,
        Steel = Steel(line),
        GammaM0 = line.Limit.Factor,
        YieldSource = line.Subject.YieldFound.Source,
        GammaSource = "settings, basis.design",
    };

    private static MemberCase MemberOf(CheckedLine line, BucklingLengths lengths, SituationFindings findings)
    {
        var needs = line.Compression.NeedsStability;
        var length = lengths.Of(line);
        var actions = MemberActions.Of(line.States.Select(s => s.Forces));
        return new MemberCase
        {
            Section = line.Shape,
            Properties = line.Properties,
            // Compression up to 4 % of the Euler load is left out of 6.3, as 6.3.1.2(4) allows.
            Actions = needs ? actions : actions with { Compression = 0 },
            Kind = findings.Forces.Situation.Kind,
            Yield = line.Subject.Yield,
            Modulus = line.Compression.Modulus ?? 210e9,
            Poisson = line.Subject.Poisson,
            Steel = Steel(line),
            Forming = line.Subject.Limits.Stability.Forming switch
            {
                TubeForming.HotFinished => HollowForming.HotFinished,
                TubeForming.ColdFormed => HollowForming.ColdFormed,
                _ => HollowForming.Unknown,
            },
            LengthY = length,
            LengthZ = length,
            GammaM1 = line.Subject.Limits.GammaM1,
            YieldSource = line.Subject.YieldFound.Source,
            GammaSource = "settings, basis.gammaM1",
        };
    }

    private static SteelKind Steel(CheckedLine line) =>
        MaterialFamilies.Of(line.Subject.Material.Name) == MaterialFamily.Stainless ? SteelKind.Stainless : SteelKind.Carbon;
}
