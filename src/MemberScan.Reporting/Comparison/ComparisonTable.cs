using System.Globalization;
using System.Text;
using MemberScan.Reporting.Display;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Comparison;

/// <summary>A comparison as comma-separated values (RFC 4180), one line per candidate; fields are written as in <see cref="MembersTable"/>.</summary>
public static class ComparisonTable
{
    /// <summary>The first line, without its end.</summary>
    public const string Header = "key,earlierKey,globalId,tag,name,class,matchedBy,outcome,worse,earlierStatus,laterStatus,earlierUtilization,laterUtilization,change,"
        + "changedInputs,earlierInputs,laterInputs,inWords";

    /// <summary>The table as bytes: UTF-8, lines end with CR LF.</summary>
    public static byte[] Write(ComparisonRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        var table = new StringBuilder(Header).Append("\r\n");
        foreach (var member in record.Members) table.AppendJoin(',', Fields(member)).Append("\r\n");
        return Encoding.UTF8.GetBytes(table.ToString());
    }

    /// <summary>By what a candidate was found again: <c>GlobalId</c>, <c>Tag</c>, <c>axis</c>, or empty.</summary>
    internal static string WordOf(MatchedBy? by) => by switch { MatchedBy.GlobalId => "GlobalId", MatchedBy.Tag => "Tag", MatchedBy.Axis => "axis", _ => "" };

    // Numbers stand as they are: the guard against formulas would turn a fall into a text.
    private static IEnumerable<string> Fields(MemberMovement m)
    {
        string[] names = [m.Later?.Key ?? "", m.Earlier?.Key ?? "", m.Latest.GlobalId, m.Latest.Tag, m.Latest.Name, m.Latest.Class, WordOf(m.MatchedBy), MovementText.Of(m.Movement)];
        string[] states = [m.IsWorse ? "yes" : "no", m.Earlier?.Verdict.Word() ?? "", m.Later?.Verdict.Word() ?? ""];
        string[] numbers = [Utilization(m.Earlier), Utilization(m.Later), Number(m.Rising)];
        string[] inputs = [Joined(m, c => c.What), Joined(m, c => c.Earlier), Joined(m, c => c.Later), m.Words];
        return [.. names.Concat(states).Select(MembersTable.Field), .. numbers, .. inputs.Select(MembersTable.Field)];
    }

    private static string Joined(MemberMovement member, Func<InputChange, string> part) => string.Join("; ", member.Changes.Select(part));

    private static string Utilization(MemberResult? member) => Number(member?.Governing?.Utilization);

    private static string Number(double? value) => value is { } number ? Math.Round(number, 10).ToString("R", CultureInfo.InvariantCulture) : "";
}
