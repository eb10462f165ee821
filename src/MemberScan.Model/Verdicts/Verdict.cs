namespace MemberScan.Model.Verdicts;

/// <summary>How a candidate ends: exactly one of three.</summary>
public enum Verdict
{
    /// <summary>Every switched-on check was made and none is over its limit.</summary>
    WithinLimit,

    /// <summary>At least one check is over its limit.</summary>
    Overstressed,

    /// <summary>Something needed for a verdict is missing; the reason says what.</summary>
    NotChecked,
}
