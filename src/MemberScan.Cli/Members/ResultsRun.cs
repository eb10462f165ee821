using System.Collections.Immutable;
using System.Globalization;
using System.Text;
using MemberScan.Cli.Files;
using MemberScan.Cli.Screening;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc;
using MemberScan.Ifc.WriteBack;
using MemberScan.Model.Rules;
using MemberScan.Part21;
using MemberScan.Reporting;

namespace MemberScan.Cli.Members;

/// <summary>Reading results back out of a model, so that a script of the modeler can be checked.</summary>
internal static class ResultsRun
{
    private const string Header = "globalId,stepId,class,name";

    /// <summary>Runs and returns the exit code: 0 results were read, 2 the model carries none, 3 it was not read to its end.</summary>
    public static int Execute(string model, string? csv, string? json, TextWriter output)
    {
        if (json is not null) throw new Failure(ExitCodes.Usage, "--json does not go with --results; use --csv.");
        if (csv is not null) OutputNames.RefuseClashes([csv], [model]);

        var (bytes, _) = InputFile.ReadModel(model);
        var diagnostics = new DiagnosticList();
        var file = Part21File.Read(bytes, Path.GetFileName(model), diagnostics);
        var results = IfcModel.Open(file, new ReadingRules(), diagnostics) is { } opened ? ResultReader.Read(opened) : [];
        using (var log = new FindingLog(verbose: false)) log.Write(diagnostics);
        if (csv is not null) Write(csv, results);
        foreach (var element in results) output.WriteLine(Line(element));
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{Path.GetFileName(model)}: {results.Length} elements with results, {results.Select(r => Text(r, "RunId")).Distinct(StringComparer.Ordinal).Count()} runs"));
        if (csv is not null) output.WriteLine($"wrote {csv}");
        return !file.ReadToEnd ? ExitCodes.NotReadToEnd : results.IsEmpty ? ExitCodes.NotChecked : 0;
    }

    private static string Line(ElementResults element)
    {
        var number = element.Values.FirstOrDefault(v => v.Name == "Utilization")?.Number;
        var utilization = number is { } u ? string.Create(CultureInfo.InvariantCulture, $" {u:0.000}") : "";
        string[] parts = [Text(element, "Status") + utilization, element.GlobalId, $"'{element.Name}'", element.Keyword, Text(element, "Reason"), Text(element, "Situation"), Text(element, "RunId")];
        return string.Concat(string.Join(" | ", parts.Where(p => p.Length > 0)).Select(c => char.IsControl(c) ? '\u00b7' : c));
    }

    private static string Text(ElementResults element, string property) => element.Values.FirstOrDefault(v => v.Name == property)?.Text ?? "";

    private static void Write(string path, ImmutableArray<ElementResults> results)
    {
        // Columns in the order in which the properties first appear; measures with a unit say it.
        var columns = results.SelectMany(r => r.Values).DistinctBy(v => v.Name).Select(v => (v.Name, Heading: v.Name + Unit(v.Measure))).ToList();
        var table = new StringBuilder(Header);
        foreach (var column in columns) table.Append(',').Append(MembersTable.Field(column.Heading));
        table.Append("\r\n");
        foreach (var element in results)
        {
            string[] texts = [element.GlobalId, element.StepId.ToString(CultureInfo.InvariantCulture), element.Keyword, element.Name];
            var values = columns.Select(c => element.Values.FirstOrDefault(v => v.Name == c.Name) is { } value
                ? value.Number?.ToString("R", CultureInfo.InvariantCulture) ?? MembersTable.Field(value.Text)
                : "");
            table.AppendJoin(',', texts.Select(MembersTable.Field).Concat(values)).Append("\r\n");
        }

        try
        {
            using var files = new OutputSet();
            files.Add(path, Encoding.UTF8.GetBytes(table.ToString()));
            files.Commit();
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            throw new Failure(ExitCodes.InputOutput, $"The table cannot be written: {e.Message} Nothing was changed; give another file.", e);
        }
    }

    private static string Unit(string measure) => measure switch { "IFCPRESSUREMEASURE" => "[Pa]", "IFCLENGTHMEASURE" => "[m]", _ => "" };
}
