using System.Globalization;
using MemberScan.Cli.Files;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;
using Spectre.Console;

namespace MemberScan.Cli.Screening;

/// <summary>The outcome on standard output: counts, the worst members, what was not checked and why, the files.</summary>
internal static class Summary
{
    /// <summary>Most members listed; all are in the report and the table.</summary>
    private const int MostListed = 10;

    /// <summary>Prints it: a table on a terminal, plain lines when redirected.</summary>
    public static void Print(ScreeningRecord record, OutputNames names, bool modelWritten)
    {
        var counts = record.Counts;
        Line($"{record.Model.FileName}: {counts.WithinLimit} within limit + {counts.Overstressed} overstressed + {counts.NotChecked} not checked = {counts.Candidates} candidates");
        foreach (var basis in record.Basis) Line($"{basis.Kind}: {basis.Text}{(basis.IsDefault ? " (default)" : "")}");

        var worst = record.Members.Where(m => m.Verdict == Verdict.Overstressed).OrderByDescending(m => m.Governing!.Utilization).ToList();
        if (worst.Count > 0) PrintOverstressed(worst);
        foreach (var group in record.Members.Where(m => m.Reason is not null).GroupBy(m => m.Reason!.Code).OrderBy(g => g.Key))
            Line($"not checked, {group.Key.Text()}: {group.Count()}. {group.Key.Request()}");
        if (record.HasDamage) Line($"The model is damaged: what was passed over stands in the report's findings.");
        if (!record.Model.ReadToEnd) Line($"The model could not be read to its end; no checked model is written.");
        else if (!modelWritten) Line($"No checked model is written; the findings say why.");
        foreach (var caution in record.Cautions) Line($"{caution}");

        if (modelWritten) Line($"wrote {names.CheckedModel}");
        Line($"wrote {names.Report}");
        Line($"wrote {names.MembersTable}");
        Line($"wrote {names.RunRecord}");
    }

    private static void PrintOverstressed(List<MemberResult> worst)
    {
        var listed = worst.Take(MostListed).ToList();
        if (Console.IsOutputRedirected)
        {
            foreach (var m in listed)
                Line($"OVERSTRESSED {m.Governing!.Utilization:0.000} {m.Key} '{Plain(m.Name)}' {m.Section}, {m.Governing.Situation}, x = {m.Governing.Station:0.###} m, {m.Governing.Point.Place}");
        }
        else
        {
            var table = new Table().Border(TableBorder.Simple);
            foreach (var heading in new[] { "overstressed", "utilization", "section", "situation", "x [m]", "where" }) table.AddColumn(heading.EscapeMarkup());
            foreach (var m in listed)
                table.AddRow(
                    Plain(m.Name.Length > 0 ? m.Name : m.Key).EscapeMarkup(), m.Governing!.Utilization.ToString("0.000", CultureInfo.InvariantCulture), m.Section.EscapeMarkup(),
                    Plain(m.Governing.Situation).EscapeMarkup(), m.Governing.Station.ToString("0.###", CultureInfo.InvariantCulture), m.Governing.Point.Place.EscapeMarkup());
            AnsiConsole.Write(table);
        }

        if (worst.Count > listed.Count) Line($"and {worst.Count - listed.Count} more overstressed");
    }

    /// <summary>Model text on a terminal: control characters would be commands to it.</summary>
    private static string Plain(string text) => string.Concat(text.Select(c => char.IsControl(c) ? '\u00b7' : c));

    private static void Line(FormattableString text) => Console.Out.WriteLine(text.ToString(CultureInfo.InvariantCulture));
}
