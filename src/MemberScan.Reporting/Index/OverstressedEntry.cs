using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Index;

/// <summary>One overstressed candidate of one of several models.</summary>
/// <param name="Key">Key of the candidate.</param>
/// <param name="Name">Its name, else its class.</param>
/// <param name="Tag">Its tag; empty if none.</param>
/// <param name="Section">Section that decides.</param>
/// <param name="Utilization">Utilization in root form [-], above 1.</param>
/// <param name="Criterion">Criterion that decides.</param>
/// <param name="Situation">Governing situation.</param>
/// <param name="Station">Distance from the start [m].</param>
/// <param name="Place">Governing point in words.</param>
public sealed record OverstressedEntry(
    string Key, string Name, string Tag, string Section, double Utilization, string Criterion, string Situation, double Station, string Place)
{
    /// <summary>The entry of an overstressed candidate.</summary>
    /// <exception cref="ArgumentException">The candidate has no governing value.</exception>
    public static OverstressedEntry Of(MemberResult member)
    {
        ArgumentNullException.ThrowIfNull(member);
        var governing = member.Governing ?? throw new ArgumentException("an overstressed candidate has a governing value", nameof(member));
        return new OverstressedEntry(
            member.Key, member.Name.Length > 0 ? member.Name : member.Class, member.Tag, governing.Section, governing.Utilization, governing.Criterion,
            governing.Situation, governing.Station, governing.Point.Place);
    }
}
