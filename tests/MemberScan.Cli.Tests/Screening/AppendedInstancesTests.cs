using System.Buffers;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.WriteBack;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.OpenModels;
using MemberScan.Part21;
using MemberScan.Part21.Containers;
using MemberScan.Screening;

namespace MemberScan.Cli.Tests.Screening;

/// <summary>What is appended to each sample and each open model, held against the published attribute tables and the standard's rules for property sets.</summary>
public sealed class AppendedInstancesTests
{
    public static TheoryData<string> Models => [.. Directory.EnumerateFiles(Memberscan.Sample(""), "*.ifc").Concat(OpenModel.All)];

    [Theory]
    [MemberData(nameof(Models))]
    public void Instances_fit_the_schema_and_the_rules_of_property_sets(string path)
    {
        var (file, first, schema) = Screened(path);
        var rules = SchemaRules.Of(schema);
        var added = file.Records.Where(r => r.Id > first).ToList();

        Assert.NotEmpty(added);
        Assert.Empty(added.SelectMany(r => rules.Faults(file, r)));
        var sets = added.Where(r => r.Keyword == "IFCPROPERTYSET").ToList();
        Assert.All(sets, set =>
        {
            Assert.Equal(StressCheckSet.SetName, Text(set[2]));
            var names = set[4].Items.Select(i => Text(Follow(file, i)[0])).ToList();
            Assert.Equal(names.Count, names.Distinct(StringComparer.Ordinal).Count());
        });

        // One relation per set, one object per relation, and no object carries the set twice.
        var relations = file.RecordsOf("IFCRELDEFINESBYPROPERTIES").Where(r => sets.Exists(s => r[5].TryReference(out var id) && id == s.Id)).ToList();
        Assert.Equal(sets.Count, relations.Count);
        Assert.All(relations, r => Assert.Single(r[4].Items));
        Assert.Equal(relations.Count, relations.Select(r => Follow(file, r[4].Items[0]).Id).Distinct().Count());
        Assert.DoesNotContain(relations, r => Follow(file, r[4].Items[0]).Keyword.EndsWith("TYPE", StringComparison.Ordinal));

        // No orphan: whatever is not a relation is referred to.
        var used = added.SelectMany(r => References(r.Arguments())).ToHashSet();
        Assert.DoesNotContain(added, r => !r.Keyword.StartsWith("IFCREL", StringComparison.Ordinal) && !used.Contains(r.Id));

        var ids = file.Records.Where(r => r.Id > first && Text(r[0]).Length == 22 && r.ArgumentCount > 4).Select(r => Text(r[0])).ToList();
        Assert.Equal(ids.Count, ids.Distinct(StringComparer.Ordinal).Count());
    }

    private static IEnumerable<ulong> References(IEnumerable<Part21Value> values) =>
        values.SelectMany(v => v.TryReference(out var id) ? [id] : v.Kind == Part21ValueKind.List ? References(v.Items) : []);

    private static (Part21File File, ulong First, string Schema) Screened(string path)
    {
        var (text, _) = ModelContainer.Read(path);
        var request = new ScreeningRequest { Model = ModelText.Of(text, Path.GetFileName(path)), Settings = Settings.Default, Timestamp = "", Version = "0", WithSetTemplate = true };
        var outcome = Screener.Run(request, new DiagnosticList());
        Assert.NotNull(outcome);
        Assert.SkipUnless(outcome.CanWriteModel, "the model is not read to its end");
        Assert.SkipWhen(outcome.Record.Members.IsEmpty, "no candidates, so no results");
        var output = new ArrayBufferWriter<byte>();
        outcome.WriteModel(output);
        var first = Part21File.Read(text, "base", new DiagnosticList()).HighestId;
        return (Part21File.Read(output.WrittenMemory, "checked", new DiagnosticList()), first, outcome.Record.Model.ReadAs);
    }

    private static Part21Record Follow(Part21File file, Part21Value value) =>
        value.TryReference(out var id) && file.TryFind(id, out var record) ? record : throw new InvalidDataException("a reference to nothing");

    private static string Text(Part21Value value) => value.TryText(out var text) ? text : "";
}
