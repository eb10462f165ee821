namespace MemberScan.Reporting.Drawing;

/// <summary>One bar of the spread: candidates whose utilization lies in (from, to].</summary>
/// <param name="From">Lower edge [-], left out; the first bar takes 0 in.</param>
/// <param name="To">Upper edge [-], taken in; infinite for the last bar.</param>
/// <param name="WithinLimit">Candidates within their limit.</param>
/// <param name="Overstressed">Overstressed candidates.</param>
/// <param name="NotChecked">Candidates not checked of which a utilization is known.</param>
public sealed record SpreadBar(double From, double To, int WithinLimit, int Overstressed, int NotChecked)
{
    /// <summary>All candidates of the bar.</summary>
    public int Total => WithinLimit + Overstressed + NotChecked;
}
