using System.Globalization;
using System.Text;

namespace MemberScan.Reporting.Index;

/// <summary>Several models as comma-separated values (RFC 4180), one line per model; fields are written as in <see cref="MembersTable"/>.</summary>
public static class IndexTable
{
    /// <summary>The first line, without its end.</summary>
    public const string Header = "model,outcome,exitCode,candidates,withinLimit,overstressed,notChecked,worstUtilization,worstKey,worstName,readToEnd,damage,runId,timestamp,modelSha256,report,failure";

    /// <summary>The table as bytes: UTF-8, lines end with CR LF.</summary>
    public static byte[] Write(IEnumerable<ModelEntry> models)
    {
        ArgumentNullException.ThrowIfNull(models);
        var table = new StringBuilder(Header).Append("\r\n");
        foreach (var model in models) table.AppendJoin(',', Fields(model)).Append("\r\n");
        return Encoding.UTF8.GetBytes(table.ToString());
    }

    private static string[] Fields(ModelEntry m)
    {
        var worst = m.Overstressed.FirstOrDefault();
        return
        [
            MembersTable.Field(m.Path), m.Outcome, Number(m.ExitCode), Number(m.Counts?.Candidates), Number(m.Counts?.WithinLimit), Number(m.Counts?.Overstressed), Number(m.Counts?.NotChecked),
            worst?.Utilization.ToString("R", CultureInfo.InvariantCulture) ?? "", MembersTable.Field(worst?.Key ?? ""), MembersTable.Field(worst?.Name ?? ""),
            m.Counts is null ? "" : Word(m.ReadToEnd), m.Counts is null ? "" : Word(m.HasDamage), m.RunId, m.Timestamp, m.ModelSha256, MembersTable.Field(m.Report), MembersTable.Field(m.Failure),
        ];
    }

    private static string Word(bool value) => value ? "yes" : "no";

    private static string Number(int? value) => value?.ToString(CultureInfo.InvariantCulture) ?? "";
}
