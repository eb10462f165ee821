namespace MemberScan.Checks;

/// <summary>What a check is worth for the verdict.</summary>
public enum CheckStanding
{
    /// <summary>It decides: over its limit or not evaluated, the member is not within its limit.</summary>
    Decides,

    /// <summary>It is shown beside and decides nothing, such as a plastic ratio or a slenderness.</summary>
    Informs,
}
