namespace MemberScan.Checks.Stability;

/// <summary>A buckling length with where it comes from.</summary>
/// <param name="Value">Buckling length L_cr [m], &gt; 0.</param>
/// <param name="Factor">Buckling length over member length [-].</param>
/// <param name="IsAssumed">Whether it follows a rule by role and ends instead of a setting for the member.</param>
/// <param name="Source">Where it comes from, in words.</param>
public sealed record BucklingLength(double Value, double Factor, bool IsAssumed, string Source);
