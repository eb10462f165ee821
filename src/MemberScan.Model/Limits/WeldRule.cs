namespace MemberScan.Model.Limits;

/// <summary>What is known of the welds of aluminium members.</summary>
/// <param name="Members">Pattern on key, tag or name of the members, <c>*</c> and <c>?</c> being wildcards.</param>
/// <param name="WeldedYield">0.2 % proof strength beside the welds [Pa]; null where the members are stated to have no welds.</param>
public sealed record WeldRule(string Members, double? WeldedYield);
