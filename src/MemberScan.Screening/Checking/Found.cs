using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Screening.Checking.Rules;

namespace MemberScan.Screening.Checking;

/// <summary>The largest stress found so far in one shear model.</summary>
/// <param name="Utilization">Stress over limit [-].</param>
/// <param name="X">Distance from the member's start [m].</param>
/// <param name="Forces">Section forces there.</param>
/// <param name="Point">Governing point.</param>
/// <param name="Field">The field that it was found in.</param>
/// <param name="Situation">Index of the situation among the member's.</param>
/// <param name="Rule">The criterion that it is held against.</param>
internal sealed record Found(double Utilization, double X, SectionForces Forces, GoverningPoint Point, StressField Field, int Situation, StressRule Rule)
{
    /// <summary>The one of larger utilization; the earlier one when they are alike.</summary>
    public static Found? Larger(Found? first, Found? second) =>
        first is null ? second : second is null || second.Utilization <= first.Utilization ? first : second;
}
