using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Readiness;

/// <summary>Takes stock of a model: candidates with section, material, length and forces found, and what is missing; no check is made.</summary>
public static class Inventory
{
    /// <summary>Takes stock.</summary>
    /// <param name="request">What to work from; its basis is not used.</param>
    /// <param name="diagnostics">Takes all findings.</param>
    /// <param name="progress">Told how far the run is; may be null.</param>
    /// <param name="cancellation">Stops the run.</param>
    /// <returns>The record; null when a forces table does not fit the model.</returns>
    public static ReadinessRecord? Take(
        ScreeningRequest request, DiagnosticList diagnostics, IProgress<ScreeningProgress>? progress = null, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(request);
        ArgumentNullException.ThrowIfNull(diagnostics);
        if (ModelContents.Read(request, diagnostics, progress, cancellation) is not { } contents) return null;

        return new ReadinessRecord
        {
            Model = contents.Facts(request),
            ForcesFiles = contents.Files,
            Members = [.. contents.Catalog.Members.Select(m => Of(m, contents.ForcesOf(m, out var notes), notes))],
            PassedOver = [.. contents.Catalog.PassedOver.Select(p => new PassedOver(p.Class, p.Count, p.Why))],
            HasDamage = contents.File.HasDamage,
        };
    }

    private static MemberReadiness Of(Member member, IReadOnlyList<MemberForces> forces, IReadOnlyList<string> notes)
    {
        var section = member.Section as Finding<SectionFinding>.Found;
        var strength = member.Material.Yield as Finding<double>.Found;
        var length = member.Length as Finding<double>.Found;
        var usable = forces.Where(f => f.Unusable is null).ToList();
        return new MemberReadiness
        {
            Identity = MemberIdentity.Of(member),
            Section = section is null ? "" : member.EndSection is { } end ? $"{section.Value.Shape.Designation} to {end.Shape.Designation}" : section.Value.Shape.Designation,
            SectionSource = section?.Source ?? "",
            Material = member.Material.Name,
            Strength = strength?.Value,
            StrengthSource = strength?.Source ?? "",
            Length = length?.Value,
            LengthSource = length?.Source ?? "",
            Situations = usable.Count,
            Stations = usable.Sum(f => f.Stations.Length),
            ForcesSource = string.Join("; ", usable.Select(f => f.Source).Distinct(StringComparer.Ordinal).Take(3)),
            Forces = [.. forces.Select(ForcesLine.Of)],
            Missing = Missing(member, forces),
            Notes = [.. member.Notes, .. notes],
        };
    }

    private static ImmutableArray<Reason> Missing(Member member, IReadOnlyList<MemberForces> forces)
    {
        IEnumerable<Reason?> all =
        [
            (member.Section as Finding<SectionFinding>.Missing)?.Why,
            (member.Material.Yield as Finding<double>.Missing)?.Why,
            (member.Length as Finding<double>.Missing)?.Why,
            forces.Count == 0 ? new Reason(ReasonCode.NoForces, "no section forces for this member in any source") : null,
            .. forces.Select(f => f.Unusable),
            forces.Count > 0 && !forces.Any(f => f.Situation.ActsInFull) ? new Reason(ReasonCode.NoCombination, "only single load cases and no combination of them") : null,
        ];
        return [.. all.OfType<Reason>().DistinctBy(r => r.Code)];
    }
}
