namespace MemberScan.Model.Verdicts;

/// <summary>Candidates by verdict; the three add up to all of them.</summary>
/// <param name="WithinLimit">Within their limit.</param>
/// <param name="Overstressed">Overstressed.</param>
/// <param name="NotChecked">Not checked.</param>
public sealed record VerdictCounts(int WithinLimit, int Overstressed, int NotChecked)
{
    /// <summary>All candidates.</summary>
    public int Candidates => WithinLimit + Overstressed + NotChecked;
}
