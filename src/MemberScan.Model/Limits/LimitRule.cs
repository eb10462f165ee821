namespace MemberScan.Model.Limits;

/// <summary>Limits of some members, in place of those of all.</summary>
/// <param name="When">The members.</param>
/// <param name="Limits">Their limits, whole: what the rule leaves out is as for all members.</param>
public sealed record LimitRule(MemberSelector When, LimitSet Limits);
