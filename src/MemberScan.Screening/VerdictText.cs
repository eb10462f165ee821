using MemberScan.Model.Verdicts;

namespace MemberScan.Screening;

/// <summary>The words of the three verdicts.</summary>
public static class VerdictText
{
    /// <summary>WITHIN LIMIT, OVERSTRESSED or NOT CHECKED.</summary>
    public static string Of(Verdict verdict) => verdict switch
    {
        Verdict.WithinLimit => "WITHIN LIMIT",
        Verdict.Overstressed => "OVERSTRESSED",
        _ => "NOT CHECKED",
    };
}
