using System.Globalization;
using System.Text.RegularExpressions;
using MemberScan.Checks;
using MemberScan.Checks.Aisc360;
using MemberScan.Checks.Aisc360.Bolts;
using MemberScan.Checks.En1993.Bolts;
using MemberScan.Checks.Threads;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Limits.Threads;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Checking.Further;

/// <summary>Threads of round bars: tension on the area of a named rule, and whatever else acts.</summary>
/// <remarks>
/// A bar has a thread where settings or names give one. It must have one where a rule is named and its role is that of a rod, or where its name
/// speaks of a thread; then it is not checked without. A rule that is not for the kind of situation gives way to the limit of the basis.
/// </remarks>
internal static partial class ThreadChecks
{
    /// <summary>Thread over bar from which the two contradict each other [-].</summary>
    private const double LargestOverBar = 1.08;

    private static readonly string[] s_rods = ["hanger", "rod"];

    /// <summary>Makes the checks.</summary>
    public static void Make(SituationFindings findings, CheckedLine line)
    {
        if (line.Shape is not Round bar) return;

        var (member, rules) = (line.Subject.Member, line.Subject.Limits.Threads);
        var thread = Thread(member, rules);
        if (thread is Finding<ThreadDesignation>.Missing missing)
        {
            var isRod = s_rods.Contains(member.Role, StringComparer.OrdinalIgnoreCase);
            if (rules.ByMember.Any(entry => MemberSelector.Names(entry.Members, member)) || SpeaksOfThread().IsMatch(member.Element.Name) || SpeaksOfThread().IsMatch(member.Element.TypeName) || (isRod && rules.Rule is not null))
                findings.Bar(missing.Why);
            else if (isRod)
                findings.Note("no thread is known; checked as a plain bar on its full section");
            return;
        }

        var found = (Finding<ThreadDesignation>.Found)thread;
        if (found.Value.Nominal > LargestOverBar * 2 * bar.Radius)
        {
            findings.Bar(ReasonCode.ThreadUnknown, string.Create(CultureInfo.InvariantCulture, $"the thread {found.Value} ({found.Source}) is larger than the bar of {2e3 * bar.Radius:0.##} mm; one of them is wrong"));
            return;
        }

        foreach (var (x, forces) in line.States) FurtherChecks.Take(findings, line, Check(findings, line, found, forces), x, forces);
    }

    private static Finding<ThreadDesignation> Thread(Member member, ThreadRules rules)
    {
        var set = rules.ByMember.Where(entry => MemberSelector.Names(entry.Members, member)).Select(entry => (entry.Thread, "settings, threads.byMember")).Take(1);
        return ThreadText.FindFirst([.. set, (member.Element.Name, "name of the member"), (member.Element.TypeName, "name of its type")]);
    }

    private static CheckSet Check(SituationFindings findings, CheckedLine line, Finding<ThreadDesignation>.Found thread, SectionForces forces)
    {
        var (rules, kind) = (line.Subject.Limits.Threads, findings.Forces.Situation.Kind);
        var rod = new RodCase
        {
            Thread = thread.Value,
            ThreadSource = thread.Source,
            Forces = forces,
            Kind = kind,
            Role = line.Subject.Member.Role,
            TemperatureFactor = rules.TemperatureFactor,
            TemperatureSource = rules.TemperatureFactor < 1 ? "settings, threads.temperatureFactor" : "no reduction for temperature",
        };
        return rules.InForce switch
        {
            ThreadRule.Allowable when kind != SituationKind.Design => rules.Allowable is { } allowable
                ? RodStress.Check(rod, Area(rules.Area), allowable, SituationKind.Service, "settings, threads.allowable")
                : Refused(RodStress.TensionClause, "threads.allowable"),
            ThreadRule.Aisc360 => rules.TensileStrength is { } tensile
                ? ThreadedPart.Check(rod, tensile, kind == SituationKind.Design ? DesignMethod.Lrfd : DesignMethod.Asd, "settings, threads.fu")
                : Refused(ThreadedPart.Clause, "threads.fu"),
            ThreadRule.En1993 when kind == SituationKind.Design => rules.TensileStrength is { } strength
                ? BoltTension.Check(rod, strength, line.Subject.Limits.GammaM2, rules.IsCut, "settings, threads.fu")
                : Refused(BoltTension.Clause, "threads.fu"),
            _ => RodStress.Check(rod, ThreadArea.Root, line.Subject.Yield / line.Limit.Factor, kind == SituationKind.Design ? SituationKind.Design : SituationKind.Service,
                $"limit of the basis, {line.Subject.YieldFound.Source}"),
        };
    }

    private static CheckSet Refused(Clause clause, string key) => new(
        [new NamedCheck("rod-tension", "tension in the thread", CheckStanding.Decides, new CheckResult.NotEvaluated(clause, new Reason(ReasonCode.NoStrength, $"the rule of the threads needs the setting {key}, which is not given")))],
        []);

    private static ThreadArea Area(ThreadAreaBasis area) => area switch
    {
        ThreadAreaBasis.Root => ThreadArea.Root,
        ThreadAreaBasis.Stress => ThreadArea.Stress,
        _ => ThreadArea.Nominal,
    };

    [GeneratedRegex(@"thread|gewinde|draad(?:stang|eind)|\bfilet[ée]|roscad|filettat", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex SpeaksOfThread();
}
