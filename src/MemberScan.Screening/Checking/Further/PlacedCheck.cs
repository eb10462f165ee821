using MemberScan.Checks;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Screening.Checking.Further;

/// <summary>A check with the place where it was made.</summary>
/// <param name="Check">The check.</param>
/// <param name="Station">Distance from the member's start [m]; null for a check of the whole member.</param>
/// <param name="Forces">Section forces there; of a check of the whole member those where the stress is largest.</param>
internal sealed record PlacedCheck(NamedCheck Check, double? Station, SectionForces? Forces)
{
    /// <summary>Utilization [-]; null when the check was not made.</summary>
    public double? Utilization => Check.Utilization;

    /// <summary>Whether it decides.</summary>
    public bool Decides => Check.Standing == CheckStanding.Decides;
}
