using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Screening.Record.Lines;

namespace MemberScan.Screening.Checking.Ranking;

/// <summary>What would help: the yield strength that the stress criterion needs, and the nearest size that passes.</summary>
internal static class Hints
{
    /// <summary>Yield strength that the stress criterion needs over all situations and both shear models [Pa]; null where none is known.</summary>
    public static double? RequiredYield(IEnumerable<SituationFindings> findings) => findings
        .SelectMany(f => new[] { f.Elementary, f.Elasticity }).OfType<Found>()
        .Select(found => found.Rule.RequiredYield(found.Point)).Max();

    /// <summary>The nearest size at which the stress criterion holds, elementary model; null where no size passes or the kind has none.</summary>
    /// <param name="findings">The situations.</param>
    /// <param name="section">The section that decides.</param>
    public static SizeHint? NearestSize(IEnumerable<SituationFindings> findings, CrossSection section)
    {
        var states = findings.Select(f => f.Largest).OfType<Found>().ToArray();
        var size = SizeSearch.Of(section, shape => Passes(shape, states)).FirstOrDefault(s => s.Value is not null);
        return size is { Value: { } value, Section: { } found } ? new SizeHint(size.Dimension, value, found.Designation) : null;
    }

    private static bool Passes(CrossSection section, Found[] states)
    {
        if (!NumberRange.Holds(section) || !StressField.TryCreate(section, ShearModel.Elementary, 0, out var field, out _)) return false;

        foreach (var state in states)
            if (!(state.Rule.Govern(field, state.Forces).Utilization <= 1)) return false;
        return true;
    }
}
