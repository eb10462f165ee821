using System.Globalization;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Readiness;
using Spectre.Console;

namespace MemberScan.Cli.Members;

/// <summary>The readiness of a model on standard output: a table on a terminal, one line per candidate when redirected, then the totals.</summary>
internal static class MembersPrint
{
    /// <summary>Writes it.</summary>
    public static void Write(TextWriter output, ReadinessRecord record, bool plain)
    {
        void Line(FormattableString text) => output.WriteLine(text.ToString(CultureInfo.InvariantCulture));

        if (plain) foreach (var member in record.Members) output.WriteLine(PlainLine(member));
        else if (!record.Members.IsEmpty) WriteTable(output, record);

        foreach (var group in record.Members.GroupBy(m => m.Class).OrderBy(g => g.Key, StringComparer.Ordinal))
            Line($"{group.Key}: {group.Count()} {(group.Count() == 1 ? "candidate" : "candidates")}, {group.Count(m => m.Section.Length > 0)} with a section, {group.Count(m => m.Strength is not null)} with a strength, {group.Count(m => m.Situations > 0)} with forces");
        foreach (var passed in record.PassedOver) Line($"{passed.Class}: {passed.Count} passed over, {passed.Why}");
        foreach (var total in record.Totals) output.WriteLine(total.Line);
        if (record.HasDamage) Line($"The model is damaged; the findings say what was passed over.");
        if (!record.Model.ReadToEnd) Line($"The model could not be read to its end.");
        Line($"{record.Model.FileName}: {record.Ready} ready + {record.Members.Length - record.Ready} with something missing = {record.Members.Length} candidates");
    }

    private static string PlainLine(MemberReadiness m)
    {
        string[] parts =
        [
            m.IsReady ? "ready" : "missing", m.Key, $"'{Clean(m.Name)}'", Class(m), $"{m.RoleGuess}?", Place(m), Section(m), Material(m), Length(m), Forces(m),
            .. m.IsReady ? [] : new[] { string.Join(", ", m.Missing.Select(r => r.Code.Text())) },
        ];
        return string.Join(" | ", parts);
    }

    private static void WriteTable(TextWriter output, ReadinessRecord record)
    {
        var console = AnsiConsole.Create(new AnsiConsoleSettings { Out = new AnsiConsoleOutput(output) });
        var table = new Table().Border(TableBorder.Simple);
        foreach (var heading in new[] { "member", "class, role (guess)", "place", "section", "material", "length", "forces", "missing" }) table.AddColumn(heading.EscapeMarkup());
        foreach (var m in record.Members)
            table.AddRow(
                Clean(m.Name.Length > 0 ? $"{m.Name} {m.Key}" : m.Key).EscapeMarkup(), $"{Class(m)}, {m.RoleGuess}?".EscapeMarkup(), Place(m).EscapeMarkup(), Section(m).EscapeMarkup(), Material(m).EscapeMarkup(),
                Length(m).EscapeMarkup(), Forces(m).EscapeMarkup(), (m.IsReady ? "nothing" : string.Join(", ", m.Missing.Select(r => r.Code.Text()))).EscapeMarkup());
        console.Write(table);
    }

    private static string Class(MemberReadiness m) => m.Identity.PredefinedType.Length > 0 ? $"{m.Class} {Clean(m.Identity.PredefinedType)}" : m.Class;

    private static string Place(MemberReadiness m)
    {
        (string Word, string Text)[] parts = [("", m.Identity.StoreyPath), ("assembly ", m.Identity.Assembly), ("type ", m.Identity.TypeName), ("layer ", m.Identity.Layer)];
        var known = string.Join(", ", parts.Where(p => p.Text.Length > 0).Select(p => p.Word + Clean(p.Text)));
        return known.Length > 0 ? known : "no place";
    }

    private static string Section(MemberReadiness m) => m.Section.Length > 0 ? $"{m.Section} ({Clean(m.SectionSource)})" : "no section";

    private static string Material(MemberReadiness m) => m.Strength is { } strength
        ? string.Create(CultureInfo.InvariantCulture, $"{Clean(m.Material)} fy {strength / 1e6:0.###} MPa ({Clean(m.StrengthSource)})")
        : $"{(m.Material.Length > 0 ? Clean(m.Material) : "no material")}, no strength";

    private static string Length(MemberReadiness m) => m.Length is { } length ? string.Create(CultureInfo.InvariantCulture, $"{length:0.###} m") : "no length";

    private static string Forces(MemberReadiness m) => m.Situations > 0
        ? string.Create(CultureInfo.InvariantCulture, $"{m.Situations} {(m.Situations == 1 ? "situation" : "situations")}, {m.Stations} stations")
        : "no forces";

    /// <summary>Model text on a terminal: control characters would be commands to it.</summary>
    private static string Clean(string text) => string.Concat(text.Select(c => char.IsControl(c) ? '\u00b7' : c));
}
