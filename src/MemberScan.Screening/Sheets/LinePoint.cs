using MemberScan.Mechanics.Forces;

namespace MemberScan.Screening.Sheets;

/// <summary>Section forces at a place along a member, as diagrams show them; two at one place are a jump.</summary>
/// <param name="X">Distance from the member's start [m].</param>
/// <param name="Forces">Section forces in local axes, T about the shear centre.</param>
/// <param name="IsStation">Whether the source has a station here; others follow by equilibrium.</param>
/// <param name="Utilization">Stress over limit by the shear model that decides [-]; null where it is not evaluated.</param>
public readonly record struct LinePoint(double X, SectionForces Forces, bool IsStation, double? Utilization);
