using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Checking.Further;
using MemberScan.Screening.Checking.Ranking;
using MemberScan.Screening.Checking.Strengths;
using MemberScan.Screening.Contacts;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Checking;

/// <summary>The verdict of one candidate out of its section, material and forces.</summary>
internal sealed class MemberChecker(SectionLibrary library, Settings settings, Lazy<ContactList?> contacts)
{
    /// <summary>Utilizations above this are over the limit.</summary>
    public const double OverLimit = 1 + 1e-9;

    /// <summary>Difference of the two shear models from which the result says so.</summary>
    private const double ModelDifference = 0.05;

    /// <summary>Bend radius over depth below which a straight-bar stress supports no verdict within the limit.</summary>
    private const double SharpBend = 10;

    private const double ProvisionalYield = 235e6;

    private const string EitherEnd = "tapered: every place is checked with the section of either end, the less favourable decides; one end is smaller in every dimension, so that it bounds what lies between";

    private readonly SituationChecker _situations = new(library, new FurtherChecks(contacts));

    /// <summary>Checks a candidate.</summary>
    /// <param name="member">The candidate.</param>
    /// <param name="forces">Its forces, one entry per situation.</param>
    /// <param name="notes">Notes about the choice of forces.</param>
    public MemberResult Check(Member member, IReadOnlyList<MemberForces> forces, IReadOnlyList<string> notes)
    {
        var all = ImmutableArray.CreateBuilder<string>();
        all.AddRange(member.Notes);
        all.AddRange(notes);

        var limits = settings.LimitsOf(member);
        var section = member.Section as Finding<SectionFinding>.Found;
        var yield = StrengthInForce.Of(member, limits);
        var strength = yield as Finding<double>.Found;
        var length = member.Length as Finding<double>.Found;
        var poisson = (Finding<double>.Found)member.Material.Poisson;
        if (strength is not null && poisson.Source == "default")
            all.Add(string.Create(CultureInfo.InvariantCulture, $"Poisson's ratio {poisson.Value:0.0##} is the default; the model gives none"));

        Reason? first = (member.Section as Finding<SectionFinding>.Missing)?.Why
            ?? OutOfRange(section, member.EndSection)
            ?? (yield as Finding<double>.Missing)?.Why
            ?? (forces.Count == 0 ? new Reason(ReasonCode.NoForces, "no section forces for this member in any source") : null)
            ?? (member.Length as Finding<double>.Missing)?.Why
            ?? (double.IsFinite(length!.Value) ? null : new Reason(ReasonCode.LengthAmbiguous, $"the length ({length.Source}) is beyond the range of numbers"));

        var isCheckable = section is not null && length is not null && double.IsFinite(length.Value) && forces.Count > 0 && OutOfRange(section, member.EndSection) is null;
        double? required = null;
        var findings = new List<SituationFindings>();
        if (first is null)
        {
            var subject = SubjectOf(member, limits, section!, length!.Value, strength!, poisson.Value, all);
            for (var i = 0; i < forces.Count; i++) findings.Add(_situations.Check(subject, forces[i], i));
            first = Barred(member, section!.Value, findings);
        }
        else
        {
            findings.AddRange(forces.Select(f => new SituationFindings(f)));
            if (isCheckable && first is { Code: ReasonCode.NoStrength or ReasonCode.StrengthImplausible }) required = RequiredYield(member, limits, section!, length!.Value, poisson.Value, forces, all);
        }

        var decisive = Decisive(findings, all, out var other);
        var worst = findings.Where(f => f.Further.Worst is not null).MaxBy(f => f.Further.Worst!.Utilization);
        var governing = GoverningCheck(decisive, other, worst, findings, strength?.Source ?? "");
        if (first is null && governing is null) first = new Reason(ReasonCode.CheckNotEvaluated, "no stress was found for the member");
        var overstressed = governing is { Utilization: > OverLimit };
        var verdict = overstressed ? Verdict.Overstressed : first is not null ? Verdict.NotChecked : Verdict.WithinLimit;
        if (overstressed && first is not null) all.Add($"beside the verdict: {first.Message}");
        foreach (var note in findings.SelectMany(f => f.Notes)) if (!all.Contains(note)) all.Add(note);

        var isOverStress = decisive is { Utilization: > OverLimit };
        return new MemberResult
        {
            Identity = MemberIdentity.Of(member),
            Section = section is null ? "" : member.EndSection is { } end ? $"{section.Value.Shape.Designation} to {end.Shape.Designation}" : section.Value.Shape.Designation,
            SectionSource = section?.Source ?? "",
            Material = member.Material.Name,
            Strength = strength?.Value,
            StrengthSource = strength?.Source ?? "",
            Length = length?.Value,
            LengthSource = length?.Source ?? "",
            Axes = (member.Axes as Finding<MemberAxes>.Found)?.Value,
            Verdict = verdict,
            Reason = verdict == Verdict.NotChecked ? first : null,
            Governing = governing,
            Checks = CheckList.Of(findings, decisive, withTraces: verdict != Verdict.WithinLimit),
            NextWorst = CheckList.Next(findings, governing),
            Deflection = CheckList.Deflection(limits, member.Role, findings),
            Margin = 1 - governing?.Utilization,
            RequiredYield = isOverStress ? Hints.RequiredYield(findings) : required,
            NearestSize = isOverStress ? Hints.NearestSize(findings, decisive!.Field.Section) : null,
            Situations = Ranked(findings),
            Notes = all.ToImmutable(),
        };
    }

    private static Taper? TaperOf(SectionFinding start, SectionFinding? end) => end is null ? null : Taper.Of(start.Shape, end.Shape);

    /// <summary>Dimensions of which a sound section is made, but whose powers leave the range of numbers.</summary>
    private static Reason? OutOfRange(Finding<SectionFinding>.Found? section, SectionFinding? end)
    {
        var shape = section?.Value.Shapes.AddRange(end?.Shapes ?? []).FirstOrDefault(s => !NumberRange.Holds(s));
        return shape is null ? null : new Reason(ReasonCode.SectionInvalid, $"the section {shape.Designation} is so small or so large that its properties are beyond the range of numbers");
    }

    /// <summary>The first thing that bars a verdict within the limit.</summary>
    private static Reason? Barred(Member member, SectionFinding section, List<SituationFindings> findings)
    {
        foreach (var finding in findings)
            if (finding.Blockers.Count > 0)
                return finding.Blockers[0];

        if (!findings.Exists(f => f.Forces.Situation.ActsInFull))
            return new Reason(ReasonCode.NoCombination, "only single load cases and no combination of them; within the limit in each says nothing about both together");

        var depth = Math.Max(section.Shape.ExtentY, section.Shape.ExtentZ);
        if (member.BendRadii.Any(radius => radius < SharpBend * depth))
            return new Reason(ReasonCode.CheckNotEvaluated, string.Create(CultureInfo.InvariantCulture, $"a bend of radius {member.BendRadii.Min() * 1e3:0.###} mm is under {SharpBend} depths; the curved-bar stress is not evaluated"));

        return null;
    }

    /// <summary>
    /// The stress that decides: by the elementary model, unless only the elasticity model is over the limit or the elementary one has no answer.
    /// </summary>
    private static Found? Decisive(List<SituationFindings> findings, ImmutableArray<string>.Builder notes, out Found? other)
    {
        var elementary = findings.Select(f => f.Elementary).Aggregate((Found?)null, Found.Larger);
        var elasticity = findings.Select(f => f.Elasticity).Aggregate((Found?)null, Found.Larger);
        if (elementary is null || elasticity is null)
        {
            other = null;
            var only = elementary ?? elasticity;
            if (elasticity is not null) notes.Add($"no elementary shear model for this {elasticity.Field.Section.Kind}; decided by the elasticity model");
            if (elementary is not null) notes.Add($"elasticity not available for a {elementary.Field.Section.Kind}; decided by the elementary model");
            return only;
        }

        var elasticityDecides = elasticity.Utilization > OverLimit && elementary.Utilization <= OverLimit;
        var (decisive, beside) = elasticityDecides ? (elasticity, elementary) : (elementary, elasticity);
        other = beside;
        var difference = Math.Abs(elasticity.Utilization - elementary.Utilization) / Math.Max(elasticity.Utilization, elementary.Utilization);
        if (difference > ModelDifference)
            notes.Add(string.Create(CultureInfo.InvariantCulture, $"the shear models differ by {100 * difference:0.0} %: elementary {elementary.Utilization:0.000}, elasticity {elasticity.Utilization:0.000}, each at its own point"));
        if (elasticityDecides)
            notes.Add("over the limit by the elasticity model only, which decides");
        return decisive;
    }

    private static Governing? GoverningCheck(Found? decisive, Found? other, SituationFindings? worst, List<SituationFindings> findings, string yieldSource)
    {
        if (decisive is null) return null;

        return worst is { Largest: { } stress, Further.Worst: { } further } && further.Utilization > decisive.Utilization * OverLimit
            ? GoverningOf.Further(further, stress, worst)
            : GoverningOf.Stress(decisive, other, findings[decisive.Situation], yieldSource);
    }

    private static Subject SubjectOf(
        Member member, LimitSet limits, Finding<SectionFinding>.Found section, double length, Finding<double>.Found strength, double poisson, ImmutableArray<string>.Builder notes)
    {
        var wall = new WallInForce(member, limits);
        var shapes = wall.Of(section.Value);
        var end = member.EndSection is { } other ? wall.Of(other) : null;
        var taper = TaperOf(shapes, end);
        if (end is not null && taper is null)
        {
            shapes = shapes with { Shapes = [.. shapes.Shapes, .. end.Shapes] };
            if (!notes.Contains(EitherEnd)) notes.Add(EitherEnd);
        }

        if (wall.IsReduced)
            foreach (var words in wall.All) if (!notes.Contains(words)) notes.Add(words);
        return new Subject(member, shapes, length, strength, poisson, limits)
        {
            Taper = taper,
            IsBrittle = StrengthInForce.IsBrittle(member.Material, limits),
            WallWords = wall.Words,
        };
    }

    /// <summary>The yield strength that the stress criterion needs of a member whose strength is missing; noted as well.</summary>
    private double? RequiredYield(
        Member member, LimitSet limits, Finding<SectionFinding>.Found section, double length, double poisson, IReadOnlyList<MemberForces> forces, ImmutableArray<string>.Builder notes)
    {
        // The strength does not change the stress; any will do.
        var subject = SubjectOf(member, limits, section, length, new Finding<double>.Found(ProvisionalYield, "provisional"), poisson, notes);
        var findings = forces.Select((f, i) => _situations.Check(subject, f, i)).ToList();
        if (Hints.RequiredYield(findings) is not { } required || !double.IsFinite(required)) return null;

        notes.Add($"{Checks.Ranking.RequiredYield.Words(required)} by the stress criterion, were the strength known; stability and walls not looked at");
        return required;
    }

    private static ImmutableArray<SituationResult> Ranked(List<SituationFindings> findings) =>
    [
        .. findings.Select(f => new SituationResult(
                f.Forces.Situation.Name, CheckList.Word(f.Forces.Situation.Kind), f.Forces.Situation.ActsInFull, LargestOf(f),
                string.Join("; ", f.Blockers.Select(b => $"{b.Code.Text()}: {b.Message}").Concat(f.Notes)),
                f.Forces.Source, f.Forces.Conversion, f.Forces.Stations))
            .OrderByDescending(s => s.Utilization ?? -1),
    ];

    private static double? LargestOf(SituationFindings findings) =>
        findings.Further.Worst?.Utilization is { } further && further > (findings.Largest?.Utilization ?? double.PositiveInfinity) ? further : findings.Largest?.Utilization;
}
