using MemberScan.Checks;
using MemberScan.Checks.Materials;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Limits;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Contacts;

namespace MemberScan.Screening.Checking.Further;

/// <summary>The checks beside the stress criterion that go with a limit of the basis: section, member, thread.</summary>
internal sealed class FurtherChecks(Lazy<ContactList?> contacts)
{
    private readonly BucklingLengths _lengths = new(contacts);

    /// <summary>Whether a limit brings clauses of stability for a member.</summary>
    public static bool ChecksStability(StressLimit? limit, Subject subject, CrossSection shape) =>
        limit is { Criterion: Criterion.En1993Elastic or Criterion.Aisc360Asd or Criterion.Aisc360Lrfd }
        && shape is Round or Rectangle or RoundedRectangle or Tube or Box && IsSteel(subject);

    /// <summary>Makes the checks of one reading of the section in one situation.</summary>
    public void Make(SituationFindings findings, CheckedLine line)
    {
        switch (line.Limit.Criterion)
        {
            case Criterion.En1993Elastic: EnChecks.Make(findings, line, _lengths); break;
            case Criterion.Aisc360Asd or Criterion.Aisc360Lrfd: AiscChecks.Make(findings, line, _lengths); break;
        }

        ThreadChecks.Make(findings, line);
    }

    /// <summary>Whether the clauses of carbon and stainless steel hold.</summary>
    internal static bool IsSteel(Subject subject) =>
        subject.Material.IsSteel || MaterialFamilies.Of(subject.Material.Name) is MaterialFamily.CarbonSteel or MaterialFamily.Stainless;

    /// <summary>Takes the checks of a set: those switched off are left out, and what decides and was not made bars a verdict.</summary>
    /// <param name="findings">Takes them.</param>
    /// <param name="line">What they were made of.</param>
    /// <param name="set">The checks.</param>
    /// <param name="station">Distance from the member's start [m]; null for a check of the whole member.</param>
    /// <param name="forces">Section forces there.</param>
    internal static void Take(SituationFindings findings, CheckedLine line, CheckSet set, double? station, SectionForces? forces)
    {
        var taken = set.Without(line.Subject.Limits.ChecksOff);
        foreach (var note in taken.Notes) findings.Note(note);
        foreach (var check in taken.Checks)
        {
            if (check is { Standing: CheckStanding.Decides, Result: CheckResult.NotEvaluated barred }) findings.Bar(barred.Why);
            findings.Further.Add(new PlacedCheck(check, station, forces));
        }
    }

    /// <summary>A set whose checks decide nothing.</summary>
    internal static CheckSet Informing(CheckSet set) => set with { Checks = [.. set.Checks.Select(c => c with { Standing = CheckStanding.Informs })] };

    /// <summary>Bars a verdict where the settings switch off what compression asks for.</summary>
    internal static void BarIfOff(SituationFindings findings, CheckedLine line, string beginning)
    {
        if (line.Compression.NeedsStability && line.Subject.Limits.ChecksOff.FirstOrDefault(key => key.StartsWith(beginning, StringComparison.Ordinal)) is { } off)
            findings.Bar(ReasonCode.StabilityNotChecked, $"the settings switch off '{off}', and the member is compressed beyond 4 % of its Euler load");
    }
}
